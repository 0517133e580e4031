/** Findings on pipe, element and plate. `{where}` stands for the flow at which it was found. */
import type { FindingWords } from './detail.ts';
import { fittingLabel } from './fittings.ts';
import { noteText } from './notes.ts';

const straight = (side: string): FindingWords => ({
  role: 'bores',
  text: (figure) => `Straight pipe ${side} the element ${figure}`,
  limit: (bounds, detail) => {
    const fitting = detail.text('fitting');
    const parts = [
      fitting === 'downstream' ? bounds : `${bounds} for: ${lower(fittingLabel(fitting))}`,
      detail.has('reduced') ? `${detail.limit('reduced', 'bores')} adds 0.5\u00a0% to the uncertainty of C` : '',
      detail.has('both') ? 'not shortened on both sides at once' : '',
      detail.has('note') ? lower(noteText(detail.text('note'))) : '',
    ];
    return parts.filter((part) => part !== '').join('; ');
  },
});

const lower = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);

export const checksOfSize: Readonly<Record<string, FindingWords>> = {
  'pipe-bore': { role: 'bore', text: (figure) => `Pipe bore ${figure}` },
  'element-bore': { role: 'bore', text: (figure) => `Bore of the element ${figure}` },
  'diameter-ratio': { role: 'ratio', text: (figure) => `Diameter ratio ${figure}` },
  'pipe-roughness': { role: 'roughness', text: (figure) => `Pipe roughness Ra ${figure}` },
  'straight-upstream': straight('before'),
  'straight-downstream': straight('after'),
  'plate-thickness': { role: 'length', text: (figure) => `Plate thickness E ${figure}` },
  'plate-thickness-edge': { role: 'length', text: (figure) => `Edge thickness e ${figure}` },
  'plate-edge-order': {
    role: 'length',
    text: (figure) => `Edge thickness e ${figure}, more than the plate it is cut from`,
  },
  'plate-bending': {
    role: 'length',
    text: (figure) => `Plate thickness E ${figure} against lasting bending{where}`,
  },
};

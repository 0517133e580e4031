/**
 * Figures put in place of the model's that the panel of the state does not show: there is no result yet, or this state
 * has no use for them. They stay at hand so that they can be mended or taken back.
 */
import { stateLabels } from '../../words/rows.ts';
import { useSelectedMeter } from '../meter.ts';
import { textAt } from '../text.ts';
import { OverrideField } from './OverrideField.tsx';
import { OVERRIDES, overridePath } from './overrides.ts';

export function LostOverrides() {
  const selected = useSelectedMeter();
  const lost = OVERRIDES.filter(
    (name) =>
      textAt(selected?.meter, overridePath(name)) !== '' && !selected?.sizing?.state.some(({ id }) => id === name),
  );
  return lost.map((name) => <OverrideField key={name} name={name} label={stateLabels[name]} />);
}

/** The drawn elements, by the kind that begins an element's code. */
import { averagingPitot } from './averaging-pitot.ts';
import type { Draft } from './contract.ts';
import { isa1932Nozzle } from './isa-1932-nozzle.ts';
import { longRadiusNozzle } from './long-radius-nozzle.ts';
import { orificePlate } from './orifice-plate.ts';
import { venturiNozzle } from './venturi-nozzle.ts';
import { venturiTube } from './venturi-tube.ts';

const drafts: Readonly<Record<string, Draft>> = {
  'orifice-plate': orificePlate,
  'isa-1932-nozzle': isa1932Nozzle,
  'long-radius-nozzle': longRadiusNozzle,
  'venturi-nozzle': venturiNozzle,
  'venturi-tube': venturiTube,
  'averaging-pitot': averagingPitot,
};

/** Kinds that can be drawn. */
export const drawnKinds: readonly string[] = Object.keys(drafts);

/** The draft for an element's code, 'orifice-plate.flange'. */
export function draftOf(code: string): Draft {
  const kind = code.split('.')[0] ?? '';
  const draft = drafts[kind];
  if (draft === undefined) throw new Error(`draftOf: expected one of ${drawnKinds.join(', ')}, got ${code}`);
  return draft;
}

/** Every primary element of this version, by the kind the file writes. */
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import { averagingPitot } from './averaging-pitot.ts';
import type { Element } from './contract.ts';
import { isa1932Nozzle } from './isa-1932-nozzle.ts';
import { longRadiusNozzle } from './long-radius-nozzle.ts';
import { orificePlate } from './orifice-plate.ts';
import { venturiNozzle } from './venturi-nozzle.ts';
import { venturiTube } from './venturi-tube.ts';

/** The elements in the order in which they are offered. */
export const elements: readonly Element[] = [
  orificePlate,
  isa1932Nozzle,
  longRadiusNozzle,
  venturiNozzle,
  venturiTube,
  averagingPitot,
];

/** Kinds that the file format names and this version does not compute. */
export const notOffered: readonly string[] = [
  'cone',
  'wedge',
  'quarter-circle-plate',
  'conical-entrance-plate',
  'eccentric-plate',
  'segmental-plate',
];

/** The element of a kind. Problems at `element.kind`: field-missing, element-not-offered, element-unknown. */
export const elementOf = (kind: string | undefined): Outcome<Element> => {
  const known = elements.map((one) => one.kind).join(', ');
  if (kind === undefined || kind === '') return fail('field-missing', 'element.kind', { choices: known });
  const element = elements.find((one) => one.kind === kind);
  if (element !== undefined) return ok(element);
  const code = notOffered.includes(kind) ? 'element-not-offered' : 'element-unknown';
  return fail(code, 'element.kind', { written: kind, known });
};

/** One traverse of the document -> parsed quantities, or every problem found. Which points the rule has is asked later. */
import type { TraverseText } from '../document/project.ts';
import { as } from '../quantity/brand.ts';
import type { Length, PressureDifference } from '../quantity/kinds.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import { type Form, failed, openForm } from './form.ts';
import {
  type Manometer,
  type Probe,
  readAngle,
  readCorrections,
  readManometer,
  readProbe,
  readTraverseUncertainty,
  type TraverseCorrections,
  type TraverseUncertainty,
} from './traverse-probe.ts';
import {
  type Profile,
  RULES,
  readCount,
  readProfile,
  readSection,
  readStraight,
  type Section,
  WALL_RULES,
} from './traverse-section.ts';

/** What was read at a point: a pressure difference, or the length of a manometer's column. */
export type Reading =
  | { readonly of: 'pressure'; readonly value: PressureDifference }
  | { readonly of: 'column'; readonly value: Length };

export interface TraverseInput {
  readonly tag: string;
  readonly section: Section;
  readonly rule: (typeof RULES)[number];
  readonly lines?: number;
  readonly pointsPerLine?: number;
  readonly profile?: Profile;
  /** What becomes of points nearer to the wall than the rule or the probe allows. */
  readonly wallRule: (typeof WALL_RULES)[number];
  /** Length of the port, from its outer end to the inside of the wall. */
  readonly port: Length;
  readonly straight: { readonly before?: number; readonly after?: number }; // hydraulic diameters
  readonly probe: Probe;
  readonly manometer?: Manometer;
  /** By line and point; a point that is not read yet is absent. */
  readonly readings: readonly (readonly (Reading | undefined)[])[];
  /** Of a second probe that stays at one point, in the order of time. */
  readonly reference: readonly Reading[];
  /** Mean of the angles at which the probe reads nothing, rad. */
  readonly nullAngle?: number;
  readonly corrections: TraverseCorrections;
  readonly uncertainty: TraverseUncertainty;
}

export const MOST_COUNT = 40; // lines, or points on one

/** Reads a traverse whose shape is checked. */
export function readTraverse(traverse: TraverseText): Outcome<TraverseInput> {
  const form = openForm(traverse);
  const section = readSection(form);
  const rule = form.choice('rule', RULES, true);
  const counted = rule !== undefined && rule !== 'single-point' && !(rule === 'log-linear' && isRectangular(section));
  const lines = readCount(form, 'lines', MOST_COUNT, counted);
  const pointsPerLine = readCount(form, 'pointsPerLine', MOST_COUNT, counted);
  const profile = rule === 'single-point' ? readProfile(form) : undefined;
  const wallRule = form.choice('wallRule', WALL_RULES) ?? 'leave';
  const port = readPort(form);
  const [before, after] = [readStraight(form, 'before', section), readStraight(form, 'after', section)];
  const probe = readProbe(form, traverse.probe?.calibration?.length ?? 0);
  const manometer = readManometer(form);
  const readings = (traverse.readings ?? []).map((line, at) =>
    line.map((_, point) => readReading(form, `readings.${at}.${point}`)),
  );
  const reference = (traverse.reference ?? []).flatMap((_, at) => readReading(form, `reference.${at}`) ?? []);
  const nullAngle = readAngle(form, 'nullAngle');
  const corrections = readCorrections(form);
  const uncertainty = readTraverseUncertainty(form);
  if (form.problems.length > 0 || !(section && rule && probe)) return failed(form);
  const optional = { lines, pointsPerLine, profile, manometer, nullAngle };
  return ok({
    ...(known(optional) as Pick<TraverseInput, keyof typeof optional>),
    tag: traverse.tag ?? '',
    section,
    rule,
    wallRule,
    port,
    straight: known({ before, after }),
    probe,
    readings,
    reference,
    corrections,
    uncertainty,
  });
}

const isRectangular = (section: Section | undefined): boolean => section?.shape === 'rectangular';

/** The keys of a group that have a value. */
function known<Group extends object>(group: Group): { [Key in keyof Group]?: Exclude<Group[Key], undefined> } {
  const entries = Object.entries(group).filter(([, value]) => value !== undefined);
  return Object.fromEntries(entries) as { [Key in keyof Group]?: Exclude<Group[Key], undefined> };
}

function readPort(form: Form): Length {
  const port = form.quantity('port', ['length']);
  if (port !== undefined && port.si < 0) form.report('negative', 'port', { written: port.number });
  return port?.si ?? as<'length'>(0);
}

/** A reading, or nothing where none is written. A length needs the manometer that it was read on. */
function readReading(form: Form, field: string): Reading | undefined {
  const read = form.quantity(field, ['pressure difference', 'length']);
  if (read === undefined) return undefined;
  if (read.measure !== 'length') return { of: 'pressure', value: read.si };
  const manometer = (form.group as TraverseText).manometer;
  if (manometer === undefined) return form.report('manometer-missing', field, { written: read.unit.symbol });
  return { of: 'column', value: read.si };
}

/**
 * Turns the question round. The figure that was found becomes an input, in the unit its field had, so that the new
 * question has all it needs.
 */
import type { Display, Unknown } from '../../../core/document/project.ts';
import { spell } from '../../../core/quantity/digits.ts';
import { fromSI, type Unit, unitOf } from '../../../core/quantity/units.ts';
import type { Solved } from '../../../core/result/record.ts';
import type { Workbench } from '../../../state/workbench.ts';
import { show } from '../../present/numbers.ts';
import { roundingOf } from '../../present/rounding.ts';
import { openingWord } from '../../words/elements.ts';
import { textAt } from '../text.ts';
import { quantityKind } from './quantities.ts';
import { split } from './split.ts';

export const FIELD_OF: Readonly<Record<Unknown, string>> = {
  bore: 'element.bore',
  differential: 'differential',
  flow: 'duty.maximum',
};

/** The unknown a meter asks for; a meter that does not say asks for its bore. */
export const unknownOf = (find: unknown): Unknown => (find === 'differential' || find === 'flow' ? find : 'bore');

interface Figure {
  readonly si: number;
  readonly unit: string; // SI, of the measure that the result is in
}

/** The found figure of a solved meter. A flow keeps the kind its field had: mass, actual or base volume. */
function figure(unknown: Unknown, solved: Solved, measure: Unit['measure'] | undefined): Figure | undefined {
  const point = solved.points.maximum;
  const bore = solved.boreAsMeasured_m;
  if (unknown === 'bore') return bore === undefined ? undefined : { si: bore, unit: 'm' };
  if (point === undefined) return undefined;
  if (unknown === 'differential') return { si: point.differential_Pa, unit: 'Pa' };
  if (measure === 'volume flow') return { si: point.volumeFlow_m3_s, unit: 'm3/s' };
  if (measure === 'base volume flow' && point.baseVolumeFlow_m3_s !== undefined)
    return { si: point.baseVolumeFlow_m3_s, unit: 'base m3/s' };
  return { si: point.massFlow_kg_s, unit: 'kg/s' };
}

/** As many as a drawing or a range carries, so that the new question answers with what was shown before. */
const DIGITS = { significant: 5, typographic: false } as const;

/** Text of the found figure for its own field; undefined where the result has none. */
export function foundText(unknown: Unknown, solved: Solved, written: string, display: Display): string | undefined {
  const { measures, unit: first } = quantityKind(FIELD_OF[unknown]);
  const usual = unitOf(first[display], measures);
  const to = split(written, measures).unit ?? usual;
  const found = figure(unknown, solved, to?.measure);
  const from = found && unitOf(found.unit, measures);
  if (found === undefined || from === undefined) return undefined;
  const target = to?.measure === from.measure ? to : usual?.measure === from.measure ? usual : from;
  const number = Number(spell(fromSI(found.si, target), DIGITS)); // and no zeros behind it
  return `${number} ${target.symbol}`;
}

/** Makes `unknown` the question of the selected meter, as one step of undo. */
export function turnTo(unknown: Unknown, { project, results, selected, writeAll }: Workbench): void {
  const meter = project.meters[selected];
  const result = results.results[selected];
  const formerly = unknownOf(meter?.find);
  if (meter === undefined || formerly === unknown) return;
  const path = FIELD_OF[formerly];
  const text =
    result?.status === 'solved' ? foundText(formerly, result, textAt(meter, path), project.display ?? 'SI') : undefined;
  writeAll([...(text === undefined ? [] : [[path, text] as const]), ['find', unknown]]);
}

/** Takes a kind of element. One without a bore cannot be asked for it: the differential becomes the question. */
export function kindTo(kind: string, { project, selected, write, writeAll }: Workbench): void {
  const asksBore = unknownOf(project.meters[selected]?.find) === 'bore';
  if (asksBore && openingWord(kind) === 'none')
    writeAll([
      ['element.kind', kind],
      ['find', 'differential'],
    ]);
  else write('element.kind', kind);
}

/**
 * Takes the bore that was pulled in the drawing. A bore that was the unknown becomes an input, and the differential
 * follows it; with the flow unknown, the flow does.
 */
export function pullTo(ratio: number, { project, results, selected, write }: Workbench): void {
  const meter = project.meters[selected];
  const result = results.results[selected];
  if (meter === undefined || result?.status !== 'solved') return;
  const { measures, unit: first } = quantityKind(FIELD_OF.bore);
  const unit = split(textAt(meter, FIELD_OF.bore), measures).unit ?? unitOf(first[project.display ?? 'SI'], measures);
  if (unit === undefined) return;
  if (unknownOf(meter.find) === 'bore') write('find', 'differential');
  write(FIELD_OF.bore, show(ratio * result.pipeAsMeasured_m, unit, roundingOf('bore', unit.symbol)).plain);
}

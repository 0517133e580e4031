/** What every part of a presented meter looks at: what was written, what was found, and how figures are printed. */
import type { Display, MeterText, Project } from '../../core/document/project.ts';
import type { Quantity } from '../../core/quantity/text.ts';
import type { Measure } from '../../core/quantity/units.ts';
import type { PointRecord, Solved } from '../../core/result/record.ts';
import type { Role } from '../words/print.ts';
import type { Value } from './model.ts';
import { asWritten, type Printer, plainNumber, printer } from './numbers.ts';
import { belongs, displayUnits, flowMeasures, flowRole, written } from './units.ts';

export interface Context extends Printer {
  readonly meter: MeterText;
  readonly display: Display;
  /** What the user wrote, digit for digit, where its unit is at home in the display; else the figure in its unit. */
  readonly given: (text: unknown, measures: readonly Measure[], si: number, role: Role) => Value;
  /** What the user wrote and could be read, in the display; absent where there is nothing. */
  readonly stated: (text: unknown, measures: readonly Measure[], role: Role) => Value | undefined;
  /** A plain number as the user wrote it; absent where there is none. */
  readonly number: (text: unknown) => Value | undefined;
  /** The flow of a point in the measure and unit of this meter. */
  readonly flow: (point: PointRecord) => Value;
  /** The flow as the user wrote it, where it is at home in the display. */
  readonly givenFlow: (text: unknown, point: PointRecord) => Value;
}

/** Reads the meter as far as it can be read: a refused one may hold anything. */
export function contextOf(meter: MeterText, project: Project): Context {
  const sound: MeterText = isGroup(meter) ? meter : {};
  const display = project.display === 'US' ? 'US' : 'SI';
  const units = displayUnits(sound, display);
  const { value, print } = printer(units);
  const own = (read: Quantity | undefined): Value | undefined =>
    read !== undefined && belongs(read.unit, display) ? asWritten(read) : undefined;
  const role = flowRole(units.flow);
  const flow = (point: PointRecord): Value => {
    const si = flowOf(point, role);
    return si === undefined ? value(point.massFlow_kg_s, 'massFlow') : value(si, role);
  };
  return {
    meter: sound,
    display,
    units,
    value,
    print,
    given: (from, measures, si, as) => own(written(from, measures)) ?? value(si, as),
    stated: (from, measures, as) => {
      const read = written(from, measures);
      return read === undefined ? undefined : (own(read) ?? value(read.si, as));
    },
    number: plainNumber,
    flow,
    givenFlow: (from, point) => own(written(from, flowMeasures)) ?? flow(point),
  };
}

const isGroup = (meter: unknown): boolean => typeof meter === 'object' && meter !== null && !Array.isArray(meter);

/** The flow of a point in one measure; absent where the fluid has no base state. */
export function flowOf(point: PointRecord, role: ReturnType<typeof flowRole>): number | undefined {
  if (role === 'volumeFlow') return point.volumeFlow_m3_s;
  return role === 'baseVolumeFlow' ? point.baseVolumeFlow_m3_s : point.massFlow_kg_s;
}

/** Maximum flow: every solved meter has it. */
export function maximumOf(result: Solved): PointRecord {
  const point = result.points.maximum;
  if (point === undefined) throw new Error(`expected a maximum flow in the result of ${result.tag}, got none`);
  return point;
}

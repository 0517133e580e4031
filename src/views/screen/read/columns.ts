/** The columns that are typed in the table of readings, as the instrument asks for them. */
import type { Display } from '../../../core/document/project.ts';
import { type Unit, unitOf } from '../../../core/quantity/units.ts';
import { readWords as words } from '../../words/readings.ts';
import type { QuantityKind } from '../field/quantities.ts';
import { columnUnit, type TableColumn } from '../fluid/rows.ts';

/** A column of quantities, or the one of times, which are text. */
export type ReadColumn = TableColumn | { readonly name: 'time'; readonly label: string; readonly kind?: undefined };

const kind = (measures: QuantityKind['measures'], si: string, us: string): QuantityKind => ({
  measures,
  unit: { SI: si, US: us },
});
const pressure = kind(['gauge pressure', 'absolute pressure'], 'bar(g)', 'psi(g)');
const length = kind(['length'], 'mm', 'in');
const signals: Readonly<Record<string, QuantityKind>> = {
  '4-20 mA': kind(['current'], 'mA', 'mA'),
  '1-5 V': kind(['voltage'], 'V', 'V'),
  percent: kind(['share'], '%', '%'),
};
const difference = kind(['pressure difference'], 'mbar', 'inH2O');

function shownOf(instrument: string, signal: string): QuantityKind {
  if (instrument === 'transmitter') return signals[signal] ?? (signals['4-20 mA'] as QuantityKind);
  return instrument === 'differential' ? difference : length;
}

export function readColumns(instrument: string, signal: string, lowRange: boolean): readonly ReadColumn[] {
  const shown = shownOf(instrument, signal);
  const read: readonly ReadColumn[] =
    instrument === 'gauges'
      ? [
          { name: 'upstream', label: words.upstream, kind: pressure },
          { name: 'throat', label: words.throat, kind: pressure },
        ]
      : [
          { name: 'value', label: words.value, kind: shown },
          ...(lowRange ? [{ name: 'lowRange', label: words.lowRange, kind: shown }] : []),
        ];
  return [
    { name: 'time', label: words.time },
    ...read,
    { name: 'pressure', label: words.pressure, kind: pressure },
    { name: 'temperature', label: words.temperature, kind: kind(['temperature'], 'degC', 'degF') },
  ];
}

export type Units = Readonly<Record<string, Unit>>;

/** The unit of each column: as chosen, as its rows are written, else the usual one of the display. */
export function unitsOf(
  rows: readonly unknown[],
  columns: readonly ReadColumn[],
  chosen: Units,
  display: Display,
): Units {
  return Object.fromEntries(
    columns.flatMap((column) => {
      if (column.kind === undefined) return [];
      const picked = chosen[column.name];
      const own = picked !== undefined && column.kind.measures.includes(picked.measure) ? picked : undefined;
      const usual = unitOf(column.kind.unit[display], column.kind.measures);
      const unit = own ?? columnUnit(rows, column) ?? usual;
      if (unit === undefined) throw new Error(`expected a unit of ${column.name}, got ${column.kind.unit[display]}`);
      return [[column.name, unit] as const];
    }),
  );
}

/** The unit above a column; choosing another converts its rows. */
import { type Unit, unitOf } from '../../../core/quantity/units.ts';
import { tableWords as words } from '../../words/fluid-forms.ts';
import { UnitOptions } from '../field/UnitOptions.tsx';
import type { TableColumn } from './rows.ts';

interface Props {
  readonly column: TableColumn;
  readonly unit: Unit | undefined;
  readonly choose: (unit: Unit) => void;
}

export function ColumnUnit({ column: { label, kind }, unit, choose }: Props) {
  return (
    <select
      aria-label={words.unit(label)}
      title={unit?.words}
      value={unit?.symbol}
      onChange={(event) => {
        const next = unitOf(event.target.value, kind.measures);
        if (next !== undefined) choose(next);
      }}
    >
      <UnitOptions measures={kind.measures} />
    </select>
  );
}

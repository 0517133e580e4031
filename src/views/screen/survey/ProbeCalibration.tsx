/** The calibration of the probe: its coefficient at each velocity. It replaces the one coefficient. */

import { type Unit, unitOf } from '../../../core/quantity/units.ts';
import { tableWords } from '../../words/fluid-forms.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { quantityKind } from '../field/quantities.ts';
import { Cell } from '../fluid/Cell.tsx';
import styles from '../fluid/inputs.module.css';
import { Problems } from '../fluid/Problems.tsx';
import { columnUnit, fileCell, rowsIn, shownCell, type TableColumn } from '../fluid/rows.ts';
import { useWrite, useWriteAll, useWritten } from '../hand.tsx';
import { textAt } from '../text.ts';

const PATH = 'probe.calibration';
const velocity: TableColumn = { name: 'velocity', label: words.velocity, kind: quantityKind('probe.calibration') };
const same = (text: string): string => text;

export function ProbeCalibration() {
  const rows = rowsIn(useWritten(PATH));
  const display = useWorkbench((state) => state.project.display ?? 'SI');
  const unit = columnUnit(rows, velocity) ?? unitOf(velocity.kind.unit[display], velocity.kind.measures);
  if (unit === undefined) throw new Error(`expected a unit of velocity, got ${velocity.kind.unit[display]}`);
  return (
    <>
      <table className={styles.table}>
        <caption>{words.calibration}</caption>
        <thead>
          <tr>
            <th scope="col">
              {velocity.label} / {unit.print}
            </th>
            <th scope="col">{words.coefficient}</th>
            <td className={styles.narrow} />
          </tr>
        </thead>
        <tbody>
          {[...rows, undefined].map((row, at) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: a row is its place in the list
            <Row key={at} row={row} at={at} unit={unit} last={at === rows.length} />
          ))}
        </tbody>
      </table>
      <Problems below={PATH} />
    </>
  );
}

interface RowProps {
  readonly row: unknown;
  readonly at: number;
  readonly unit: Unit;
  readonly last: boolean;
}

function Row({ row, at, unit, last }: RowProps) {
  const settle = useWorkbench((state) => state.settle);
  const write = useWrite();
  const writeAll = useWriteAll();
  const path = `${PATH}.${at}`;
  const cell = (name: string, label: string) => ({
    path: `${path}.${name}`,
    label: tableWords.row(label, at),
    text: textAt(row, name),
    write: (text: string) => write(`${path}.${name}`, text),
    settle,
    paste: () => undefined,
  });
  const shown = (text: string): string => shownCell(text, velocity, unit);
  const file = (typed: string): string => fileCell(typed, velocity, unit);
  const remove = (): void => writeAll([[path, undefined]]);
  return (
    <tr>
      <td>
        <Cell {...cell('velocity', velocity.label)} shown={shown} file={file} />
      </td>
      <td>
        <Cell {...cell('coefficient', words.coefficient)} shown={same} file={same} />
      </td>
      <td className={styles.narrow}>
        {!last && (
          <button type="button" className={buttons.remove} aria-label={tableWords.remove(at)} onClick={remove}>
            ×
          </button>
        )}
      </td>
    </tr>
  );
}

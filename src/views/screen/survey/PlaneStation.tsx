/** Station 4: the plane, the second probe, corrections that are chosen, and how sure the inputs are. */
import { surveyPlace as words } from '../../words/survey-place.ts';
import { blockageChoices } from '../../words/surveys.ts';
import { useWorkbench } from '../binding.tsx';
import { MeterTextField } from '../field/MeterTextField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { quantityKind } from '../field/quantities.ts';
import { Cell } from '../fluid/Cell.tsx';
import styles from '../fluid/inputs.module.css';
import { Problems } from '../fluid/Problems.tsx';
import { fileCell, rowsIn, shownCell, type TableColumn } from '../fluid/rows.ts';
import { UsualChoice } from '../fluid/UsualChoice.tsx';
import { useWrite, useWritten } from '../hand.tsx';
import { Fold } from '../station/Fold.tsx';
import { Station } from '../station/Station.tsx';
import type { Readings } from './readings.ts';

export function PlaneStation({ readings }: { readonly readings: Readings }) {
  return (
    <Station number={4} title={words.stations[3]}>
      <QuantityField path="straight.before" label="Straight before" />
      <QuantityField path="straight.after" label="Straight after" />
      <QuantityField path="nullAngle" label="Mean null angle" />
      <Fold title="Second probe, corrections">
        <Reference readings={readings} />
        <UsualChoice path="corrections.blockage" label="Stem in the duct" choices={blockageChoices} />
        <QuantityField path="corrections.turbulence" label="Turbulence" />
        <MeterTextField path="corrections.wall" label="Wall factor" decimal />
      </Fold>
      <Fold title={words.sure}>
        <QuantityField path="uncertainty.reading" label="Reading, ±" />
        <QuantityField path="uncertainty.coefficient" label="Coefficient, ±" />
        <QuantityField path="uncertainty.density" label="Density, ±" />
        <QuantityField path="uncertainty.area" label="Area, ±" />
        <QuantityField path="uncertainty.points" label="Points, ±" />
      </Fold>
    </Station>
  );
}

const PATH = 'reference';
const column: TableColumn = { name: PATH, label: words.reading, kind: quantityKind('readings') };

/** Readings of a second probe; an emptied one keeps its place while others follow. */
function Reference({ readings: { unit } }: { readonly readings: Readings }) {
  const list = rowsIn(useWritten(PATH)).map((text) => (typeof text === 'string' ? text : ''));
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const put = (at: number, text: string): void => {
    const next = at < list.length ? list.with(at, text) : [...list, text];
    const last = next.findLastIndex((one) => one !== '');
    write(PATH, last < 0 ? undefined : next.slice(0, last + 1));
  };
  return (
    <>
      <table className={styles.table}>
        <caption>
          {words.reference} / {unit.print}
        </caption>
        <tbody>
          {[...list, ''].map((text, at) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: a reading is its place in time
            <tr key={at}>
              <td>
                <Cell
                  path={`${PATH}.${at}`}
                  label={words.referenceRow(at)}
                  text={text}
                  shown={(own) => shownCell(own, column, unit)}
                  file={(typed) => fileCell(typed, column, unit)}
                  write={(own) => put(at, own)}
                  settle={settle}
                  paste={() => undefined}
                />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <Problems below={PATH} />
    </>
  );
}

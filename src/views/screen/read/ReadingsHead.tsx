/** The head of the table of readings: names, the unit of each typed column, what is found. */
import { type Unit, unitOf } from '../../../core/quantity/units.ts';
import type { PresentedReadings, ReadingColumn } from '../../present/readings-model.ts';
import { readWords as words } from '../../words/readings.ts';
import { UnitOptions } from '../field/UnitOptions.tsx';
import type { ReadColumn, Units } from './columns.ts';
import styles from './Read.module.css';

/** What is found, before the note of a row and after it. */
export const FIRST: readonly ReadingColumn[] = ['differential', 'flow'];
export const MORE: readonly ReadingColumn[] = ['velocity', 'reynolds', 'coefficient', 'expansibility', 'uncertainty'];

interface Props {
  readonly columns: readonly ReadColumn[];
  readonly units: Units;
  readonly found: PresentedReadings['units'] | undefined;
  readonly chooseUnit: (name: string, unit: Unit) => void;
  readonly fill: (name: string) => void;
}

export function ReadingsHead({ columns, units, found, chooseUnit, fill }: Props) {
  return (
    <thead>
      <tr>
        {columns.map((column) => (
          <th key={column.name} scope="col">
            {column.label}
            <UnitOf column={column} unit={units[column.name]} chooseUnit={chooseUnit} />
            {(column.name === 'pressure' || column.name === 'temperature') && (
              <button
                type="button"
                className={styles.fill}
                aria-label={words.fillOf(column.label)}
                title={words.fillOf(column.label)}
                onClick={() => fill(column.name)}
              >
                {words.fill}
              </button>
            )}
          </th>
        ))}
        <Found ids={FIRST} found={found} />
        <th scope="col">{words.note}</th>
        <Found ids={MORE} found={found} />
        <td />
      </tr>
    </thead>
  );
}

interface FoundProps extends Pick<Props, 'found'> {
  readonly ids: readonly ReadingColumn[];
}

const Found = ({ ids, found }: FoundProps) =>
  ids.map((id) => (
    <th key={id} scope="col" className={styles.figure}>
      {words[id]}
      {found !== undefined && found[id] !== '' && <span className={styles.unit}>{found[id]}</span>}
    </th>
  ));

interface UnitProps {
  readonly column: ReadColumn;
  readonly unit: Unit | undefined;
  readonly chooseUnit: (name: string, unit: Unit) => void;
}

function UnitOf({ column, unit, chooseUnit }: UnitProps) {
  if (column.kind === undefined || unit === undefined) return null;
  const { measures } = column.kind;
  return (
    <select
      className={styles.unit}
      aria-label={words.unitOf(column.label)}
      value={unit.symbol}
      onChange={(event) => {
        const next = unitOf(event.target.value, measures);
        if (next !== undefined) chooseUnit(column.name, next);
      }}
    >
      <UnitOptions measures={measures} />
    </select>
  );
}

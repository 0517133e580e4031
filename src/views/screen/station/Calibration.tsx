/** The element's own coefficients: rows of Reynolds number and C. One row is a constant. */
import { coefficientWords, rulesOf } from '../../words/elements.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { useWrite, useWritten } from '../hand.tsx';
import { useMeterText, useProblem } from '../meter.ts';
import { textAt } from '../text.ts';
import styles from './Calibration.module.css';

const PATH = 'element.calibration';
const COLUMNS = [
  { key: 'reynolds', label: 'Re (pipe)' },
  { key: 'coefficient', label: 'C' },
] as const;

/** The columns with the symbol of the element's coefficient. */
const columnsOf = (kind: string) =>
  COLUMNS.map(({ key, label }) => ({ key, label: key === 'coefficient' ? coefficientWords(kind).symbol : label }));

export function Calibration() {
  const problem = useProblem(PATH);
  const kind = useMeterText('element.kind');
  const list = useWritten(PATH);
  const count = Array.isArray(list) ? list.length : 0;
  const rows = Array.from({ length: count + 1 }, (_, at) => at); // one more, to be filled
  return (
    <table className={styles.table}>
      <caption>Calibration, replaces the coefficient of the {rulesOf(kind)}</caption>
      <thead>
        <tr>
          {columnsOf(kind).map(({ key, label }) => (
            <th key={key} scope="col">
              {label}
            </th>
          ))}
          <td />
        </tr>
      </thead>
      <tbody>
        {rows.map((at) => (
          <CalibrationRow key={at} at={at} last={at === count} />
        ))}
      </tbody>
      {problem && <caption className={styles.problem}>{problem}</caption>}
    </table>
  );
}

function CalibrationRow({ at, last }: { readonly at: number; readonly last: boolean }) {
  const row = useWritten(`${PATH}.${at}`);
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const kind = useMeterText('element.kind');
  const path = `${PATH}.${at}`;
  return (
    <tr>
      {columnsOf(kind).map(({ key, label }) => (
        <td key={key}>
          <CalibrationCell
            path={`${path}.${key}`}
            label={`${label}, row ${at + 1}`}
            text={textAt(row, key)}
            write={write}
            settle={settle}
          />
        </td>
      ))}
      <td>
        {!last && (
          <button
            type="button"
            className={buttons.remove}
            aria-label={`Remove row ${at + 1}`}
            onClick={() => write(path, undefined)}
          >
            ×
          </button>
        )}
      </td>
    </tr>
  );
}

interface CellProps {
  readonly path: string;
  readonly label: string;
  readonly text: string;
  readonly write: (path: string, value: unknown) => void;
  readonly settle: () => void;
}

function CalibrationCell({ path, label, text, write, settle }: CellProps) {
  const problem = useProblem(path);
  return (
    <input
      type="text"
      inputMode="decimal"
      autoComplete="off"
      data-field={path}
      aria-label={label}
      aria-invalid={problem !== undefined && text !== ''}
      title={problem}
      value={text}
      onChange={(event) => write(path, event.target.value)}
      onBlur={settle}
    />
  );
}

/** Which column holds what, and in which unit. What is chosen is written into the document, each choice a step of undo. */
import type { Measure } from '../../../core/quantity/units.ts';
import type { PresentedLook } from '../../present/log-model.ts';
import { logFields, logParts, withoutColumn, logWords as words } from '../../words/logs.ts';
import { useWorkbench } from '../binding.tsx';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { UnitOptions } from '../field/UnitOptions.tsx';
import { useWrite, useWriteAll, useWritten } from '../hand.tsx';
import styles from './Log.module.css';
import { unitOfName } from './unit-of-name.ts';
import { useLogProblem } from './useLog.ts';

type Columns = PresentedLook['columns'];

const MEASURES: Readonly<Record<Figures, readonly Measure[]>> = {
  differential: ['pressure difference'],
  signal: ['current', 'voltage', 'share'],
  pressure: ['gauge pressure', 'absolute pressure'],
  temperature: ['temperature'],
};
type Figures = 'differential' | 'signal' | 'pressure' | 'temperature';

/** A column as the document names it: by its name, or by its number where the name says nothing. */
const nameOf = (columns: Columns, at: number): string | number => {
  const name = columns[at]?.name ?? '';
  return columns.filter((one) => one.name === name).length === 1 ? name : at + 1;
};

/** Place of a column that is named or numbered; -1 for one that is not there. */
const placeOf = (columns: Columns, written: unknown): number =>
  typeof written === 'number' ? written - 1 : columns.findIndex(({ name }) => name === written);

export function LogColumns({ look }: { readonly look: PresentedLook }) {
  const hasSignal = useWritten('log.signal') !== undefined;
  const hasDifferential = useWritten('log.differential') !== undefined;
  return (
    <div className={styles.columns}>
      <h3>{words.columns}</h3>
      <div className={styles.fields}>
        <TimeColumn look={look} />
        {(hasDifferential || !hasSignal) && <FigureColumn part="differential" look={look} />}
        {(hasSignal || !hasDifferential) && <FigureColumn part="signal" look={look} />}
        <FigureColumn part="pressure" look={look} open={withoutColumn.pressure} />
        <FigureColumn part="temperature" look={look} open={withoutColumn.temperature} />
      </div>
    </div>
  );
}

interface SelectProps {
  readonly id: string;
  readonly path: string;
  readonly columns: Columns;
  readonly written: unknown;
  readonly open: string;
  readonly problem: string | undefined;
  readonly choose: (at: number) => void;
}

/** The choice of a column; one that the log does not have is kept and shown as it is written. */
function ColumnSelect({ id, path, columns, written, open, problem, choose }: SelectProps) {
  const at = placeOf(columns, written);
  const isForeign = written !== undefined && columns[at] === undefined;
  return (
    <select
      id={id}
      className={styles.column}
      data-field={path}
      aria-invalid={problem !== undefined}
      value={isForeign ? 'foreign' : at}
      onChange={(event) => choose(Number(event.target.value))}
    >
      <option value={-1}>{open}</option>
      {isForeign && <option value="foreign">{String(written)}</option>}
      {columns.map((column) => (
        <option key={column.at} value={column.at}>
          {column.name}
        </option>
      ))}
    </select>
  );
}

function TimeColumn({ look: { columns, decided, hasClock } }: { readonly look: PresentedLook }) {
  const written = useWritten('log.time');
  const isGroup = typeof written === 'object' && written !== null;
  const path = isGroup ? 'log.time.column' : 'log.time';
  const column = isGroup ? (written as { column?: unknown }).column : written;
  const clock = useWritten('log.time.clock');
  const problem = useLogProblem('log.time');
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const choose = (at: number, place = path): void => {
    write(place, at < 0 ? undefined : nameOf(columns, at));
    settle();
  };
  const chooseClock = (at: number): void => {
    if (!isGroup) write('log.time', { column: written });
    choose(at, 'log.time.clock');
  };
  return (
    <>
      <Frame
        id="field-log.time"
        label={logParts.time}
        problem={problem}
        note={decided.time && <span>{decided.time}</span>}
      >
        <div className={box.box} data-invalid={problem !== undefined}>
          <ColumnSelect
            id="field-log.time"
            open={words.choose}
            {...{ path, columns, problem, choose }}
            written={column}
          />
        </div>
      </Frame>
      {(clock !== undefined || hasClock) && (
        <Frame id="field-log.time.clock" label={logParts.clock}>
          <div className={box.box}>
            <ColumnSelect
              id="field-log.time.clock"
              path="log.time.clock"
              open={words.none2}
              problem={undefined}
              written={clock}
              choose={chooseClock}
              columns={columns}
            />
          </div>
        </Frame>
      )}
    </>
  );
}

interface FigureProps {
  readonly part: Figures;
  readonly look: PresentedLook;
  /** Words for leaving the column out; without them one must be chosen. */
  readonly open?: string;
}

function FigureColumn({ part, look: { columns, decided }, open }: FigureProps) {
  const path = `log.${part}`;
  const column = useWritten(`${path}.column`);
  const unit = useWritten(`${path}.unit`);
  const problem = useLogProblem(path);
  const unitProblem = useLogProblem(`${path}.unit`);
  const write = useWrite();
  const writeAll = useWriteAll();
  const settle = useWorkbench((state) => state.settle);
  const id = `field-${path}`;
  const choose = (at: number): void => {
    if (at < 0) write(path, undefined);
    else {
      const named = unitOfName(columns[at]?.name ?? '', MEASURES[part]);
      writeAll([
        [`${path}.column`, nameOf(columns, at)],
        ...(named === undefined ? [] : [[`${path}.unit`, named] as const]),
      ]);
    }
    settle();
  };
  const note = decided[part];
  return (
    <Frame id={id} label={logParts[part]} problem={problem ?? unitProblem} note={note && <span>{note}</span>}>
      <div className={box.box} data-invalid={(problem ?? unitProblem) !== undefined}>
        <ColumnSelect
          {...{ id, columns, problem, choose }}
          path={`${path}.column`}
          open={open ?? words.notUsed}
          written={column}
        />
        {column !== undefined && (
          <select
            className={box.unit}
            data-field={`${path}.unit`}
            aria-label={`${logParts[part]}, ${logFields.unit}`}
            value={typeof unit === 'string' ? unit : ''}
            onChange={(event) => {
              write(`${path}.unit`, event.target.value);
              settle();
            }}
          >
            {(unit === undefined || unit === '') && <option value="">{logFields.unit}</option>}
            <UnitOptions measures={MEASURES[part]} />
          </select>
        )}
      </div>
    </Frame>
  );
}

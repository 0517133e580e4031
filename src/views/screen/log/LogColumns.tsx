/** Which column holds what, and in which unit. What is chosen is written into the document, each choice a step of undo. */
import { type Measure, unitOf } from '../../../core/quantity/units.ts';
import type { PresentedLook } from '../../present/log-model.ts';
import { logFields, logParts, withoutColumn, logWords as words } from '../../words/logs.ts';
import { useWorkbench } from '../binding.tsx';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { UnitOptions } from '../field/UnitOptions.tsx';
import { useWrite, useWriteAll, useWritten } from '../hand.tsx';
import { ColumnSelect, nameOf } from './ColumnSelect.tsx';
import styles from './Log.module.css';
import { unitOfName } from './unit-of-name.ts';
import { useLogProblem } from './useLog.ts';

const MEASURES: Readonly<Record<Figures, readonly Measure[]>> = {
  differential: ['pressure difference'],
  signal: ['current', 'voltage', 'share'],
  pressure: ['gauge pressure', 'absolute pressure'],
  temperature: ['temperature'],
};
type Figures = 'differential' | 'signal' | 'pressure' | 'temperature';

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

function TimeColumn({ look: { columns, decided, hasClock } }: { readonly look: PresentedLook }) {
  const { path, column, problem, choose } = useTime(columns);
  const clock = useWritten('log.time.clock');
  const id = 'field-log.time';
  return (
    <>
      <Frame id={id} label={logParts.time} problem={problem} note={decided.time && <span>{decided.time}</span>}>
        <div className={box.box} data-invalid={problem !== undefined}>
          <ColumnSelect {...{ id, path, columns, problem, choose }} open={words.choose} written={column} />
        </div>
      </Frame>
      {(clock !== undefined || hasClock) && <ClockColumn columns={columns} clock={clock} />}
    </>
  );
}

/** The time is the name of a column, or a group where it has a clock or a format beside it. */
function useTime(columns: PresentedLook['columns']) {
  const written = useWritten('log.time');
  const problem = useLogProblem('log.time');
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const isGroup = typeof written === 'object' && written !== null;
  const path = isGroup ? 'log.time.column' : 'log.time';
  const column = isGroup ? (written as { column?: unknown }).column : written;
  const choose = (at: number): void => {
    write(path, at < 0 ? undefined : nameOf(columns, at));
    settle();
  };
  return { path, column, problem, choose };
}

function ClockColumn({ columns, clock }: { readonly columns: PresentedLook['columns']; readonly clock: unknown }) {
  const time = useWritten('log.time');
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const [id, path] = ['field-log.time.clock', 'log.time.clock'];
  const choose = (at: number): void => {
    if (typeof time === 'object') write(path, at < 0 ? undefined : nameOf(columns, at));
    else if (at >= 0) write('log.time', { column: time, clock: nameOf(columns, at) });
    settle();
  };
  return (
    <Frame id={id} label={logParts.clock}>
      <div className={box.box}>
        <ColumnSelect {...{ id, path, columns, choose }} open={words.none2} problem={undefined} written={clock} />
      </div>
    </Frame>
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
  const columnProblem = useLogProblem(path);
  const unitProblem = useLogProblem(`${path}.unit`);
  const write = useWrite();
  const writeAll = useWriteAll();
  const settle = useWorkbench((state) => state.settle);
  const id = `field-${path}`;
  const problem = columnProblem ?? unitProblem;
  const choose = (at: number): void => {
    const named = unitOfName(columns[at]?.name ?? '', MEASURES[part]);
    const unit = named === undefined ? [] : [[`${path}.unit`, named] as const];
    if (at < 0) write(path, undefined);
    else writeAll([[`${path}.column`, nameOf(columns, at)], ...unit]);
    settle();
  };
  const note = decided[part];
  return (
    <Frame id={id} label={logParts[part]} problem={problem} note={note && <span>{note}</span>}>
      <div className={box.box} data-invalid={problem !== undefined}>
        <ColumnSelect
          {...{ id, columns, choose }}
          path={`${path}.column`}
          open={open ?? words.notUsed}
          problem={columnProblem}
          written={column}
        />
        {column !== undefined && <UnitSelect part={part} />}
      </div>
    </Frame>
  );
}

function UnitSelect({ part }: { readonly part: Figures }) {
  const path = `log.${part}.unit`;
  const unit = useWritten(path);
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const written = typeof unit === 'string' ? unit : '';
  const isForeign = written !== '' && unitOf(written, MEASURES[part])?.symbol !== written;
  return (
    <select
      className={box.unit}
      data-field={path}
      aria-label={`${logParts[part]}, ${logFields.unit}`}
      value={written}
      onChange={(event) => {
        write(path, event.target.value);
        settle();
      }}
    >
      {written === '' && <option value="">{logFields.unit}</option>}
      {isForeign && <option value={written}>{written}</option>}
      <UnitOptions measures={MEASURES[part]} />
    </select>
  );
}

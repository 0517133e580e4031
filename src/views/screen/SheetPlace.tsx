/** The sheets as they will be printed, with the choice of paper, of meters and of sheets. */
import { type ComponentType, useState } from 'react';
import type { Project } from '../../core/document/project.ts';
import type { Results } from '../../core/result/record.ts';
import { type ListName, standingOf } from '../../state/lists.ts';
import type { Conversion } from '../present/log-context.ts';
import { useCommands, useWorkbench } from './binding.tsx';
import { useLogConversion } from './log-conversion.ts';
import styles from './SheetPlace.module.css';

export type Paper = 'A4' | 'Letter';
export type SheetKind = 'log' | 'form' | 'survey' | 'sizing' | 'readings' | 'checks' | 'dimensions' | 'working';

/** The printed sheets; app hands them in, the screen only gives them their place. */
export type SheetsView = ComponentType<{
  readonly project: Project;
  readonly results: Results;
  readonly paper: Paper;
  readonly only?: { readonly list: ListName; readonly index: number };
  readonly include?: readonly SheetKind[];
  readonly log?: Conversion & { readonly index: number };
  readonly paperOnly?: boolean;
}>;

const PAPERS: readonly Paper[] = ['A4', 'Letter'];
const SHEETS: readonly { readonly kind: SheetKind; readonly label: string }[] = [
  { kind: 'sizing', label: 'Sizing' },
  { kind: 'readings', label: 'Readings' },
  { kind: 'log', label: 'Summary of the log' },
  { kind: 'form', label: 'Field form' },
  { kind: 'survey', label: 'Survey' },
  { kind: 'checks', label: 'Checks and sources' },
  { kind: 'dimensions', label: 'Tolerances and inspection' },
  { kind: 'working', label: 'Working' },
];

/** The paper that goes with the units of a project. */
export const paperFor = ({ display }: Project): Paper => (display === 'US' ? 'Letter' : 'A4');

/** Whether the address asks for the summary of the log alone. */
const isLogAsked = (): boolean => window.location.hash === '#/sheet/log';

/** The form for the field goes along while some survey is not read to the end. */
function usualSheets({ traverses }: Results): readonly SheetKind[] {
  const read = traverses.every((result) => result.status === 'solved' && result.measured === result.points);
  return [...(read ? [] : ['form' as const]), 'log', 'survey', 'sizing', 'readings', 'checks', 'dimensions'];
}

export function SheetPlace({ sheets: Sheets }: { readonly sheets: SheetsView }) {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results);
  const list = useWorkbench((state) => state.hand);
  const index = useWorkbench((state) => standingOf(state, state.hand).selected);
  const [paper, setPaper] = useState<Paper>(paperFor(project));
  const log = useLogConversion();
  const [onlyLog] = useState(() => log !== undefined && isLogAsked());
  const [alone, setAlone] = useState(onlyLog);
  const [include, setInclude] = useState<readonly SheetKind[]>(() => (onlyLog ? ['log'] : usualSheets(results)));
  const commands = useCommands();
  return (
    <div className={styles.place}>
      <h1 className={styles.title}>Sheets</h1>
      <div className={styles.bar}>
        <Choices legend="Paper" name="paper" choices={PAPERS} chosen={paper} choose={setPaper} />
        <Choices
          legend="Print"
          name="which"
          choices={['all', 'this one']}
          chosen={alone ? 'this one' : 'all'}
          choose={(choice) => setAlone(choice === 'this one')}
        />
        <Kinds include={include} choose={setInclude} offered={SHEETS.filter(({ kind }) => kind !== 'log' || log)} />
        <button type="button" onClick={() => commands.print()}>
          Print
        </button>
      </div>
      <div className={styles.sheets}>
        <Sheets
          project={project}
          results={results}
          paper={paper}
          include={include}
          {...(log === undefined ? {} : { log })}
          {...(alone && index >= 0 ? { only: { list, index } } : {})}
        />
      </div>
    </div>
  );
}

interface KindsProps {
  readonly offered: typeof SHEETS;
  readonly include: readonly SheetKind[];
  readonly choose: (include: readonly SheetKind[]) => void;
}

/** Which sheets of each meter and survey. */
function Kinds({ include, choose, offered }: KindsProps) {
  const toggle = (kind: SheetKind) =>
    choose(include.includes(kind) ? include.filter((one) => one !== kind) : [...include, kind]);
  return (
    <fieldset>
      <legend>Sheets</legend>
      {offered.map(({ kind, label }) => (
        <label key={kind}>
          <input type="checkbox" checked={include.includes(kind)} onChange={() => toggle(kind)} />
          {label}
        </label>
      ))}
    </fieldset>
  );
}

interface ChoicesProps<Choice extends string> {
  readonly legend: string;
  readonly name: string;
  readonly choices: readonly Choice[];
  readonly chosen: Choice;
  readonly choose: (choice: Choice) => void;
}

function Choices<Choice extends string>({ legend, name, choices, chosen, choose }: ChoicesProps<Choice>) {
  return (
    <fieldset>
      <legend>{legend}</legend>
      {choices.map((choice) => (
        <label key={choice}>
          <input type="radio" name={name} checked={chosen === choice} onChange={() => choose(choice)} />
          {choice}
        </label>
      ))}
    </fieldset>
  );
}

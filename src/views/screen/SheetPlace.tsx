/** The sheets as they will be printed, with the choice of paper. */
import { type ComponentType, useState } from 'react';
import type { Project } from '../../core/document/project.ts';
import type { Results } from '../../core/result/record.ts';
import { useCommands, useWorkbench } from './binding.tsx';
import styles from './SheetPlace.module.css';

export type Paper = 'A4' | 'Letter';

/** The printed sheets; app hands them in, the screen only gives them their place. */
export type SheetsView = ComponentType<{ readonly project: Project; readonly results: Results; readonly paper: Paper }>;

const PAPERS: readonly Paper[] = ['A4', 'Letter'];

export function SheetPlace({ sheets: Sheets }: { readonly sheets: SheetsView }) {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results);
  const [paper, setPaper] = useState<Paper>(project.display === 'US' ? 'Letter' : 'A4');
  const commands = useCommands();
  return (
    <div className={styles.place}>
      <div className={styles.bar}>
        <fieldset>
          <legend>Paper</legend>
          {PAPERS.map((name) => (
            <label key={name}>
              <input type="radio" name="paper" checked={paper === name} onChange={() => setPaper(name)} />
              {name}
            </label>
          ))}
        </fieldset>
        <button type="button" onClick={() => commands.print()}>
          Print
        </button>
      </div>
      <div className={styles.sheets}>
        <Sheets project={project} results={results} paper={paper} />
      </div>
    </div>
  );
}

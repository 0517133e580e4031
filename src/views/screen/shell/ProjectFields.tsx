/** What holds for the whole project: the title block, the site and the base state. */
import { fieldLabel } from '../../words/fields.ts';
import { problemSentence } from '../../words/problems.ts';
import { useWorkbench } from '../binding.tsx';
import { QuantityBox } from '../field/QuantityField.tsx';
import { TextField } from '../field/TextField.tsx';
import { BaseStateSelect } from '../fluid/BaseState.tsx';
import { textAt } from '../text.ts';
import styles from './ProjectFields.module.css';

const TITLE_BLOCK = ['title', 'revision', 'preparedBy', 'checkedBy'] as const;
const QUANTITIES = ['site.atmosphere', 'site.gravity', 'base.pressure', 'base.temperature'] as const;

/** What stands where nothing is written, as the file's definition has it. */
const USUAL: Readonly<Record<(typeof QUANTITIES)[number], string>> = {
  'site.atmosphere': '101.325 kPa(a)',
  'site.gravity': '9.80665 m/s²',
  'base.pressure': '101.325 kPa(a)',
  'base.temperature': '15 °C',
};

export function ProjectFields() {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results.results);
  const write = useWorkbench((state) => state.writeProject);
  const settle = useWorkbench((state) => state.settle);
  const refused = results.flatMap((result) => (result.status === 'refused' ? result.problems : []));
  const problemAt = (path: string): string | undefined => {
    const problem = refused.find(({ field }) => field === path);
    return problem && problemSentence(problem);
  };
  return (
    <div className={styles.fields}>
      {TITLE_BLOCK.map((path) => (
        <TextField
          key={path}
          path={path}
          label={fieldLabel(path)}
          text={textAt(project, path)}
          write={(text) => write(path, text)}
          settle={settle}
        />
      ))}
      <BaseStateSelect id="project-base" />
      {QUANTITIES.map((path) => {
        const text = textAt(project, path);
        return (
          <QuantityBox
            key={path}
            path={path}
            text={text}
            problem={problemAt(path)}
            write={(next) => write(path, next)}
            note={text === '' && <span>empty: {USUAL[path]}</span>}
          />
        );
      })}
    </div>
  );
}

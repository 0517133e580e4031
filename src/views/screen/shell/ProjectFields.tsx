/** What holds for the whole project: the title block, the site and the base state. */
import { SITE_DEFAULTS } from '../../../core/document/defaults.ts';
import { asPrinted } from '../../present/base.ts';
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

/** What stands where nothing is written. */
const USUAL: Readonly<Record<(typeof QUANTITIES)[number], string>> = {
  'site.atmosphere': SITE_DEFAULTS.atmosphere,
  'site.gravity': SITE_DEFAULTS.gravity,
  'base.pressure': SITE_DEFAULTS.basePressure,
  'base.temperature': SITE_DEFAULTS.baseTemperature,
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
            note={text === '' && <span>empty: {asPrinted(USUAL[path])}</span>}
          />
        );
      })}
    </div>
  );
}

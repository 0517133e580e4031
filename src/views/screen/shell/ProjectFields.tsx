/** What holds for the whole project: the title block, the site and the base state. */
import { fieldLabel } from '../../words/fields.ts';
import { useWorkbench } from '../binding.tsx';
import { TextField } from '../field/TextField.tsx';
import { BaseStateSelect } from '../fluid/BaseState.tsx';
import { textAt } from '../text.ts';
import styles from './ProjectFields.module.css';
import { SiteFields } from './SiteFields.tsx';

const TITLE_BLOCK = ['title', 'revision', 'preparedBy', 'checkedBy'] as const;

export function ProjectFields() {
  const project = useWorkbench((state) => state.project);
  const write = useWorkbench((state) => state.writeProject);
  const settle = useWorkbench((state) => state.settle);
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
      <SiteFields />
    </div>
  );
}

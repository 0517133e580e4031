/** A choice of yes or no; no leaves nothing behind in the document. */
import { fieldLabel } from '../../words/fields.ts';
import { useWorkbench } from '../binding.tsx';
import { valueAt } from '../text.ts';
import styles from './inputs.module.css';

export function CheckField({ path }: { readonly path: string }) {
  const checked = useWorkbench((state) => isYes(valueAt(state.project.meters[state.selected], path)));
  const write = useWorkbench((state) => state.write);
  const settle = useWorkbench((state) => state.settle);
  return (
    <label className={styles.check}>
      <input
        type="checkbox"
        data-field={path}
        checked={checked}
        onChange={(event) => {
          write(path, event.target.checked ? true : undefined);
          settle();
        }}
      />
      {fieldLabel(path)}
    </label>
  );
}

const isYes = (value: unknown): boolean => value === true || value === 'true';

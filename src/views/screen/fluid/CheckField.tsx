/** A choice of yes or no; no leaves nothing behind in the document. */
import { fieldLabel } from '../../words/fields.ts';
import { useWorkbench } from '../binding.tsx';
import { useWrite, useWritten } from '../hand.tsx';
import styles from './inputs.module.css';

export function CheckField({ path }: { readonly path: string }) {
  const checked = isYes(useWritten(path));
  const write = useWrite();
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

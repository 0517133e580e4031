/** The name of the survey, and what can be done with it as a whole. */
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { focusSoon } from '../focus.ts';
import styles from '../MeterHead.module.css';
import { textAt } from '../text.ts';

const FIELDS = [
  { path: 'tag', label: 'Tag', size: 12 },
  { path: 'service', label: 'Service', size: 34 },
] as const;

export function SurveyHead({ index }: { readonly index: number }) {
  const traverse = useWorkbench((state) => state.project.traverses?.[index]);
  const write = useWorkbench((state) => state.write);
  const settle = useWorkbench((state) => state.settle);
  return (
    <div className={styles.head}>
      {FIELDS.map(({ path, label, size }) => (
        <label key={path} className={styles.field}>
          <span>{label}</span>
          <input
            type="text"
            data-field={path}
            size={size}
            autoComplete="off"
            spellCheck={path === 'service'}
            value={textAt(traverse, path)}
            onChange={(event) => write(path, event.target.value, 'traverses')}
            onBlur={settle}
          />
        </label>
      ))}
      <Actions index={index} />
    </div>
  );
}

function Actions({ index }: { readonly index: number }) {
  const count = useWorkbench((state) => state.project.traverses?.length ?? 0);
  const duplicate = useWorkbench((state) => state.duplicateTraverse);
  const move = useWorkbench((state) => state.moveTraverse);
  const remove = useWorkbench((state) => state.deleteTraverse);
  const orders = [
    { words: 'Duplicate', order: () => duplicate(index), off: false },
    { words: 'Move up', order: () => move(index, index - 1), off: index === 0 },
    { words: 'Move down', order: () => move(index, index + 1), off: index + 1 >= count },
    {
      words: 'Delete',
      order: () => {
        remove(index);
        focusSoon('#content'); // the button goes with its survey
      },
      off: false,
    },
  ];
  return (
    <div className={styles.actions}>
      {orders.map(({ words, order, off }) => (
        <button key={words} type="button" className={buttons.quiet} disabled={off} onClick={order}>
          {words}
        </button>
      ))}
    </div>
  );
}

/** The name of a meter or a survey, and what can be done with it as a whole. */
import { itemsIn, type ListName } from '../../state/lists.ts';
import { useWorkbench } from './binding.tsx';
import buttons from './button.module.css';
import { focusSoon } from './focus.ts';
import styles from './ItemHead.module.css';
import { textAt } from './text.ts';

const FIELDS = [
  { path: 'tag', label: 'Tag', size: 12 },
  { path: 'service', label: 'Service', size: 34 },
] as const;

interface Props {
  readonly index: number;
  readonly list: ListName;
}

export function ItemHead({ index, list }: Props) {
  const item = useWorkbench((state) => itemsIn(state.project, list)[index]);
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
            value={textAt(item, path)}
            onChange={(event) => write(path, event.target.value, list)}
            onBlur={settle}
          />
        </label>
      ))}
      <Actions index={index} list={list} />
    </div>
  );
}

function Actions({ index, list }: Props) {
  const meters = list === 'meters';
  const count = useWorkbench((state) => itemsIn(state.project, list).length);
  const duplicate = useWorkbench((state) => (meters ? state.duplicateMeter : state.duplicateTraverse));
  const move = useWorkbench((state) => (meters ? state.moveMeter : state.moveTraverse));
  const remove = useWorkbench((state) => (meters ? state.deleteMeter : state.deleteTraverse));
  const discard = () => {
    remove(index);
    focusSoon('#content'); // the button goes with its item
  };
  const key = (keys: string) => (meters ? { title: keys } : {}); // the keys move a meter
  return (
    <div className={styles.actions}>
      <button type="button" className={buttons.quiet} onClick={() => duplicate(index)}>
        Duplicate
      </button>
      <button
        type="button"
        className={buttons.quiet}
        disabled={index === 0}
        {...key('Alt + ↑')}
        onClick={() => move(index, index - 1)}
      >
        Move up
      </button>
      <button
        type="button"
        className={buttons.quiet}
        disabled={index + 1 >= count}
        {...key('Alt + ↓')}
        onClick={() => move(index, index + 1)}
      >
        Move down
      </button>
      <button type="button" className={buttons.quiet} onClick={discard}>
        Delete
      </button>
    </div>
  );
}

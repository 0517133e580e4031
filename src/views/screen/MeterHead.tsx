/** The name of the meter, and what can be done with it as a whole. */
import { useWorkbench } from './binding.tsx';
import buttons from './button.module.css';
import { focusSoon } from './focus.ts';
import styles from './MeterHead.module.css';
import { textAt } from './text.ts';

const FIELDS = [
  { path: 'tag', label: 'Tag', size: 12 },
  { path: 'service', label: 'Service', size: 34 },
] as const;

export function MeterHead({ index }: { readonly index: number }) {
  const meter = useWorkbench((state) => state.project.meters[index]);
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
            value={textAt(meter, path)}
            onChange={(event) => write(path, event.target.value)}
            onBlur={settle}
          />
        </label>
      ))}
      <MeterActions index={index} />
    </div>
  );
}

function MeterActions({ index }: { readonly index: number }) {
  const count = useWorkbench((state) => state.project.meters.length);
  const duplicate = useWorkbench((state) => state.duplicateMeter);
  const move = useWorkbench((state) => state.moveMeter);
  const remove = useWorkbench((state) => state.deleteMeter);
  const discard = () => {
    remove(index);
    focusSoon('#content'); // the button goes with its meter
  };
  return (
    <div className={styles.actions}>
      <button type="button" className={buttons.quiet} onClick={() => duplicate(index)}>
        Duplicate
      </button>
      <button
        type="button"
        className={buttons.quiet}
        disabled={index === 0}
        title="Alt + ↑"
        onClick={() => move(index, index - 1)}
      >
        Move up
      </button>
      <button
        type="button"
        className={buttons.quiet}
        disabled={index + 1 >= count}
        title="Alt + ↓"
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

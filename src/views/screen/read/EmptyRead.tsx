/** A project without a meter that could be read: it is described first. */
import { readWords as words } from '../../words/readings.ts';
import { useCommands, useWorkbench } from '../binding.tsx';
import styles from '../EmptyProject.module.css';
import { focusFieldSoon } from '../focus.ts';
import { goTo } from '../place.ts';

export function EmptyRead() {
  const addMeter = useWorkbench((state) => state.addMeter);
  const commands = useCommands();
  const begin = () => {
    addMeter();
    goTo('size');
    focusFieldSoon('pipe.size');
  };
  return (
    <div className={styles.empty}>
      <h1>{words.empty}</h1>
      <p>{words.emptyText}</p>
      <div className={styles.ways}>
        <button type="button" className={styles.first} onClick={begin}>
          {words.begin}
        </button>
        <button type="button" onClick={() => void commands.openExample()}>
          Open the example
        </button>
        <button type="button" onClick={() => void commands.openFile()}>
          Open a file
        </button>
      </div>
    </div>
  );
}

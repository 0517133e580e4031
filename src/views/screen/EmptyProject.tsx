/** A project without meters: the two ways to begin. */
import { useCommands, useWorkbench } from './binding.tsx';
import styles from './EmptyProject.module.css';
import { focusFieldSoon } from './focus.ts';

export function EmptyProject() {
  const addMeter = useWorkbench((state) => state.addMeter);
  const commands = useCommands();
  const begin = () => {
    addMeter();
    focusFieldSoon('pipe.size');
  };
  return (
    <div className={styles.empty}>
      <h1>Which bore, which differential, which flow?</h1>
      <p>
        State two of them, the pipe and the fluid. The third is found as you type, with its limits, its uncertainty and
        its working.
      </p>
      <div className={styles.ways}>
        <button type="button" className={styles.first} onClick={begin}>
          Size a meter
        </button>
        <button type="button" onClick={() => void commands.openExample()}>
          Open the example
        </button>
        <button type="button" onClick={() => void commands.openFile()}>
          Open a file
        </button>
      </div>
      <p className={styles.small}>
        A project file can also be dropped anywhere on this window. Everything stays in this browser.
      </p>
    </div>
  );
}

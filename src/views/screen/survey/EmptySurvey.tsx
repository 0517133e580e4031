/** A project without surveys: how to begin. */
import { surveyPlace as words } from '../../words/survey-place.ts';
import { useCommands, useWorkbench } from '../binding.tsx';
import styles from '../EmptyProject.module.css';
import { focusFieldSoon } from '../focus.ts';

export function EmptySurvey() {
  const add = useWorkbench((state) => state.addTraverse);
  const commands = useCommands();
  const begin = () => {
    add();
    focusFieldSoon('section.width');
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
      </div>
    </div>
  );
}

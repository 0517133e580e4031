/** What the log leaves open, each with both readings to choose from; and what else stands in the way of a conversion. */
import type { PresentedLook } from '../../present/log-model.ts';
import { logWords as words } from '../../words/logs.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { useWrite, useWritten } from '../hand.tsx';
import { Way } from '../ProblemList.tsx';
import styles from './Log.module.css';

export function LogQuestions({ look: { questions, problems } }: { readonly look: PresentedLook }) {
  const answer = useAnswer();
  if (questions.length + problems.length === 0) return null;
  return (
    <div className={styles.questions} role="status">
      {questions.length > 0 && <h3>{words.questions}</h3>}
      {questions.map(({ text, path, answers }) => (
        <div key={`${path} ${text}`} className={styles.question}>
          <p>{text}</p>
          {answers.map(({ label, value }) => (
            <button key={value} type="button" className={buttons.framed} onClick={() => answer(path, value)}>
              {label}
            </button>
          ))}
        </div>
      ))}
      {problems.length > 0 && <h3>{words.blocked}</h3>}
      {problems.map(({ field, sentence }) => (
        <p key={`${field} ${sentence}`} className={styles.problem}>
          <Way field={field} /> <span>{sentence}</span>
        </p>
      ))}
    </div>
  );
}

/** Writes an answer as a step of undo; the format of the time needs the time to be a group. */
function useAnswer(): (path: string, value: string) => void {
  const time = useWritten('log.time');
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  return (path, value) => {
    settle();
    if (path === 'log.time.format' && typeof time !== 'object') write('log.time', { column: time, format: value });
    else write(path, value);
    settle();
  };
}

/** The problems of the rows of a table, below it: a cell is too small for a sentence. */
import { useProblems } from '../meter.ts';
import styles from './inputs.module.css';

/** @param below path of the table */
export function Problems({ below }: { readonly below: string }) {
  const problems = useProblems();
  const own = problems.filter(({ field }) => field === below || field.startsWith(`${below}.`));
  return own.map(({ field, sentence }) => (
    <p key={`${field} ${sentence}`} className={styles.problem}>
      {sentence}
    </p>
  ));
}

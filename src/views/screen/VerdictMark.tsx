/** A verdict in shape and word: a ring closed, a gap open, a bar across. The colour only repeats it. */
import type { Verdict } from '../words/verdicts.ts';
import styles from './VerdictMark.module.css';

type Standing = Verdict | 'refused' | 'unchecked';

const shapes: Readonly<Record<Standing, string>> = {
  inside: 'M6 1.5a4.5 4.5 0 1 1 0 9a4.5 4.5 0 1 1 0-9z',
  caution: 'M6 1L11 6L6 11L1 6z',
  outside: 'M1.5 1.5H10.5V10.5H1.5z',
  refused: 'M1 6H11',
  unchecked: 'M1 6H4M8 6H11',
};

export function VerdictMark({ verdict, words }: { readonly verdict: Standing; readonly words: string }) {
  return (
    <span className={`${styles.mark} ${styles[verdict]}`}>
      <svg viewBox="0 0 12 12" width="11" height="11" aria-hidden="true" focusable="false">
        <path d={shapes[verdict]} />
        {verdict === 'caution' && <path className={styles.hole} d="M6 4V6.6M6 8V8.6" />}
        {verdict === 'outside' && <path className={styles.hole} d="M3.5 8.5L8.5 3.5" />}
      </svg>
      {words}
    </span>
  );
}

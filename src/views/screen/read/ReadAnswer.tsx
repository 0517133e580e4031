/** The answer of the row at hand as one sentence: what was read, what that is, what flows. */
import type { Segment } from '../../present/model.ts';
import type { ReadingRow } from '../../present/readings-model.ts';
import { readWords as words } from '../../words/readings.ts';
import styles from '../Answer.module.css';
import type { SelectedMeter } from '../meter.ts';
import { ProblemList } from '../ProblemList.tsx';
import { useRested } from '../useRested.ts';

const LOUD_PAUSE = 1200; // ms without a change before the sentence is read out

interface Props {
  readonly selected: SelectedMeter;
  readonly row: ReadingRow | undefined;
}

export function ReadAnswer({ selected, row }: Props) {
  const unsolved = selected.result.status === 'refused';
  const wait: readonly Segment[] = [{ text: words.wait(selected.now.tag), role: 'words' }];
  const answer = row?.answer ?? wait;
  const spoken = useRested(answer.map(({ text }) => text).join(''), LOUD_PAUSE);
  if (unsolved)
    return (
      <header className={styles.answer} data-stale="true">
        <h1 className={styles.sentence}>{words.unsolved}</h1>
        <ProblemList selected={selected} />
        <a href="#/size">{words.toSize}</a>
      </header>
    );
  return (
    <header className={styles.answer}>
      <h1 className={styles.sentence}>
        {answer.map((segment, at) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: the sentence is replaced as a whole
          <span key={at} className={styles[segment.role]}>
            {segment.text}
          </span>
        ))}
      </h1>
      {row !== undefined && row.under !== '' && <p className={styles.under}>{row.under}</p>}
      <p className={styles.spoken} aria-live="polite">
        {spoken}
      </p>
    </header>
  );
}

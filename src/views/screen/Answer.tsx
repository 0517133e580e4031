/** The answer as one sentence. It stays in sight on a phone and is read out once the typing rests. */
import type { PresentedSizing, Segment } from '../present/model.ts';
import styles from './Answer.module.css';
import type { SelectedMeter } from './meter.ts';
import { ProblemList } from './ProblemList.tsx';
import { unsolved } from './unsolved.ts';
import { useRested } from './useRested.ts';

const LOUD_PAUSE = 1200; // ms without a change before the sentence is read out

const plain = (segments: readonly Segment[]): string => segments.map(({ text }) => text).join('');

export function Answer({ selected }: { readonly selected: SelectedMeter }) {
  const { sizing, stale, now } = selected;
  const spoken = useRested(
    stale ? `Not solved. ${now.problems[0]?.sentence ?? ''}` : sizing ? plain(sizing.answer) : '',
    LOUD_PAUSE,
  );
  return (
    <header className={styles.answer} data-stale={stale}>
      {sizing ? (
        <Sentence sizing={sizing} stale={stale} />
      ) : (
        <h1 className={styles.sentence}>
          {now.tag} {unsolved(selected).wrong.length > 0 ? 'cannot be solved as it stands' : 'waits for its figures'}.
        </h1>
      )}
      {stale && <ProblemList selected={selected} />}
      <p className={styles.spoken} aria-live="polite">
        {spoken}
      </p>
    </header>
  );
}

function Sentence({ sizing, stale }: { readonly sizing: PresentedSizing; readonly stale: boolean }) {
  return (
    <>
      {stale && <p className={styles.staleWords}>Last good result. What is typed now cannot be solved.</p>}
      <h1 className={styles.sentence}>
        {sizing.answer.map((segment, at) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: the sentence is replaced as a whole
          <span key={at} className={styles[segment.role]}>
            {segment.text}
          </span>
        ))}
      </h1>
      <p className={styles.under}>{sizing.under}</p>
    </>
  );
}

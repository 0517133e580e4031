/** What flows in the duct as one sentence, or how far the survey is. It is read out once the typing rests. */
import { surveyPlace as words } from '../../words/survey-place.ts';
import styles from '../Answer.module.css';
import { ProblemList } from '../ProblemList.tsx';
import { unsolved } from '../unsolved.ts';
import { useRested } from '../useRested.ts';
import { VerdictMark } from '../VerdictMark.tsx';
import type { SelectedSurvey } from './selected.ts';

const LOUD_PAUSE = 1200; // ms without a change before the sentence is read out

export function SurveyAnswer({ selected }: { readonly selected: SelectedSurvey }) {
  const { survey, stale, besides, now, traverse } = selected;
  const sentence = survey?.answer.map(({ text }) => text).join('') ?? '';
  const troubled = { now, meter: traverse };
  const spoken = useRested(stale ? `Not solved. ${now.problems[0]?.sentence ?? ''}` : sentence, LOUD_PAUSE);
  return (
    <header className={styles.answer} data-stale={stale}>
      {stale && survey && <p className={styles.staleWords}>{words.stale}</p>}
      {survey === undefined ? (
        <h1 className={styles.sentence}>
          {now.tag} {unsolved(troubled).wrong.length > 0 ? words.wrong : words.waiting}.
        </h1>
      ) : (
        <h1 className={styles.sentence}>
          {survey.answer.map((segment, at) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: the sentence is replaced as a whole
            <span key={at} className={styles[segment.role]}>
              {segment.text}
            </span>
          ))}
        </h1>
      )}
      {survey && (
        <p className={styles.under}>
          {survey.under} · <VerdictMark verdict={now.verdict.worst} words={now.verdict.words} />
        </p>
      )}
      {besides && <p className={styles.staleWords}>{words.besides}</p>}
      {survey?.status === 'planned' && <p className={styles.staleWords}>{words.planned}</p>}
      {now.problems.length > 0 && <ProblemList selected={troubled} />}
      <p className={styles.spoken} aria-live="polite">
        {spoken}
      </p>
    </header>
  );
}

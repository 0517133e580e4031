/** One point after the other, for one hand at the duct: its depth in large figures, one large box, the next at the thumb. */
import { useEffect, useRef, useState } from 'react';
import { SurveySection } from '../../drawing/SurveySection.tsx';
import type { PresentedSurvey, SurveyPoint } from '../../present/survey-model.ts';
import { measureWords as words } from '../../words/survey-place.ts';
import { surveyWords } from '../../words/surveys.ts';
import { useProblem, useProblems } from '../meter.ts';
import styles from './Measure.module.css';
import { ReadingBox, readingPath } from './ReadingBox.tsx';
import type { Readings } from './readings.ts';

interface Props {
  readonly survey: PresentedSurvey;
  readonly readings: Readings;
  /** The point it begins at. */
  readonly from: number;
  readonly close: (at: number) => void;
}

export function Measure({ survey, readings, from, close }: Props) {
  const ref = useRef<HTMLDialogElement>(null);
  const [number, setNumber] = useState(from);
  useEffect(() => {
    const dialog = ref.current;
    dialog?.showModal();
    return () => dialog?.close();
  }, []);
  useEffect(() => {
    const box = ref.current?.querySelector<HTMLInputElement>(`[data-point-box="${number}"] input`);
    box?.focus();
    box?.select();
  }, [number]);
  const points = survey.lines.flatMap((line) => line.points);
  const point = points[number - 1] ?? points[0];
  if (point === undefined) return null;
  const go = (by: 1 | -1): void => {
    const next = number + by;
    if (next > points.length) ref.current?.close();
    else setNumber(Math.max(1, next));
  };
  return (
    <dialog ref={ref} className={styles.dialog} aria-label={words.title} onClose={() => close(number)}>
      <header className={styles.top}>
        <p>
          <b>{words.point(point.number, points.length)}</b>
          <span>{whereOf(survey, point)}</span>
        </p>
        <button type="button" className={styles.close} onClick={() => ref.current?.close()}>
          {words.close}
        </button>
      </header>
      <div className={styles.picture}>
        <SurveySection survey={survey} width={300} height={190} type={10} current={point.number} />
      </div>
      <Entry key={point.number} {...{ survey, readings, point, go }} last={number === points.length} />
      <Unread {...{ readings, points, number }} to={setNumber} />
    </dialog>
  );
}

const whereOf = ({ lines }: PresentedSurvey, { line }: SurveyPoint): string => {
  const at = lines[line];
  return [at?.title, at?.place].filter(Boolean).join(', ');
};

interface UnreadProps {
  readonly readings: Readings;
  readonly points: readonly SurveyPoint[];
  /** The point at hand, which says its own trouble. */
  readonly number: number;
  readonly to: (number: number) => void;
}

/** The way back to the points whose text is no reading. */
function Unread({ readings, points, number, to }: UnreadProps) {
  const problems = useProblems();
  const unread = points.filter(
    (point) =>
      point.number !== number &&
      readings.textAt(point.line, point.point) !== '' &&
      problems.some(({ field }) => field === readingPath(point)),
  );
  return (
    <p className={styles.unread} role="status">
      {unread.map((point) => (
        <button key={point.number} type="button" onClick={() => to(point.number)}>
          {words.unread(point.number)}
        </button>
      ))}
    </p>
  );
}

interface EntryProps {
  readonly survey: PresentedSurvey;
  readonly readings: Readings;
  readonly point: SurveyPoint;
  readonly go: (by: 1 | -1) => void;
  readonly last: boolean;
}

function Entry({ survey, readings, point, go, last }: EntryProps) {
  const problem = useProblem(readingPath(point));
  const text = readings.textAt(point.line, point.point);
  const turnSign = (): void => {
    const turned = /^\s*[-\u2212]/.test(text) ? text.replace(/^\s*[-\u2212]\s*/, '') : text === '' ? '-' : `-${text}`;
    readings.write([{ line: point.line, point: point.point, text: turned }]);
  };
  return (
    <div className={styles.entry}>
      <p className={styles.depth}>
        <b>{point.depth.text}</b>
        <span>{survey.fromPort ? surveyWords.fromPort : surveyWords.fromWall}</span>
      </p>
      <div className={styles.row} data-point-box={point.number}>
        <ReadingBox point={point} readings={readings} className={styles.box} go={go} />
        <span className={styles.unit}>{readings.unit.print}</span>
        <button
          type="button"
          className={styles.sign}
          aria-label={words.sign}
          onClick={(event) => {
            turnSign();
            event.currentTarget.parentElement?.querySelector('input')?.focus(); // the keys go on where they were
          }}
        >
          ±
        </button>
      </div>
      <p className={styles.found} aria-live="polite">
        {problem !== undefined && text !== '' ? <em>{problem}</em> : (point.velocity?.text ?? '\u00a0')}
      </p>
      <div className={styles.keys}>
        <button type="button" className={styles.back} disabled={point.number === 1} onClick={() => go(-1)}>
          {words.back}
        </button>
        <button type="button" className={styles.next} onClick={() => go(1)}>
          {last ? words.done : words.next}
        </button>
      </div>
    </div>
  );
}

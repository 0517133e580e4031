/** The survey of a duct: what flows, the section with its points, the readings as they come, and what follows from them. */
import { type KeyboardEvent, useState } from 'react';
import { SurveyProfile } from '../../drawing/SurveyProfile.tsx';
import { SurveySection } from '../../drawing/SurveySection.tsx';
import type { PresentedSurvey } from '../../present/survey-model.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import along from '../Along.module.css';
import { Boundary } from '../Boundary.tsx';
import { focusField, focusNext } from '../focus.ts';
import { HandProvider } from '../hand.tsx';
import { ItemHead } from '../ItemHead.tsx';
import { Way } from '../ProblemList.tsx';
import { Checks } from '../panel/Checks.tsx';
import { Notes } from '../panel/Notes.tsx';
import { States } from '../panel/States.tsx';
import { Working } from '../panel/Working.tsx';
import size from '../Size.module.css';
import { unsolved } from '../unsolved.ts';
import { useWidth } from '../useWidth.ts';
import { DuctStation } from './DuctStation.tsx';
import { EmptySurvey } from './EmptySurvey.tsx';
import { Measure } from './Measure.tsx';
import { PlaneStation } from './PlaneStation.tsx';
import { ProbeStation } from './ProbeStation.tsx';
import { readingPath } from './ReadingBox.tsx';
import { ReadingsPanel } from './ReadingsPanel.tsx';
import { Results, Suggestions } from './Results.tsx';
import { type Readings, useReadings } from './readings.ts';
import { SectionStation } from './SectionStation.tsx';
import styles from './Survey.module.css';
import { SurveyAnswer } from './SurveyAnswer.tsx';
import { type SelectedSurvey, useSelectedSurvey } from './selected.ts';

/** Enter in a text box goes on to the next field; the boxes of readings have their own way. */
function onEnter(event: KeyboardEvent): void {
  const { target } = event;
  if (event.key !== 'Enter' || !(target instanceof HTMLInputElement) || target.dataset.field === undefined) return;
  event.preventDefault();
  focusNext(target);
}

export function Survey() {
  const selected = useSelectedSurvey();
  if (selected === undefined) return <EmptySurvey />;
  return (
    <HandProvider list="traverses">
      <One key={selected.key} selected={selected} />
    </HandProvider>
  );
}

function One({ selected }: { readonly selected: SelectedSurvey }) {
  const { survey, stale } = selected;
  const readings = useReadings(survey);
  const [current, setCurrent] = useState<number>();
  const [measuring, setMeasuring] = useState(false);
  const next = nextOf(survey, readings);
  const measure = (): void => setMeasuring(true);
  const stop = (at: number): void => {
    setMeasuring(false);
    setCurrent(at);
  };
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: Enter is only passed on to the next field
    <div className={size.size} onKeyDown={onEnter}>
      <SurveyAnswer selected={selected} />
      {survey && (
        <button type="button" className={styles.measure} onClick={measure}>
          {words.measure}
        </button>
      )}
      <div className={along.along}>
        <ItemHead index={selected.index} list="traverses" />
        <Plan selected={selected} readings={readings} />
      </div>
      <Boundary of={survey}>
        <Pictures selected={selected} current={current ?? next} />
        {survey && <ReadingsPanel {...{ survey, readings, stale, setCurrent, measure }} current={current ?? next} />}
        {survey && <Found selected={selected} />}
      </Boundary>
      {survey && measuring && <Measure survey={survey} readings={readings} from={next ?? current ?? 1} close={stop} />}
    </div>
  );
}

/** The first point that is not read yet. */
const nextOf = (survey: PresentedSurvey | undefined, readings: Readings): number | undefined =>
  survey?.lines.flatMap(({ points }) => points).find(({ line, point }) => readings.textAt(line, point) === '')?.number;

interface PlanProps {
  readonly selected: SelectedSurvey;
  readonly readings: Readings;
}

/** The form, folded away at first where the plan is made and its fluid known. */
function Plan({ selected: { now, survey }, readings }: PlanProps) {
  const [open] = useState(now.progress === undefined || survey?.status === 'planned');
  return (
    <details className={styles.plan} open={open}>
      <summary>
        <b>{words.plan}</b> {now.title}
        <span>{words.planOf}</span>
      </summary>
      <Stations readings={readings} />
    </details>
  );
}

const Stations = ({ readings }: { readonly readings: Readings }) => (
  <form className={along.stations} onSubmit={(event) => event.preventDefault()} autoComplete="off">
    <SectionStation />
    <ProbeStation />
    <DuctStation />
    <PlaneStation readings={readings} />
  </form>
);

interface PicturesProps {
  readonly selected: SelectedSurvey;
  readonly current: number | undefined;
}

function Pictures({ selected, current }: PicturesProps) {
  const { survey, stale } = selected;
  const [frame, width] = useWidth();
  if (survey === undefined) return <Blank selected={selected} />;
  const goTo = (number: number): void => {
    const point = survey.lines.flatMap(({ points }) => points)[number - 1];
    if (point !== undefined) focusField(readingPath(point));
  };
  const wide = width > 760;
  const left = wide ? Math.min(400, width * 0.38) : width;
  const height = wide ? 270 : 250;
  return (
    <div className={`${along.along} ${along.drawing}`} data-stale={stale} ref={frame}>
      {width > 0 && (
        <div className={styles.pictures}>
          <SurveySection survey={survey} width={left} height={height} current={current} onPoint={goTo} />
          <SurveyProfile
            profile={survey.profile}
            width={wide ? width - left - 20 : width}
            height={wide ? 260 : 200}
            current={current}
          />
        </div>
      )}
      {stale && <p className={along.stale}>last good result</p>}
    </div>
  );
}

/** No plan yet: what it waits for. */
function Blank({ selected: { now, traverse } }: { readonly selected: SelectedSurvey }) {
  const { wrong, missing } = unsolved({ now, meter: traverse });
  const fields = [...new Set((wrong.length > 0 ? wrong : missing).map(({ field }) => field))];
  return (
    <p className={`${along.along} ${along.blank}`}>
      {wrong.length > 0 ? words.blankWrong : words.blank}
      {fields.map((field, at) => (
        <span key={field}>
          {at > 0 && ', '}
          <Way field={field} />
        </span>
      ))}
      .
    </p>
  );
}

function Found({ selected: { survey, stale } }: { readonly selected: SelectedSurvey }) {
  if (survey === undefined) return null;
  const { state, overridable, plan, working, notes, cautions } = survey;
  return (
    <>
      <div className={size.columns}>
        <div className={size.column}>
          <Results survey={survey} stale={stale} />
          <Suggestions survey={survey} stale={stale} />
          <States sizing={{ state, overridable, pipe: plan, metal: [] }} stale={stale} />
        </div>
        {survey.status === 'solved' && <Checks groups={survey.checks} stale={stale} />}
      </div>
      {working.some(({ rows }) => rows.length > 0) && <Working sizing={{ working }} stale={stale} />}
      <Notes sizing={{ notes, cautions }} />
    </>
  );
}

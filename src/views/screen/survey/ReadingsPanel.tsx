/** The readings, line by line: number and depth of each point, its box, the velocity found there. */
import { useState } from 'react';
import type { PresentedSurvey, SurveyLine, SurveyPoint } from '../../present/survey-model.ts';
import { surveyPlace as words } from '../../words/surveys.ts';
import buttons from '../button.module.css';
import { UnitOptions } from '../field/UnitOptions.tsx';
import { Problems } from '../fluid/Problems.tsx';
import { focusField } from '../focus.ts';
import { Panel } from '../panel/Panel.tsx';
import { PastedBlock } from './PastedBlock.tsx';
import { figuresIn, inOrder, sequenceOf } from './paste-readings.ts';
import { ReadingBox, readingPath } from './ReadingBox.tsx';
import styles from './ReadingsPanel.module.css';
import type { Readings } from './readings.ts';

interface Props {
  readonly survey: PresentedSurvey;
  readonly readings: Readings;
  readonly stale: boolean;
  readonly current: number | undefined;
  readonly setCurrent: (number: number) => void;
  readonly measure: () => void;
}

export function ReadingsPanel({ survey, readings, stale, current, setCurrent, measure }: Props) {
  const [said, say] = useState('');
  const [block, setBlock] = useState<string>();
  const counts = survey.lines.map(({ points }) => points.length);
  const all = survey.lines.flatMap(({ points }) => points);
  const go = (from: SurveyPoint, by: 1 | -1): void => {
    const next = all[from.number - 1 + by];
    if (next !== undefined) focusField(readingPath(next));
  };
  const paste = (text: string, from: SurveyPoint): void => {
    const texts = sequenceOf(figuresIn(text));
    if (texts === undefined) {
      setBlock(text);
      return;
    }
    const { cells, left } = inOrder(texts, counts, from);
    readings.write(cells.map((cell) => ({ ...cell, text: readings.file(cell.text) })));
    say(words.taken(cells.length, left));
  };
  return (
    <Panel id="readings" title={words.readings} stale={stale} aside={<Aside readings={readings} measure={measure} />}>
      <p className={styles.hint}>{words.hint}</p>
      {block !== undefined && (
        <PastedBlock
          text={block}
          counts={counts}
          readings={readings}
          close={(sentence) => {
            setBlock(undefined);
            say(sentence);
          }}
        />
      )}
      <div className={styles.lines}>
        {survey.lines.map((line) => (
          <Line key={line.at} {...{ line, survey, readings, current, setCurrent, go, paste }} />
        ))}
      </div>
      <Problems below="readings" />
      <p className={styles.said} aria-live="polite">
        {said}
      </p>
    </Panel>
  );
}

function Aside({ readings, measure }: { readonly readings: Readings; readonly measure: () => void }) {
  return (
    <div className={styles.aside}>
      <label>
        {words.unit}
        <select value={readings.unit.symbol} onChange={(event) => readings.chooseUnit(event.target.value)}>
          <UnitOptions measures={readings.units} />
        </select>
      </label>
      <button type="button" className={buttons.quiet} onClick={readings.clear}>
        {words.clear}
      </button>
      <button type="button" className={styles.measure} onClick={measure}>
        {words.measure}
      </button>
    </div>
  );
}

interface LineProps {
  readonly line: SurveyLine;
  readonly survey: PresentedSurvey;
  readonly readings: Readings;
  readonly current: number | undefined;
  readonly setCurrent: (number: number) => void;
  readonly go: (from: SurveyPoint, by: 1 | -1) => void;
  readonly paste: (text: string, from: SurveyPoint) => void;
}

function Line({ line, survey: { units }, readings, current, setCurrent, go, paste }: LineProps) {
  return (
    <table className={styles.line}>
      <caption>
        <b>{line.title}</b> {line.place}
      </caption>
      <thead>
        <tr>
          <th scope="col">{words.point}</th>
          <th scope="col">
            {words.depth} <span>/ {units.depth}</span>
          </th>
          <th scope="col">
            {words.reading} <span>/ {readings.unit.print}</span>
          </th>
          <th scope="col">
            {words.velocity} <span>/ {units.velocity}</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {line.points.map((point) => (
          <tr key={point.number} data-current={point.number === current}>
            <th scope="row">{point.number}</th>
            <td title={point.moved ? words.moved : undefined}>
              {point.depth.number}
              {point.moved && <span aria-hidden="true"> ▪</span>}
            </td>
            <td>
              <ReadingBox
                point={point}
                readings={readings}
                className={styles.box}
                enter={() => setCurrent(point.number)}
                go={(by) => go(point, by)}
                paste={(text) => paste(text, point)}
              />
            </td>
            <td className={styles.velocity}>{point.velocity?.number ?? ''}</td>
          </tr>
        ))}
      </tbody>
      {line.mean && (
        <tfoot>
          <tr>
            <th scope="row" colSpan={3}>
              {words.lineMean}
            </th>
            <td>{line.mean.number}</td>
          </tr>
        </tfoot>
      )}
    </table>
  );
}

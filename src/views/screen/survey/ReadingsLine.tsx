/** One line of the probe as a table: number and depth of each point, its box, the velocity found there. */
import type { PresentedSurvey, SurveyLine, SurveyPoint } from '../../present/survey-model.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import { ReadingBox } from './ReadingBox.tsx';
import styles from './ReadingsPanel.module.css';
import type { Readings } from './readings.ts';

export interface Hands {
  readonly survey: PresentedSurvey;
  readonly readings: Readings;
  readonly current: number | undefined;
  readonly setCurrent: (number: number) => void;
  readonly go: (from: SurveyPoint, by: 1 | -1) => void;
  readonly paste: (text: string, from: SurveyPoint) => void;
}

export function ReadingsLine({ line, hands }: { readonly line: SurveyLine; readonly hands: Hands }) {
  const { survey, readings } = hands;
  const heads = [
    { label: words.depth, unit: survey.units.depth },
    { label: words.reading, unit: readings.unit.print },
    { label: words.velocity, unit: survey.units.velocity },
  ];
  return (
    <table className={styles.line}>
      <caption>
        <b>{line.title}</b> {line.place}
      </caption>
      <thead>
        <tr>
          <th scope="col">{words.point}</th>
          {heads.map(({ label, unit }) => (
            <th key={label} scope="col">
              {label} <span>/ {unit}</span>
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {line.points.map((point) => (
          <Point key={point.number} point={point} hands={hands} />
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

function Point({ point, hands }: { readonly point: SurveyPoint; readonly hands: Hands }) {
  const { readings, current, setCurrent, go, paste } = hands;
  return (
    <tr data-current={point.number === current}>
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
  );
}

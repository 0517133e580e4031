/** Every point of a survey by line: depth, reading, velocity, and its weight where the points do not count alike. */
import type { PresentedSurvey, SurveyLine, SurveyPoint } from '../present/survey-model.ts';
import type { SurveySheet } from '../present/survey-sheet.ts';
import { checksAre, dash } from '../words/sheet.ts';
import { surveyPlace } from '../words/survey-place.ts';
import { sheetOfSurvey as words } from '../words/survey-sheet.ts';
import { surveyWords } from '../words/surveys.ts';
import { Block } from './Block.tsx';
import { Page } from './Page.tsx';
import type { Place } from './paper.ts';
import survey from './survey.module.css';

export function PointsSheet({ sheet, place }: { readonly sheet: SurveySheet; readonly place: Place }) {
  const { head, survey: read } = sheet;
  return (
    <Page head={head} type={words.points} verdict={checksAre(read.verdict.words)} place={place}>
      <Points survey={read} />
    </Page>
  );
}

/** The tables alone, where they fit beside the checks. */
export function Points({ survey: read }: { readonly survey: PresentedSurvey }) {
  const from = read.fromPort ? surveyWords.fromPort : surveyWords.fromWall;
  return (
    <Block title={words.byLine} aside={words.depthFrom(from, read.units.depth)}>
      <div className={read.shape.weighted ? survey.weighted : survey.narrow}>
        {read.lines.map((line) => (
          <Line key={line.at} line={line} survey={read} />
        ))}
      </div>
    </Block>
  );
}

interface LineProps {
  readonly line: SurveyLine;
  readonly survey: PresentedSurvey;
}

function Line({ line: { title, place, points, mean }, survey: { units, shape } }: LineProps) {
  const heads = [
    { label: surveyPlace.depth, unit: units.depth },
    { label: words.differential, unit: units.differential },
    { label: words.velocity, unit: units.velocity },
    ...(shape.weighted ? [{ label: words.weight, unit: '1' }] : []),
  ];
  return (
    <table className={survey.points}>
      <caption>
        <b>{title}</b> {place}
      </caption>
      <thead>
        <tr>
          <th scope="col">{words.number}</th>
          {heads.map(({ label, unit }) => (
            <th key={label} scope="col">
              {label} / {unit}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {points.map((point) => (
          <PointRow key={point.number} point={point} weighted={shape.weighted} />
        ))}
      </tbody>
      {mean && (
        <tfoot>
          <tr>
            <th scope="row" colSpan={3}>
              {surveyWords.mean}
            </th>
            <td>{mean.number}</td>
          </tr>
        </tfoot>
      )}
    </table>
  );
}

const PointRow = ({ point, weighted }: { readonly point: SurveyPoint; readonly weighted: boolean }) => (
  <tr>
    <th scope="row">{point.number}</th>
    <td>
      {point.depth.number}
      {point.moved && ' ▪'}
    </td>
    <td>{point.differential?.number ?? dash}</td>
    <td>{point.velocity?.number ?? dash}</td>
    {weighted && <td>{point.weight.number}</td>}
  </tr>
);

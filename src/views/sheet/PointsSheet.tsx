/** Every point of a survey by line: depth, reading, velocity, and its weight where the points do not count alike. */
import type { PresentedSurvey, SurveyLine } from '../present/survey-model.ts';
import type { SurveySheet } from '../present/survey-sheet.ts';
import { checksAre } from '../words/sheet.ts';
import { surveyPlace, surveyWords, sheetOfSurvey as words } from '../words/surveys.ts';
import { Block } from './Block.tsx';
import { Page } from './Page.tsx';
import type { Place } from './paper.ts';
import survey from './survey.module.css';

export function PointsSheet({ sheet, place }: { readonly sheet: SurveySheet; readonly place: Place }) {
  const { head, survey: read } = sheet;
  const from = read.fromPort ? surveyWords.fromPort : surveyWords.fromWall;
  return (
    <Page head={head} type={words.points} verdict={checksAre(read.verdict.words)} place={place}>
      <Block title={words.byLine} aside={words.depthFrom(from, read.units.depth)}>
        <div className={survey.lines}>
          {read.lines.map((line) => (
            <Line key={line.at} line={line} survey={read} />
          ))}
        </div>
      </Block>
    </Page>
  );
}

function Line({ line: { title, place, points, mean }, survey: { units, shape } }: LineProps) {
  return (
    <table className={survey.points}>
      <caption>
        <b>{title}</b> {place}
      </caption>
      <thead>
        <tr>
          <th scope="col">{surveyPlace.point}</th>
          <th scope="col">
            {surveyPlace.depth} / {units.depth}
          </th>
          {shape.weighted && <th scope="col">{words.weight}</th>}
          <th scope="col">
            {words.differential} / {units.differential}
          </th>
          <th scope="col">
            {surveyPlace.velocity} / {units.velocity}
          </th>
        </tr>
      </thead>
      <tbody>
        {points.map((point) => (
          <tr key={point.number}>
            <th scope="row">{point.number}</th>
            <td>
              {point.depth.number}
              {point.moved && ' ▪'}
            </td>
            {shape.weighted && <td>{point.weight.number}</td>}
            <td>{point.differential?.number ?? '–'}</td>
            <td>{point.velocity?.number ?? '–'}</td>
          </tr>
        ))}
      </tbody>
      {mean && (
        <tfoot>
          <tr>
            <th scope="row" colSpan={shape.weighted ? 4 : 3}>
              {surveyWords.mean}
            </th>
            <td>{mean.number}</td>
          </tr>
        </tfoot>
      )}
    </table>
  );
}

interface LineProps {
  readonly line: SurveyLine;
  readonly survey: PresentedSurvey;
}

/** The blank form for the field: the section with its points, a box for each reading at its depth, what else to note. */
import { SurveySection } from '../drawing/SurveySection.tsx';
import type { SurveyLine } from '../present/survey-model.ts';
import type { FieldForm } from '../present/survey-sheet.ts';
import { fieldNotes, formFacts, sheetOfSurvey as words } from '../words/survey-sheet.ts';
import { surveyWords } from '../words/surveys.ts';
import { Block } from './Block.tsx';
import styles from './content.module.css';
import { Notes } from './Notes.tsx';
import { Page } from './Page.tsx';
import type { Place } from './paper.ts';
import survey from './survey.module.css';
import tables from './table.module.css';

const PICTURE = { width: 340, height: 210, type: 10.8 }; // px; 90 mm by 55 mm

export function FormSheet({ sheet, place }: { readonly sheet: FieldForm; readonly place: Place }) {
  const { head, survey: plan, facts } = sheet;
  const blank = { ...plan, shape: { ...plan.shape, lines: plan.shape.lines.map(withoutVelocities) } };
  const from = plan.fromPort ? surveyWords.fromPort : surveyWords.fromWall;
  return (
    <Page head={head} type={words.form} verdict="" place={place}>
      <div className={styles.halves}>
        <SurveySection survey={blank} {...PICTURE} />
        <Block title={words.plan}>
          <table className={tables.table}>
            <tbody>
              {facts.map(({ label, text }) => (
                <tr key={label}>
                  <th scope="row">{label}</th>
                  <td>{text}</td>
                </tr>
              ))}
            </tbody>
          </table>
          <p className={styles.exception}>{formFacts.legend}</p>
        </Block>
      </div>
      <Block title={words.toRead} aside={words.depthFrom(from, plan.units.depth)}>
        <div className={survey.lines}>
          {plan.lines.map((line) => (
            <Line key={line.at} line={line} />
          ))}
        </div>
      </Block>
      <Block title={words.toNote}>
        <div className={survey.notes}>
          {fieldNotes.map((note) => (
            <div key={note}>{note}</div>
          ))}
        </div>
      </Block>
      <Notes lines={plan.cautions} />
    </Page>
  );
}

/** A blank form shows no reading, whatever is known of it by now. */
const withoutVelocities = (line: SurveyLine): SurveyLine => ({
  ...line,
  points: line.points.map(({ velocity_m_s: _, velocity: __, differential: ___, ...point }) => point),
});

function Line({ line: { title, place, points } }: { readonly line: SurveyLine }) {
  return (
    <table className={survey.form}>
      <caption>
        <b>{title}</b> {place}
      </caption>
      <tbody>
        {points.map((point) => (
          <tr key={point.number}>
            <th scope="row">{point.number}</th>
            <td>
              {point.depth.number}
              {point.moved && ' ▪'}
            </td>
            <td className={survey.box} />
          </tr>
        ))}
      </tbody>
    </table>
  );
}

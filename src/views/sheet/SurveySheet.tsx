/** First sheet of a survey: what flows, the section and the velocities, result, fluid, and how the checks stand. */
import { SurveyProfile } from '../drawing/SurveyProfile.tsx';
import { SurveySection } from '../drawing/SurveySection.tsx';
import type { SurveySheet as Sheet } from '../present/survey-sheet.ts';
import { checksAre, unitsNote } from '../words/sheet.ts';
import { sheetOfSurvey as words } from '../words/survey-sheet.ts';
import { Block } from './Block.tsx';
import styles from './content.module.css';
import { Notes } from './Notes.tsx';
import { Page } from './Page.tsx';
import type { Place } from './paper.ts';
import { Rows } from './Rows.tsx';
import { Standing } from './Standing.tsx';
import pictures from './survey.module.css';

const SECTION = { width: 270, height: 230, type: 10.8 }; // px; type of 8 pt
const PROFILE = { width: 400, height: 230, type: 10.8 };

export function SurveySheet({ sheet, place }: { readonly sheet: Sheet; readonly place: Place }) {
  const { head, survey, answer } = sheet;
  return (
    <Page head={head} type={words.type} verdict={checksAre(survey.verdict.words)} place={place}>
      <p className={styles.answer}>{answer}</p>
      <p>{survey.under}</p>
      {survey.measured < survey.points && <p className={styles.loud}>{words.incomplete}</p>}
      <Block title={words.pictures}>
        <div className={pictures.pictures}>
          <SurveySection survey={survey} {...SECTION} />
          <SurveyProfile profile={survey.profile} {...PROFILE} />
        </div>
      </Block>
      <div className={styles.halves}>
        <div className={styles.stack}>
          <Rows title={words.result} rows={sheet.results} />
          <Rows title={words.plan} rows={sheet.plan} />
          <Rows title={words.quality} rows={sheet.quality} />
        </div>
        <div className={styles.stack}>
          <Rows title={words.fluid} rows={sheet.fluid} />
          <Standing blocks={sheet.checks} />
          {survey.certainty !== '' && <p className={styles.exception}>{survey.certainty}</p>}
        </div>
      </div>
      <Notes lines={[...survey.cautions, ...survey.notes, unitsNote]} />
    </Page>
  );
}

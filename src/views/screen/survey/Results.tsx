/** What the survey found: flow, quality of the readings, what makes the uncertainty, and numbers of points in use. */
import type { Row } from '../../present/model.ts';
import type { PresentedSurvey, SurveySuggestion } from '../../present/survey-model.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import buttons from '../button.module.css';
import { Clause } from '../Clause.tsx';
import { useWriteAll } from '../hand.tsx';
import { Figure } from '../panel/Figure.tsx';
import { Panel } from '../panel/Panel.tsx';
import states from '../panel/States.module.css';
import styles from './Results.module.css';

interface Props {
  readonly survey: PresentedSurvey;
  readonly stale: boolean;
}

export function Results({ survey, stale }: Props) {
  if (survey.results.length === 0) return null;
  return (
    <Panel id="survey-result" title={words.result} stale={stale}>
      <Rows rows={survey.results} />
      {survey.terms.length > 0 && (
        <details className={styles.more}>
          <summary>{words.terms}</summary>
          <Rows rows={survey.terms} />
        </details>
      )}
      {survey.certainty !== '' && <p className={styles.note}>{survey.certainty}</p>}
      <h3 className={styles.title}>{words.quality}</h3>
      <Rows rows={survey.quality} />
    </Panel>
  );
}

const Rows = ({ rows }: { readonly rows: readonly Row[] }) => (
  <dl className={states.rows}>
    {rows.map((row) => (
      <Figure key={row.id} row={row} />
    ))}
  </dl>
);

export function Suggestions({ survey, stale }: Props) {
  return (
    <Panel id="suggestions" title={words.suggestions} stale={stale}>
      <ul className={styles.suggestions}>
        {survey.suggestions.map((one) => (
          <Suggestion key={one.key} suggestion={one} />
        ))}
      </ul>
      <p className={styles.note}>{words.suggestionNote}</p>
    </Panel>
  );
}

function Suggestion({
  suggestion: { text, rule, lines, pointsPerLine, cited, chosen },
}: {
  readonly suggestion: SurveySuggestion;
}) {
  const writeAll = useWriteAll();
  return (
    <li>
      <span>{text}</span>
      <span className={styles.source}>
        <Clause cited={cited} />
      </span>
      {chosen ? (
        <b>{words.chosen}</b>
      ) : (
        <button
          type="button"
          className={buttons.framed}
          aria-label={words.takeOf(text)}
          onClick={() =>
            writeAll([
              ['rule', rule],
              ['lines', lines],
              ['pointsPerLine', pointsPerLine],
            ])
          }
        >
          {words.take}
        </button>
      )}
    </li>
  );
}

/** The readings, line by line: number and depth of each point, its box, the velocity found there. */
import { useState } from 'react';
import type { PresentedSurvey, SurveyPoint } from '../../present/survey-model.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import buttons from '../button.module.css';
import { UnitOptions } from '../field/UnitOptions.tsx';
import { Problems } from '../fluid/Problems.tsx';
import { focusField } from '../focus.ts';
import { Panel } from '../panel/Panel.tsx';
import { PastedBlock } from './PastedBlock.tsx';
import { figuresIn, inOrder, sequenceOf } from './paste-readings.ts';
import { readingPath } from './ReadingBox.tsx';
import { type Hands, ReadingsLine } from './ReadingsLine.tsx';
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
  const { said, block, hands, close } = useHands({ survey, readings, current, setCurrent });
  return (
    <Panel id="readings" title={words.readings} stale={stale} aside={<Aside readings={readings} measure={measure} />}>
      <p className={styles.hint}>{words.hint}</p>
      {block !== undefined && (
        <PastedBlock
          text={block}
          counts={survey.lines.map(({ points }) => points.length)}
          readings={readings}
          close={close}
        />
      )}
      <div className={styles.lines}>
        {survey.lines.map((line) => (
          <ReadingsLine key={line.at} line={line} hands={hands} />
        ))}
      </div>
      <Problems below="readings" />
      <p className={styles.said} aria-live="polite">
        {said}
      </p>
    </Panel>
  );
}

/** Where the keys lead, and what becomes of a pasted table. */
function useHands({
  survey,
  readings,
  current,
  setCurrent,
}: Pick<Props, 'survey' | 'readings' | 'current' | 'setCurrent'>) {
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
  const close = (sentence: string): void => {
    setBlock(undefined);
    say(sentence);
  };
  const hands: Hands = { survey, readings, current, setCurrent, go, paste };
  return { said, block, hands, close };
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

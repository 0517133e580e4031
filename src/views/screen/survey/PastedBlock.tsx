/** A pasted block of several rows and columns: which of them are the lines is asked, never guessed. */
import { surveyPlace as words } from '../../words/survey-place.ts';
import buttons from '../button.module.css';
import { type Counts, figuresIn, inLines } from './paste-readings.ts';
import styles from './ReadingsPanel.module.css';
import type { Readings } from './readings.ts';

interface Props {
  readonly text: string;
  readonly counts: Counts;
  readonly readings: Readings;
  readonly close: (sentence: string) => void;
}

const WAYS = [
  { way: 'rows', label: words.byRows },
  { way: 'columns', label: words.byColumns },
] as const;

export function PastedBlock({ text, counts, readings, close }: Props) {
  const rows = figuresIn(text);
  const width = Math.max(0, ...rows.map((row) => row.length));
  return (
    <fieldset className={styles.block}>
      <legend>{words.block(rows.length, width)}</legend>
      {WAYS.map(({ way, label }) => {
        const cells = inLines(rows, counts, way);
        return (
          <button
            key={way}
            type="button"
            className={buttons.framed}
            disabled={cells === undefined}
            onClick={() => {
              const taken = (cells ?? []).map((cell) => ({ ...cell, text: readings.file(cell.text) }));
              readings.write(taken);
              close(words.taken(taken.filter((cell) => cell.text !== '').length, 0));
            }}
          >
            {cells === undefined ? `${label}: ${words.noFit}` : label}
          </button>
        );
      })}
      <button type="button" className={buttons.quiet} onClick={() => close('')}>
        {words.leave}
      </button>
    </fieldset>
  );
}

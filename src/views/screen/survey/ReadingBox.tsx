/** The box of one reading. Enter goes on to the next point, Shift + Enter back; a pasted table goes to the survey. */
import type { SurveyPoint } from '../../present/survey-model.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import { useWorkbench } from '../binding.tsx';
import { isTable } from '../fluid/paste.ts';
import { useDraft } from '../fluid/useDraft.ts';
import { useProblem } from '../meter.ts';
import type { Readings } from './readings.ts';

interface Props {
  readonly point: SurveyPoint;
  readonly readings: Readings;
  readonly className?: string | undefined;
  readonly enter?: () => void;
  readonly go: (by: 1 | -1) => void;
  readonly paste?: (text: string) => void;
  readonly described?: string | undefined;
}

export const readingPath = ({ line, point }: Pick<SurveyPoint, 'line' | 'point'>): string =>
  `readings.${line}.${point}`;

export function ReadingBox({ point, readings, className, enter, go, paste, described }: Props) {
  const settle = useWorkbench((state) => state.settle);
  const path = readingPath(point);
  const problem = useProblem(path);
  const text = readings.textAt(point.line, point.point);
  const draft = useDraft(text, readings.shown, readings.file, (next) =>
    readings.write([{ line: point.line, point: point.point, text: next }]),
  );
  return (
    <input
      type="text"
      inputMode="decimal"
      enterKeyHint="next"
      autoComplete="off"
      spellCheck={false}
      className={className}
      data-field={path}
      aria-label={words.readingOf(point.number)}
      aria-invalid={problem !== undefined && text !== ''}
      aria-describedby={described}
      title={problem}
      value={draft.value}
      onChange={(event) => draft.type(event.target.value)}
      onFocus={enter}
      onPaste={(event) => {
        const pasted = event.clipboardData.getData('text/plain');
        if (paste === undefined || !isTable(pasted)) return;
        event.preventDefault();
        paste(pasted);
      }}
      onKeyDown={(event) => {
        if (event.key !== 'Enter') return;
        event.preventDefault();
        event.stopPropagation();
        draft.settle();
        settle();
        go(event.shiftKey ? -1 : 1);
      }}
      onBlur={settle}
    />
  );
}

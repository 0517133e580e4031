/** One figure in a table of inputs. A pasted table goes to the table, anything else into the box. */
import { useProblem } from '../meter.ts';
import { isTable } from './paste.ts';
import { useDraft } from './useDraft.ts';

interface Props {
  readonly path: string;
  readonly label: string;
  readonly text: string;
  readonly shown: (text: string) => string;
  readonly file: (typed: string) => string;
  readonly write: (text: string) => void;
  readonly settle: () => void;
  readonly paste: (table: string) => void;
}

export function Cell({ path, label, text, shown, file, write, settle, paste }: Props) {
  const problem = useProblem(path);
  const draft = useDraft(text, shown, file, write);
  return (
    <input
      type="text"
      inputMode="decimal"
      autoComplete="off"
      spellCheck={false}
      data-field={path}
      aria-label={label}
      aria-invalid={problem !== undefined && text !== ''}
      title={problem}
      value={draft.value}
      onChange={(event) => draft.type(event.target.value)}
      onPaste={(event) => {
        const pasted = event.clipboardData.getData('text/plain');
        if (!isTable(pasted)) return;
        event.preventDefault();
        paste(pasted);
      }}
      onKeyDown={(event) => {
        if (event.key === 'Enter') draft.settle();
      }}
      onBlur={settle}
    />
  );
}

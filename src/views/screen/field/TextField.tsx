/** Words or a plain number, kept as typed. */
import { useUntried } from '../meter.ts';
import styles from './box.module.css';
import { Frame, problemId } from './Frame.tsx';

interface Props {
  readonly path: string;
  readonly label: string;
  readonly text: string;
  readonly problem?: string | undefined;
  readonly decimal?: boolean;
  readonly write: (text: string) => void;
  readonly settle: () => void;
}

export function TextField({ path, label, text, problem, decimal = false, write, settle }: Props) {
  const id = `field-${path}`;
  const waiting = useUntried() && text === '';
  const invalid = problem !== undefined && !waiting;
  return (
    <Frame id={id} label={label} problem={problem} waiting={waiting}>
      <div className={styles.box} data-invalid={invalid}>
        <input
          id={id}
          className={styles.input}
          data-field={path}
          type="text"
          inputMode={decimal ? 'decimal' : 'text'}
          enterKeyHint="next"
          autoComplete="off"
          spellCheck={!decimal}
          value={text}
          aria-invalid={invalid}
          aria-describedby={problem === undefined ? undefined : problemId(id)}
          onChange={(event) => write(event.target.value)}
          onBlur={settle}
        />
      </div>
    </Frame>
  );
}

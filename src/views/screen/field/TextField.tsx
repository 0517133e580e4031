/** Words or a plain number, kept as typed. */
import styles from './box.module.css';
import { Frame } from './Frame.tsx';
import { useFieldState } from './useFieldState.ts';

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
  const { frame, invalid, box } = useFieldState({ path, text, problem });
  return (
    <Frame {...frame} label={label}>
      <div className={styles.box} data-invalid={invalid}>
        <input
          {...box}
          className={styles.input}
          type="text"
          inputMode={decimal ? 'decimal' : 'text'}
          enterKeyHint="next"
          autoComplete="off"
          spellCheck={!decimal}
          value={text}
          onChange={(event) => write(event.target.value)}
          onBlur={settle}
        />
      </div>
    </Frame>
  );
}

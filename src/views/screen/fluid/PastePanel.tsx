/** The frame of a paste: the text as it came, what is read of it, and whether to take it. */
import { type ReactNode, useEffect, useId, useRef } from 'react';
import { pasteWords as words } from '../../words/fluid-forms.ts';
import buttons from '../button.module.css';
import styles from './paste.module.css';

interface Props {
  readonly hint: string;
  readonly text: string;
  readonly change: (text: string) => void;
  /** Lines that could not be read. */
  readonly unread: readonly string[];
  /** How many lines are taken; none can be taken while it is 0. */
  readonly count: number;
  readonly take: () => void;
  readonly close: () => void;
  /** What is read, as a table. */
  readonly children: ReactNode;
}

export function PastePanel({ hint, text, change, unread, count, take, close, children }: Props) {
  const area = useRef<HTMLTextAreaElement>(null);
  const id = useId();
  useEffect(() => area.current?.focus(), []);
  return (
    <div className={styles.panel}>
      <label htmlFor={id}>{words.box}</label>
      <textarea
        id={id}
        ref={area}
        rows={5}
        spellCheck={false}
        autoComplete="off"
        value={text}
        aria-describedby={`${id}-hint`}
        onChange={(event) => change(event.target.value)}
      />
      <p id={`${id}-hint`} className={styles.hint}>
        {hint}
      </p>
      <div aria-live="polite">
        {count > 0 && children}
        {unread.length > 0 && <p className={styles.unread}>{words.unread(unread)}</p>}
      </div>
      {count > 0 && <p className={styles.hint}>{words.replaces}</p>}
      <div className={styles.orders}>
        <button type="button" className={`${buttons.framed} ${styles.take}`} disabled={count === 0} onClick={take}>
          {words.take(count)}
        </button>
        <button type="button" className={buttons.framed} onClick={close}>
          {words.leave}
        </button>
      </div>
    </div>
  );
}

/** What every field has: its label, the box, what it was read as, and the sentence of its problem. */
import type { ReactNode } from 'react';
import styles from './Frame.module.css';

export interface FrameProps {
  readonly id: string;
  readonly label: string;
  readonly echo?: string | undefined;
  readonly problem?: string | undefined;
  /** Nothing is wrong yet, the field only waits to be filled: the sentence is kept for those who hear the page. */
  readonly waiting?: boolean;
  readonly note?: ReactNode;
  readonly aside?: ReactNode;
  readonly children: ReactNode;
}

export const problemId = (id: string): string => `${id}-problem`;
export const noteId = (id: string): string => `${id}-note`;

export function Frame({ id, label, echo, problem, waiting = false, note, aside, children }: FrameProps) {
  return (
    <div className={styles.frame}>
      <div className={styles.head}>
        <label className={styles.label} htmlFor={id}>
          {label}
        </label>
        {aside}
      </div>
      {children}
      {(echo || note) && (
        <div className={styles.note} id={noteId(id)}>
          {echo && <span>{echo}</span>}
          {note}
        </div>
      )}
      {problem && (
        <div className={waiting ? styles.waiting : styles.problem} id={problemId(id)}>
          {problem}
        </div>
      )}
    </div>
  );
}

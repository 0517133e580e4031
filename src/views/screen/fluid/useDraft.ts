/**
 * What is typed into a box whose text is written in another spelling: the box keeps what was typed while the document
 * holds what that typing wrote.
 */
import { useState } from 'react';

export interface Draft {
  readonly value: string;
  type(typed: string): void;
  /** Shows the text as the document has it again. */
  settle(): void;
}

export function useDraft(
  text: string,
  shown: (text: string) => string,
  file: (typed: string) => string,
  write: (text: string) => void,
): Draft {
  const [draft, setDraft] = useState<{ readonly typed: string; readonly written: string }>();
  const live = draft !== undefined && draft.written === text;
  return {
    value: live ? draft.typed : shown(text),
    type: (typed) => {
      const written = file(typed);
      setDraft({ typed, written });
      write(written);
    },
    settle: () => setDraft(undefined),
  };
}

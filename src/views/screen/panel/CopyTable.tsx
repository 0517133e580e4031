/** Copies a table and says whether it worked. */
import { useState } from 'react';
import buttons from '../button.module.css';
import { type Cell, copyCells } from './clipboard.ts';

const WORDS = { ready: 'Copy table', done: 'Copied', refused: 'The browser refused to copy' } as const;

export function CopyTable({ cells }: { readonly cells: readonly (readonly Cell[])[] }) {
  const [state, setState] = useState<keyof typeof WORDS>('ready');
  const copy = (): void => {
    copyCells(cells).then(
      () => setState('done'),
      () => setState('refused'),
    );
  };
  return (
    <button type="button" className={buttons.quiet} onClick={copy} onBlur={() => setState('ready')}>
      <span aria-live="polite">{WORDS[state]}</span>
    </button>
  );
}

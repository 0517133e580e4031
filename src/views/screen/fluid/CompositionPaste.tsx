/** A composition from a spreadsheet, looked over before it is taken. */
import { useState } from 'react';
import { compositionSum } from '../../present/composition.ts';
import { pasteWords as words } from '../../words/fluid-forms.ts';
import { useWriteAll } from '../hand.tsx';
import { PastedShares } from './PastedShares.tsx';
import { PastePanel } from './PastePanel.tsx';
import styles from './paste.module.css';
import { type Choices, chosenName, compositionFrom, pastedComposition } from './paste-composition.ts';
import { Sum } from './Sum.tsx';
import type { ShareUnit } from './share.ts';

interface Props {
  readonly text: string;
  readonly close: () => void;
}

export function CompositionPaste({ text: pasted, close }: Props) {
  const writeAll = useWriteAll();
  const [text, setText] = useState(pasted);
  const [unit, setUnit] = useState<ShareUnit>();
  const [choices, setChoices] = useState<Choices>({});
  const read = pastedComposition(text);
  const inUse = unit ?? read.unit;
  const composition = compositionFrom(read, inUse, choices);
  const shares = Object.values(composition);
  const unknown = read.shares.filter((share, at) => chosenName(share, at, choices) === '').length;
  const take = (): void => {
    const basis = read.basis === undefined ? [] : [['fluid.basis', read.basis] as const];
    writeAll([['fluid.composition', composition], ...basis]);
    close();
  };
  const change = (next: string): void => {
    setText(next);
    setChoices({});
  };
  return (
    <PastePanel
      hint={words.compositionHint}
      text={text}
      change={change}
      unread={read.unread}
      count={shares.length}
      take={take}
      close={close}
    >
      <PastedShares
        read={read}
        unit={inUse}
        chooseUnit={setUnit}
        choices={choices}
        choose={(at, name) => setChoices({ ...choices, [at]: name })}
      />
      <Sum of={compositionSum(shares)} />
      {read.basis !== undefined && <p className={styles.hint}>{words.basis(read.basis)}</p>}
      {unknown > 0 && <p className={styles.unread}>{words.unknown(unknown)}</p>}
    </PastePanel>
  );
}

/** The composition of a gas: a table of components, the sum while it is typed, typical gases and a paste to start from. */
import { useState } from 'react';
import { compositionSum } from '../../present/composition.ts';
import { pasteWords, compositionWords as words } from '../../words/fluid-forms.ts';
import buttons from '../button.module.css';
import { useWritten } from '../hand.tsx';
import { Fold } from '../station/Fold.tsx';
import { CompositionPaste } from './CompositionPaste.tsx';
import { CompositionTable } from './CompositionTable.tsx';
import { compositionIn, entriesOf } from './composition.ts';
import styles from './inputs.module.css';
import { PresetGas } from './PresetGas.tsx';
import { Problems } from './Problems.tsx';
import { Sum } from './Sum.tsx';

const PATH = 'fluid.composition';

export function Composition() {
  const shares = compositionIn(useWritten(PATH));
  const [pasted, setPasted] = useState<string>();
  const entries = entriesOf(shares);
  const sum = compositionSum(entries.map(({ text }) => text));
  const [open] = useState(sum.missing !== undefined || sum.above !== undefined); // a whole one is only looked up
  return (
    <Fold title={words.title} count={words.count(entries.length, sum.sum.text)} open={open}>
      {pasted === undefined ? (
        <>
          <CompositionTable shares={shares} paste={setPasted} />
          <Sum of={sum} />
          <Problems below={PATH} />
          <PresetGas />
          <button type="button" className={`${buttons.framed} ${styles.order}`} onClick={() => setPasted('')}>
            {pasteWords.open}
          </button>
        </>
      ) : (
        <CompositionPaste text={pasted} close={() => setPasted(undefined)} />
      )}
    </Fold>
  );
}

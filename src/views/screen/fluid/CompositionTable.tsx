/** The components and their shares. Each row keeps its text; the unit above the column is that of its boxes. */
import { useState } from 'react';
import { componentLabel } from '../../words/components.ts';
import { compositionWords as words } from '../../words/fluid-forms.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { useWrite, useWriteAll } from '../hand.tsx';
import { Cell } from './Cell.tsx';
import { ComponentSelect } from './ComponentSelect.tsx';
import {
  type Composition,
  type Entry,
  entriesOf,
  inUnit,
  renamed,
  tableUnit,
  without,
  withShare,
} from './composition.ts';
import styles from './inputs.module.css';
import { ShareUnitSelect } from './ShareUnitSelect.tsx';
import { fileShare, type ShareUnit, shownShare } from './share.ts';

const PATH = 'fluid.composition';

interface Props {
  readonly shares: Composition;
  readonly paste: (table: string) => void;
}

export function CompositionTable({ shares, paste }: Props) {
  const writeAll = useWriteAll();
  const [chosen, setChosen] = useState<ShareUnit>();
  const entries = entriesOf(shares);
  const unit = entries.some(({ text }) => text !== '') ? tableUnit(shares) : (chosen ?? '%');
  const taken = entries.map(({ name }) => name);
  const once = (next: Composition | undefined): void => writeAll([[PATH, next]]);
  const chooseUnit = (next: ShareUnit): void => {
    setChosen(next);
    if (entries.length > 0) once(inUnit(shares, next));
  };
  return (
    <table className={styles.table}>
      <thead>
        <tr>
          <th scope="col">{words.component}</th>
          <th scope="col" className={styles.figure}>
            <ShareUnitSelect label={words.unit} unit={unit} choose={chooseUnit} />
          </th>
          <td className={styles.narrow} />
        </tr>
      </thead>
      <tbody>
        {entries.map((entry) => (
          <Row key={entry.name} {...{ shares, entry, unit, taken, once, paste }} />
        ))}
        <tr>
          <td colSpan={3}>
            <ComponentSelect
              label={words.add}
              open={words.add}
              value=""
              taken={taken}
              choose={(name) => once(withShare(shares, name, ''))}
            />
          </td>
        </tr>
      </tbody>
    </table>
  );
}

interface RowProps extends Props {
  readonly entry: Entry;
  readonly unit: ShareUnit;
  readonly taken: readonly string[];
  readonly once: (next: Composition | undefined) => void;
}

function Row({ shares, entry: { name, text }, unit, taken, once, paste }: RowProps) {
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const label = componentLabel(name);
  return (
    <tr>
      <th scope="row">
        <ComponentSelect
          label={words.rename(label)}
          value={name}
          taken={taken}
          choose={(to) => once(renamed(shares, name, to))}
        />
      </th>
      <td className={styles.figure}>
        <Cell
          path={`${PATH}.${name}`}
          label={words.shareOf(label)}
          text={text}
          shown={(own) => shownShare(own, unit)}
          file={(typed) => fileShare(typed, unit)}
          write={(next) => write(PATH, withShare(shares, name, next))}
          settle={settle}
          paste={paste}
        />
      </td>
      <td className={styles.narrow}>
        <button
          type="button"
          className={buttons.remove}
          aria-label={words.remove(label)}
          onClick={() => once(without(shares, name))}
        >
          ×
        </button>
      </td>
    </tr>
  );
}

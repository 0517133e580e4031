/** What was read of a pasted composition, line by line; a name that is not known is settled here. */
import { componentLabel } from '../../words/components.ts';
import { pasteWords as words } from '../../words/fluid-forms.ts';
import { ComponentSelect } from './ComponentSelect.tsx';
import styles from './paste.module.css';
import { type Choices, chosenName, type PastedComposition, repeated } from './paste-composition.ts';
import { ShareUnitSelect } from './ShareUnitSelect.tsx';
import { type ShareUnit, shareText } from './share.ts';

interface Props {
  readonly read: PastedComposition;
  readonly unit: ShareUnit;
  readonly chooseUnit: (unit: ShareUnit) => void;
  readonly choices: Choices;
  readonly choose: (at: number, name: string) => void;
}

export function PastedShares({ read: { shares }, unit, chooseUnit, choices, choose }: Props) {
  const twice = repeated(shares, choices);
  return (
    <>
      {shares.some((share) => share.unit === undefined) && (
        <div className={styles.unit}>
          {words.shareUnit} <ShareUnitSelect label={words.shareUnit} unit={unit} choose={chooseUnit} />
        </div>
      )}
      <table className={styles.preview}>
        <caption>{words.preview}</caption>
        <tbody>
          {shares.map((share, at) => (
            // The lines of a text have no other name than their place.
            // biome-ignore lint/suspicious/noArrayIndexKey: they never move
            <tr key={at}>
              <td className={styles.written}>{share.written}</td>
              <td>
                <ComponentSelect
                  label={words.standsFor(share.written)}
                  open={words.leaveOut}
                  value={chosenName(share, at, choices)}
                  choose={(name) => choose(at, name)}
                />
                {twice.has(at) && (
                  <p className={styles.unread}>{words.twice(componentLabel(chosenName(share, at, choices)))}</p>
                )}
              </td>
              <td className={styles.figure}>{shareText(share.number, share.unit ?? unit)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </>
  );
}

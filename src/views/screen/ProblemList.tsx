/** What still stands in the way, each with the way to its field. */
import { fieldLabel } from '../words/fields.ts';
import buttons from './button.module.css';
import { focusField } from './focus.ts';
import styles from './ProblemList.module.css';
import { type Troubled, unsolved } from './unsolved.ts';

export function ProblemList({ selected }: { readonly selected: Troubled }) {
  const { wrong, missing } = unsolved(selected);
  return (
    <div className={styles.list}>
      {wrong.map(({ field, sentence }) => (
        <p key={`${field} ${sentence}`} className={styles.wrong}>
          <Way field={field} />
          <span>{sentence}</span>
        </p>
      ))}
      {missing.length > 0 && (
        <p className={styles.missing}>
          <span>Still to be filled in:</span>
          {missing.map(({ field, sentence }) => (
            <span key={`${field} ${sentence}`} title={sentence}>
              <Way field={field} />
            </span>
          ))}
        </p>
      )}
    </div>
  );
}

/** Leads to the field. */
export const Way = ({ field }: { readonly field: string }) => (
  <button type="button" className={buttons.word} onClick={() => focusField(field)}>
    {fieldLabel(field)}
  </button>
);

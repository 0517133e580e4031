/** What still stands in the way, each with the way to its field. */
import { fieldLabel } from '../words/fields.ts';
import { focusField } from './focus.ts';
import type { SelectedMeter } from './meter.ts';
import styles from './ProblemList.module.css';
import { valueAt } from './text.ts';

export function ProblemList({ selected }: { readonly selected: SelectedMeter }) {
  const { problems } = selected.now;
  const empty = problems.filter(({ field }) => isEmpty(valueAt(selected.meter, field)));
  const wrong = problems.filter((problem) => !empty.includes(problem));
  return (
    <div className={styles.list}>
      {wrong.map(({ field, sentence }) => (
        <p key={`${field} ${sentence}`} className={styles.wrong}>
          <Way field={field} />
          <span>{sentence}</span>
        </p>
      ))}
      {empty.length > 0 && (
        <p className={styles.missing}>
          <span>Still to be filled in:</span>
          {empty.map(({ field, sentence }) => (
            <span key={`${field} ${sentence}`} title={sentence}>
              <Way field={field} />
            </span>
          ))}
        </p>
      )}
    </div>
  );
}

const isEmpty = (written: unknown): boolean => written === undefined || written === '';

const Way = ({ field }: { readonly field: string }) => (
  <button type="button" className={styles.way} onClick={() => focusField(field)}>
    {fieldLabel(field)}
  </button>
);

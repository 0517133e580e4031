/** What the shares add up to, said again as they are typed. */
import type { CompositionSum } from '../../present/composition.ts';
import { compositionWords as words } from '../../words/fluid-forms.ts';
import styles from './inputs.module.css';

export function Sum({ of: { sum, missing, above } }: { readonly of: CompositionSum }) {
  const off = missing ? words.missing(missing.text) : above && words.above(above.text);
  return (
    <output className={styles.sum} aria-label={words.sum}>
      <span>{words.sum}</span>
      <b>{sum.text}</b>
      {off && <span className={styles.off}>{off}</span>}
    </output>
  );
}

/** Where figures come from, and what to mind in the field. */
import type { PresentedSizing } from '../../present/model.ts';
import styles from './Notes.module.css';
import { Panel } from './Panel.tsx';

export function Notes({ sizing }: { readonly sizing: Pick<PresentedSizing, 'notes' | 'cautions'> }) {
  if (sizing.notes.length + sizing.cautions.length === 0) return null;
  return (
    <Panel id="notes" title="Notes and cautions">
      <ul className={styles.notes}>
        {[...sizing.notes, ...sizing.cautions].map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
    </Panel>
  );
}

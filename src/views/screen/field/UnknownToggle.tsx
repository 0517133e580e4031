/** The button beside bore, differential and flow that makes it the unknown. */
import type { Unknown } from '../../../core/document/project.ts';
import { useWorkbenchStore } from '../binding.tsx';
import { focusSoon } from '../focus.ts';
import { turnTo } from './turn.ts';
import styles from './UnknownToggle.module.css';

interface Props {
  readonly unknown: Unknown;
  readonly label: string;
  readonly pressed: boolean;
}

export function UnknownToggle({ unknown, label, pressed }: Props) {
  const store = useWorkbenchStore();
  return (
    <button
      type="button"
      className={styles.toggle}
      aria-pressed={pressed}
      aria-label={`Find the ${label.toLowerCase()}`}
      data-unknown={unknown}
      onClick={() => {
        turnTo(unknown, store.getState());
        focusSoon(`[data-unknown="${unknown}"]`); // the field, and this button with it, is drawn anew
      }}
    >
      find
    </button>
  );
}

/** Where the work stands, in words. */
import type { Keeping } from '../../../state/workbench.ts';
import { useCommands, useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import styles from './KeepingStatus.module.css';
import { causeWords } from './standing.ts';

function words(keeping: Keeping): string {
  switch (keeping.state) {
    case 'reading':
      return 'Reading what is kept here';
    case 'new':
      return 'Not kept yet: nothing is typed';
    case 'pending':
      return 'Keeping';
    case 'kept':
      return `Kept in this browser ${keeping.at} · not in a file`;
    case 'memory':
      return `Not kept: ${causeWords(keeping.cause)}`;
    case 'failed':
      return `Keeping failed: ${causeWords(keeping.cause)}`;
    case 'elsewhere':
      return 'Another tab holds this project';
  }
}

const isTrouble = ({ state }: Keeping): boolean => state === 'memory' || state === 'failed' || state === 'elsewhere';

export function KeepingStatus() {
  const keeping = useWorkbench((state) => state.keeping);
  const commands = useCommands();
  return (
    <div className={styles.status} data-trouble={isTrouble(keeping)}>
      <span aria-live="polite" data-keeping={keeping.state}>
        {words(keeping)}
      </span>
      {keeping.state === 'elsewhere' && (
        <>
          <button type="button" className={buttons.framed} onClick={() => void commands.takeOver()}>
            Work here
          </button>
          <button type="button" className={buttons.framed} onClick={() => void commands.workOnCopy()}>
            Work on a copy
          </button>
        </>
      )}
    </div>
  );
}

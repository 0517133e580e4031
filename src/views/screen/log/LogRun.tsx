/** Starting a conversion, how far it is, and how it ended where it came to no end. */
import { useEffect, useState } from 'react';
import type { LogProgress, OpenLog } from '../../../state/logs.ts';
import { presentProgress } from '../../present/log-progress.ts';
import { presentProblem } from '../../present/problem.ts';
import { logWords as words } from '../../words/logs.ts';
import { useCommands } from '../binding.tsx';
import buttons from '../button.module.css';
import styles from './Log.module.css';

interface Props {
  readonly log: OpenLog;
  readonly ready: boolean;
  readonly stale: boolean;
}

export function LogRun({ log, ready, stale }: Props) {
  const commands = useCommands();
  const { progress, converted, troubles, cancelled } = log;
  if (progress !== undefined) return <Running progress={progress} />;
  return (
    <div className={styles.run}>
      <button
        type="button"
        className={converted === undefined || stale ? styles.first : buttons.framed}
        disabled={!ready}
        onClick={() => void commands.convertLog()}
      >
        {converted === undefined ? words.convert : words.again}
      </button>
      <div role="status" className={styles.said}>
        {cancelled && <p>{words.cancelled}</p>}
        {troubles.map((trouble) => (
          <p key={trouble.code} className={styles.problem}>
            {presentProblem(trouble).sentence}
          </p>
        ))}
        {stale && <p className={styles.stale}>{words.stale}</p>}
      </div>
    </div>
  );
}

function Running({ progress }: { readonly progress: LogProgress }) {
  const commands = useCommands();
  const { share, text } = presentProgress(progress);
  return (
    <div className={styles.run}>
      <progress className={styles.progress} value={share} max={1} aria-label={words.title} />
      <button type="button" className={buttons.framed} onClick={() => commands.cancelLog()}>
        {words.cancel}
      </button>
      <p className={styles.figures}>{text}</p>
      <p className={styles.hidden} role="status">
        {useEvery(5000, text)}
      </p>
    </div>
  );
}

/** A text that is read out no more often than every so many ms. */
function useEvery(ms: number, text: string): string {
  const [said, say] = useState({ text, at: 0 });
  useEffect(() => {
    const now = performance.now();
    if (now - said.at >= ms) say({ text, at: now });
  }, [ms, text, said.at]);
  return said.text;
}

/** The log of a meter: opened, looked at, converted, and what it came to. */

import type { OpenLog } from '../../../state/logs.ts';
import { logWords as words } from '../../words/logs.ts';
import { useCommands } from '../binding.tsx';
import buttons from '../button.module.css';
import { useSelectedMeter } from '../meter.ts';
import { Panel } from '../panel/Panel.tsx';
import styles from './Log.module.css';
import { LogColumns } from './LogColumns.tsx';
import { LogQuestions } from './LogQuestions.tsx';
import { LogResult } from './LogResult.tsx';
import { LogRows } from './LogRows.tsx';
import { LogRules } from './LogRules.tsx';
import { LogRun } from './LogRun.tsx';
import { OpenLogButtons } from './OpenLogButtons.tsx';
import { useConverted, useLog, useLook } from './useLog.ts';

export function LogPanel() {
  const selected = useSelectedMeter();
  const { log, elsewhere } = useLog();
  if (selected === undefined) return null;
  return (
    <Panel id="log" title={words.title} aside={log && <CloseLog busy={log.progress !== undefined} />}>
      {log === undefined ? <OpenLogButtons elsewhere={elsewhere} /> : <LogAtHand log={log} />}
    </Panel>
  );
}

function CloseLog({ busy }: { readonly busy: boolean }) {
  const commands = useCommands();
  return (
    <>
      <button type="button" className={buttons.quiet} disabled={busy} onClick={() => void commands.openLog()}>
        {words.openOther}
      </button>
      <button type="button" className={buttons.quiet} disabled={busy} onClick={() => commands.closeLog()}>
        {words.close}
      </button>
    </>
  );
}

function LogAtHand({ log }: { readonly log: OpenLog }) {
  const look = useLook(log);
  const converted = useConverted();
  return (
    <div className={styles.log}>
      <p className={styles.file}>
        <b>{log.name}</b>
        {look && <span>{look.spelling}</span>}
      </p>
      {look === undefined && log.troubles.length === 0 && <p role="status">{words.looking}</p>}
      {look && (
        <fieldset className={styles.setup} disabled={log.progress !== undefined}>
          <legend className={styles.hidden}>{words.columns}</legend>
          <LogRows look={look} />
          <LogColumns look={look} />
          <LogRules look={look} />
          <LogQuestions look={look} />
        </fieldset>
      )}
      <LogRun
        log={log}
        ready={look !== undefined && log.look?.problems.length === 0}
        stale={converted?.stale ?? false}
      />
      {converted && log.converted && (
        <LogResult log={converted.log} stale={converted.stale} output={log.converted.output} />
      )}
    </div>
  );
}

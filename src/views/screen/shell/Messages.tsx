/** What the program has to say once: a deletion that can be taken back, a notice, a new version. */
import type { ReactNode } from 'react';
import { useCommands, useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import styles from './Messages.module.css';
import { noticeWords } from './standing.ts';

export function Messages() {
  return (
    <div className={styles.messages} aria-live="polite">
      <Deleted />
      <NoticeLine />
      <Update />
    </div>
  );
}

function Deleted() {
  const deleted = useWorkbench((state) => state.deleted);
  const undo = useWorkbench((state) => state.undo);
  const dismiss = useWorkbench((state) => state.dismissDeleted);
  if (deleted === undefined) return null;
  const takeBack = (): void => {
    undo();
    dismiss();
  };
  return (
    <Line
      words={`${deleted.tag || (deleted.list === 'meters' ? 'The meter' : 'The survey')} is deleted.`}
      dismiss={dismiss}
    >
      <button type="button" className={buttons.framed} onClick={takeBack}>
        Take it back
      </button>
    </Line>
  );
}

function NoticeLine() {
  const notice = useWorkbench((state) => state.notice);
  const dismiss = useWorkbench((state) => state.dismissNotice);
  return notice && <Line words={noticeWords(notice)} trouble={notice.kind === 'problem'} dismiss={dismiss} />;
}

function Update() {
  const ready = useWorkbench((state) => state.update);
  const setUpdate = useWorkbench((state) => state.setUpdate);
  const commands = useCommands();
  if (!ready) return null;
  return (
    <Line words="A new version of Headwright is ready. The work is kept first." dismiss={() => setUpdate(false)}>
      <button type="button" className={buttons.framed} onClick={() => void commands.applyUpdate()}>
        Start it
      </button>
    </Line>
  );
}

interface LineProps {
  readonly words: string;
  readonly trouble?: boolean;
  readonly dismiss: () => void;
  readonly children?: ReactNode;
}

function Line({ words, trouble = false, dismiss, children }: LineProps) {
  return (
    <p className={styles.line} data-trouble={trouble}>
      <span>{words}</span>
      {children}
      <button type="button" className={buttons.framed} onClick={dismiss}>
        Dismiss
      </button>
    </p>
  );
}

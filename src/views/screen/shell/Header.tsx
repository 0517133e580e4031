/** The top of the window: name, project, places, undo, and where the work is kept. */
import { useCommands, useWorkbench } from '../binding.tsx';
import { PLACES, usePlace } from '../place.ts';
import { textAt } from '../text.ts';
import { useDialogs } from './dialogs.tsx';
import styles from './Header.module.css';
import { KeepingStatus } from './KeepingStatus.tsx';
import { Menu } from './Menu.tsx';

export function Header() {
  return (
    <header className={styles.header}>
      <p className={styles.name}>
        <b>Head</b>wright
      </p>
      <ProjectName />
      <Places />
      <History />
      <KeepingStatus />
      <Menu />
    </header>
  );
}

function ProjectName() {
  const title = useWorkbench((state) => textAt(state.project, 'title'));
  const revision = useWorkbench((state) => textAt(state.project, 'revision'));
  const { show } = useDialogs();
  return (
    <button
      type="button"
      className={styles.project}
      title="Title, revision, site and base state"
      onClick={() => show('project')}
    >
      {title || 'Untitled project'}
      {revision && ` · revision ${revision}`}
    </button>
  );
}

function Places() {
  const here = usePlace();
  return (
    <nav className={styles.places} aria-label="Places">
      {PLACES.map(({ id, label }) => (
        <a key={id} href={`#/${id}`} aria-current={id === here ? 'page' : undefined}>
          {label}
        </a>
      ))}
    </nav>
  );
}

function History() {
  const canUndo = useWorkbench((state) => state.canUndo);
  const canRedo = useWorkbench((state) => state.canRedo);
  const undo = useWorkbench((state) => state.undo);
  const redo = useWorkbench((state) => state.redo);
  const commands = useCommands();
  return (
    <div className={styles.orders}>
      <button type="button" disabled={!canUndo} onClick={undo}>
        Undo
      </button>
      <button type="button" disabled={!canRedo} onClick={redo}>
        Redo
      </button>
      <button type="button" className={styles.save} onClick={() => void commands.saveFile()}>
        Save file
      </button>
    </div>
  );
}

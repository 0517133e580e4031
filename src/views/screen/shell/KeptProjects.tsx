/** The projects kept in this browser. A damaged one is never thrown away unasked. */
import type { KeptProject } from '../../../state/workbench.ts';
import { useCommands, useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { useDialogs } from './dialogs.tsx';
import styles from './KeptProjects.module.css';

const CONDITIONS: Readonly<Record<KeptProject['condition'], string>> = {
  sound: '',
  damaged: 'damaged: the last sound version can be opened',
  newer: 'written by a newer Headwright',
};

export function KeptProjects() {
  const projects = useWorkbench((state) => state.projects);
  if (projects.length === 0) return <p>None yet. The project at hand is kept as soon as something is typed.</p>;
  return (
    <ul className={styles.list}>
      {projects.map((project) => (
        <Kept key={project.id} project={project} />
      ))}
    </ul>
  );
}

function Kept({ project }: { readonly project: KeptProject }) {
  const { title, savedAt, condition, current } = project;
  return (
    <li className={styles.kept}>
      <span>
        <b>{title || 'Untitled'}</b> <span className={styles.when}>{current ? 'at hand' : savedAt}</span>
        {condition !== 'sound' && <em>{CONDITIONS[condition]}</em>}
      </span>
      <span className={styles.orders}>
        <Opening project={project} />
        {!current && <Remove project={project} />}
      </span>
    </li>
  );
}

/** What can be opened of it, and its text where that is not all. */
function Opening({ project: { id, condition, current } }: { readonly project: KeptProject }) {
  const commands = useCommands();
  const { show } = useDialogs();
  const open = (order: (id: string) => Promise<void>): void => {
    show(undefined);
    void order(id);
  };
  return (
    <>
      {condition === 'sound' && !current && (
        <button type="button" className={buttons.framed} onClick={() => open((one) => commands.openKept(one))}>
          Open
        </button>
      )}
      {condition === 'damaged' && (
        <button type="button" className={buttons.framed} onClick={() => open((one) => commands.openEarlier(one))}>
          Open earlier version
        </button>
      )}
      {condition !== 'sound' && (
        <button type="button" className={buttons.framed} onClick={() => void commands.downloadRaw(id)}>
          Save its text
        </button>
      )}
    </>
  );
}

function Remove({ project: { id, title } }: { readonly project: KeptProject }) {
  const commands = useCommands();
  return (
    <button
      type="button"
      className={buttons.framed}
      aria-label={`Remove ${title || 'Untitled'}`}
      onClick={() => void commands.removeKept(id)}
    >
      Remove
    </button>
  );
}

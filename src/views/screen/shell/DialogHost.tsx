/** Shows the dialog that is open. */
import { Dialog } from './Dialog.tsx';
import { useDialogs } from './dialogs.tsx';
import { FindField } from './FindField.tsx';
import { KeptProjects } from './KeptProjects.tsx';
import { Keys } from './Keys.tsx';
import { ProjectFields } from './ProjectFields.tsx';

const DIALOGS = {
  keys: { title: 'Keys', Content: Keys },
  find: { title: 'Find a field', Content: FindField },
  project: { title: 'Project', Content: ProjectFields },
  kept: { title: 'Projects in this browser', Content: KeptProjects },
} as const;

export function DialogHost() {
  const { open, show } = useDialogs();
  if (open === undefined) return null;
  const { title, Content } = DIALOGS[open];
  return (
    <Dialog key={open} title={title} close={() => show(undefined)}>
      <Content />
    </Dialog>
  );
}

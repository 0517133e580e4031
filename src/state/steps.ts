/** Which edits make one step of undo: those of one field, until another is edited or the step is ended. */
import type { Project } from '../core/document/project.ts';

export interface Steps {
  /** The project as it was before the step that `field` has open. */
  before(field: string): Project | undefined;
  /** Carries out a change of `field` that starts at `project`; it goes on with the open step of that field. */
  during(field: string, project: Project, change: () => void): void;
  /** Whether the change at hand belongs to the step before it. */
  goesOn(): boolean;
  end(): void;
}

export function createSteps(): Steps {
  let open: { readonly field: string; readonly before: Project } | undefined;
  let going = false;
  return {
    before: (field) => (open?.field === field ? open.before : undefined),
    during: (field, project, change) => {
      going = open?.field === field;
      if (!going) open = { field, before: project };
      try {
        change();
      } finally {
        going = false;
      }
    },
    goesOn: () => going,
    end: () => {
      open = undefined;
    },
  };
}

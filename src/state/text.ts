/** The text of the project: that of the file it came from, byte for byte, while it says the same. */
import { encode } from '../core/document/codec.ts';
import type { WorkbenchState } from './workbench.ts';

export function textOf({ project, opened }: Pick<WorkbenchState, 'project' | 'opened'>): string {
  if (project === opened.project) return opened.source;
  const text = encode(project);
  return text === encode(opened.project) ? opened.source : text;
}

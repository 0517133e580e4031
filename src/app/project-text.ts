/** Between the text of a project file and a project. */
import { decode } from '../core/document/codec.ts';
import type { Project } from '../core/document/project.ts';
import type { Outcome } from '../core/quantity/outcome.ts';

/** Reads a project file; a byte order mark is no part of the JSON. */
export const readProject = (text: string): Outcome<Project> => decode(text.replace(/^\ufeff/, ''));

/** The title for lists and file names; without one, the first tags. */
export function titleOf(project: Project): string {
  if (typeof project.title === 'string' && project.title.trim() !== '') return project.title;
  const tags = [...project.meters, ...(project.traverses ?? [])].flatMap((meter: unknown) => {
    const tag = typeof meter === 'object' && meter !== null && 'tag' in meter ? meter.tag : undefined;
    return typeof tag === 'string' && tag !== '' ? [tag] : [];
  });
  return tags.slice(0, 3).join(', ') + (tags.length > 3 ? ' …' : '');
}

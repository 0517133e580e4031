/** The site of a project: what every meter and traverse stands on. */
import type { Project } from '../document/project.ts';
import { readSite } from '../input/site.ts';
import type { SiteRecord } from '../result/record.ts';
import { siteRecord } from '../result/site.ts';

/** The site, with what its place suggests; undefined where it cannot be read: every meter then says why. */
export function solveSite(project: Pick<Project, 'site' | 'base'>): SiteRecord | undefined {
  const site = readSite(project);
  return site.ok ? siteRecord(site.value) : undefined;
}

/** What the browser prints, read back from the PDF as its text. */
import { spawnSync } from 'node:child_process';
import { writeFileSync } from 'node:fs';
import type { Page, TestInfo } from '@playwright/test';

interface Printed {
  /** The text of each page, laid out as on paper. */
  readonly pages: readonly string[];
  /** What the file says of itself: number and size of the pages. */
  readonly about: string;
}

/** Prints the page as it stands to `name`.pdf among the results of the test. */
export async function printed(page: Page, info: TestInfo, name = 'sheets'): Promise<Printed> {
  const path = info.outputPath(`${name}.pdf`);
  writeFileSync(path, await page.pdf({ preferCSSPageSize: true, printBackground: true }));
  const read = (command: string, ...args: string[]): string => spawnSync(command, args, { encoding: 'utf8' }).stdout;
  const text = read('pdftotext', '-layout', path, '-');
  return { pages: text.split('\f').slice(0, -1), about: read('pdfinfo', path) };
}

/** Spaces of any kind and width are one. */
export const flat = (text: string): string => text.replace(/[\s\u00a0\u202f\u2009]+/g, ' ');

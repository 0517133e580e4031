/** Sentences for what the program says about the work it keeps: why nothing is kept, and notices. */
import type { Notice } from '../../../state/workbench.ts';
import { problemSentence } from '../../words/problems.ts';

const REFUSED = 'the browser refused to write. Save to a file.';

const CAUSES: Readonly<Record<string, string>> = {
  'no-space': 'this browser has no space left. Save to a file.',
  closed: 'the browser closed its storage. Load the page again.',
  newer: 'a newer version of Headwright holds the storage. Load the page again.',
  'no-database': 'this browser offers no storage here. Save to a file before you leave.',
  blocked: 'another tab holds the storage in an older form. Close it and load the page again.',
  storage: REFUSED,
};

export const causeWords = (cause: string): string => CAUSES[cause] ?? REFUSED;

type Words = (detail: Notice['detail']) => string;

const named = (detail: Notice['detail']): string => detail.name || 'The file';
const titled = (detail: Notice['detail']): string => detail.title || 'The project';

const NOTICES: Readonly<Record<string, Words>> = {
  'close-other-tabs': () => 'Other tabs hold an older version of Headwright. Close them to keep work here.',
  'not-kept': () => 'What you last wrote is not kept yet, so it stays in view. Save it to a file first.',
  'both-changed': () => 'The project changed in two tabs. This tab went on as a copy of its own.',
  'stored-gone': (d) => `${titled(d)} is no longer in this browser.`,
  'stored-damaged': (d) =>
    `${titled(d)} cannot be read as it was kept. Its last sound version is under Projects in this browser.`,
  'stored-newer': (d) => `${titled(d)} was written by a newer version of Headwright and is left as it is.`,
  'no-earlier-version': (d) =>
    `No earlier version of ${titled(d)} is kept here. Save its text to a file and mend it there.`,
  'held-elsewhere': (d) => `${titled(d)} is open in another tab. Close it there first.`,
  'open-cancelled': () => 'Nothing was opened.',
  'file-opened': (d) => `${named(d)} is open. It is kept as a project of its own in this browser.`,
  'file-unreadable': (d) => `${named(d)} could not be read. Check that it is still there, and open it again.`,
  'file-too-large': (d) => `${named(d)} is too large for a project file. Logs are converted, not opened.`,
  'file-not-text': (d) => `${named(d)} is not text. Open a file that ends in .headwright.json.`,
  'save-cancelled': () => 'Nothing was saved.',
  'file-not-written': (d) => `${named(d)} was not written in full. Save it again, to another place.`,
  'file-refused': (d) => `${named(d)} could not be written there. Save it to another place.`,
  'file-downloaded': (d) => `${named(d)} went to the downloads of this browser.`,
  'file-saved': (d) => `Saved as ${named(d)}.`,
  'log-without-meter': ({ name }) =>
    `${name} is a log, and there is no meter to convert it by. Add or open a meter first.`,
  'log-on-its-way': (d) => `A log is being converted: ${named(d)} can be opened when it is done, or cancelled.`,
  'example-log-missing': () =>
    'This meter cannot be solved as it stands, so that there is no example log for it. Mend the meter first.',
  'example-missing': () => 'The example is not at hand without a network. Open it once while online.',
  'example-opened': () => 'This is a copy of the example. Change what you like.',
};

/** The sentence of a notice; a code of a file that cannot be read has its words among the problems. */
export function noticeWords({ code, detail }: Notice): string {
  const words = NOTICES[code];
  if (words !== undefined) return words(detail);
  if (code.startsWith('storage-')) return `Keeping failed: ${causeWords(code.slice('storage-'.length))}`;
  const sentence = problemSentence({ code, field: '', detail });
  return detail.name ? `${detail.name}: ${sentence}` : sentence;
}

/** Every key of the program, in the order of the list. The handler and the list are made from this one table. */
export type Order = 'keys' | 'find' | 'undo' | 'redo' | 'save' | 'open' | 'previous' | 'next' | 'up' | 'down';

export interface KeyRow {
  /** Absent for what the browser or a field does by itself. */
  readonly order?: Order;
  readonly keys: string; // as printed
  readonly words: string;
  readonly key?: string; // KeyboardEvent.key
  readonly with?: 'command' | 'command-shift' | 'alt';
}

export const KEYS: readonly KeyRow[] = [
  { keys: 'Tab', words: 'Next field, in the order of the data' },
  { keys: 'Enter', words: 'Settle the field and go on to the next' },
  { order: 'find', keys: '/', key: '/', words: 'Find a field by its name' },
  { order: 'find', keys: 'Ctrl K', key: 'k', with: 'command', words: 'The same from inside a field' },
  { order: 'previous', keys: '[', key: '[', words: 'Previous meter or survey' },
  { order: 'next', keys: ']', key: ']', words: 'Next meter or survey' },
  { order: 'up', keys: 'Alt ↑', key: 'ArrowUp', with: 'alt', words: 'Move it up in the list' },
  { order: 'down', keys: 'Alt ↓', key: 'ArrowDown', with: 'alt', words: 'Move it down in the list' },
  { order: 'undo', keys: 'Ctrl Z', key: 'z', with: 'command', words: 'Undo; inside a field, undo the typing' },
  { order: 'redo', keys: 'Ctrl Shift Z', key: 'z', with: 'command-shift', words: 'Redo' },
  { order: 'redo', keys: 'Ctrl Y', key: 'y', with: 'command', words: 'Redo' },
  { order: 'save', keys: 'Ctrl S', key: 's', with: 'command', words: 'Save to a file' },
  { order: 'open', keys: 'Ctrl O', key: 'o', with: 'command', words: 'Open a file' },
  { order: 'keys', keys: '?', key: '?', words: 'This list' },
];

const held = (event: KeyboardEvent): KeyRow['with'] | undefined => {
  if (event.ctrlKey || event.metaKey) return event.shiftKey ? 'command-shift' : 'command';
  return event.altKey ? 'alt' : undefined;
};

const isText = (target: EventTarget | null): boolean =>
  target instanceof HTMLInputElement ? target.type === 'text' || target.type === 'search' : target instanceof HTMLTextAreaElement;

/** Undo and redo inside a text box are the browser's own. */
const TYPING: readonly Order[] = ['undo', 'redo'];

/** What a key orders where the focus stands; undefined leaves the key to the browser. */
export function orderOf(event: KeyboardEvent): Order | undefined {
  const row = KEYS.find(({ key, with: modifier }) => key === (event.key.length === 1 ? event.key.toLowerCase() : event.key) && modifier === held(event));
  if (row?.order === undefined) return undefined;
  if (event.target instanceof HTMLSelectElement && (row.with === undefined || row.with === 'alt')) return undefined;
  if (isText(event.target) && (row.with === undefined || TYPING.includes(row.order))) return undefined;
  return row.order;
}

/** The port in the browser's database. A write is kept when its transaction is complete, not before. */
import { type DBSchema, type IDBPDatabase, type IDBPTransaction, openDB } from 'idb';
import { hashOf } from './hash.ts';
import type { Draft, Durability, KeptRecord, Port, Writing } from './port.ts';
import {
  entryOf,
  isRecord,
  isSetAside,
  MOST_VERSIONS,
  newestFirst,
  readingOf,
  soundOnes,
  unnumbered,
  verdictOn,
} from './record.ts';

export const DATABASE = 'headwright';
const DATABASE_VERSION = 1;

interface Shelves extends DBSchema {
  projects: { key: string; value: KeptRecord };
  versions: { key: [string, number]; value: KeptRecord };
}
type Both = IDBPTransaction<Shelves, ['projects', 'versions'], 'readwrite'>;

export interface DatabaseOptions {
  /** The clock, ms since 1970. */
  readonly now?: () => number;
  /** An older version of the program holds the database in another tab. */
  readonly onBlocked?: () => void;
  /** A newer version in another tab wants the database: finish what is at hand; it is closed afterwards. */
  readonly onWanted?: () => Promise<void>;
}

/** Opens the database; rejects where the browser refuses it. */
export async function openDatabase(options: DatabaseOptions = {}): Promise<Port> {
  const connect = createConnect(options);
  const now = options.now ?? Date.now;
  await connect();
  return {
    list: async () => {
      const database = await connect();
      const transaction = database.transaction('projects');
      const [ids, stored] = await Promise.all([transaction.store.getAllKeys(), transaction.store.getAll()]);
      return newestFirst(await Promise.all(ids.map((id, index) => entryOf(stored[index], id))));
    },
    read: async (id) => readingOf(await takeUp(await connect(), id, now())),
    write: async (draft, expected, durability) => {
      const record = unnumbered(draft, durability, now());
      return write(await connect(), record, expected, durability, now());
    },
    leave: (draft, expected) => {
      const last = { ...unnumbered(draft, 'relaxed', now()), revision: expected + 1 };
      layBeside(connect.current(), last);
    },
    versions: async (id) => {
      const stored = await (await connect()).getAll('versions', allOf(id));
      return soundOnes(stored.toReversed());
    },
    remove: async (id) => {
      const transaction = (await connect()).transaction(['projects', 'versions'], 'readwrite', {
        durability: 'strict',
      });
      const { done } = transaction;
      await settled(transaction, [
        transaction.objectStore('projects').delete(id),
        transaction.objectStore('versions').delete(allOf(id)),
      ]);
      await done;
    },
    close: () =>
      void connect().then(
        (database) => database.close(),
        () => undefined,
      ),
  };
}

interface Connect {
  (): Promise<IDBPDatabase<Shelves>>;
  /** The connection if it is open now. */
  current(): IDBPDatabase<Shelves> | undefined;
}

/** One connection, opened again after the browser has ended it. */
function createConnect({ onBlocked, onWanted }: DatabaseOptions): Connect {
  let connection: Promise<IDBPDatabase<Shelves>> | undefined;
  let current: IDBPDatabase<Shelves> | undefined;
  const ended = (): void => {
    connection = undefined;
    current = undefined;
  };
  const open = (): Promise<IDBPDatabase<Shelves>> =>
    openDB<Shelves>(DATABASE, DATABASE_VERSION, {
      upgrade: (database) => {
        database.createObjectStore('projects', { keyPath: 'id' });
        database.createObjectStore('versions', { keyPath: ['id', 'revision'] });
      },
      blocked: () => onBlocked?.(),
      blocking: (_current, _wanted, event) => {
        const database = event.target as IDBDatabase;
        void (onWanted?.() ?? Promise.resolve()).finally(() => {
          database.close();
          ended();
        });
      },
      terminated: ended,
    });
  const keep = (database: IDBPDatabase<Shelves>): IDBPDatabase<Shelves> => {
    current = database;
    return database;
  };
  const connect = (): Promise<IDBPDatabase<Shelves>> => {
    connection ??= open().then(keep, (cause: unknown) => {
      connection = undefined;
      throw cause;
    });
    return connection;
  };
  return Object.assign(connect, { current: () => current });
}

const allOf = (id: string): IDBKeyRange => IDBKeyRange.bound([id, 0], [id, Number.POSITIVE_INFINITY]);

/** Compare, set aside and set, in one transaction. */
async function write(
  database: IDBPDatabase<Shelves>,
  record: Omit<KeptRecord, 'revision'>,
  expected: number,
  durability: Durability,
  now: number,
): Promise<Writing> {
  const transaction = database.transaction(['projects', 'versions'], 'readwrite', { durability });
  const verdict = settled(transaction, [replace(transaction, record, expected, now)]);
  const [outcome] = (await verdict) as [Writing];
  await transaction.done;
  return outcome;
}

async function replace(
  transaction: Both,
  record: Omit<KeptRecord, 'revision'>,
  expected: number,
  now: number,
): Promise<Writing> {
  const projects = transaction.objectStore('projects');
  const stored: unknown = await projects.get(record.id);
  const verdict = verdictOn(stored, record satisfies Draft, expected);
  if (!verdict.ok) return verdict;
  await transaction.objectStore('versions').delete([record.id, verdict.revision]); // a last word, now written itself
  if (isRecord(stored)) await setAside(transaction, stored, now);
  await projects.put({ ...record, revision: verdict.revision });
  return verdict;
}

/**
 * The last word of a page, among the versions under the revision it would have become. Committed without an answer: of
 * a page that is being closed, a browser finishes only what is already asked for.
 */
function layBeside(database: IDBPDatabase<Shelves> | undefined, last: KeptRecord): void {
  try {
    const transaction = database?.transaction('versions', 'readwrite');
    if (transaction === undefined) return;
    const put = transaction.store.put(last);
    transaction.commit();
    Promise.all([put, transaction.done]).catch(() => undefined);
  } catch {
    // The connection is closing; the usual write says so if the page lives on.
  }
}

/** What is stored, after a last word that follows on it has taken its place. */
async function takeUp(database: IDBPDatabase<Shelves>, id: string, now: number): Promise<unknown> {
  const transaction = database.transaction(['projects', 'versions'], 'readwrite');
  const [found] = await settled(transaction, [replaceByLast(transaction, id, now)]);
  await transaction.done;
  return found;
}

async function replaceByLast(transaction: Both, id: string, now: number): Promise<unknown> {
  const [projects, versions] = [transaction.objectStore('projects'), transaction.objectStore('versions')];
  const stored: unknown = await projects.get(id);
  if (!isRecord(stored)) return stored;
  const last: unknown = await versions.get([id, stored.revision + 1]);
  if (!isRecord(last) || hashOf(last.text) !== last.hash || !verdictOn(stored, last, stored.revision).ok) return stored;
  await versions.delete([id, last.revision]);
  await setAside(transaction, stored, now);
  await projects.put(last);
  return last;
}

async function setAside(transaction: Both, stored: KeptRecord, now: number): Promise<void> {
  const versions = transaction.objectStore('versions');
  const latest = await versions.openCursor(allOf(stored.id), 'prev');
  if (!isSetAside(stored, latest?.value, now)) return;
  await versions.put(stored);
  const keys = await versions.getAllKeys(allOf(stored.id));
  for (const key of keys.slice(0, Math.max(0, keys.length - MOST_VERSIONS))) await versions.delete(key);
}

/** Waits for the steps of a transaction; if one fails, the whole is undone and the cause of that step is told. */
async function settled<Step>(
  transaction: { abort(): void; readonly done: Promise<void> },
  steps: readonly Promise<Step>[],
): Promise<readonly Step[]> {
  try {
    return await Promise.all(steps);
  } catch (cause) {
    transaction.done.catch(() => undefined); // its rejection repeats `cause`
    try {
      transaction.abort();
    } catch {
      // Already undone by the browser.
    }
    throw cause;
  }
}

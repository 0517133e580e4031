/** Opens the place where projects are kept; a browser that refuses it gets memory, and the user is told why. */
import { causeOf } from '../persist/autosave.ts';
import { type DatabaseOptions, openDatabase } from '../persist/indexeddb.ts';
import { createMemory } from '../persist/memory.ts';
import type { Port } from '../persist/port.ts';

const PATIENCE = 2_000; // ms a browser has to open its database

/** Never rejects. Causes of memory: no-database, blocked (an older version holds it), newer (a newer one has changed it). */
export async function openStorage(options: DatabaseOptions): Promise<Port> {
  let blocked = false;
  let late = false;
  const onBlocked = (): void => {
    blocked = true;
    options.onBlocked?.();
  };
  const opening = Promise.resolve().then(() => openDatabase({ ...options, onBlocked }));
  const patience = new Promise<undefined>((resolve) => {
    setTimeout(resolve, PATIENCE, undefined);
  });
  opening.then((port) => late && port.close()).catch(() => undefined); // told below
  try {
    const port = await Promise.race([opening, patience]);
    if (port !== undefined) return port;
    late = true;
    return createMemory(blocked ? 'blocked' : 'no-database');
  } catch (fault) {
    return createMemory(causeOf(fault) === 'newer' ? 'newer' : 'no-database');
  }
}

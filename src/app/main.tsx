/** Puts the program together: the core under the workbench, the workbench on the desk, the screen on the page. */
import { lazy } from 'react';
import { createRoot } from 'react-dom/client';
import { solveSite } from '../core/run/site.ts';
import { solveTraverse } from '../core/run/traverse.ts';
import { solveMeter } from '../core/run.ts';
import { flushWhenHidden } from '../persist/autosave.ts';
import { createWorkbench } from '../state/create.ts';
import { Root } from '../views/screen/Root.tsx';
import type { SheetsView } from '../views/screen/SheetPlace.tsx';
import { createClient } from '../worker/client.ts';
import { spawn } from '../worker/spawn.ts';
import { dayOf } from './clock.ts';
import { createDesk, type Desk } from './desk.ts';
import { createLogOrders } from './logs.ts';
import { registerOffline } from './offline.ts';
import { createOrders } from './orders.ts';
import { start } from './shelf.ts';
import { openStorage } from './storage.ts';
import { newId, tab } from './tab.ts';

const Paper = lazy(async () => ({ default: (await import('../views/sheet/Sheets.tsx')).Sheets }));
/** The sheets carry the day they are printed; only the app knows the clock. */
const Sheets: SheetsView = (props) => <Paper {...props} printedOn={dayOf(new Date())} />;

const store = createWorkbench({ solveMeter, solveTraverse, solveSite });
let desk: Desk | undefined;
let newVersion: (() => void) | undefined;

const port = await openStorage({
  onBlocked: () => store.getState().setNotice({ code: 'close-other-tabs', detail: {}, kind: 'problem' }),
  onWanted: async () => {
    await desk?.autosave.flush('strict');
    desk?.autosave.stop();
    store.getState().setKeeping({ state: 'failed', cause: 'newer' });
  },
});
desk = createDesk({ store, port, locks: navigator.locks, tab, newId });
flushWhenHidden(document, desk.autosave);
await start(desk);

const root = document.getElementById('root');
if (root === null) throw new Error('expected an element #root in the page, got none');
const owner = newId();
/** Other pages leave what this one converted alone as long as it lives. */
void (navigator.locks as LockManager | undefined)?.request(owner, () => new Promise(() => undefined));
const logs = createLogOrders({ store, client: createClient(spawn), owner });
const commands = createOrders({ desk, logs, newVersion: () => newVersion });
createRoot(root).render(<Root store={store} commands={commands} sheets={Sheets} />);

registerOffline(
  (apply) => {
    newVersion = apply;
    store.getState().setUpdate(true);
  },
  () => undefined, // working offline is what the page promises anyway
);

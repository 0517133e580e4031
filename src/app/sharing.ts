/** One project in two tabs: what each has is kept, never mixed and never lost. */
import { textOf } from '../state/text.ts';
import { type Desk, sheetOf, show, showAsOwn } from './desk.ts';

/**
 * Takes the project at hand over from the tab that holds it. Unchanged there, it goes on as it stands here; unchanged
 * here, as it was kept there; changed in both, this tab's becomes a project of its own.
 */
export async function takeOver(desk: Desk): Promise<void> {
  if (desk.hold !== undefined && desk.autosave.at() !== undefined) return;
  const { store, port } = desk.options;
  const hold = await desk.locks.takeOver(desk.id);
  const reading = await port.read(desk.id).catch((fault: unknown) => {
    hold.release();
    throw fault;
  });
  const revision = reading.state === 'sound' ? reading.record.revision : 0;
  const changedHere = store.getState().project !== desk.base.project;
  if (reading.state === 'absent' || revision === desk.base.revision) {
    desk.hold = hold;
    desk.autosave.begin(desk.id, revision);
    desk.autosave.changed();
    await desk.autosave.flush('strict');
    return;
  }
  if (!changedHere) {
    const sheet = await sheetOf(desk, desk.id);
    return sheet === undefined ? hold.release() : show(desk, sheet, hold);
  }
  hold.release();
  await workOnCopy(desk);
  store.getState().setNotice({ code: 'both-changed', detail: {}, kind: 'info' });
}

/** What this tab shows becomes a project of its own. */
export async function workOnCopy(desk: Desk): Promise<void> {
  const state = desk.options.store.getState();
  await showAsOwn(desk, state.project, textOf(state));
}

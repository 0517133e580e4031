/**
 * Rows on their way through the conversion, column by column, in SI. A batch keeps what it is given until it is
 * settled: rows at its end wait for those that follow, because of two rows with one stamp the last good one counts.
 */
export interface Batch {
  size: number;
  row: Float64Array;
  time: Float64Array;
  differential: Float64Array;
  pressure: Float64Array;
  temperature: Float64Array;
  density: Float64Array;
  flow: Float64Array;
  account: Uint8Array;
}

const COLUMNS = ['row', 'time', 'differential', 'pressure', 'temperature', 'density', 'flow'] as const;

const columns = (room: number): Omit<Batch, 'size'> => ({
  row: new Float64Array(room),
  time: new Float64Array(room),
  differential: new Float64Array(room),
  pressure: new Float64Array(room),
  temperature: new Float64Array(room),
  density: new Float64Array(room),
  flow: new Float64Array(room),
  account: new Uint8Array(room),
});

export const openBatch = (room: number): Batch => ({ size: 0, ...columns(room) });

/** Makes room for so many rows more; what the batch holds stays. */
export function makeRoom(batch: Batch, rows: number): void {
  const needed = batch.size + rows;
  if (needed <= batch.account.length) return;
  const wider = columns(Math.max(needed, 2 * batch.account.length));
  for (const name of COLUMNS) {
    wider[name].set(batch[name].subarray(0, batch.size));
    batch[name] = wider[name];
  }
  wider.account.set(batch.account.subarray(0, batch.size));
  batch.account = wider.account;
}

/** Drops the first rows; those behind them move to the front. */
export function drop(batch: Batch, settled: number): void {
  if (settled === 0) return;
  for (const name of COLUMNS) batch[name].copyWithin(0, settled, batch.size);
  batch.account.copyWithin(0, settled, batch.size);
  batch.size -= settled;
}

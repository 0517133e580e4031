/**
 * The converted log: one row for every row of the log, with what became of it. No text of the log comes this way, so
 * that no cell can be taken for a formula.
 */
import { accounts, FIRST_REFUSED, FIRST_TROUBLE } from './account.ts';
import type { Batch } from './batch.ts';
import {
  type Bytes,
  endRow,
  flush,
  openBytes,
  type Sink,
  writeByte,
  writeCount,
  writeExact,
  writeSignificant,
  writeWord,
} from './bytes.ts';
import { type Calendar, openCalendar, writeStamp } from './stamp.ts';

/** Significant digits of every figure, or as many as it needs to be read back as the same double. */
export type Digits = number | 'all';

export interface Out {
  readonly bytes: Bytes;
  readonly calendar: Calendar;
  readonly digits: Digits;
}

const HEADER = 'row,time,differential_Pa,density_kg_m3,massFlow_kg_s,account';
const COMMA = 44;
/** The last cell of a row by account, with the comma before it. */
const lastCells = accounts.map(({ code }) => Uint8Array.from(`,${code}`, (letter) => letter.charCodeAt(0)));

/** Opens the output and writes its header. */
export function openOut(sink: Sink, digits: Digits): Out {
  const bytes = openBytes(sink);
  writeWord(bytes, HEADER);
  endRow(bytes);
  return { bytes, calendar: openCalendar(), digits };
}

/** Writes the first rows of a batch. A row without flow has no density; one that is not converted has neither. */
export function writeRows({ bytes, calendar, digits }: Out, batch: Batch, settled: number): void {
  const { row, time, differential, density, flow, account } = batch;
  for (let at = 0; at < settled; at += 1) {
    const kind = account[at] as number;
    writeCount(bytes, row[at] as number);
    writeByte(bytes, COMMA);
    if (kind < FIRST_TROUBLE) writeStamp(bytes, calendar, time[at] as number);
    writeByte(bytes, COMMA);
    if (kind < FIRST_REFUSED) writeFigure(bytes, differential[at] as number, digits);
    writeByte(bytes, COMMA);
    if (kind < FIRST_REFUSED && flow[at] !== 0) writeFigure(bytes, density[at] as number, digits);
    writeByte(bytes, COMMA);
    if (kind < FIRST_REFUSED) writeFigure(bytes, flow[at] as number, digits);
    writeCell(bytes, lastCells[kind] as Uint8Array);
    endRow(bytes);
  }
}

function writeCell(out: Bytes, cell: Uint8Array): void {
  const { buffer, size } = out;
  for (let at = 0; at < cell.length; at += 1) buffer[size + at] = cell[at] as number;
  out.size = size + cell.length;
}

const writeFigure = (bytes: Bytes, value: number, digits: Digits): void =>
  digits === 'all' ? writeExact(bytes, value) : writeSignificant(bytes, value, digits);

export const closeOut = ({ bytes }: Out): void => flush(bytes);

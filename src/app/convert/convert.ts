/**
 * `convert`: a log from a file through a meter, its rows into another file. The output is written beside its place and
 * put there at the end, so that nothing half written ever has its name.
 */
import { readFile } from 'node:fs/promises';
import { type Order, openConversion } from '../../views/headless/convert.ts';
import type { Answer } from '../../views/headless/solve.ts';
import { type Draft, openDraft } from './draft.ts';
import { openSource, type Source } from './source.ts';

export interface ConvertOrder extends Omit<Order, 'project'> {
  readonly file: string;
  readonly log: string;
  readonly out: string;
}

/** How a conversion ended; 130 and 143 when it was interrupted: 128 and the number of the signal. */
export interface Ended extends Omit<Answer, 'exit'> {
  readonly exit: Answer['exit'] | 130 | 143;
}

const refuse = (error: string): Ended => ({ exit: 2, output: '', error });
const because = (cause: unknown): string => (cause instanceof Error ? cause.message : String(cause));

/** Converts; `interrupt` ends it early, and nothing is left behind then. */
export async function convert(order: ConvertOrder, interrupt: AbortSignal): Promise<Ended> {
  let project: string;
  try {
    project = await readFile(order.file, 'utf8');
  } catch (cause) {
    return refuse(`The file ${order.file} cannot be read: ${because(cause)}.`);
  }
  let source: Source;
  try {
    source = await openSource(order.log, interrupt);
  } catch (cause) {
    return interrupt.aborted ? interrupted(interrupt) : refuse(`The log ${order.log} ${unreadable(cause)}.`);
  }
  const draft = openDraft(order.out, order.log);
  if (typeof draft === 'string') {
    source.close();
    return refuse(draft);
  }
  try {
    return await through({ ...order, project }, source, draft, interrupt);
  } finally {
    draft.drop();
    source.close();
  }
}

const interrupted = ({ reason }: AbortSignal): Ended => ({
  exit: reason === 'SIGTERM' ? 143 : 130,
  output: '',
  error: 'The conversion was interrupted: nothing was written.',
});

/** What keeps a log from being read, told apart: a packed one that is cut or damaged, and what the system says. */
function unreadable(cause: unknown): string {
  const code = (cause as NodeJS.ErrnoException | undefined)?.code ?? '';
  if (code === 'Z_BUF_ERROR') return 'is packed and ends before its end';
  if (code.startsWith('Z_')) return `is packed and damaged (${because(cause)})`;
  return `cannot be read: ${because(cause)}`;
}

async function through(order: Order & ConvertOrder, source: Source, draft: Draft, interrupt: AbortSignal) {
  const running = openConversion(order, source.beginning, draft.write);
  if ('exit' in running) return running;
  const broken = (why: string): Ended =>
    refuse(`The log ${order.log} ${why}, after ${running.rows()} rows: nothing was written.`);
  try {
    running.push(source.beginning.first);
    for await (const piece of source.rest) {
      if (interrupt.aborted) return interrupted(interrupt);
      if (draft.fault() !== undefined) break;
      running.push(piece);
    }
  } catch (cause) {
    if (interrupt.aborted) return interrupted(interrupt);
    if ((cause as NodeJS.ErrnoException | undefined)?.code === undefined) throw cause; // a defect, not the file's
    return broken(unreadable(cause));
  }
  const answer = draft.fault() === undefined ? running.finish() : undefined;
  const change = await source.change();
  if (change !== undefined) return broken(change);
  if (interrupt.aborted) return interrupted(interrupt);
  const fault = draft.fault() ?? draft.place();
  if (fault !== undefined || answer === undefined) return refuse(`The output cannot be written: ${fault}.`);
  return answer;
}

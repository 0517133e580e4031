/**
 * The command line. `solve FILE` prints the results of a project file; `convert FILE --tag TAG --log IN --out OUT` turns a
 * log into flows and prints what it came to.
 * Exit: 0 every meter solved, or the log converted; 1 at least one meter refused, or this log; 2 the file is no project,
 * a file cannot be read or written, or the command is unknown; 70 the program itself failed (EX_SOFTWARE of
 * sysexits.h); 130 and 143 interrupted.
 */
import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { type Answer, solveText } from '../views/headless/solve.ts';
import { convert, type Ended } from './convert/convert.ts';
import { readConvert } from './convert/words.ts';

const refuse = (error: string): Answer => ({ exit: 2, output: '', error });

/** npm runs a script in the root of the project and says here where the user typed it. */
const here = (process.env.npm_lifecycle_event === 'headwright' && process.env.INIT_CWD) || process.cwd();

const solve = (file: string): Answer => {
  let text: string;
  try {
    text = readFileSync(resolve(here, file), 'utf8');
  } catch (cause) {
    return refuse(`The file ${file} cannot be read: ${cause instanceof Error ? cause.message : String(cause)}.`);
  }
  return solveText(text);
};

const USAGE =
  'Usage: npm run --silent headwright -- solve FILE, or ' +
  'convert FILE --tag TAG --log IN.csv --out OUT.csv [--exact] [--digits 1 to 17, or all]';

/** An interrupt is told to the conversion, which tidies up; a second one ends the program as usual. */
function interruptOf(): AbortSignal {
  const controller = new AbortController();
  for (const name of ['SIGINT', 'SIGTERM'] as const) process.once(name, () => controller.abort(name));
  return controller.signal;
}

function answer([command, file, ...rest]: readonly string[]): Ended | Promise<Ended> {
  if (command === 'solve' && file !== undefined && rest.length === 0) return solve(file);
  const order = command === 'convert' && file !== undefined ? readConvert(rest) : undefined;
  if (order === undefined || file === undefined) return refuse(USAGE);
  const at = { file: resolve(here, file), log: resolve(here, order.log), out: resolve(here, order.out) };
  return convert({ ...order, ...at }, interruptOf());
}

const line = (text: string): string => (text === '' || text.endsWith('\n') ? text : `${text}\n`);
process.stdout.on('error', (cause: NodeJS.ErrnoException) => {
  if (cause.code !== 'EPIPE') throw cause; // the reader has read enough, as `head` does
});
const { exit, output, error } = await answer(process.argv.slice(2));
process.stdout.write(line(output));
process.stderr.write(line(error));
process.exitCode = exit; // not process.exit(): a pipe may still be taking the output

/**
 * The command line. `solve FILE` prints the results of a project file.
 * Exit: 0 every meter solved, 1 at least one refused, 2 the file is no project (or the command is unknown), 70 the
 * program itself failed (EX_SOFTWARE of sysexits.h).
 */
import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { type Answer, solveText } from '../views/headless/solve.ts';

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

const answer = ([command, file, ...rest]: readonly string[]): Answer =>
  command === 'solve' && file !== undefined && rest.length === 0
    ? solve(file)
    : refuse('Usage: npm run --silent headwright -- solve FILE');

const line = (text: string): string => (text === '' || text.endsWith('\n') ? text : `${text}\n`);
process.stdout.on('error', (cause: NodeJS.ErrnoException) => {
  if (cause.code !== 'EPIPE') throw cause; // the reader has read enough, as `head` does
});
const { exit, output, error } = answer(process.argv.slice(2));
process.stdout.write(line(output));
process.stderr.write(line(error));
process.exitCode = exit; // not process.exit(): a pipe may still be taking the output

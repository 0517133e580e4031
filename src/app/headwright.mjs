/** The command line: builds itself when a source is newer, then runs. Plain JavaScript, because Node 20 reads no types. */
import { bundle } from './bundle.mjs';

/** What no file can be the cause of: exit 70, so that it is not taken for a refused meter, which is 1. */
const fail = (/** @type {unknown} */ defect) => {
  const words = defect instanceof Error ? defect.stack : String(defect);
  process.stderr.write(`${words}\nHeadwright itself has failed; this is a fault of the program, not of the file.\n`);
  process.exitCode = 70;
};
process.on('uncaughtException', fail);

try {
  await import(await bundle('src/app/command.ts'));
} catch (defect) {
  fail(defect);
}

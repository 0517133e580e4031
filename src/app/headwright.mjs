/** The command line: builds itself when a source is newer, then runs. Plain JavaScript, because Node 20 reads no types. */
import { bundle } from './bundle.mjs';

await import(await bundle('src/app/command.ts'));

/** Converts so many rows, made on the way, and prints the largest memory that the process ever had. */
import { writeExample } from '../../src/core/log/example.ts';
import { openLog } from '../../src/core/log/log.ts';
import { exampleBytes, midnight, planOf } from '../core/log/example.ts';

const wanted = Number(process.argv.at(-1));
const LOST = 1263 / 86_400; // rows that a day of the example has less than seconds, about
const log = openLog(planOf(exampleBytes({ seconds: 1000 })), () => undefined);
let left = wanted;
const usual = { from: midnight, seed: 1, pressure: 39, temperature: 400 };
let header = 1;
writeExample({ ...usual, seconds: Math.ceil(wanted * (1 + 2 * LOST)) + 2000 }, (bytes) => {
  let end = 0;
  while (left + header > 0 && end < bytes.length) {
    if (bytes[end] === 10) {
      if (header > 0) header -= 1;
      else left -= 1;
    }
    end += 1;
  }
  if (end > 0) log.push(bytes.subarray(0, end));
});
const { rows } = log.finish();
process.stdout.write(`${rows} rows, ${process.resourceUsage().maxRSS} kB\n`);

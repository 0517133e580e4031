/** Puts every vector to the core and says how far it is off. The gate and the accuracy table share this function. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { subjects as air } from './subjects/air.ts';
import { subjects as averagingPitot } from './subjects/averaging-pitot.ts';
import { subjects as element } from './subjects/element.ts';
import { subjects as gas } from './subjects/gas.ts';
import { subjects as gasViscosity } from './subjects/gas-viscosity.ts';
import { subjects as liquid } from './subjects/liquid.ts';
import { subjects as log } from './subjects/log.ts';
import { subjects as otherGas } from './subjects/other-gas.ts';
import { subjects as reading } from './subjects/reading.ts';
import { subjects as solve } from './subjects/solve.ts';
import { subjects as traverse } from './subjects/traverse.ts';
import { subjects as units } from './subjects/units.ts';
import { subjects as water } from './subjects/water.ts';

type Given = Record<string, number | string>;
interface Tolerance {
  readonly rel?: number;
  readonly abs?: number;
  /** Half a unit of this significant digit of the expected figure. */
  readonly digits?: number;
  readonly why: string;
}
export interface VectorFile {
  readonly source: string;
  readonly origin: 'published' | 'independent' | 'unseen' | 'copied';
  readonly seen?: string;
  readonly subject: string;
  readonly about: Readonly<Record<string, unknown>>;
  readonly tolerance: Readonly<Record<string, Tolerance>>;
  readonly cases: readonly {
    readonly name: string;
    readonly given: Given;
    readonly expect: Readonly<Record<string, number>>;
  }[];
}

export interface Compared {
  readonly path: string;
  readonly file: VectorFile;
  readonly name: string;
  readonly field: string;
  readonly expected: number;
  readonly got: number;
  readonly relative: number;
  /** Error as a share of the tolerance: up to 1 is right. */
  readonly share: number;
}

const ROOT = join(import.meta.dirname, '.');
/** Folders beside the sources: what runs the vectors, what made the independent ones. */
const NOT_SOURCES = ['generate', 'subjects'];
/** Rounding of the two numbers that are compared. */
const ROUNDING = 4 * Number.EPSILON;

const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = {
  ...air,
  ...averagingPitot,
  ...element,
  ...gas,
  ...gasViscosity,
  ...liquid,
  ...log,
  ...otherGas,
  ...reading,
  ...solve,
  ...traverse,
  ...units,
  ...water,
};

/** Every vectors file, by its path below tests/vectors. */
export function vectorFiles(): readonly { readonly path: string; readonly file: VectorFile }[] {
  const sources = readdirSync(ROOT, { withFileTypes: true }).filter(
    (entry) => entry.isDirectory() && !NOT_SOURCES.includes(entry.name),
  );
  return sources.flatMap(({ name }) =>
    readdirSync(join(ROOT, name))
      .filter((file) => file.endsWith('.json'))
      .sort()
      .map((file) => ({
        path: `${name}/${file}`,
        file: JSON.parse(readFileSync(join(ROOT, name, file), 'utf8')) as VectorFile,
      })),
  );
}

/** Half a unit of the last of so many significant digits. */
const halfUnit = (size: number, digits?: number): number =>
  digits === undefined || size === 0 ? 0 : 0.5 * 10 ** (Math.floor(Math.log10(size)) + 1 - digits);

/** Every expected figure of every case of one file, compared. */
export function compareAll({ path, file }: { readonly path: string; readonly file: VectorFile }): Compared[] {
  const subject = subjects[file.subject];
  if (subject === undefined) throw new Error(`${path}: expected a known subject, got ${file.subject}`);
  return file.cases.flatMap(({ name, given, expect }) => {
    const answer = subject(given);
    return Object.entries(expect).map(([field, expected]) => {
      const got = answer[field];
      const tolerance = file.tolerance[field];
      if (got === undefined || tolerance === undefined)
        throw new Error(`${path}, ${name}: expected an answer and a tolerance for ${field}`);
      const size = Math.abs(expected);
      const allowed =
        (tolerance.abs ?? 0) + ((tolerance.rel ?? 0) + ROUNDING) * size + halfUnit(size, tolerance.digits);
      const error = Math.abs(got - expected);
      return {
        path,
        file,
        name,
        field,
        expected,
        got,
        relative: error / Math.abs(expected || 1),
        share: error === 0 ? 0 : error / allowed,
      };
    });
  });
}

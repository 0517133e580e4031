/** A row of a log: explicit, against one root a row and against a search for C; the surface alone; what both are off by. */
import { seamsOf } from '../../src/core/fluid/state.ts';
import { BLOCK, openBlock, states } from '../../src/core/log/block.ts';
import { type Kernel, kernelOf, type RowFlows, type Rows } from '../../src/core/log/kernel.ts';
import { type Cells, surfaceOf } from '../../src/core/log/surface.ts';
import { flowAt, meterAt } from '../../src/core/run/standing.ts';
import { flowFrom } from '../../src/core/solve/flow.ts';
import { logMeter } from '../core/log/meters.ts';
import { generator } from '../laws/random.ts';
import { compare, type Work } from './pairs.ts';
import { type Line, ratioLine } from './report.ts';
import { rootLoop } from './yardsticks.ts';

const ROWS = 60_000;
const REFEREED = 2000;
const ELEMENT = 'orifice flange';

type Logs = ReturnType<typeof logMeter>;

/** Rows over the box, their differentials over two decades; like a log, pressure and temperature wander. */
function rowsOf({ box, most }: Logs): Required<Rows> {
  const random = generator(53);
  const wander = ([lower, upper]: readonly [number, number]) => {
    let share = 0.5;
    return Float64Array.from({ length: ROWS }, () => {
      share = Math.min(1, Math.max(0, share + 0.02 * (random() - 0.5)));
      return lower + share * (upper - lower);
    });
  };
  return {
    differential: Float64Array.from({ length: ROWS }, () => most * 0.01 ** random()),
    pressure: wander(box.pressure),
    temperature: wander(box.temperature),
  };
}

const flowsOf = () => ({ massFlow: new Float64Array(ROWS), path: new Uint8Array(ROWS) }) satisfies RowFlows;

/** So many rows, in runs of a column's length. */
const inRuns =
  (run: (rows: number) => number): Work =>
  (count) => {
    let sum = 0;
    for (let left = count; left > 0; left -= ROWS) sum += run(Math.min(left, ROWS));
    return sum;
  };

const byKernel = ({ convert }: Kernel, rows: Rows): Work => {
  const flows = flowsOf();
  return inRuns((count) => {
    convert(rows, flows, 0, count);
    return flows.massFlow[count >> 1] as number;
  });
};

const roots = (rows: Rows): Work => {
  const into = new Float64Array(ROWS);
  return inRuns((count) => {
    rootLoop(rows.differential, 0.01, into, count);
    return into[count >> 1] as number;
  });
};

/** A meter whose state stands, searched for row by row. */
const searched = ({ stands }: Logs, rows: Rows): Work => {
  const { meter } = stands.solution;
  const into = new Float64Array(ROWS);
  return inRuns((count) => {
    for (let row = 0; row < count; row += 1) {
      const found = flowFrom(rows.differential[row] as never, meter);
      into[row] = found.ok ? found.value.massFlow : 0;
    }
    return into[count >> 1] as number;
  });
};

const known = (kernel: Kernel): NonNullable<Kernel['bounds']> => {
  if (kernel.bounds !== undefined) return kernel.bounds;
  throw new Error(`expected a surface, got ${kernel.why}`);
};

/** The state stands: only the differential is logged. */
function still(fluid: string): Line[] {
  const logs = logMeter(fluid, ELEMENT);
  const { pressure: p, temperature: T } = logs.stands.solution.meter.state;
  const kernel = kernelOf(logs.stands, { pressure: [p, p], temperature: [T, T] });
  const rows = { differential: rowsOf(logs).differential };
  const row = byKernel(kernel, rows);
  return [
    ratioLine(`${fluid}, only Δp logged: row / one root`, compare(row, roots(rows)), '<= 12'),
    ratioLine(`${fluid}, only Δp logged: search for C / row`, compare(searched(logs, rows), row), '>= 6'),
    { name: `${fluid}: bound of C, relative`, value: known(kernel).coefficient, target: '<= 1e-12' },
    { name: `${fluid}: largest distance from the search`, value: distance(logs, kernel, rows), target: '<= 1e-12' },
  ];
}

/** Pressure and temperature are logged too. */
function moving(fluid: string): Line[] {
  const logs = logMeter(fluid, ELEMENT);
  const started = performance.now();
  const kernel = kernelOf(logs.stands, logs.box);
  const built = (performance.now() - started) / 1000;
  const rows = rowsOf(logs);
  return [
    ratioLine(`${fluid}, Δp, p and T logged: row / one root`, compare(byKernel(kernel, rows), roots(rows))),
    ratioLine(
      `${fluid}: density, viscosity, exponent by the surface / one root`,
      compare(densities(logs, rows), roots(rows)),
      '<= 12',
    ),
    { name: `${fluid}: bound of the density, relative`, value: known(kernel).density, target: '<= 1e-7' },
    { name: `${fluid}: bound of the flow, relative`, value: known(kernel).massFlow },
    { name: `${fluid}: largest distance from the whole calculation`, value: distance(logs, kernel, rows) },
    { name: `${fluid}: surface and approximants built in`, value: built, unit: 's' },
  ];
}

/** The surface alone: density, and with it the other figures that a row needs. */
function densities({ stands, box }: Logs, { pressure, temperature }: Required<Rows>): Work {
  const surface = surfaceOf(
    (p, T) => {
      const meter = meterAt(stands, { pressure: p as never, temperature: T as never });
      return meter.ok ? { ok: true, value: meter.value.state } : meter;
    },
    box,
    seamsOf(stands.written.fluid ?? {}, stands.site.atmosphere),
  ) as Cells;
  const block = openBlock();
  return inRuns((rows) => {
    for (let from = 0; from < rows; from += BLOCK) {
      const to = Math.min(from + BLOCK, rows);
      block.pressure.set(pressure.subarray(from, to));
      block.temperature.set(temperature.subarray(from, to));
      states(surface, block, to - from);
    }
    return block.density[0] as number;
  });
}

function distance({ stands }: Logs, { convert }: Kernel, rows: Rows): number {
  const flows = flowsOf();
  convert(rows, flows, 0, REFEREED);
  let most = 0;
  for (let row = 0; row < REFEREED; row += 1) {
    const moment =
      rows.pressure === undefined
        ? {}
        : { pressure: rows.pressure[row] as never, temperature: rows.temperature?.[row] as never };
    const found = flowAt(stands, moment, rows.differential[row] as never);
    if (!found.ok) throw new Error(`row ${row}: ${JSON.stringify(found.problems)}`);
    most = Math.max(most, Math.abs((flows.massFlow[row] as number) / found.value.operation.massFlow - 1));
  }
  return most;
}

export function rows(): Line[] {
  return [
    ...['stated liquid', 'stated gas'].flatMap(still),
    ...['liquid water', 'steam', 'eleven components'].flatMap(moving),
  ];
}

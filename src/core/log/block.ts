/**
 * A block of rows through the explicit way, one pass after another: states, expansibility, flow without C, C. Each pass
 * is one loop over columns with everything else at hand, so that a row costs some tens of nanoseconds; nothing is allocated.
 * Rows of a block lie in the box of the surface.
 */
import type { Primary } from '../element/contract.ts';
import { type Approximant, coefficientAt } from './approximant.ts';
import { type Expansion, expansibilities } from './expansion.ts';
import { bicubic, TERMS as CELL_TERMS, type Patch } from './patch.ts';
import { FLOW, figureAt, type Growth, RATIO, REYNOLDS, spanAt } from './spans.ts';
import { type Cells, patchNumber } from './surface.ts';

/** Rows in a block, at most. */
export const BLOCK = 512;

/** What explicit rows are made of. */
export interface Explicit {
  readonly primary: Primary;
  readonly surface: Cells;
  readonly growth: Growth;
  readonly approximant: Approximant;
  /** Absent where the ratio moves or no short polynomial holds: then the element's own formula is taken. */
  readonly expansion?: Expansion;
  /** Of the meter as it stands, for rows without their own. */
  readonly pressure: number;
  readonly temperature: number;
  /** Whether there is one state in the box: then the block holds it from the beginning. */
  readonly still: boolean;
  readonly block: Block;
}

/** The columns of a block. SI. */
export interface Block {
  readonly differential: Float64Array;
  readonly pressure: Float64Array;
  readonly temperature: Float64Array;
  readonly density: Float64Array;
  readonly viscosity: Float64Array;
  readonly exponent: Float64Array;
  readonly epsilon: Float64Array;
  /** q_m/C. */
  readonly ideal: Float64Array;
  /** Re_D/C: A1 of ISO 5167-1:2003, Annex A. */
  readonly invariant: Float64Array;
  /** 0 where C has to be searched for. */
  readonly coefficient: Float64Array;
}

const column = (): Float64Array => new Float64Array(BLOCK);

/** An empty block; ε is that of a liquid until it is filled in. */
export const openBlock = (): Block => ({
  ...{ differential: column(), pressure: column(), temperature: column() },
  ...{ density: column(), viscosity: column(), exponent: column(), epsilon: column().fill(1) },
  ...{ ideal: column(), invariant: column(), coefficient: column() },
});

/** Density, viscosity and exponent of the first rows, patch by patch. */
export function states(surface: Cells, block: Block, count: number): void {
  const { patches } = surface;
  if (patches.length === 1) {
    statesOn(patches[0] as Patch, surface, block, 0, count);
    return;
  }
  let from = 0;
  while (from < count) {
    const patch = patchNumber(surface, block.pressure[from] as number, block.temperature[from] as number);
    let to = from + 1;
    while (to < count && patchNumber(surface, block.pressure[to] as number, block.temperature[to] as number) === patch)
      to += 1;
    statesOn(patches[patch] as Patch, surface, block, from, to);
    from = to;
  }
}

function statesOn(patch: Patch, { expands, tied }: Cells, block: Block, from: number, to: number): void {
  const { p0, perP, T0, perT, cells, figures } = patch;
  const { pressure, temperature, density, viscosity, exponent } = block;
  const [lastP, lastT, stride] = [patch.cellsP - 1, patch.cellsT - 1, figures * CELL_TERMS];
  for (let row = from; row < to; row += 1) {
    const p = pressure[row] as number;
    const x = (p - p0) * perP;
    const y = ((temperature[row] as number) - T0) * perT;
    const atP = Math.max(0, Math.min(x | 0, lastP));
    const atT = Math.max(0, Math.min(y | 0, lastT));
    const at = (atP * (lastT + 1) + atT) * stride;
    const first = bicubic(cells, at, x - atP, y - atT);
    viscosity[row] = bicubic(cells, at + CELL_TERMS, x - atP, y - atT);
    if (tied) temperature[row] = bicubic(cells, at + stride - CELL_TERMS, x - atP, y - atT);
    if (expands) {
      density[row] = tied ? first * p : (first * p) / (temperature[row] as number);
      exponent[row] = bicubic(cells, at + 2 * CELL_TERMS, x - atP, y - atT);
    } else density[row] = first;
  }
}

/** ε of a fluid that expands. */
export function epsilons({ expansion, growth, primary, block }: Explicit, count: number): void {
  const { differential, pressure, temperature, exponent, epsilon } = block;
  if (expansion !== undefined) {
    expansibilities(expansion, differential, pressure, exponent, epsilon, count);
    return;
  }
  for (let row = 0; row < count; row += 1) {
    const T = temperature[row] as number;
    const span = spanAt(growth, T);
    const t = (T - (growth.middle[span] as number)) * (growth.perHalf[span] as number);
    const epsilonAt = primary.expansibility(figureAt(growth, span, RATIO, t), exponent[row] as number);
    epsilon[row] = epsilonAt((differential[row] as number) / (pressure[row] as number));
  }
}

/** q_m/C and Re_D/C, by the metal at the temperature of the row. */
export function ideals({ growth, block }: Explicit, count: number): void {
  const { differential, temperature, density, viscosity, epsilon, ideal, invariant } = block;
  const { middle, perHalf } = growth;
  const still = growth.upper.length === 1 && perHalf[0] === 0;
  let flow = figureAt(growth, 0, FLOW, 0); // at 1 Pa and 1 kg/m3
  let reynolds = figureAt(growth, 0, REYNOLDS, 0); // 4/(π D)
  for (let row = 0; row < count; row += 1) {
    if (!still) {
      const T = temperature[row] as number;
      const span = spanAt(growth, T);
      const t = (T - (middle[span] as number)) * (perHalf[span] as number);
      flow = figureAt(growth, span, FLOW, t);
      reynolds = figureAt(growth, span, REYNOLDS, t);
    }
    const q = (epsilon[row] as number) * flow * Math.sqrt((differential[row] as number) * (density[row] as number));
    ideal[row] = q;
    invariant[row] = (q * reynolds) / (viscosity[row] as number);
  }
}

/** C at Re_D/C and the temperature of the row; 0 where the approximant does not reach. Whether there is such a row. */
export function coefficients({ approximant, growth, block }: Explicit, count: number): boolean {
  const { temperature, invariant, coefficient } = block;
  const still = growth.upper.length === 1 && growth.perHalf[0] === 0;
  let open = false;
  for (let row = 0; row < count; row += 1) {
    const T = temperature[row] as number;
    const span = still ? 0 : spanAt(growth, T);
    const t = still ? 0 : (T - (growth.middle[span] as number)) * (growth.perHalf[span] as number);
    const C = coefficientAt(approximant, span, invariant[row] as number, t, still);
    coefficient[row] = C;
    open ||= C === 0;
  }
  return open;
}

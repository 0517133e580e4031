/**
 * Density, viscosity and isentropic exponent of a fluid over a box of pressure and temperature, from true states, for
 * rows by the million. The error is measured when it is built, at states drawn at random, and stated; where the box is
 * not one smooth phase there is no surface and the reason is told: then each row is solved by itself.
 *
 * Of a gas the surface holds ρ T/p, which hardly moves, along a saturation line ρ/p; of a liquid ρ.
 */
import type { FluidState } from '../fluid/contract.ts';
import type { Seams } from '../fluid/model.ts';
import { seeded } from '../numeric/seeded.ts';
import type { Outcome } from '../quantity/outcome.ts';
import { lookUp, type Patch, patchOver, type Sample, type Side } from './patch.ts';

/** What the rows of a log span; both ends alike where a quantity is constant. Pa absolute, K. */
export interface Box {
  readonly pressure: Side;
  readonly temperature: Side;
}

/** Why there is no surface: the fluid is refused somewhere in the box, changes its phase, or is nowhere smooth enough. */
export type NoSurface =
  | 'fluid-refused'
  | 'two-phases'
  | 'partly-outside'
  | 'temperature-tied'
  | 'not-smooth'
  | 'too-many-seams';

/** Largest relative errors. */
export interface SurfaceBounds {
  readonly density: number;
  readonly viscosity: number;
  readonly isentropicExponent: number; // 0 of a liquid
}

export interface Cells {
  readonly kind: 'cells';
  readonly box: Box;
  readonly expands: boolean;
  /** Whether the temperature follows from the pressure; then it is the last figure of a patch, and no side of the box. */
  readonly tied: boolean;
  /** Least and largest temperature of a state, K. */
  readonly temperatures: Side;
  /** Inner borders of the patches, rising; a figure on a border belongs below it. */
  readonly bordersP: Float64Array;
  readonly bordersT: Float64Array;
  readonly patches: readonly Patch[]; // p before T
  readonly bounds: SurfaceBounds;
  /** Least and largest isentropic exponent that was met; 1 and 1 of a liquid. */
  readonly exponents: Side;
  /** Cautions that some state of the box carries. */
  readonly cautions: readonly string[];
  /** Whether every state of the box is outside the range of its formulation; if only some were there is no surface. */
  readonly outside: boolean;
  /** True states that were solved for it. */
  readonly states: number;
}

export type Surface = Cells | { readonly kind: 'exact'; readonly why: NoSurface };

/** The state at a pressure and a temperature; without one, at that which the fluid ties to the pressure. */
export type StateAt = (p: number, T?: number) => Outcome<FluidState>;

/** The error of density that a surface may have. */
const MOST_ERROR = 1e-7;
/** Of viscosity and isentropic exponent, which move the flow by a hundredth and by a tenth of their own. */
const MOST_OTHER_ERROR = 1e-6;
const MOST_PATCHES = 64;
/** States drawn at random in the whole box, and in each patch, at least. */
const DRAWN = 64;
const DRAWN_PER_PATCH = 24;
const SEED = 20768;
/** States along each edge of the box. */
const ALONG = 9;
/** An error seen at that many places may be larger between them. */
const UNSEEN = 4;
/** Where a side of a border owns it, the border is moved by this, so that rounding cannot cross it. */
const HAIR = 4e-12;

/** Two phases stand side by side, or the state is not the phase it is taken for. */
const twoPhases = ['fluid-two-phase', 'fluid-liquid', 'wet-steam', 'water-dew-point'];

/** Wet steam is what a surface along the saturation line is asked for. */
const asked = 'wet-steam';

/** The surface of a fluid over a box; `seams` are where its formulation changes or bends. */
export const surfaceOf = (stateAt: StateAt, box: Box, seams: Seams): Surface =>
  surfaceFrom(takenFrom(stateAt, false), box, seams);

/** The surface of a fluid whose temperature follows from its pressure, along the pressures of a log. */
export const tiedSurfaceOf = (stateAt: StateAt, pressure: Side): Surface =>
  surfaceFrom(takenFrom(stateAt, true), { pressure, temperature: [0, 0] }, { pressure: [], temperature: [] });

function surfaceFrom(taken: Taken, box: Box, seams: Seams): Surface {
  const inside = (values: readonly number[], [lower, upper]: Side): number[] =>
    [...new Set(values)].filter((at) => at > lower && at < upper).sort((one, other) => one - other);
  const [atP, atT] = [inside(seams.pressure, box.pressure), inside(seams.temperature, box.temperature)];
  if ((atP.length + 1) * (atT.length + 1) > MOST_PATCHES) return { kind: 'exact', why: 'too-many-seams' };
  const edge = edgesOf(box).map(([p, T]) => taken.sample(p, T));
  const refused = edge.find((figures) => typeof figures === 'string');
  if (refused !== undefined) return exact(refused);
  const patches = sidesOf(box.pressure, atP).flatMap((p) =>
    sidesOf(box.temperature, atT).map((T) => patchOver(p, T, taken.sample)),
  );
  const failed = patches.find((patch) => typeof patch === 'string');
  if (failed !== undefined) return exact(failed);
  const draft = {
    box,
    expands: taken.expands(),
    tied: taken.tied,
    patches: patches.filter((patch) => typeof patch !== 'string'),
  };
  const bordersP = owned(atP, 'pressure', draft, taken.sample);
  const bordersT = owned(atT, 'temperature', draft, taken.sample);
  if (bordersP === undefined || bordersT === undefined) return exact('not-smooth');
  const cells = { ...draft, bordersP, bordersT };
  const bounds = boundsOf(cells, taken.sample);
  if (typeof bounds === 'string') return exact(bounds);
  const good =
    bounds.density <= MOST_ERROR && Math.max(bounds.viscosity, bounds.isentropicExponent) <= MOST_OTHER_ERROR;
  return good ? { kind: 'cells', ...cells, bounds, ...taken.summary() } : exact('not-smooth');
}

const exact = (why: unknown): Surface => ({ kind: 'exact', why: why as NoSurface });

/** The exponents met are widened by this share, for what lies between the states. */
const WIDER = 0.05;

type Taken = ReturnType<typeof takenFrom>;

/** True states as samples, with a count and with what all of them must have in common. */
function takenFrom(stateAt: StateAt, tied: boolean) {
  let states = 0;
  let [phase, outside]: (boolean | undefined)[] = [];
  const exponents = openRange();
  const temperatures = openRange();
  const cautions = new Set<string>();
  const sample: Sample = (p, T) => {
    const found = tied ? stateAt(p) : stateAt(p, T);
    states += 1;
    if (!found.ok) return 'fluid-refused' satisfies NoSurface;
    const { density, viscosity, isentropicExponent: kappa = 1, expands, temperature } = found.value;
    if (!tied && temperature !== T) return 'temperature-tied' satisfies NoSurface;
    const said = found.value.cautions ?? [];
    const beyond = said.some(({ verdict }) => verdict === 'outside');
    phase ??= expands;
    outside ??= beyond;
    const twofold = said.some(({ id }) => twoPhases.includes(id) && !(tied && id === asked));
    if (expands !== phase || twofold) return 'two-phases' satisfies NoSurface;
    if (beyond !== outside) return 'partly-outside' satisfies NoSurface;
    for (const { id } of said) cautions.add(id);
    exponents.take(kappa);
    temperatures.take(temperature);
    const still = (density * (tied ? 1 : T)) / p;
    const figures = expands ? [still, viscosity, kappa] : [density, viscosity];
    return tied ? [...figures, temperature] : figures;
  };
  const summary = () => ({
    exponents: exponents.wider(),
    temperatures: tied ? temperatures.wider() : temperatures.met(),
    ...{ cautions: [...cautions], outside: outside === true, states },
  });
  return { sample, expands: () => phase === true, tied, summary };
}

/** Least and largest of the figures met, as they are and with room for what lies between. */
function openRange() {
  let [least, most] = [Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
  return {
    take: (value: number): void => {
      [least, most] = [Math.min(least, value), Math.max(most, value)];
    },
    met: (): Side => [least, most],
    wider: (): Side => [least - WIDER * (most - least), most + WIDER * (most - least)],
  };
}

/** The corners of the box and states along its edges: a phase border that cuts a corner off shows there first. */
function edgesOf({ pressure, temperature }: Box): (readonly [p: number, T: number])[] {
  const along = ([lower, upper]: Side): number[] =>
    lower === upper ? [lower] : Array.from({ length: ALONG }, (_, at) => between(lower, upper, at / (ALONG - 1)));
  return [
    ...along(pressure).flatMap((p) => temperature.map((T) => [p, T] as const)),
    ...along(temperature).flatMap((T) => pressure.map((p) => [p, T] as const)),
  ];
}

const between = (lower: number, upper: number, share: number): number =>
  share === 1 ? upper : lower + share * (upper - lower);

const sidesOf = ([lower, upper]: Side, borders: readonly number[]): Side[] => {
  const all = [lower, ...borders, upper];
  return all.slice(1).map((end, at) => [all[at] as number, end]);
};

type Draft = Pick<Cells, 'box' | 'expands' | 'tied' | 'patches'>;

/** The borders, each moved a hair to leave it to the side whose patch is right there; undefined where neither is. */
function owned(
  borders: readonly number[],
  side: 'pressure' | 'temperature',
  { box, patches }: Draft,
  sample: Sample,
): Float64Array | undefined {
  const other = side === 'pressure' ? box.temperature : box.pressure;
  const across = patches.length / (borders.length + 1); // patches along the other side, for one of this
  const moved = borders.map((border, at) => {
    const right = [0, 1].map((next) =>
      Array.from({ length: patches.length }, (_, index) => index)
        .filter(
          (index) => (side === 'pressure' ? Math.floor(index / across) : index % (borders.length + 1)) === at + next,
        )
        .every((index) => meets(patches[index] as Patch, border, side, other, sample)),
    );
    if (right[0]) return border * (1 + HAIR);
    return right[1] ? border * (1 - HAIR) : undefined;
  });
  return moved.includes(undefined) ? undefined : Float64Array.from(moved as number[]);
}

/** Whether a patch is right on one of its borders. */
function meets(patch: Patch, border: number, side: 'pressure' | 'temperature', other: Side, sample: Sample): boolean {
  const into = new Float64Array(patch.figures);
  const [from, cells, per] =
    side === 'pressure' ? [patch.T0, patch.cellsT, patch.perT] : [patch.p0, patch.cellsP, patch.perP];
  return [0.21, 0.5, 0.83].every((share) => {
    const along = per === 0 ? other[0] : from + (share * cells) / per;
    const [p, T] = side === 'pressure' ? [border, along] : [along, border];
    const figures = sample(p, T);
    lookUp(patch, p, T, into);
    return (
      typeof figures !== 'string' &&
      figures.every((known, at) => Math.abs((into[at] as number) / known - 1) < MOST_ERROR)
    );
  });
}

/** The largest errors at states drawn at random, with what the last coefficients leave out. */
function boundsOf(
  cells: Omit<Cells, 'kind' | 'bounds' | 'exponents' | 'temperatures' | 'cautions' | 'outside' | 'states'>,
  sample: Sample,
): SurfaceBounds | string {
  const random = seeded(SEED);
  const into = new Float64Array(4);
  const worst = [0, 0, 0, 0];
  const { box, patches } = cells;
  const count = Math.max(DRAWN, DRAWN_PER_PATCH * patches.length);
  for (let drawn = 0; drawn < count; drawn += 1) {
    const p = between(...box.pressure, random());
    const T = between(...box.temperature, random());
    const figures = sample(p, T);
    if (typeof figures === 'string') return figures;
    lookUp(patchAt(cells, p, T), p, T, into);
    figures.forEach((known, at) => {
      worst[at] = Math.max(worst[at] as number, Math.abs((into[at] as number) / known - 1));
    });
  }
  const bound = (at: number): number =>
    UNSEEN * (worst[at] as number) + Math.max(...patches.map(({ tails }) => tails[at] ?? 0)) + 4 * Number.EPSILON;
  return { density: bound(0), viscosity: bound(1), isentropicExponent: cells.expands ? bound(2) : 0 };
}

/** The patch that a state of the box lies in. */
export const patchAt = (of: Layout, p: number, T: number): Patch => of.patches[patchNumber(of, p, T)] as Patch;

type Layout = Pick<Cells, 'bordersP' | 'bordersT' | 'patches'>;

/** Its number, p before T. */
export function patchNumber({ bordersP, bordersT }: Layout, p: number, T: number): number {
  let atP = 0;
  while (atP < bordersP.length && p > (bordersP[atP] as number)) atP += 1;
  let atT = 0;
  while (atT < bordersT.length && T > (bordersT[atT] as number)) atT += 1;
  return atP * (bordersT.length + 1) + atT;
}

/** Seeded random meters over the whole valid range of every element, and a little beyond its edges where asked. */
import { averagingPitot } from '../../src/core/element/averaging-pitot.ts';
import type { Geometry, Primary } from '../../src/core/element/contract.ts';
import { elements } from '../../src/core/element/registry.ts';
import type { FluidState } from '../../src/core/fluid/contract.ts';
import type {
  AbsolutePressure,
  Density,
  DynamicViscosity,
  Length,
  PressureDifference,
  Temperature,
} from '../../src/core/quantity/kinds.ts';
import { type Meter, meterOf } from '../../src/core/solve/equation.ts';

/** mulberry32: 32 bits of state, enough for tests, the same on every machine. */
export function generator(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t = (t + Math.imul(t ^ (t >>> 7), t | 61)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** What the sheet of an averaging pitot says; a width of nothing where K counts the whole pipe. */
export interface Sheet {
  readonly coefficient: number;
  readonly expansion: number;
  readonly width: number; // m
}

export interface RandomMeter extends Meter {
  /** Of a bar across the pipe, which has no bore. */
  readonly sheet?: Sheet;
  readonly differential: PressureDifference;
}

/** Every element with every choice of its own field. */
export const everyPrimary: readonly Primary[] = elements.flatMap((element) => {
  const field = element.fields.find(({ type }) => type === 'choice');
  if (field?.type !== 'choice') return [element.primary({})];
  const sheet = element.bore === 'none' ? { coefficient: 0.65, width: 0.004 } : {};
  return field.choices.map((choice) => element.primary({ ...sheet, [field.name]: choice }));
});

/** The same element with figures of its own, where a sheet says them. */
function withSheet(primary: Primary, pipe: Length, random: () => number) {
  if (primary.insertion === undefined) return { primary };
  const clear = primary.name === 'averaging-pitot.clear';
  const figures = { coefficient: 0.4 + 0.6 * random(), expansion: 0.4 * random() };
  const width = (0.01 + 0.2 * random()) * pipe;
  const area = clear ? 'clear' : 'pipe';
  return {
    primary: averagingPitot.primary({ ...figures, width, area }),
    sheet: { ...figures, width: clear ? width : 0 },
  };
}

/** Pipe and section; a bar across the pipe has its own. */
function geometryOf(primary: Primary, pipe: Length, ratio: number): Geometry {
  const section = primary.insertion?.section(pipe);
  if (section === undefined) return { pipe, bore: (ratio * pipe) as Length, ratio };
  if (!section.ok) throw new Error(`expected a section of ${primary.name}, got ${JSON.stringify(section.problems)}`);
  return section.value;
}

const source = { clause: 'drawn at random', seen: 'read' } as const;
const MOST_REYNOLDS = 1e8;

/** A meter inside the limits of its standard, with x up to a quarter when it measures a gas. */
export function randomMeter(random: () => number): RandomMeter {
  const between = (a: number, b: number) => a + (b - a) * random();
  const logBetween = (a: number, b: number) => a * (b / a) ** random();
  const drawn = everyPrimary[Math.floor(random() * everyPrimary.length)] as Primary;
  const bounds = (at: Geometry, id: string) => drawn.limits(at, 1e6).find((limit) => limit.id === id) ?? {};
  const any: Geometry = { pipe: 0.1 as Length, bore: 0.05 as Length, ratio: 0.5 };
  const { min: leastPipe = 0.05, max: mostPipe = 1 } = bounds(any, 'pipe-bore') as { min?: number; max?: number };
  const { min: leastRatio = 0.1, max: mostRatio = 0.75 } = bounds(any, 'diameter-ratio') as {
    min?: number;
    max?: number;
  };
  const pipe = logBetween(leastPipe, mostPipe) as Length;
  const { primary, sheet } = withSheet(drawn, pipe, random);
  const geometry = geometryOf(primary, pipe, between(leastRatio, mostRatio));
  const { ratio } = geometry;
  const { min = 1e4, max = MOST_REYNOLDS } = bounds(geometry, 'reynolds-pipe') as { min?: number; max?: number };
  const reynolds = logBetween(min * 1.04, max / 1.1);
  const expands = random() < 0.6;
  const pressure = logBetween(1e5, 2e7);
  const expansion = expands ? logBetween(1e-5, 0.25) : logBetween(1e-4, 0.5);
  const density = expands ? logBetween(0.3, 200) : between(500, 1500);
  const differential = expansion * pressure;
  const exponent = between(1.05, 1.67);
  const epsilon = expands ? primary.expansibility(ratio, exponent)(expansion) : 1;
  const ideal =
    epsilon * (Math.PI / 4) * geometry.bore ** 2 * Math.sqrt((2 * differential * density) / (1 - ratio ** 4));
  const viscosity = (4 * ideal * primary.guess) / (Math.PI * pipe * reynolds);
  const state: FluidState = {
    pressure: pressure as AbsolutePressure,
    temperature: 300 as Temperature,
    density: density as Density,
    viscosity: viscosity as DynamicViscosity,
    phase: expands ? 'gas' : 'liquid',
    expands,
    ...(expands ? { isentropicExponent: exponent } : {}),
    sources: { density: source, viscosity: source },
    working: [],
  };
  return {
    ...meterOf(primary, geometry, state),
    ...(sheet === undefined ? {} : { sheet }),
    differential: differential as PressureDifference,
  };
}

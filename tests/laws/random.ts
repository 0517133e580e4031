/** Seeded random meters over the whole valid range of every element, and a little beyond its edges where asked. */
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

export interface RandomMeter extends Meter {
  readonly differential: PressureDifference;
}

/** Every element with every choice of its own field. */
export const everyPrimary: readonly Primary[] = elements.flatMap((element) => {
  const [field] = element.fields;
  if (field === undefined) return [element.primary({})];
  if (field.type !== 'choice') throw new Error(`expected a choice, got ${field.type}`);
  return field.choices.map((choice) => element.primary({ [field.name]: choice }));
});

const source = { clause: 'drawn at random', seen: 'read' } as const;
const MOST_REYNOLDS = 1e8;

/** A meter inside the limits of its standard, with x up to a quarter when it measures a gas. */
export function randomMeter(random: () => number): RandomMeter {
  const between = (a: number, b: number) => a + (b - a) * random();
  const logBetween = (a: number, b: number) => a * (b / a) ** random();
  const primary = everyPrimary[Math.floor(random() * everyPrimary.length)] as Primary;
  const bounds = (at: Geometry, id: string) => primary.limits(at, 1e6).find((limit) => limit.id === id) ?? {};
  const any: Geometry = { pipe: 0.1 as Length, bore: 0.05 as Length, ratio: 0.5 };
  const { min: leastPipe = 0.05, max: mostPipe = 1 } = bounds(any, 'pipe-bore') as { min?: number; max?: number };
  const { min: leastRatio = 0.1, max: mostRatio = 0.75 } = bounds(any, 'diameter-ratio') as {
    min?: number;
    max?: number;
  };
  const pipe = logBetween(leastPipe, mostPipe);
  const ratio = between(leastRatio, mostRatio);
  const geometry = { pipe: pipe as Length, bore: (ratio * pipe) as Length, ratio };
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
  return { ...meterOf(primary, geometry, state), differential: differential as PressureDifference };
}

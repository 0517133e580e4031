/** What the vectors of pitot tubes and traverses ask of the core; worked examples go through a whole traverse. */
import type { TraverseText } from '../../../src/core/document/project.ts';
import type { FluidState } from '../../../src/core/fluid/contract.ts';
import { stateOf } from '../../../src/core/fluid/state.ts';
import { readSite } from '../../../src/core/input/site.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import type { SolvedTraverse } from '../../../src/core/result/record.ts';
import { solveTraverse } from '../../../src/core/run/traverse.ts';
import { biasOnPowerLaw } from '../../../src/core/traverse/bias.ts';
import { type CircularRule, circularLayout } from '../../../src/core/traverse/circular.ts';
import { LOG_LINEAR_26 } from '../../../src/core/traverse/log-linear-26.table.ts';
import { meanOverCentre, meanVelocityPosition } from '../../../src/core/traverse/profile.ts';
import { logLinearPattern, rectangularLayout } from '../../../src/core/traverse/rectangular.ts';
import {
  columnDifference,
  impactShare,
  indicatedVelocity,
  pointVelocity,
} from '../../../src/core/traverse/velocity.ts';
import { number } from './element.ts';

type Given = Readonly<Record<string, number | string>>;

const R = 8.31446261815324; // J/(mol.K), SI Brochure, 9th edition
const MILLIMETRE = { water: 9.80665, mercury: 133.322387415 }; // Pa, conventional columns
const source = { clause: 'as the example states', seen: 'read' } as const;

/** Entries key1, key2, ... of a list. */
const numbered = (key: string, values: readonly number[]): Record<string, number> =>
  Object.fromEntries(values.map((value, at) => [`${key}${at + 1}`, value]));

const onDiameter = (given: Given, count: number): readonly number[] =>
  circularLayout(String(given.rule) as CircularRule, 2, count).lines[0]?.points.map(({ at }) => at) ?? [];

const gas = (density: number, pressure: number, temperature: number, exponent?: number): FluidState => ({
  pressure: as<'absolute pressure'>(pressure),
  temperature: as<'temperature'>(temperature),
  density: as<'density'>(density),
  viscosity: as<'dynamic viscosity'>(1.8e-5), // plays no part
  phase: 'gas',
  expands: exponent !== undefined,
  ...(exponent === undefined ? {} : { isentropicExponent: exponent }),
  sources: { density: source, viscosity: source },
  working: [],
});

const velocity = (dp: number, state: FluidState, coefficient = 1): number =>
  pointVelocity(indicatedVelocity(as<'pressure difference'>(dp), state), {
    kind: 's-type',
    coefficient,
    calibration: [],
  });

/** One point at the centre of a pipe with the fluid of the example. */
function single(text: TraverseText, gravity = 9.80665): SolvedTraverse {
  const result = solveTraverse(
    {
      section: { shape: 'circular', diameter: '1 m' },
      rule: 'single-point',
      profile: { kind: 'stated', meanOverCentre: 1 },
      probe: { kind: 'pitot-static', coefficient: 1 },
      state: { pressure: '1e7 Pa(a)', temperature: '288.15 K' },
      ...text,
    },
    0,
    { site: { gravity: `${gravity} m/s2` } },
  );
  if (result.status === 'refused') throw new Error(`expected a traverse, got ${JSON.stringify(result.problems)}`);
  return result;
}

function manometer(given: Given): Record<string, number> {
  const result = single(
    {
      section: { shape: 'circular', diameter: `${given.D ?? 1} m` },
      profile: { kind: 'stated', meanOverCentre: given.meanOverCentre ?? 1 },
      probe: { kind: 'pitot-static', coefficient: number(given, 'K') },
      fluid: { kind: 'stated', density: `${given.rho} kg/m3`, viscosity: `${given.mu ?? 0.001} Pa.s` },
      manometer: { liquid: { density: `${given.rhoGauge} kg/m3` } },
      readings: [[`${given.h} m`]],
    },
    number(given, 'g'),
  );
  const v = result.lines[0]?.points[0]?.velocity_m_s ?? 0;
  const { meanVelocity_m_s = 0, volumeFlow_m3_s = 0, massFlow_kg_s = 0, reynolds = 0 } = result.flow ?? {};
  return { v, vMean: meanVelocity_m_s, q_v: volumeFlow_m3_s, q_m: massFlow_kg_s, Re: reynolds };
}

/** The velocity from stagnation figures: static state by the isentropic law, then the tube. */
function stagnation(given: Given): Record<string, number> {
  const kappa = number(given, 'kappa');
  const [p0, p] = [number(given, 'pTotal'), number(given, 'pStatic')];
  const T = number(given, 'TTotal') * (p / p0) ** ((kappa - 1) / kappa);
  const specific = (number(given, 'cp') * (kappa - 1)) / kappa; // R = cp (κ - 1)/κ
  return { v: velocity(p0 - p, gas(p / (specific * T), p, T, kappa)) };
}

function molarMass(given: Given): Record<string, number> {
  const site = readSite({});
  if (!site.ok) throw new Error('expected a site, got problems');
  const share = (key: string) => number(given, key) / 100;
  const composition = {
    nitrogen: share('N2'),
    oxygen: share('O2'),
    ...(share('CO2') > 0 ? { 'carbon-dioxide': share('CO2') } : {}),
  };
  const { base, atmosphere } = site.value;
  const state = stateOf({ kind: 'gas', composition }, base, base, atmosphere);
  if (!state.ok || state.value.molarMass === undefined) throw new Error('expected a gas with a molar mass, got none');
  return { M: 1000 * state.value.molarMass };
}

/** Density of an ideal gas at the units of the method: mmHg, K, g/mol. */
const stackDensity = (P: number, T: number, M: number): number => (P * MILLIMETRE.mercury * M) / (1000 * R * T);

function uncertainty(given: Given): Record<string, number> {
  const [p, T, v] = [number(given, 'p'), number(given, 'T'), number(given, 'v')];
  const density = p / (287 * T); // kg/m3, air as the example has it
  const result = single({
    fluid: { kind: 'stated', density: `${density} kg/m3`, viscosity: '18 uPa.s' },
    readings: [[`${(density * v ** 2) / 2} Pa`]],
    uncertainty: { reading: `${given.U} Pa` },
  });
  return { percent: result.uncertainty?.terms.find(({ name }) => name === 'reading')?.percentOfFlow ?? 0 };
}

export const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = {
  'traverse-circular': (given) => numbered('y', onDiameter(given, 2 * number(given, 'perRadius'))),
  'traverse-percent': (given) =>
    numbered(
      'p',
      onDiameter(given, number(given, 'perDiameter')).map((at) => 100 * at),
    ),
  'traverse-rectangular': (given) => {
    const count = number(given, 'perLine');
    const layout = rectangularLayout('log-tchebycheff', count, count);
    return numbered('x', layout.lines[0]?.points.map(({ at }) => at) ?? []);
  },
  'traverse-pattern': () => ({
    points: logLinearPattern().lines.reduce((sum, { points }) => sum + points.length, 0),
    weights: LOG_LINEAR_26.reduce((sum, [, , weight]) => sum + weight, 0),
  }),
  'traverse-bias': (given) => {
    const layout = circularLayout(String(given.rule) as CircularRule, 2, 2 * number(given, 'perRadius'));
    return { bias7: biasOnPowerLaw(layout, 7), bias10: biasOnPowerLaw(layout, 10) };
  },
  'mean-velocity-point': ({ profile, n }) => {
    const assumed =
      profile === 'laminar'
        ? ({ kind: 'laminar', at: 'mean-velocity' } as const)
        : ({ kind: 'power', at: 'mean-velocity', exponent: Number(n) } as const);
    return { yOverD: meanVelocityPosition(assumed), meanOverCentre: meanOverCentre(assumed) };
  },
  'pitot-manometer': manometer,
  'pitot-stagnation': stagnation,
  'pitot-static-pressure': (given) => ({
    pEnd:
      number(given, 'pStart') +
      columnDifference(
        number(given, 'h'),
        as<'density'>(number(given, 'rho')),
        as<'density'>(0),
        as<'acceleration'>(number(given, 'g')),
      ),
  }),
  'pitot-incompressible': (given) => ({ v: velocity(number(given, 'dp'), gas(number(given, 'rho'), 101325, 288.15)) }),
  'pitot-compressibility': (given) => {
    const factor = Math.sqrt(impactShare(number(given, 'x'), 1.4));
    return { exact: factor, series: factor };
  },
  'pitot-uncertainty': uncertainty,
  'epa-constant': (given) => {
    const density = stackDensity(number(given, 'P'), number(given, 'T'), number(given, 'M'));
    return { Kp: velocity(MILLIMETRE.water, gas(density, 1e5, 300)) };
  },
  'epa-velocity': (given) => {
    const density = stackDensity(number(given, 'P'), number(given, 'T'), number(given, 'M'));
    const differential = number(given, 'rootMean') ** 2 * MILLIMETRE.water;
    return {
      v: velocity(differential, gas(density, number(given, 'P') * MILLIMETRE.mercury, 400), number(given, 'Cp')),
    };
  },
  'dry-molar-mass': molarMass,
};

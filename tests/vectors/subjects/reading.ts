/** What the vectors of manometers, transmitters and read meters ask of the core; meter problems go through a whole file. */
import type { MeterText } from '../../../src/core/document/project.ts';
import { mercuryDensity } from '../../../src/core/fluid/gauge-liquid.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import { capillaryRise } from '../../../src/core/reading/capillary.ts';
import { alongChain, type Column, columnsDifferential } from '../../../src/core/reading/chain.ts';
import { trueLength } from '../../../src/core/reading/scale.ts';
import {
  differentialOf,
  type Output,
  placeFrom,
  placeOf,
  type Range,
  type SignalName,
  signals,
} from '../../../src/core/reading/signal.ts';
import { statedParts } from '../../../src/core/reading/stated.ts';
import { tubeLevels } from '../../../src/core/reading/tube.ts';
import type { SolvedReading } from '../../../src/core/result/readings-record.ts';
import type { Solved } from '../../../src/core/result/record.ts';
import { densityFactor } from '../../../src/core/run/reading.ts';
import { solveMeter } from '../../../src/core/run.ts';
import { number } from './element.ts';

type Given = Readonly<Record<string, number | string>>;
type Subject = (given: Given) => Record<string, number>;

const standardGravity = 9.80665; // m/s2, CGPM 1901
const gravityOf = (given: Given): number => ('g' in given ? number(given, 'g') : standardGravity);
const processLegs = (rho: number, rise = 0, drop = 0) => ({
  process: rho,
  upstream: rho,
  downstream: rho,
  rise,
  drop,
});

/** 'density:fall; density:fall' as columns. */
const columnsOf = (given: Given): Column[] =>
  String(given.steps)
    .split(';')
    .map((step) => {
      const [density, fall] = step.split(':').map(Number);
      if (density === undefined || fall === undefined) throw new Error(`expected a density and a fall, got ${step}`);
      return { density, fall };
    });

const scale = { zero: as<'length'>(0) };
const roomTemperature = as<'temperature'>(293.15);

/** Vertical distance of the levels for a reading on a tube beside a well. */
function separation(reading: number, angle: number, wellRatio: number): number {
  const tube = { sine: Math.sin(angle), angle, wellRatio, corrected: false };
  const { upstream, downstream } = tubeLevels(reading, tube, scale, roomTemperature, 1);
  return downstream - upstream;
}

/** The argument at which a rising function has a value, by halving. */
function argument(f: (x: number) => number, value: number, lower: number, upper: number): number {
  let [low, high] = [lower, upper];
  for (let step = 0; step < 100; step += 1) {
    const middle = (low + high) / 2;
    if (f(middle) < value) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** A meter of a textbook: a liquid by its density, C by a calibration of one row, what it is read on as it says. */
function meter(given: Given, changes: Partial<MeterText>): Solved {
  const ratio = 'd' in given ? number(given, 'd') / number(given, 'D') : 0;
  const approach = given.approach === 'neglected' ? Math.sqrt(1 - ratio ** 4) : 1; // C E is what the book calls C
  const result = solveMeter(
    {
      fluid: { kind: 'stated', density: `${given.rho} kg/m3`, viscosity: '1 mPa.s' },
      upstream: { pressure: '100 bar(a)', temperature: '15 degC' },
      pipe: { bore: `${given.D} m` },
      element: {
        kind: String(given.element ?? 'venturi-tube'),
        ...(given.element === 'orifice-plate' ? { tappings: 'corner' } : { convergent: 'machined' }),
        ...('d' in given ? { bore: `${given.d} m` } : {}),
        calibration: [{ reynolds: 1e5, coefficient: number(given, 'C') * approach }],
      },
      differential: '10 kPa',
      find: 'flow',
      ...changes,
    },
    0,
    { site: { gravity: `${gravityOf(given)} m/s2` } },
  );
  if (result.status === 'refused') throw new Error(`expected a solution, got ${JSON.stringify(result.problems)}`);
  return result;
}

const uTube = (given: Given): Partial<MeterText> => ({
  instrument: {
    kind: number(given, 'rho_g') > number(given, 'rho') ? 'u-tube' : 'inverted-u-tube',
    liquid: { density: `${given.rho_g} kg/m3` },
  },
});

function firstReading(result: Solved): SolvedReading {
  const row = result.readings?.rows[0];
  if (row?.status !== 'solved') throw new Error(`expected a reading, got ${JSON.stringify(row?.problem)}`);
  return row;
}

const figure = (value: number | undefined): number => {
  if (value === undefined) throw new Error('expected a figure of the reading, got none');
  return value;
};

function flows(row: SolvedReading, given: Given): Record<string, number> {
  const d = number(given, 'd');
  const volume = figure(row.volumeFlow_m3_s);
  return {
    q_m: figure(row.massFlow_kg_s),
    q_V: volume,
    dp: figure(row.differential_Pa),
    V: figure(row.velocityPipe_m_s),
    V_d: volume / ((Math.PI / 4) * d ** 2),
  };
}

/** Flow of a meter read on a column of `h`. */
const readColumn: Subject = (given) =>
  flows(firstReading(meter(given, { ...uTube(given), readings: [{ value: `${given.h} m` }] })), given);

/** The reading of a column at a flow: the differential of that flow over the differential of one metre. */
const columnOfFlow: Subject = (given) => {
  const ofFlow = meter(given, { find: 'differential', duty: { maximum: `${given.q_V} m3/s` } });
  const dp = figure(ofFlow.points.maximum?.differential_Pa);
  const metre = figure(firstReading(meter(given, { ...uTube(given), readings: [{ value: '1 m' }] })).differential_Pa);
  return { h: dp / metre, h_process: dp / (number(given, 'rho') * gravityOf(given)) };
};

const rowOf = (given: Given, upstream: number, throat: number, rise: number): SolvedReading =>
  firstReading(
    meter(given, {
      instrument: { kind: 'gauges', rise: `${rise} m` },
      readings: [{ upstream: `${upstream} Pa(a)`, throat: `${throat} Pa(a)` }],
    }),
  );

/** What two gauges at the tappings differ by at a flow. */
const gaugesOfFlow: Subject = (given) => {
  const ofFlow = meter(given, { find: 'differential', duty: { maximum: `${given.q_V} m3/s` } });
  const dp = figure(ofFlow.points.maximum?.differential_Pa);
  const base = 1e6; // Pa, plays no part
  const shown = figure(rowOf(given, base, base, number(given, 'rise')).differential_Pa);
  return { dp_gauges: dp - shown };
};

/** C of a meter from the flow and what two gauges show as heads. */
const coefficientOfGauges: Subject = (given) => {
  const pressure = (head: number) => 1e6 + number(given, 'rho') * gravityOf(given) * head; // Pa
  const row = rowOf({ ...given, C: 1 }, pressure(number(given, 'h1')), pressure(number(given, 'h2')), 0);
  return { C: number(given, 'q_V') / figure(row.volumeFlow_m3_s) };
};

/** Bore for a mass flow at a differential that a column shows. */
const boreOfColumn: Subject = (given) => {
  const dp = columnsDifferential(
    { upstream: -number(given, 'h') / 2, downstream: number(given, 'h') / 2 },
    number(given, 'rho_g'),
    processLegs(number(given, 'rho')),
    gravityOf(given),
  );
  const found = meter(given, {
    find: 'bore',
    differential: `${dp} Pa`,
    duty: { maximum: `${given.q_m} kg/s` },
  });
  return { d: figure(found.bore_m) };
};

const flowOfDifferential = (given: Given, reading: number, changes: Partial<MeterText> = {}): number =>
  figure(
    firstReading(
      meter(given, { instrument: { kind: 'differential' }, readings: [{ value: `${reading} Pa` }], ...changes }),
    ).massFlow_kg_s,
  );

const rangeOf = (given: Given): Range => ({
  lower: as<'pressure difference'>(number(given, 'lower')),
  upper: as<'pressure difference'>(number(given, 'upper')),
});

/** A signal in the unit of its name, from one output to another. */
function signalFrom(given: Given): Record<string, number> {
  const signal = signals[String(given.signal ?? '4-20 mA') as SignalName];
  const unit: Range = { lower: as<'pressure difference'>(0), upper: as<'pressure difference'>(1) };
  const x = placeOf(number(given, 'from') * signal.size, signal);
  const differential = differentialOf(x, unit, String(given.output) as Output);
  const place = placeFrom(differential, unit, String(given.as) as Output);
  return { to: (signal.zero + place * (signal.full - signal.zero)) / signal.size };
}

export const subjects: Readonly<Record<string, Subject>> = {
  'column-differential': (given) => {
    const h = number(given, 'h') * ('angle' in given ? Math.sin((number(given, 'angle') * Math.PI) / 180) : 1);
    const levels = { upstream: -h / 2, downstream: h / 2 };
    return {
      dp: columnsDifferential(levels, number(given, 'rho_g'), processLegs(number(given, 'rho')), gravityOf(given)),
    };
  },
  'column-levels': (given) => {
    const rise = number(given, 'z2') - number(given, 'z1');
    const rho = number(given, 'rho');
    const levels = { upstream: number(given, 'zi1'), downstream: number(given, 'zi2') };
    const legs = processLegs(rho, rise, number(given, 'z1'));
    const piezometric = columnsDifferential(levels, number(given, 'rho_g'), legs, gravityOf(given));
    return { dp: piezometric + rho * gravityOf(given) * rise };
  },
  'column-chain': (given) => ({ p: alongChain(number(given, 'p'), columnsOf(given), gravityOf(given)) }),
  'well-reading': (given) => {
    const ratio = number(given, 'ratio');
    const h = number(given, 'dp') / (number(given, 'rho_net') * gravityOf(given));
    const reading = argument((R) => separation(R, Math.PI / 2, ratio), h, 0, 10);
    return { R: reading, uncorrected: (reading / h - 1) * number(given, 'dp') };
  },
  'inclined-angle': (given) => {
    const h = number(given, 'dp') / (number(given, 'rho_g') * gravityOf(given));
    // the section of the tube is stated as cut by the level; across the tube it is smaller by the sine
    const across = (angle: number) => number(given, 'ratio') * Math.sin(angle);
    const theta = argument((angle) => separation(number(given, 'L'), angle, across(angle)), h, 0, Math.PI / 2);
    return { theta };
  },
  'capillary-rise': (given) => ({
    rise: capillaryRise(
      number(given, 'sigma'),
      (number(given, 'contact') * Math.PI) / 180,
      number(given, 'rho'),
      number(given, 'bore'),
      gravityOf(given),
    ),
  }),
  'barometer-correction': (given) => {
    const T = as<'temperature'>(number(given, 't') + 273.15);
    const zero = as<'temperature'>(273.15);
    const brass = { zero: as<'length'>(0), metal: { name: 'brass', trueAt: zero } } as const;
    const reduced = (trueLength(number(given, 'h'), brass, T) * mercuryDensity(T)) / mercuryDensity(zero);
    return { correction: reduced - number(given, 'h') };
  },
  'meter-on-column': readColumn,
  'column-of-meter': columnOfFlow,
  'gauges-of-meter': gaugesOfFlow,
  'coefficient-of-gauges': coefficientOfGauges,
  'bore-of-column': boreOfColumn,
  'meter-on-differential': (given) =>
    flows(
      firstReading(meter(given, { instrument: { kind: 'differential' }, readings: [{ value: `${given.dp} Pa` }] })),
      given,
    ),
  'level-signal': (given) => {
    const { zero, full, size } = signals['4-20 mA'];
    const x = placeFrom(number(given, 'head'), rangeOf(given), 'linear');
    return { mA: (zero + x * (full - zero)) / size };
  },
  'signal-to-signal': signalFrom,
  'error-at-flow': (given) => {
    const fraction = number(given, 'fraction');
    const share = as<'ratio'>(number(given, 'percent') / 100);
    const stated = { as: 'expanded', terms: [{ name: 'accuracy', value: { of: 'span', share } }] } as const;
    const [part] = statedParts(stated, { span: 1, reading: fraction ** 2 });
    const relative = figure(part?.pascal) / fraction ** 2;
    return { dpPercent: 100 * relative, flowPercent: 50 * relative, exactPercent: 100 * (Math.sqrt(1 + relative) - 1) };
  },
  'compensation-factor': (given) => {
    const density = (p: number, T: number) => p / T; // in proportion, ideal gas
    const factor = densityFactor(
      density(number(given, 'p'), number(given, 'T')),
      density(number(given, 'p_d'), number(given, 'T_d')),
    );
    return { mass: factor, volume: 1 / factor };
  },
  'wrong-bore': (given) => {
    const flow = (d: number) => flowOfDifferential({ ...given, d }, 5000);
    return { error: flow(number(given, 'd_entered')) / flow(number(given, 'd_true')) - 1 };
  },
  'wrong-leg': (given) => {
    const shown = number(given, 'dp') + number(given, 'extra');
    return { error: flowOfDifferential(given, shown) / flowOfDifferential(given, number(given, 'dp')) - 1 };
  },
  'wrong-density': (given) => {
    const mass = (rho: number) => flowOfDifferential({ ...given, rho }, 5000);
    const [entered, real] = [number(given, 'rho_entered'), number(given, 'rho_true')];
    const error = mass(entered) / mass(real);
    return { mass: error - 1, volume: (error * real) / entered - 1 };
  },
};

/** The averaging pitot through the whole calculation: what its sheet says, and what it has no figure for. */
import { describe, expect, test } from 'vitest';
import { averagingPitot } from '../../../src/core/element/averaging-pitot.ts';
import type { Length } from '../../../src/core/quantity/kinds.ts';
import { refusal, solved, steam, verdict, water } from '../sample.ts';

const { duty } = water;
const bar = (own: object = {}, from: object = water) => ({
  ...from,
  pipe: { bore: '300 mm' },
  element: { kind: 'averaging-pitot', coefficient: 0.65, ...own },
  differential: '40 mbar',
  duty: {},
  find: 'flow',
});
const gas = {
  ...water,
  fluid: { kind: 'stated', density: '8 kg/m3', viscosity: '18 uPa.s', isentropicExponent: 1.25 },
  upstream: { pressure: '5 bar(a)', temperature: '20 degC' },
};
const maximum = (meter: object) => {
  const { points } = solved(meter);
  if (points.maximum === undefined) throw new Error('expected a maximum flow, got none');
  return points.maximum;
};
const area = (Math.PI / 4) * 0.3 ** 2;

describe('the equation', () => {
  test('a file with K alone is solved: q_m = K A sqrt(2 dp rho)', () => {
    const { density_kg_m3: density } = solved(bar()).state;
    expect(maximum(bar()).massFlow_kg_s).toBeCloseTo(0.65 * area * Math.sqrt(2 * 4000 * density), 10);
  });
  test('K counts what the bar leaves clear where the sheet says so', () => {
    const share = maximum(bar({ area: 'clear', width: '20 mm' })).massFlow_kg_s / maximum(bar()).massFlow_kg_s;
    expect(share).toBeCloseTo((area - 0.02 * 0.3) / area, 12);
    expect(maximum(bar({ area: 'pipe', width: '20 mm' })).massFlow_kg_s).toBe(maximum(bar()).massFlow_kg_s);
  });
  test('the expansion number makes ε = 1 - a Δp/(κ p₁)', () => {
    const point = maximum(bar({ expansion: 0.2 }, gas));
    expect(point.epsilon).toBeCloseTo(1 - (0.2 * 4000) / (1.25 * 5e5), 14);
    expect(maximum(bar({}, gas)).epsilon).toBe(1);
    expect(maximum(bar({ expansion: 0.2 })).epsilon).toBe(1); // a liquid
  });
  test('the pipe grows with the line, and a material of the bar changes nothing', () => {
    const hot = { ...bar(), pipe: { bore: '300 mm', material: 'carbon-steel' } };
    expect(maximum(hot).massFlow_kg_s).toBeGreaterThan(maximum(bar()).massFlow_kg_s);
    expect(maximum(bar({ material: 'stainless-316' })).massFlow_kg_s).toBe(maximum(bar()).massFlow_kg_s);
  });
  test('a calibration stands in the place of K', () => {
    const calibration = [{ reynolds: 1e6, coefficient: 0.7 }];
    expect(maximum(bar({ coefficient: undefined, calibration })).C).toBe(0.7);
    expect(maximum(bar({ calibration })).C).toBe(0.7);
  });
});

describe('what it has no figure for is absent', () => {
  const result = solved(bar());
  test('bore, ratio, loss and heads', () => {
    for (const key of ['bore_m', 'boreAsMeasured_m', 'diameterRatio']) expect(result).not.toHaveProperty(key);
    expect(maximum(bar())).not.toHaveProperty('permanentLoss_Pa');
    expect(maximum(bar())).not.toHaveProperty('velocityBore_m_s');
    expect([result.heads, result.dimensions, result.straightLengths]).toEqual([[], [], []]);
    expect(result.reynoldsLimits).toEqual({});
  });
  test('no line of β, E or d, and no loss in the working', () => {
    const ids = maximum(bar()).working.map(({ id }) => id);
    for (const id of ['diameter-ratio', 'approach-factor', 'loss', 'uncertainty']) expect(ids).not.toContain(id);
    expect(ids).toEqual(expect.arrayContaining(['reynolds-pipe', 'C', 'mass-flow', 'velocity']));
  });
  test('the loss of the sheet makes a loss and head lines', () => {
    const lossy = solved(bar({ loss: '8 %' }));
    expect(lossy.points.maximum?.permanentLoss_Pa).toBeCloseTo(320, 10);
    expect(lossy.heads.map(({ station }) => station)).toEqual([
      'inlet',
      'face',
      'tapping-upstream',
      'tapping-downstream',
      'recovered',
    ]);
    const [, , front, back] = lossy.heads;
    expect(front?.pressure_m).toBe(front?.total_m); // the flow rests in front of the bar
    const density = lossy.state.density_kg_m3;
    expect((front?.pressure_m ?? 0) - (back?.pressure_m ?? 0)).toBeCloseTo(4000 / (density * 9.80665), 12);
  });
});

describe('the uncertainty', () => {
  const stated = { pipe: '0.3 %', differential: '0.5 % of reading', density: '0.2 %' };
  const budget = (own: object, uncertainty: object = stated, from: object = water) =>
    maximum({ ...bar(own, from), uncertainty }).uncertainty;

  test('counts D twice, the bore not at all', () => {
    const { expanded_percent, terms, open } = budget({ coefficientUncertainty: '1 %' });
    expect(terms.map(({ name }) => name)).toEqual(['C', 'epsilon', 'pipe', 'differential', 'density']);
    expect(terms.map(({ percentOfFlow }) => percentOfFlow)).toEqual([1, 0, 0.6, 0.25, 0.1]);
    expect(expanded_percent).toBeCloseTo(Math.sqrt(1 + 0.36 + 0.0625 + 0.01), 12);
    expect(open).toEqual([]);
  });
  test('counts D by its share of the clear area', () => {
    const [, , pipe] = budget({ coefficientUncertainty: '1 %', area: 'clear', width: '20 mm' }).terms;
    const wider = (D: number) => (Math.PI / 4) * D ** 2 - 0.02 * D;
    const slope = ((wider(0.3003) - wider(0.2997)) / 0.0006 / wider(0.3)) * 0.3;
    expect(pipe?.percentOfFlow).toBeCloseTo(0.3 * slope, 8);
  });
  test('is open where the sheet says nothing of K, the user nothing of D, or anybody of ε', () => {
    expect(budget({}).open).toEqual(['coefficient']);
    expect(budget({ coefficientUncertainty: '1 %' }, {}).open).toEqual(['pipe', 'differential', 'density']);
    expect(budget({ coefficientUncertainty: '1 %' }, stated, gas).open).toEqual(['expansibility']);
  });
  test('is no figure where nothing of it is stated', () => {
    expect(budget({}, {})).not.toHaveProperty('expanded_percent');
    expect(budget({}, {}).open).toEqual(['coefficient', 'pipe', 'differential', 'density']);
    expect(budget({}, { density: '1 %' }).expanded_percent).toBe(0.5);
  });
});

describe('checks', () => {
  test('the limits of the sheet', () => {
    const reynolds = maximum(bar()).reynoldsPipe;
    expect(verdict(bar({ reynoldsMin: reynolds * 1.01 }), 'reynolds-pipe')).toBe('outside');
    expect(verdict(bar({ reynoldsMin: reynolds * 0.99 }), 'reynolds-pipe')).toBe('inside');
    expect(verdict(bar({ reynoldsMax: reynolds * 0.99 }), 'reynolds-pipe')).toBe('outside');
    const velocity = maximum(bar()).velocityPipe_m_s;
    expect(verdict(bar({ velocityMax: `${velocity * 0.99} m/s` }), 'pipe-velocity')).toBe('outside');
    expect(verdict(bar({ velocityMax: `${velocity * 1.01} m/s` }), 'pipe-velocity')).toBe('inside');
    expect(verdict(bar(), 'pipe-velocity')).toBeUndefined();
  });
  test('its straight pipe holds for any fitting', () => {
    const laid = (before: string) => ({
      ...bar({ straightBefore: '9 D', straightAfter: '3 D' }),
      installation: { before, after: '3 D', fitting: 'globe-valve' },
    });
    expect(verdict(laid('9 D'), 'straight-upstream')).toBe('inside');
    expect(verdict(laid('8.9 D'), 'straight-upstream')).toBe('outside');
    expect(maximum(laid('8.9 D')).uncertainty.open).toContain('straight-length');
    expect(verdict(laid('9 D'), 'straight-downstream')).toBe('inside');
  });
  test('a gas without an expansion number is a caution, a liquid needs none', () => {
    expect(verdict(bar({}, gas), 'expansion-number')).toBe('caution');
    expect(verdict(bar({ expansion: 0 }, gas), 'expansion-number')).toBeUndefined();
    expect(verdict(bar(), 'expansion-number')).toBeUndefined();
    expect(verdict(bar({}, steam), 'expansion-number')).toBe('caution');
  });
  test('boiling behind the bar', () => {
    const near = { ...bar(), upstream: { pressure: '0.6 bar(a)', temperature: '85 degC' } }; // boils at 0.578 bar
    expect(verdict(near, 'bar-cavitation')).toBe('outside');
    expect(verdict(bar(), 'bar-cavitation')).toBe('inside');
    for (const id of ['cavitation', 'flashing', 'span', 'diameter-ratio']) expect(verdict(bar(), id)).toBeUndefined();
  });
  test('what the sheet leaves out is told as not checked', () => {
    const needs = (own: object) => solved(bar(own)).unchecked.map((one) => one.needs);
    expect(needs({})).toEqual(
      expect.arrayContaining(['element.reynoldsMin', 'element.straightBefore', 'element.straightAfter']),
    );
    const told = needs({ reynoldsMin: 2e4, straightBefore: '9 D', straightAfter: '3 D' });
    expect(told).toEqual(['installation.fluctuation', 'installation.before', 'installation.after']);
  });
});

describe('what is refused', () => {
  test.each([
    [{ coefficient: undefined }, ['field-missing at element.coefficient']],
    [{ coefficient: 'sixty' }, ['number-unreadable at element.coefficient']],
    [{ coefficient: 0 }, ['figure-implausible at element.coefficient']],
    [{ coefficient: '-0.65' }, ['figure-implausible at element.coefficient']],
    [{ coefficient: 65 }, ['figure-implausible at element.coefficient']],
    [{ area: 'duct' }, ['choice-unknown at element.area']],
    [{ area: 'clear' }, ['field-missing at element.width']],
    [{ area: 'clear', width: '0.25 m' }, ['bar-too-wide at element.width']],
    [{ width: '0.25 m' }, ['bar-too-wide at element.width']],
    [{ width: '-1 mm' }, ['not-positive at element.width']],
    [{ coefficientUncertainty: '1' }, ['unit-missing at element.coefficientUncertainty']],
    [{ coefficientUncertainty: '-1 %' }, ['share-out-of-range at element.coefficientUncertainty']],
    [{ loss: '120 %' }, ['share-out-of-range at element.loss']],
    [{ expansion: -0.1 }, ['figure-implausible at element.expansion']],
    [{ expansion: 0.42 }, ['figure-implausible at element.expansion']],
    [{ reynoldsMin: 0 }, ['figure-implausible at element.reynoldsMin']],
    [{ reynoldsMin: 5e5, reynoldsMax: '4e5' }, ['reynolds-order at element.reynoldsMax']],
    [{ velocityMax: '5 mm' }, ['unit-wrong-measure at element.velocityMax']],
    [{ straightBefore: '2 m' }, ['unit-wrong-measure at element.straightBefore']],
  ])('%j', (own, reasons) => expect(refusal(bar(own))).toEqual(reasons));

  test('a bore is not found, whatever else is given', () => {
    const asked = { ...bar(), duty, find: 'bore' };
    expect(refusal(asked)).toEqual(['bore-none at find']);
    expect(refusal({ ...asked, find: 'differential' })).toEqual([]);
  });
  test('a bore that stands in the file is not read', () => {
    expect(refusal(bar({ bore: 'nonsense' }))).toEqual([]);
  });
});

test('Δp ε² rises over the whole range that is searched, for every κ of a gas', () => {
  const { expansibility } = averagingPitot.primary({ coefficient: 0.65, expansion: 0.41 });
  for (const kappa of [0.5, 1, 1.4]) {
    const epsilon = expansibility(0, kappa);
    const rising = (x: number) => x * epsilon(x) ** 2;
    for (let x = 0.004; x <= 0.4; x += 0.004)
      expect(rising(x), `κ ${kappa}, x ${x}`).toBeGreaterThan(rising(x - 0.004));
  }
});

test('both problems of a sheet are told at once', () => {
  const section = averagingPitot.primary({ area: 'clear', reynoldsMin: 2, reynoldsMax: 1 }).insertion?.section;
  const found = section?.(0.3 as Length);
  expect(found?.ok === false && found.problems.map(({ code }) => code)).toEqual(['reynolds-order', 'field-missing']);
});

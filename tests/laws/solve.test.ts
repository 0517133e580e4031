/** Laws of the whole calculation, by random meters written as a user writes them. A failing seed is printed. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { MeterText } from '../../src/core/document/project.ts';
import type { Solved } from '../../src/core/result/record.ts';
import { solveMeter } from '../../src/core/run.ts';
import { anyMeter, barMeter, boredMeter, liquidMeter, near } from './written.ts';

const solved = (meter: MeterText): Solved => {
  const result = solveMeter(meter, 0, {});
  if (result.status === 'refused') throw new Error(JSON.stringify(result.problems));
  return result;
};
const flowOf = (result: Solved) => result.points.maximum?.massFlow_kg_s ?? Number.NaN;
const differentialOf = (result: Solved) => result.points.maximum?.differential_Pa ?? Number.NaN;
const boreOf = (result: Solved) => result.boreAsMeasured_m ?? Number.NaN;
const asText = (value: number, unit: string) => `${value} ${unit}`;

describe('there and back within 1e-10', () => {
  test('flow, then differential, then flow', () => {
    fc.assert(
      fc.property(anyMeter, (meter) => {
        const first = solved({ ...meter, find: 'flow' });
        const back = solved({ ...meter, find: 'differential', duty: { maximum: asText(flowOf(first), 'kg/s') } });
        near(differentialOf(back), differentialOf(first), 1e-10);
        const again = solved({ ...meter, find: 'flow', differential: asText(differentialOf(back), 'Pa') });
        near(flowOf(again), flowOf(first), 1e-10);
      }),
      { numRuns: 400 },
    );
  });

  test('flow, then bore, then flow, then bore', () => {
    fc.assert(
      fc.property(boredMeter, (meter) => {
        const first = solved({ ...meter, find: 'flow' });
        const sized = solved({ ...meter, find: 'bore', duty: { maximum: asText(flowOf(first), 'kg/s') } });
        near(boreOf(sized), boreOf(first), 1e-10);
        const element = { ...meter.element, bore: asText(boreOf(sized), 'm') };
        const again = solved({ ...meter, element, find: 'flow' });
        near(flowOf(again), flowOf(first), 1e-10);
        const resized = solved({ ...meter, find: 'bore', duty: { maximum: asText(flowOf(again), 'kg/s') } });
        near(boreOf(resized), boreOf(sized), 1e-10);
      }),
      { numRuns: 400 },
    );
  });
});

describe('the answer does not depend on how it is written', () => {
  test('SI and US spellings of one quantity give one result', () => {
    const meter = (own: Partial<MeterText>): MeterText => ({
      fluid: { kind: 'stated', density: '998 kg/m3', viscosity: '1.0 mPa.s' },
      upstream: { pressure: '6 bar(a)', temperature: '20 degC' },
      pipe: { bore: '101.6 mm' },
      element: { kind: 'orifice-plate', tappings: 'flange', bore: '50.8 mm' },
      differential: '24908.891 Pa',
      find: 'flow',
      ...own,
    });
    const si = solved(meter({}));
    const us = solved(
      meter({
        upstream: { pressure: '6 bar(a)', temperature: '68 degF' },
        pipe: { bore: '4 in' },
        element: { kind: 'orifice-plate', tappings: 'flange', bore: '2 in' },
        differential: '100 inH2O',
      }),
    );
    near(flowOf(us), flowOf(si), 1e-14);
    near(
      us.points.maximum?.uncertainty.expanded_percent ?? 0,
      si.points.maximum?.uncertainty.expanded_percent ?? 1,
      1e-14,
    );
  });

  test('the display of the project leaves the results alone', () => {
    fc.assert(
      fc.property(anyMeter, (meter) => {
        const one = solveMeter({ ...meter, find: 'flow' }, 0, { display: 'SI' } as object);
        const other = solveMeter({ ...meter, find: 'flow' }, 0, { display: 'US' } as object);
        expect(other).toEqual(one);
      }),
      { numRuns: 50 },
    );
  });
});

describe('physics', () => {
  test('more differential, more flow and more loss', () => {
    fc.assert(
      fc.property(anyMeter, fc.double({ min: 1.001, max: 1.2, noNaN: true }), (meter, more) => {
        const first = solved({ ...meter, find: 'flow' });
        const harder = solved({ ...meter, find: 'flow', differential: asText(differentialOf(first) * more, 'Pa') });
        expect(flowOf(harder)).toBeGreaterThan(flowOf(first));
        expect(harder.points.maximum?.permanentLoss_Pa).toBeGreaterThan(
          first.points.maximum?.permanentLoss_Pa ?? Number.NaN,
        );
      }),
      { numRuns: 200 },
    );
  });

  test('more bore, more flow', () => {
    fc.assert(
      fc.property(boredMeter, fc.double({ min: 1.001, max: 1.2, noNaN: true }), (meter, more) => {
        const first = solved({ ...meter, find: 'flow' });
        const wider = solved({
          ...meter,
          find: 'flow',
          element: { ...meter.element, bore: asText(boreOf(first) * (1 + (more - 1) / 10), 'm') },
        });
        expect(flowOf(wider)).toBeGreaterThan(flowOf(first));
      }),
      { numRuns: 200 },
    );
  });

  test('a wider bore passes more, also far below the limits where these change with the ratio', () => {
    const at = (ratio: number) =>
      flowOf(
        solved({
          fluid: { kind: 'stated', density: '1000 kg/m3', viscosity: '5 mPa.s' },
          upstream: { pressure: '5 bar(a)', temperature: '20 degC' },
          pipe: { bore: '50 mm' },
          element: { kind: 'isa-1932-nozzle', bore: asText(0.05 * ratio, 'm') },
          differential: '1 mbar',
          find: 'flow',
        }),
      );
    const ratios = Array.from({ length: 60 }, (_, step) => 0.41 + step * 0.001);
    for (const [index, ratio] of ratios.entries())
      if (index > 0) expect(at(ratio)).toBeGreaterThan(at(ratios[index - 1] ?? 0));
  });

  test('the permanent loss lies between nothing and the differential, and the terms make the sum', () => {
    fc.assert(
      fc.property(anyMeter, (meter) => {
        const { points } = solved({ ...meter, find: 'flow' });
        for (const point of Object.values(points)) {
          expect(point.permanentLoss_Pa).toBeGreaterThan(0);
          expect(point.permanentLoss_Pa).toBeLessThan(point.differential_Pa);
          const squares = point.uncertainty.terms.reduce((sum, { percentOfFlow }) => sum + percentOfFlow ** 2, 0);
          near((point.uncertainty.expanded_percent ?? Number.NaN) ** 2, squares, 1e-12);
        }
      }),
      { numRuns: 200 },
    );
  });

  test('an averaging pitot passes K times what its section would at the velocity of the differential', () => {
    fc.assert(
      fc.property(barMeter, (meter) => {
        const result = solved({ ...meter, find: 'flow' });
        const point = result.points.maximum;
        if (point === undefined) throw new Error('expected a maximum');
        const { density_kg_m3: density } = result.state;
        const width = meter.element?.area === 'clear' ? Number.parseFloat(String(meter.element.width)) / 1000 : 0;
        const clear = 1 - width / ((Math.PI / 4) * result.pipe_m); // of the area of the pipe
        const ideal = Math.sqrt((2 * point.differential_Pa) / density); // m/s
        near(point.velocityPipe_m_s, point.C * point.epsilon * clear * ideal, 1e-12);
        expect([result.bore_m, result.diameterRatio, point.velocityBore_m_s]).toEqual([
          undefined,
          undefined,
          undefined,
        ]);
      }),
      { numRuns: 200 },
    );
  });

  test('with C = 1 and no expansion, p/rho + V2/2 + gz is the same at both sections', () => {
    fc.assert(
      fc.property(liquidMeter, (meter) => {
        const element = { ...meter.element, calibration: [{ reynolds: 1, coefficient: 1 }] };
        const result = solved({ ...meter, element, find: 'flow' });
        const point = result.points.maximum;
        if (point === undefined) throw new Error('expected a maximum');
        const { density_kg_m3: density, pressure_Pa: pressure } = result.state;
        const upstream = pressure / density + point.velocityPipe_m_s ** 2 / 2;
        const throat = (pressure - point.differential_Pa) / density + (point.velocityBore_m_s ?? Number.NaN) ** 2 / 2;
        near(throat, upstream, 1e-12); // both tappings at one level, so that gz is the same
      }),
      { numRuns: 300 },
    );
  });

  test('a hotter metal passes more through the same plate, by about twice its growth', () => {
    const cold: MeterText = {
      fluid: { kind: 'stated', density: '800 kg/m3', viscosity: '0.5 mPa.s' },
      upstream: { pressure: '10 bar(a)', temperature: '220 degC' },
      pipe: { bore: '200 mm', material: 'stainless-304' },
      element: { kind: 'venturi-tube', convergent: 'as-cast', bore: '100 mm', material: 'stainless-304' },
      differential: '200 mbar',
      find: 'flow',
    };
    const { material: _, ...bare } = cold.element ?? {};
    const grown = flowOf(solved(cold)) / flowOf(solved({ ...cold, pipe: { bore: '200 mm' }, element: bare }));
    near(grown, (1 + 16.6e-6 * 200) ** 2, 1e-4); // EN 10088-1, mean coefficient 16.5e-6/K at 200 degC, 17e-6/K at 300
  });
});

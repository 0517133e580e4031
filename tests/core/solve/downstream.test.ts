/** A temperature measured behind the element: the one upstream, and what is said where there is no way back. */
import { describe, expect, it } from 'vitest';
import type { MeterText } from '../../../src/core/document/project.ts';
import type { FluidState } from '../../../src/core/fluid/contract.ts';
import { propertiesAt } from '../../../src/core/fluid/if97/evaluate.ts';
import { placeOf } from '../../../src/core/fluid/if97/place.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import { ok } from '../../../src/core/quantity/outcome.ts';
import { upstreamFrom } from '../../../src/core/solve/downstream.ts';
import { seeded } from '../fluid/seeded.ts';
import { answer, refusal, solved, steam, water } from '../sample.ts';

const gas: MeterText = {
  tag: 'FE-3101',
  fluid: { kind: 'gas', composition: { methane: 0.9, ethane: 0.06, nitrogen: 0.04 } },
  upstream: { pressure: '60 bar(g)', temperature: '15 degC' },
  pipe: { bore: '200 mm' },
  element: { kind: 'orifice-plate', tappings: 'flange', bore: '120 mm' },
  duty: { maximum: '60000 base m3/h', normal: '30000 base m3/h' },
  differential: '500 mbar',
  find: 'flow',
};

const behind = (meter: MeterText, temperature = meter.upstream?.temperature): MeterText => ({
  ...meter,
  upstream: { ...meter.upstream, ...(temperature === undefined ? {} : { temperature }), temperatureAt: 'downstream' },
});

describe('the temperature upstream', () => {
  it.each<[string, MeterText]>([
    ['flow', gas],
    ['bore', { ...gas, duty: { maximum: '100 t/h' }, find: 'bore' }],
    ['differential', { ...gas, find: 'differential' }],
    ['flow of steam', steam],
    ['flow of air', { ...gas, fluid: { kind: 'air' }, duty: { maximum: '50 t/h' } }],
  ])('is that measured downstream and the loss times the coefficient: %s', (_, meter) => {
    const { state, points } = solved(behind(meter));
    const measured = solved(meter).state.temperature_K;
    expect(state.downstream).toEqual({ measured_K: measured, loss_Pa: points.maximum?.permanentLoss_Pa });
    const rise = (state.jouleThomson_K_Pa ?? 0) * (points.maximum?.permanentLoss_Pa ?? 0);
    expect(state.temperature_K).toBeCloseTo(measured + rise, 9);
    expect(Math.abs(rise)).toBeGreaterThan(0.02);
  });

  it('leads back to where it came from', () => {
    const start = solved(gas);
    const loss = start.points.maximum?.permanentLoss_Pa ?? 0;
    const T3 = start.state.temperature_K - (start.state.jouleThomson_K_Pa ?? 0) * loss;
    const back = solved(behind(gas, `${T3} K`));
    expect(back.state.temperature_K).toBeCloseTo(start.state.temperature_K, 9);
    expect(back.points.maximum?.massFlow_kg_s).toBeCloseTo(start.points.maximum?.massFlow_kg_s ?? 0, 9);
    expect(back.state.density_kg_m3).toBeCloseTo(start.state.density_kg_m3, 9);
  });

  it('is the measured one as the loss goes to nothing', () => {
    for (const differential of ['10 mbar', '0.1 mbar', '0.001 mbar']) {
      const { state, points } = solved(behind({ ...gas, duty: { maximum: '1 t/h' }, differential }));
      const share = (state.temperature_K - 288.15) / (points.maximum?.permanentLoss_Pa ?? 0);
      expect(share).toBeGreaterThan(0);
      expect(share).toBeLessThan(1e-5); // K/Pa: the rise is in proportion to the loss, whatever its size
    }
    const least = solved(behind({ ...gas, duty: { maximum: '1 t/h' }, differential: '0.001 mbar' }));
    expect(least.state.temperature_K).toBeCloseTo(288.15, 6);
  });

  it('counts for every flow of the meter, and for its metal', () => {
    const metal = { bore: '200 mm', material: 'carbon-steel' };
    const warm = solved(behind({ ...gas, pipe: metal }));
    const same = solved({
      ...gas,
      pipe: metal,
      upstream: { ...gas.upstream, temperature: `${warm.state.temperature_K} K` },
    });
    expect(warm.pipe_m).toBe(same.pipe_m);
    expect(warm.points).toEqual(same.points);
  });

  it('says where it comes from in its working', () => {
    const { working } = solved(behind(gas));
    expect(working.slice(0, 2).map(({ id, symbol, unit, remark }) => [id, symbol, unit, remark])).toEqual([
      ['jouleThomson', 'μ_JT', 'K/Pa', 'joule-thomson'],
      ['temperature', 'T_1', 'K', 'temperature-from-downstream'],
    ]);
    expect(solved(gas).working[0]?.id).toBe('density');
  });

  it('says that it could not settle', () => {
    const state = { jouleThomson: 1, phase: 'gas' } as FluidState;
    const swinging = (T: number) => ok({ value: T, state, loss: T > 300 ? 0 : 10 });
    expect(upstreamFrom(as<'temperature'>(295), swinging, 'upstream.temperature')).toMatchObject({
      ok: false,
      problems: [{ code: 'temperature-unsettled', field: 'upstream.temperature', detail: { lower: 295, upper: 305 } }],
    });
    const falling = () => ok({ value: 0, state, loss: -1000 });
    expect(upstreamFrom(as<'temperature'>(295), falling, 'x')).toMatchObject({
      problems: [{ code: 'temperature-unsettled', detail: { lower: 0, upper: 295 } }],
    });
  });
});

describe('a temperature that stands as measured downstream', () => {
  const finding = (meter: MeterText) => solved(meter).checks.find(({ id }) => id === 'temperature-downstream');
  const stated = { kind: 'stated', density: '5 kg/m3', viscosity: '0.01 cP', isentropicExponent: 1.3 };

  it('is a caution where no coefficient is known', () => {
    const meter = behind({ ...gas, fluid: stated, duty: { maximum: '10 t/h' } });
    expect(finding(meter)).toMatchObject({ verdict: 'caution', value: 288.15, detail: { why: 'no-coefficient' } });
    expect(solved(meter).state).toMatchObject({ temperature_K: 288.15, downstream: { measured_K: 288.15 } });
    expect(solved(meter).state.downstream).not.toHaveProperty('loss_Pa');
  });

  it('is a caution on the saturation line', () => {
    const wet = { ...steam, fluid: { kind: 'water', quality: '97 %' }, upstream: { pressure: '10 bar(g)' } };
    expect(finding(behind(wet))).toMatchObject({ detail: { why: 'on-saturation-line' } });
  });

  it('is silent where it was corrected or measured upstream', () => {
    expect(finding(behind(gas))).toBeUndefined();
    expect(finding({ ...gas, upstream: { ...gas.upstream, temperatureAt: 'upstream' } })).toBeUndefined();
    expect(finding({ ...gas, fluid: stated, duty: { maximum: '10 t/h' } })).toBeUndefined();
  });

  it('is refused where it is neither', () => {
    const meter = { ...gas, upstream: { ...gas.upstream, temperatureAt: 'here' } };
    expect(refusal(meter)).toEqual(['choice-unknown at upstream.temperatureAt']);
    expect(answer(behind(water)).status).toBe('solved');
  });
});

it('follows the line of constant enthalpy of water and steam', () => {
  const random = seeded(5167);
  let count = 0;
  while (count < 300) {
    const T = 280 + 900 * random();
    const p = 10 ** (3 + 4.9 * random());
    const at = (dp: number, dT: number) => {
      const place = placeOf(as<'absolute pressure'>(p), as<'temperature'>(T));
      return propertiesAt(as<'absolute pressure'>(p + dp), as<'temperature'>(T + dT), place);
    };
    const here = at(0, 0);
    if (here === undefined) continue;
    const dp = 1e-4 * p;
    const dT = here.jouleThomson * dp;
    const along = ((at(dp, dT)?.enthalpy ?? 0) - (at(-dp, -dT)?.enthalpy ?? 0)) / (2 * dp); // (∂h/∂p) along it
    const across = ((at(dp, 0)?.enthalpy ?? 0) - (at(-dp, 0)?.enthalpy ?? 0)) / (2 * dp); // (∂h/∂p) at constant T
    expect(Math.abs(along), `${p} Pa, ${T} K`).toBeLessThan(1e-4 * Math.abs(across) + 1e-9);
    count += 1;
  }
});

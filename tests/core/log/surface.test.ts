/** The property surface against true states, at states it has not seen. */
import { describe, expect, it } from 'vitest';
import { seamsOf } from '../../../src/core/fluid/state.ts';
import { lookUp } from '../../../src/core/log/patch.ts';
import { patchAt, type StateAt, surfaceOf } from '../../../src/core/log/surface.ts';
import type { AbsolutePressure, Temperature } from '../../../src/core/quantity/kinds.ts';
import { meterAt } from '../../../src/core/run/standing.ts';
import { generator } from '../../laws/random.ts';
import { logged, logMeter } from './meters.ts';

const STATES = 2000;

describe('a surface over the box of a log', () => {
  it.each(Object.keys(logged))('of %s is right within the bounds it states', (name) => {
    const { stands, box } = logMeter(name, 'orifice flange');
    const stateAt: StateAt = (p, T) => {
      const meter = meterAt(stands, { pressure: p as AbsolutePressure, temperature: T as Temperature });
      return meter.ok ? { ok: true, value: meter.value.state } : meter;
    };
    const surface = surfaceOf(stateAt, box, seamsOf(stands.written.fluid ?? {}, stands.site.atmosphere));
    if (surface.kind === 'exact') throw new Error(`${name}: ${surface.why}`);
    const random = generator(41);
    const into = new Float64Array(3);
    const worst = [0, 0, 0];
    for (let turn = 0; turn < STATES; turn += 1) {
      const p = box.pressure[0] + random() * (box.pressure[1] - box.pressure[0]);
      const T = box.temperature[0] + random() * (box.temperature[1] - box.temperature[0]);
      const known = stateAt(p, T);
      if (!known.ok) throw new Error(JSON.stringify(known.problems));
      lookUp(patchAt(surface, p, T), p, T, into);
      const { density, viscosity, isentropicExponent } = known.value;
      const off = (value: number, by: number) => Math.abs(value / by - 1);
      worst[0] = Math.max(worst[0] ?? 0, off(surface.expands ? ((into[0] ?? 0) * p) / T : (into[0] ?? 0), density));
      worst[1] = Math.max(worst[1] ?? 0, off(into[1] ?? 0, viscosity));
      if (surface.expands) worst[2] = Math.max(worst[2] ?? 0, off(into[2] ?? 0, isentropicExponent ?? 0));
    }
    const { bounds } = surface;
    expect(bounds.density).toBeLessThanOrEqual(1e-7);
    expect(worst[0]).toBeLessThanOrEqual(bounds.density);
    expect(worst[1]).toBeLessThanOrEqual(bounds.viscosity);
    expect(worst[2]).toBeLessThanOrEqual(bounds.isentropicExponent);
  });
});

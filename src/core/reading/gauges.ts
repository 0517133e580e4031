/**
 * Two gauges, one at each tapping or at a height above it. What they show is brought to the tappings through their legs,
 * and the head between the tappings is taken off. The gauge upstream gives the line pressure of its row.
 */
import { as } from '../quantity/brand.ts';
import { ok } from '../quantity/outcome.ts';
import { named, type Working } from '../quantity/working.ts';
import { asked } from './asked.ts';
import { readCellFields } from './cell.ts';
import { alongChain, hydrostatics } from './chain.ts';
import type { Instrument } from './contract.ts';
import { legTemperatureCautions } from './leg-temperature.ts';
import { type LegDensities, legsAt } from './legs.ts';
import { reversedCautions } from './reversed.ts';
import { combinedWorking, statedParts } from './stated.ts';

export const gauges: Instrument = {
  kind: 'gauges',
  settle(form) {
    const fields = readCellFields(form, false);
    const height = (name: string) => form.quantity(`instrument.${name}`, ['length'])?.si ?? 0;
    const [above1, above2] = [height('heightUpstream'), height('heightThroat')];
    return {
      kind: 'gauges',
      asks: { shows: [], gauges: true },
      read(shown, { state, gravity }) {
        const [upstream, throat] = [asked(shown.upstream, 'an upstream gauge'), asked(shown.throat, 'a throat gauge')];
        const legs = legsAt(fields.legs, state, fields.ambient);
        const p1 = alongChain(upstream, [{ density: legs.upstream, fall: above1 }], gravity);
        const p2 = alongChain(throat, [{ density: legs.downstream, fall: above2 }], gravity);
        const value = as<'pressure difference'>(p1 - p2 - legs.process * gravity * legs.rise);
        const lengths = { upstream: above1, downstream: -above2 };
        const seen = { temperature: fields.ambient, differential: value, state, gravity };
        const parts = statedParts(fields.uncertainty, { span: 0, reading: Math.abs(value) });
        const line = lineOf({ upstream, throat, above1, above2, value }, legs, gravity);
        return ok({
          standing: 'as-shown',
          differential: value,
          cautions: [...reversedCautions(value), ...legTemperatureCautions(fields.legs, lengths, seen)],
          working: [line, ...combinedWorking(parts)],
          uncertainty: parts,
          picture: { upstream_Pa: upstream, throat_Pa: throat },
        });
      },
    };
  },
};

interface Shows {
  readonly upstream: number; // Pa
  readonly throat: number;
  readonly above1: number; // m
  readonly above2: number;
  readonly value: number; // Pa
}

const lineOf = (shows: Shows, legs: LegDensities, gravity: number): Working => ({
  id: 'differential',
  symbol: 'Δp',
  formula: 'p_a + ρ_L * g * h_a - p_b - ρ_M * g * h_b - ρ_1 * g * s',
  given: [
    named('p_a', shows.upstream, 'Pa(a)', 'gauge-upstream'),
    named('p_b', shows.throat, 'Pa(a)', 'gauge-throat'),
    named('ρ_L', legs.upstream, 'kg/m3', 'density-of-upstream-leg'),
    named('ρ_M', legs.downstream, 'kg/m3', 'density-of-downstream-leg'),
    named('h_a', shows.above1, 'm', 'height-of-upstream-gauge'),
    named('h_b', shows.above2, 'm', 'height-of-throat-gauge'),
    named('ρ_1', legs.process, 'kg/m3', 'density'),
    named('g', gravity, 'm/s2', 'gravity'),
    named('s', legs.rise, 'm', 'rise-of-tappings'),
  ],
  value: shows.value,
  unit: 'Pa',
  source: hydrostatics,
});

/** What every instrument with a column of liquid makes of its two levels: differential, working, uncertainty, cautions. */
import type { Form } from '../input/form.ts';
import {
  type Gauge,
  type InstrumentUncertainty,
  type Legs,
  readGauge,
  readInstrumentUncertainty,
  readLegs,
  readScale,
  type Scale,
} from '../input/instrument.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import { named, type Working } from '../quantity/working.ts';
import { capillaryCautions } from './capillary.ts';
import { columnsDifferential, hydrostatics } from './chain.ts';
import type { Conditions, Shown, UncertaintyPart } from './contract.ts';
import { legTemperatureCautions } from './leg-temperature.ts';
import { fillingOf, type LegDensities, legsAt, legsGiven } from './legs.ts';
import { gaugeDensity, liquidCautions, liquidWorking } from './liquid.ts';
import { reversedCautions } from './reversed.ts';
import { resolution } from './scale.ts';
import { combinedWorking, statedParts } from './stated.ts';

/** What of a column its fields say. */
export interface ColumnFields {
  readonly gauge: Gauge;
  readonly legs: Legs;
  readonly scale: Scale;
  readonly uncertainty: InstrumentUncertainty;
  /** True where the gauge fluid lies on top of the process fluid. */
  readonly inverted: boolean;
}

/** A column at one reading. */
export interface Levels {
  /** Menisci above the zero mark, m. */
  readonly upstream: number;
  readonly downstream: number;
  /** How they follow from what was read. */
  readonly working: readonly Working[];
  /** Metres of separation for one metre of the scale, and how many menisci are read on it. */
  readonly perReading: number;
  readonly menisci: 1 | 2;
  /** Inclination of the tube, rad; absent where it is upright. */
  readonly angle?: number;
  /** Bore of a tube that stands against a well, m. */
  readonly bore?: number;
}

export function readColumnFields(form: Form, inverted = false): ColumnFields | undefined {
  const gauge = readGauge(form, inverted);
  const legs = readLegs(form);
  const scale = readScale(form);
  const uncertainty = readInstrumentUncertainty(form, false);
  return gauge === undefined ? undefined : { gauge, legs, scale, uncertainty, inverted };
}

/**
 * The differential of a column. Problems: manometer-liquid-light and manometer-liquid-heavy, where the two fluids would
 * change places; gauge-air-unknown.
 */
export function readColumn(fields: ColumnFields, levels: Levels, { state, gravity }: Conditions): Outcome<Shown> {
  const { gauge, inverted } = fields;
  const liquid = gaugeDensity(gauge, state);
  if (!liquid.ok) return liquid;
  const { density } = liquid.value;
  const legs = legsAt(fields.legs, state, gauge.temperature);
  const fluid = inverted ? Math.min(legs.upstream, legs.downstream) : Math.max(legs.upstream, legs.downstream);
  const net = inverted ? fluid - density : density - fluid;
  if (!(net > 0)) {
    const code = inverted ? 'manometer-liquid-heavy' : 'manometer-liquid-light';
    return fail(code, 'instrument.liquid', { liquid: density, fluid });
  }
  const differential = columnsDifferential(levels, density, legs, gravity);
  const lengths = {
    upstream: levels.upstream - legs.drop,
    downstream: legs.drop + legs.rise - levels.downstream,
  };
  const seen = { temperature: gauge.temperature, differential, state, gravity };
  const parts = partsOf(fields, levels, net * gravity, differential);
  const narrow = levels.bore === undefined ? [] : capillaryCautions(gauge.liquid, density, levels.bore, gravity);
  const line = { ...lineOf(levels, density, legs, gravity, inverted), value: differential };
  return ok({
    standing: 'as-shown',
    differential,
    cautions: [
      ...reversedCautions(differential),
      ...liquidCautions(gauge),
      ...legTemperatureCautions(fields.legs, lengths, seen),
      ...narrow,
    ],
    working: [liquidWorking(gauge, liquid.value), ...levels.working, line, ...combinedWorking(parts)],
    uncertainty: parts,
    picture: {
      levelUpstream_m: levels.upstream,
      levelDownstream_m: levels.downstream,
      liquid_kg_m3: density,
      upstreamLeg_kg_m3: legs.upstream,
      downstreamLeg_kg_m3: legs.downstream,
    },
  });
}

/** Resolution of the scale, what the inclination is worth, and what is stated; `perMetre` is Pa for a metre of separation. */
function partsOf(
  { scale, uncertainty }: ColumnFields,
  levels: Levels,
  perMetre: number,
  differential: number,
): readonly UncertaintyPart[] {
  const { division } = scale;
  const length = division === undefined ? undefined : levels.perReading * resolution(division, levels.menisci);
  const tilt = uncertainty.angle;
  const rows: readonly UncertaintyPart[] = [
    ...(length === undefined ? [] : [{ name: 'resolution', pascal: perMetre * length }]),
    ...(tilt === undefined || levels.angle === undefined
      ? []
      : [{ name: 'inclination', pascal: (Math.abs(differential) / Math.tan(levels.angle)) * tilt }]), // d(dp)/dp = cot(theta) d(theta)
  ];
  return [...rows, ...statedParts(uncertainty, { span: 0, reading: Math.abs(differential) })];
}

/** The line of the differential without its value. */
function lineOf(
  { upstream, downstream }: Levels,
  density: number,
  legs: LegDensities,
  gravity: number,
  inverted: boolean,
): Omit<Working, 'value'> {
  const common = { id: 'differential', symbol: 'Δp', unit: 'Pa', source: hydrostatics } as const;
  const given = [named('ρ_g', density, 'kg/m3', 'density-of-gauge-liquid'), ...legsGiven(legs)];
  const g = named('g', gravity, 'm/s2', 'gravity');
  const filling = fillingOf(legs);
  if (filling === 'two') {
    const levels = [named('z_u', upstream, 'm', 'level-upstream'), named('z_d', downstream, 'm', 'level-downstream')];
    const formula = 'ρ_g * g * (z_d - z_u) + ρ_M * g * (z + s - z_d) - ρ_L * g * (z - z_u) - ρ_1 * g * s';
    return { ...common, formula, given: [...given, g, ...levels] };
  }
  const h = named('h', inverted ? upstream - downstream : downstream - upstream, 'm', 'level-difference');
  const over = filling === 'one' ? 'ρ_L' : 'ρ_1';
  const net = inverted ? `(${over} - ρ_g)` : `(ρ_g - ${over})`;
  const climb = filling === 'one' ? ' + (ρ_L - ρ_1) * g * s' : '';
  return { ...common, formula: `${net} * g * h${climb}`, given: [...given, g, h] };
}

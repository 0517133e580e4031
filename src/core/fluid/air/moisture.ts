/**
 * The water in air: its mole fraction from the relative humidity, the dew point or the wet bulb, all at the pressure of
 * the air itself. Standard: CIPM-2007, Eq. 3 and A1.3 (x_v = h f p_s / p); WMO-No. 8, Annex 4.B (psychrometer).
 * Symbols: h relative humidity, t_d dew point, t_w wet bulb, f enhancement factor, p_s saturation pressure; SI.
 */
import { isInside } from '../../numeric/bounds.ts';
import { zeroCelsius as freezing } from '../../quantity/constants.ts';
import type { AbsolutePressure, Temperature } from '../../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import type { Caution } from '../contract.ts';
import { criticalTemperature } from '../if97/saturation.ts';
import type { Conditions, State } from '../model.ts';
import { enhancementRange, enhancementSource, type Saturated, saturatedAt } from './saturation.ts';

/** What says how moist the air is. */
export type Moisture =
  | { readonly by: 'relativeHumidity'; readonly h: number }
  | { readonly by: 'dewPoint'; readonly temperature: Temperature }
  | { readonly by: 'wetBulb'; readonly temperature: Temperature };

/** Water vapour in air, and what it was found from. */
export interface Vapour {
  readonly moisture: Moisture;
  /** Mole fraction x_v. */
  readonly fraction: number;
  /** At the temperature of the air, of the dew point or of the wet bulb. */
  readonly saturated: Saturated;
  /** Psychrometer coefficient, 1/K; present with a wet bulb. */
  readonly psychrometer?: number;
}

/** Temperatures at which air can be said to be so and so humid, K. WMO-No. 8: from -50 degC, over liquid water. */
const humidRange = { min: 223.15, max: criticalTemperature };
const lowestDewPoint = enhancementRange.temperature.min; // K, 173.15

/** Where the psychrometer coefficient comes from. */
export const psychrometerSource: Source = { clause: 'WMO-No. 8, Annex 4.B, aspirated psychrometer', seen: 'memory' };
/** Where that coefficient was found, Pa: about atmospheric pressure (practice). */
export const psychrometerRange = { min: 60e3, max: 110e3 } as const;

/**
 * Mole fraction of water vapour in air at p and T.
 * Problems: humidity-out-of-range, vapour-exceeds-pressure, dew-point-out-of-range, dew-point-above-temperature,
 * wet-bulb-out-of-range, wet-bulb-above-temperature, wet-bulb-too-low.
 */
export function vapourIn(moisture: Moisture, conditions: Conditions): Outcome<Vapour> {
  if (moisture.by === 'relativeHumidity') return byHumidity(moisture, conditions);
  return moisture.by === 'dewPoint' ? byDewPoint(moisture, conditions) : byWetBulb(moisture, conditions);
}

type Of<By extends Moisture['by']> = Extract<Moisture, { readonly by: By }>;

function byHumidity(moisture: Of<'relativeHumidity'>, conditions: Conditions): Outcome<Vapour> {
  const { pressure: p, temperature: T, paths } = conditions;
  if (!(T >= humidRange.min && T <= humidRange.max))
    return fail('humidity-out-of-range', paths.own(moisture.by), {
      temperature: T,
      lowest: humidRange.min,
      highest: humidRange.max,
    });
  const saturated = saturatedAt(T, p, false, T);
  return below(moisture, saturated, moisture.h * shareOf(saturated, p), conditions); // x_v = h f p_s / p
}

function byDewPoint(moisture: Of<'dewPoint'>, conditions: Conditions): Outcome<Vapour> {
  const { pressure: p, temperature: T, paths } = conditions;
  const { temperature: Td } = moisture;
  const place = paths.own(moisture.by);
  if (Td > T) return fail('dew-point-above-temperature', place, { dewPoint: Td, temperature: T });
  if (!(Td >= lowestDewPoint && Td <= criticalTemperature))
    return fail('dew-point-out-of-range', place, {
      dewPoint: Td,
      lowest: lowestDewPoint,
      highest: criticalTemperature,
    });
  const saturated = saturatedAt(Td, p, true, T);
  return below(moisture, saturated, shareOf(saturated, p), conditions); // x_v = f(p, t_d) p_s(t_d) / p
}

function byWetBulb(moisture: Of<'wetBulb'>, conditions: Conditions): Outcome<Vapour> {
  const { pressure: p, temperature: T, paths } = conditions;
  const { temperature: Tw } = moisture;
  const place = paths.own(moisture.by);
  if (Tw > T) return fail('wet-bulb-above-temperature', place, { wetBulb: Tw, temperature: T });
  if (!(Tw >= freezing && Tw <= enhancementRange.temperature.max))
    return fail('wet-bulb-out-of-range', place, {
      wetBulb: Tw,
      lowest: freezing,
      highest: enhancementRange.temperature.max,
    });
  const saturated = saturatedAt(Tw, p, false, T);
  const A = 6.53e-4 * (1 + 9.44e-4 * (Tw - freezing)); // 1/K; WMO-No. 8, Annex 4.B
  const fraction = shareOf(saturated, p) - A * (T - Tw); // e = f p_s(t_w) - A p (t - t_w), x_v = e/p
  if (fraction < 0) return fail('wet-bulb-too-low', place, { wetBulb: Tw, temperature: T });
  const found = below(moisture, saturated, fraction, conditions);
  return found.ok ? ok({ ...found.value, psychrometer: A }) : found;
}

/** Mole fraction of the vapour in saturated air. */
const shareOf = ({ pressure, factor }: Saturated, p: AbsolutePressure): number => (factor * pressure) / p;

/** Nearly nothing but vapour is steam, not air (practice). */
const MOST_VAPOUR = 0.9;

function below(
  moisture: Moisture,
  saturated: Saturated,
  fraction: number,
  { pressure, paths }: Conditions,
): Outcome<Vapour> {
  if (fraction <= MOST_VAPOUR) return ok({ moisture, fraction, saturated });
  const detail = { fraction, most: MOST_VAPOUR, vapourPressure: fraction * pressure, pressure };
  return fail('vapour-exceeds-pressure', paths.own(moisture.by), detail);
}

/** Where the moisture was found beyond what its formulas are known for. */
export function moistureCautions({ moisture }: Vapour, { pressure: p, temperature: T }: State): readonly Caution[] {
  const at = moisture.by === 'relativeHumidity' ? T : moisture.temperature;
  const { temperature, pressure } = enhancementRange;
  const caution = (id: string, value: number, unit: string, limit: Caution['limit'], source: Source): Caution[] =>
    isInside(value, limit) ? [] : [{ id, verdict: 'caution', value, unit, limit, source }];
  return [
    ...caution('enhancement-temperature', at, 'K', temperature, enhancementSource),
    ...caution('enhancement-pressure', p, 'Pa', pressure, enhancementSource),
    ...(moisture.by === 'wetBulb'
      ? caution('psychrometer-pressure', p, 'Pa', psychrometerRange, psychrometerSource)
      : []),
  ];
}

/**
 * Water and steam on the saturation line: one of pressure and temperature gives the other.
 * Standard: IAPWS R7-97(2012), Eq. 30 and 31. Symbols: those of the release; SI.
 */
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import { boilingAt, bounds, lowestSaturationPressure, vapourPressureAt } from '../if97/place.ts';
import { criticalPressure, criticalTemperature } from '../if97/saturation.ts';
import { bothOf, type Parsed, type Paths, type State } from '../model.ts';

/** Wet steam cannot be further from its saturation temperature than instruments err (practice). */
const furthestFromLine = 5; // K

/**
 * Pressure and temperature as given; with a phase or a quality one of them is enough. Of wet steam the pressure governs.
 * Problems: field-missing, quality-of-liquid, no-saturation-pressure, no-saturation-temperature, wet-steam-off-line.
 */
export function saturatedState(parsed: Parsed, known: Partial<State>, paths: Paths): Outcome<State> {
  const { quality } = parsed.numbers;
  const { phase } = parsed.choices;
  if (quality !== undefined && (quality === 0 || phase === 'liquid'))
    return fail('quality-of-liquid', paths.own('quality'), { percent: 100 * quality });
  const { pressure, temperature } = known;
  const onLine =
    quality !== undefined || (phase !== undefined && (pressure === undefined || temperature === undefined));
  if (!onLine || (pressure === undefined && temperature === undefined)) return bothOf(known, paths);
  if (pressure === undefined) return byTemperature(known, paths);
  const boiling = boilingAt(pressure);
  if (boiling === undefined)
    return fail('no-saturation-pressure', paths.pressure, {
      pressure,
      lowest: lowestSaturationPressure,
      highest: criticalPressure,
    });
  if (temperature !== undefined && Math.abs(temperature - boiling) > furthestFromLine) {
    const detail = { pressure, temperature, saturationTemperature: boiling, furthest: furthestFromLine };
    return fail('wet-steam-off-line', paths.temperature, detail);
  }
  return ok({ pressure, temperature: boiling });
}

function byTemperature({ temperature }: Partial<State>, paths: Paths): Outcome<State> {
  if (temperature === undefined) throw new Error('saturated: expected a temperature, got none');
  const pressure = vapourPressureAt(temperature);
  if (pressure !== undefined) return ok({ pressure, temperature });
  const detail = { temperature, lowest: bounds.lowestTemperature, highest: criticalTemperature };
  return fail('no-saturation-temperature', paths.temperature, detail);
}

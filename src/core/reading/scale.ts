/** From the length that is read to the length that is: zero, growth of the scale's metal, resolution of its divisions. */
import type { Scale, ScaleMetal } from '../input/instrument.ts';
import type { Length, Temperature } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';
import { named, type Working } from '../quantity/working.ts';

/** Linear expansion of the metals that scales are made of, 1/K. */
const EXPANSION: Readonly<Record<ScaleMetal, { readonly perKelvin: number; readonly source: Source }>> = {
  brass: { perKelvin: 1.84e-5, source: { clause: 'NBS Monograph 8, brass scales', seen: 'memory' } },
  steel: { perKelvin: 1.15e-5, source: { clause: 'steel scales, custom of the trade', seen: 'practice' } },
};

/** The true length of what was read on a scale at a temperature. */
export function trueLength(read: number, { zero, metal }: Scale, temperature: Temperature): Length {
  const shown = read - zero;
  if (metal === undefined) return shown as Length;
  return (shown * (1 + EXPANSION[metal.name].perKelvin * (temperature - metal.trueAt))) as Length; // h (1 + a (t - t_s))
}

/** The working of a true length; none where zero and metal change nothing. */
export function scaleWorking(read: number, scale: Scale, temperature: Temperature): readonly Working[] {
  const { zero, metal } = scale;
  if (zero === 0 && metal === undefined) return [];
  const shown = [named('h_r', read, 'm', 'reading'), named('h_0', zero, 'm', 'zero-of-scale')];
  const value = trueLength(read, scale, temperature);
  if (metal === undefined) {
    const source: Source = { clause: 'zero with both sides at one pressure', seen: 'derived' };
    return [{ id: 'trueLength', symbol: 'h_s', formula: 'h_r - h_0', given: shown, value, unit: 'm', source }];
  }
  const { perKelvin, source } = EXPANSION[metal.name];
  const given = [
    ...shown,
    named('α_s', perKelvin, '1/K', 'expansion-of-scale'),
    named('T', temperature, 'K', 'temperature-of-scale'),
    named('T_s', metal.trueAt, 'K', 'temperature-scale-true'),
  ];
  const formula = '(h_r - h_0) * (1 + α_s * (T - T_s))';
  return [{ id: 'trueLength', symbol: 'h_s', formula, given, value, unit: 'm', source }];
}

/** Half a division at each meniscus that is read, rectangular; two standard uncertainties, m. JCGM 100:2008, 4.3.7. */
export const resolution = (division: number, menisci: 1 | 2): number =>
  (2 * Math.sqrt(menisci) * (division / 2)) / Math.sqrt(3); // 2 a/sqrt(3), a = half a division

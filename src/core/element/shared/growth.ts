/** Thermal growth of pipe and element between the temperature they were measured at and the line temperature. */
import { celsius, kelvin } from '../../quantity/constants.ts';
import type { Length, Temperature } from '../../quantity/kinds.ts';
import type { Source } from '../../quantity/source.ts';
import type { Given, Working } from '../../quantity/working.ts';
import { along } from './bracket.ts';
import { type Material, materials } from './materials.table.ts';

const reference = kelvin(20); // K; the mean coefficients count from 20 degC

/** The keys that the file may write. */
export const materialKeys: readonly string[] = materials.map(({ key }) => key);

/** The material of a key of the file; undefined when the table has none of that name. */
export const materialOf = (key: string): Material | undefined => materials.find((row) => row.key === key);

/** Mean expansion from 20 degC to `temperature`, 1/K; linear between the figures of the table, held outside. */
export const meanExpansion = (material: Material, temperature: Temperature): number =>
  along(material.celsius, material.expansion, celsius(temperature)) * 1e-6;

/** Whether the table reaches `temperature`; it counts from 20 degC, so that and its nearest figure are always reached. */
export const expansionKnown = (material: Material, temperature: Temperature): boolean => {
  const at = celsius(temperature);
  const [first, last] = [material.celsius[0] as number, material.celsius[material.celsius.length - 1] as number];
  return at >= Math.min(first, 20) && at <= Math.max(last, 20);
};

/** 1 + alpha(T) (T - 20 degC): the size at T over the size at 20 degC. */
const stretch = (material: Material, temperature: Temperature): number =>
  1 + meanExpansion(material, temperature) * (temperature - reference); // ISO 5167-1, 5.2 with mean coefficients

/**
 * A length at the temperature `to`, m, from the length as measured at `from`, through its size at 20 degC.
 * The inverse is the same call with the temperatures exchanged. Source: ISO 5167-1, 5.2.
 */
export const grow = (length: Length, material: Material, from: Temperature, to: Temperature): Length =>
  (from === to ? length : (length * stretch(material, to)) / stretch(material, from)) as Length;

/** What the working of a grown length is called: the symbol of the length, for example `D` or `d`, and its words. */
export interface Grown {
  readonly symbol: string;
  readonly words: string;
  readonly length: Length; // as measured
  readonly material: Material;
  readonly measuredAt: Temperature;
  readonly line: Temperature;
}

/** The working of `grow`. */
export const growthWorking = ({ symbol, words, length, material, measuredAt, line }: Grown): Working => {
  const atReference = measuredAt === reference;
  const top = `${symbol}_m * (1 + α_T * (T - T_20))`;
  const given: Given[] = [
    { symbol: `${symbol}_m`, value: length, unit: 'm', words: `${words}-as-measured` },
    { symbol: 'α_T', value: meanExpansion(material, line), unit: '1/K', words: 'mean-expansion' },
    { symbol: 'T', value: line, unit: 'K', words: 'temperature' },
    { symbol: 'T_20', value: reference, unit: 'K', words: 'reference-temperature' },
  ];
  if (!atReference) {
    given.push({
      symbol: 'α_m',
      value: meanExpansion(material, measuredAt),
      unit: '1/K',
      words: 'mean-expansion-measured',
    });
    given.push({ symbol: 'T_m', value: measuredAt, unit: 'K', words: 'temperature-measured' });
  }
  return {
    id: words,
    symbol,
    formula: atReference ? top : `${top} / (1 + α_m * (T_m - T_20))`, // ISO 5167-1, 5.2
    given,
    value: grow(length, material, measuredAt, line),
    unit: 'm',
    source: growthSource(material),
    ...(expansionKnown(material, line) ? {} : { remark: 'expansion-held' }),
  };
};

/** The relation is the standard's, the coefficient the table's; the working names both. */
const growthSource = (material: Material): Source => ({
  clause: `ISO 5167-1, 5.2; ${material.source.clause}`,
  seen: 'memory',
});

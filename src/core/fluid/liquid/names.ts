/** The liquids that can be named: their keys by family, and every spelling that is read. */

import { plainName } from '../model.ts';
import { solutes } from './electrolyte.table.ts';
import { glycols } from './inhibited-glycol.table.ts';
import { products } from './petroleum.ts';
import { pureLiquids } from './pure.table.ts';
import { mixtures } from './secondary.table.ts';

const namesOf = (rows: readonly { readonly name: string }[]): readonly string[] => rows.map(({ name }) => name);

/** Keys by family, in the order they are offered. */
export const liquidFamilies = {
  pure: namesOf(pureLiquids),
  mixture: [...namesOf(mixtures), ...namesOf(glycols)],
  solution: namesOf(solutes),
  petroleum: products,
} as const;

/** Other spellings in use, each with its key. */
const others: readonly (readonly [string, string])[] = [
  ['2-methylpropane', 'isobutane'],
  ['methyl ethyl ketone', 'methyl-ethyl-ketone'],
  ['1,2-propylene glycol', 'propylene-glycol'],
  ['isopropanol', '2-propanol'],
  ['sulphur dioxide', 'sulfur-dioxide'],
  ['hydrogen sulphide', 'hydrogen-sulfide'],
  ['n-butane', 'butane'],
  ['n-pentane', 'pentane'],
  ['n-hexane', 'hexane'],
  ['n-heptane', 'heptane'],
  ['n-octane', 'octane'],
  ['n-nonane', 'nonane'],
  ['n-decane', 'decane'],
  ['sulphuric acid', 'sulfuric-acid-solution'],
  ['caustic soda', 'sodium-hydroxide-solution'],
  ['caustic potash', 'potassium-hydroxide-solution'],
];

/** A solution is also known by its solute alone and by its formula, where no pure liquid has that name. */
const ofSolutes = solutes.flatMap(({ name, formula }) => {
  const solute = name.replace(/-solution$/, '');
  const taken = pureLiquids.some((pure) => pure.name === solute);
  return taken ? [] : [[solute, name] as const, [formula, name] as const];
});

/** Every spelling, by its plain name. */
export const liquidNames: ReadonlyMap<string, string> = new Map([
  ...Object.values(liquidFamilies).flatMap((keys) => keys.map((key) => [plainName(key), key] as const)),
  ...[...others, ...ofSolutes].map(([spelling, key]) => [plainName(spelling), key] as const),
]);

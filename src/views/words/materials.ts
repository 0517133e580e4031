/**
 * Names of the materials of pipe and element, by the key that the file uses, in the order of the list. Metals of one
 * family carry their UNS number; short, so that a narrow list shows them whole.
 */
import type { Choice } from './elements.ts';

export const materialChoices: readonly Choice[] = [
  { value: 'carbon-steel', label: 'Carbon steel' },
  { value: 'stainless-304', label: 'Stainless 304' },
  { value: 'stainless-316', label: 'Stainless 316' },
  { value: 'duplex', label: 'Duplex S32205' },
  { value: 'stainless-410', label: 'Stainless 410' },
  { value: 'stainless-430', label: 'Stainless 430' },
  { value: 'alloy-400', label: 'Nickel N04400' },
  { value: 'alloy-c276', label: 'Nickel N10276' },
  { value: 'alloy-c22', label: 'Nickel N06022' },
  { value: 'alloy-625', label: 'Nickel N06625' },
  { value: 'titanium', label: 'Titanium, grade 2' },
  { value: 'red-brass', label: 'Red brass C23000' },
  { value: 'free-cutting-brass', label: 'Brass C36000' },
  { value: 'bronze', label: 'Tin bronze' },
  { value: 'copper', label: 'Copper C12200' },
  { value: 'aluminium', label: 'Aluminium' },
  { value: 'grey-iron', label: 'Grey cast iron' },
  { value: 'ductile-iron', label: 'Ductile iron' },
  { value: 'pvc', label: 'PVC' },
  { value: 'cpvc', label: 'CPVC' },
  { value: 'pe', label: 'Polyethylene' },
  { value: 'pp', label: 'Polypropylene' },
  { value: 'ptfe', label: 'PTFE' },
  { value: 'grp', label: 'Glass-fibre plastic' },
];

/** Name of a material; a key that is not in the list stands as it is written. */
export const materialLabel = (key: string): string =>
  materialChoices.find((choice) => choice.value === key)?.label ?? key;

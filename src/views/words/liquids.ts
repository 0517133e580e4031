/** The liquids that can be named, in the families of the list, and what each needs beside its name. */
import type { Choice } from './elements.ts';
import { inhibited, mixtures, petroleum, pure, solutions } from './liquids.table.ts';

/** `needs` is what is asked beside the name: the density of an oil, the share of what is dissolved. */
export interface LiquidChoice extends Choice {
  readonly needs: 'nothing' | 'petroleum' | 'concentration' | 'concentration-and-basis';
}

const own: Readonly<Record<string, string>> = {
  '1-propanol': '1-Propanol',
  '2-propanol': '2-Propanol',
  '1-butanol': '1-Butanol',
  'p-xylene': 'p-Xylene',
  'o-xylene': 'o-Xylene',
  'methyl-tert-butyl-ether': 'Methyl tert-butyl ether',
};

/** 'ethylene-glycol-water' as 'Ethylene glycol and water'. */
function labelOf(value: string): string {
  const words = value
    .replace(/-water-inhibited$/, '-and-water-with-inhibitors')
    .replace(/-water$/, '-and-water')
    .replaceAll('-', ' ');
  return own[value] ?? words.charAt(0).toUpperCase() + words.slice(1);
}

const liquid =
  (needs: LiquidChoice['needs']) =>
  (value: string): LiquidChoice => ({ value, label: labelOf(value), needs });

const byLabel = (one: Choice, other: Choice): number => one.label.localeCompare(other.label, 'en');

/** Families in the order of the list, and the names in each by their letters. */
export const liquidGroups: readonly { readonly label: string; readonly choices: readonly LiquidChoice[] }[] = [
  { label: 'Petroleum', choices: petroleum.map(liquid('petroleum')) },
  {
    label: 'Mixtures and brines',
    choices: [...mixtures.map(liquid('concentration')), ...inhibited.map(liquid('concentration-and-basis'))].sort(
      byLabel,
    ),
  },
  { label: 'Solutions in water', choices: solutions.map(liquid('concentration')).sort(byLabel) },
  { label: 'Pure liquids', choices: pure.map(liquid('nothing')).sort(byLabel) },
];

const choices = liquidGroups.flatMap((group) => group.choices);

/** The liquid of a name of the file; undefined for one that is not in the list. */
export const liquidNamed = (name: string): LiquidChoice | undefined => choices.find(({ value }) => value === name);

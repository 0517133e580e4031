/** Names of the fluid models and phases, and the choices that each model asks for. */
import type { Solved } from '../../core/result/record.ts';
import type { Choice } from './elements.ts';
import { gasLabel } from './gases.ts';
import { liquidNamed } from './liquids.ts';

/** The fluids that can be chosen, in the order of the list. */
export const fluidChoices: readonly Choice[] = [
  { value: 'water', label: 'Water or steam' },
  { value: 'gas', label: 'Gas or mixture' },
  { value: 'air', label: 'Dry or moist air' },
  { value: 'liquid', label: 'Another liquid' },
  { value: 'stated', label: 'Stated figures' },
];

/** What settles the phase of water on the saturation line. */
export const phaseChoices: readonly Choice[] = [
  { value: 'liquid', label: 'Liquid' },
  { value: 'vapour', label: 'Vapour' },
];

/** A list of which the first stands where nothing is written. */
type UsualFirst = readonly [Choice, ...Choice[]];

/** Which side of a phase border is meant where a gas has two densities. */
export const gasPhaseChoices: UsualFirst = [
  { value: 'gas', label: 'Gas' },
  { value: 'liquid', label: 'Liquid' },
];

/** The equation of state of a mixture. */
export const equationChoices: UsualFirst = [
  { value: 'gerg-2008', label: 'GERG-2008' },
  { value: 'aga8-detail', label: 'AGA8 DETAIL' },
];

/** Where the temperature is measured, seen from the element. */
export const temperatureChoices: UsualFirst = [
  { value: 'upstream', label: 'Upstream' },
  { value: 'downstream', label: 'Downstream' },
];

/** What the fractions of a composition count. */
export const basisChoices: UsualFirst = [
  { value: 'mole', label: 'By mole' },
  { value: 'mass', label: 'By mass' },
];

/** What the share of what is dissolved counts. */
export const concentrationChoices: UsualFirst = [
  { value: 'mass', label: 'By mass' },
  { value: 'volume', label: 'By volume' },
];

/** What a base volume of moist air counts. */
export const baseBasisChoices: UsualFirst = [
  { value: 'wet', label: 'The moist air' },
  { value: 'dry', label: 'The dry air in it' },
];

/** How the viscosity is drawn between the rows of a table. */
export const viscosityRuleChoices: UsualFirst = [
  { value: 'andrade', label: 'ln μ straight in 1/T' },
  { value: 'walther', label: 'Walther line, ASTM D341' },
];

/** Names of the typical gases that a composition may start from. */
const presets: Readonly<Record<string, string>> = {
  'lean-gas': 'Lean gas',
  'rich-gas': 'Rich gas',
  'high-nitrogen-gas': 'High-nitrogen gas',
  'dry-air': 'Dry air',
  'hydrogen-blend': 'Hydrogen blend',
  biogas: 'Biogas',
};

export const presetLabel = (name: string): string => presets[name] ?? name;

/** Name of the fluid of a meter: water by its phase, a liquid by its own. A kind that is not known stands as written. */
export function fluidLabel(kind: string, phase?: Phase, name = ''): string {
  if (kind === 'water') return phase === 'vapour' ? 'Steam' : 'Water';
  if (kind === 'stated') return 'Stated fluid';
  if (kind === 'air') return 'Air';
  if (kind === 'gas') return name === '' ? 'Gas mixture' : gasLabel(name);
  if (kind === 'liquid') return name === '' ? 'Liquid by table' : (liquidNamed(name)?.label ?? sentenceCase(name));
  return kind;
}

const sentenceCase = (name: string): string => name.charAt(0).toUpperCase() + name.slice(1).replaceAll('-', ' ');

export type Phase = Solved['state']['phase'];

const phases: Readonly<Record<Phase, string>> = {
  liquid: 'liquid',
  vapour: 'vapour',
  supercritical: 'supercritical',
  gas: 'gas',
};

export const phaseWord = (phase: Phase): string => phases[phase];

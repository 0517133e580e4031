/** Names of the fluid models and phases. */
import type { Solved } from '../../core/result/record.ts';
import type { Choice } from './elements.ts';

/** The fluids that can be chosen, in the order of the list. */
export const fluidChoices: readonly Choice[] = [
  { value: 'water', label: 'Water or steam' },
  { value: 'stated', label: 'Stated density and viscosity' },
];

/** What settles the phase of water on the saturation line. */
export const phaseChoices: readonly Choice[] = [
  { value: 'liquid', label: 'Liquid' },
  { value: 'vapour', label: 'Vapour' },
];

/** Name of the fluid of a meter; water is named by its phase. A kind this version does not know stands as written. */
export function fluidLabel(kind: string, phase?: Phase): string {
  if (kind === 'water') return phase === 'vapour' ? 'Steam' : 'Water';
  if (kind === 'stated') return 'Stated fluid';
  return kind;
}

export type Phase = Solved['state']['phase'];

const phases: Readonly<Record<Phase, string>> = {
  liquid: 'liquid',
  vapour: 'vapour',
  supercritical: 'supercritical',
  gas: 'gas',
};

export const phaseWord = (phase: Phase): string => phases[phase];

/**
 * Base states in use: where gas volumes are counted. Each with the texts that are written into the project; its two
 * figures stand below the list where it is chosen.
 */
import { SITE_DEFAULTS } from '../../core/document/defaults.ts';
import type { Choice } from './elements.ts';

export interface BaseState {
  readonly temperature: string;
  readonly pressure: string;
}

const states: readonly (Choice & BaseState)[] = [
  { value: 'iso-13443', label: '15 °C, ISO 13443', temperature: '15 degC', pressure: '101.325 kPa(a)' },
  { value: 'din-1343', label: '0 °C, DIN 1343', temperature: '0 degC', pressure: '101.325 kPa(a)' },
  { value: '60F-14.696', label: '60 °F, 14.696 psi', temperature: '60 degF', pressure: '14.696 psi(a)' },
  { value: '60F-14.73', label: '60 °F, 14.73 psi', temperature: '60 degF', pressure: '14.73 psi(a)' },
  { value: '20C', label: '20 °C, 1 atm', temperature: '20 degC', pressure: '101.325 kPa(a)' },
  { value: '25C', label: '25 °C, 1 atm', temperature: '25 degC', pressure: '101.325 kPa(a)' },
];

export const baseStateChoices: readonly Choice[] = states;

/** The texts of a choice; undefined for one that is not in the list. */
export const baseStateOf = (value: string): BaseState | undefined => states.find((state) => state.value === value);

/** What stands where a project says nothing. */
export const usualBase: BaseState = {
  temperature: SITE_DEFAULTS.baseTemperature,
  pressure: SITE_DEFAULTS.basePressure,
};

/** The choice whose texts a project has; '' for a base state of its own. */
export function baseStateNamed({ temperature, pressure }: BaseState): string {
  const same = states.find((state) => state.temperature === temperature && state.pressure === pressure);
  return same?.value ?? '';
}

export const baseStateWords = {
  label: 'Base state',
  own: 'own base state',
  more: 'Base pressure and temperature',
  line: (temperature: string, pressure: string): string => `base: ${temperature}, ${pressure}`,
} as const;

/**
 * What the surface of a liquid makes of its level in a narrow tube. It cancels between two equal limbs; between a tube
 * and a well it does not, and belongs in the zero reading. Source: Jurin's law; constants at 20 degC on clean glass.
 */
import type { Caution } from '../fluid/contract.ts';
import type { GaugeLiquid } from '../input/instrument.ts';
import type { Source } from '../quantity/source.ts';

const JURIN: Source = { clause: 'capillary rise, 4 σ cos θ/(ρ g d)', seen: 'second-hand' };
const SURFACE = {
  water: { tension: 0.0728, contact: 0 }, // N/m, rad; water on clean glass, from memory
  mercury: { tension: 0.465, contact: (130 * Math.PI) / 180 }, // N/m, rad; Walshaw and Jobson, Ex. 3.2.1
} as const;
/** A level that is moved by more deserves a word, m. */
const NOTED = 1e-3;

/** Rise of a liquid in a tube of bore d, m; negative where it is pressed down. `contact` in rad. */
export const capillaryRise = (tension: number, contact: number, density: number, bore: number, g: number): number =>
  (4 * tension * Math.cos(contact)) / (density * g * bore); // Jurin's law

/** A caution where the tube of a well moves the level by more than a millimetre. */
export function capillaryCautions(liquid: GaugeLiquid, density: number, bore: number, g: number): readonly Caution[] {
  if (liquid !== 'water' && liquid !== 'mercury') return [];
  const { tension, contact } = SURFACE[liquid];
  const value = Math.abs(capillaryRise(tension, contact, density, bore, g));
  if (value <= NOTED) return [];
  return [{ id: 'capillary-level', verdict: 'caution', value, unit: 'm', limit: { max: NOTED }, source: JURIN }];
}

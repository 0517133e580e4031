/** What an equation in the Helmholtz energy makes of a composition alone: all that depends on neither T nor density. */
import type { Gathered } from './slots.ts';

/** A mixture: everything that does not depend on temperature and density. */
export interface Mixture extends Gathered {
  /** Mole fractions in the order of componentNames; they sum to 1. */
  readonly x: readonly number[];
  readonly molarMass: number; // kg/mol
  readonly R: number; // molar gas constant of the equation, J/(mol.K)
  readonly Tr: number; // reducing temperature, K
  readonly rhoR: number; // reducing density, mol/m3
}

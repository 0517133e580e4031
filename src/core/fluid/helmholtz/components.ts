/** The components of a gas mixture, in the one order in which every composition is listed. */
import { components } from './components.table.ts';

/** Names of the components, in the order in which every composition is listed. */
export const componentNames: readonly string[] = components.map(({ name }) => name);
/** Molar masses in the same order, kg/mol. */
export const molarMasses: readonly number[] = components.map(({ M }) => M / 1000);

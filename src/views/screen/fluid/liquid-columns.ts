/** The columns of the tables that a liquid may be given by. */
import { quantityKind } from '../field/quantities.ts';
import type { TableColumn } from './rows.ts';

const temperature: TableColumn = {
  name: 'temperature',
  label: 'Temperature',
  kind: quantityKind('upstream.temperature'),
};
const density: TableColumn = { name: 'density', label: 'Density', kind: quantityKind('fluid.density') };
const viscosity: TableColumn = { name: 'viscosity', label: 'Viscosity', kind: quantityKind('fluid.viscosity') };

export const LIQUID_TABLE: readonly TableColumn[] = [temperature, density, viscosity];
export const OIL_VISCOSITIES: readonly TableColumn[] = [temperature, viscosity];

/**
 * Liquids by name, by the user's table, or petroleum by its density. A liquid does not expand; its viscosity, vapour
 * pressure, bulk modulus and base density may be stated in place of what the formulation has.
 * Standard: none of its own, see liquids/, table.ts and petroleum.ts. Symbols: SI.
 */
import { fail, type Outcome, ok } from '../../quantity/outcome.ts';
import type { FluidState } from '../contract.ts';
import type { Conditions, FluidModel, Parsed } from '../model.ts';
import { liquidCautions } from './cautions.ts';
import type { Liquid } from './contract.ts';
import { electrolyte } from './electrolyte.ts';
import { figuresOf } from './figures.ts';
import { inhibitedGlycol, inhibitedTemperatures } from './inhibited-glycol.ts';
import { liquidNames } from './names.ts';
import { petroleum, products } from './petroleum.ts';
import { pureLiquid } from './pure.ts';
import { secondaryFluid } from './secondary.ts';
import { tableLiquid, type ViscosityRule } from './table.ts';
import { liquidRanges, liquidSources, liquidUncertainties, liquidWorking } from './working.ts';

/** The state of a liquid. Problems: those of finding the liquid, of its ranges and of the stated figures. */
function liquidState(parsed: Parsed, conditions: Conditions): Outcome<FluidState> {
  const found = liquidOf(parsed, conditions);
  if (!found.ok) return found;
  const figures = figuresOf(found.value, parsed, conditions);
  if (!figures.ok) return figures;
  const { density, viscosity, vapourPressure, baseDensity } = figures.value;
  const cautions = liquidCautions(found.value, figures.value, conditions);
  return ok({
    pressure: conditions.pressure,
    temperature: conditions.temperature,
    density,
    viscosity,
    phase: 'liquid',
    expands: false,
    ...(vapourPressure === undefined ? {} : { vapourPressure }),
    ...(baseDensity === undefined ? {} : { baseDensity }),
    ...(cautions.length === 0 ? {} : { cautions }),
    uncertainties: liquidUncertainties(found.value, figures.value),
    ranges: liquidRanges(found.value, figures.value),
    sources: liquidSources(found.value, figures.value),
    working: liquidWorking(found.value, figures.value, conditions),
  });
}

/** Which liquid the fields name. Problems: field-missing, liquid-twice, concentration-unused, concentration-basis. */
function liquidOf(parsed: Parsed, { paths: { own } }: Conditions): Outcome<Liquid> {
  const { choices, numbers, rows } = parsed;
  const { name } = choices;
  const concentration = own('concentration');
  if (name !== undefined && rows.table !== undefined) return fail('liquid-twice', own('table'));
  const basis = choices.concentrationBasis === 'volume' ? 'volume' : 'mass';
  const mixture =
    name === undefined
      ? undefined
      : (inhibitedGlycol(name, numbers.concentration, basis, concentration) ??
        withMass(basis, own) ??
        secondaryFluid(name, numbers.concentration, concentration) ??
        electrolyte(name, numbers.concentration, concentration));
  if (mixture !== undefined) return mixture;
  if (numbers.concentration !== undefined) return fail('concentration-unused', concentration);
  if (rows.table !== undefined) return tableLiquid(rows.table, ruleOf(choices.viscosityRule), own('table'));
  if (name === undefined) return fail('field-missing', own('name'));
  const product = products.find((candidate) => candidate === name);
  if (product !== undefined) return petroleum(product, parsed, own);
  const pure = pureLiquid(name);
  if (pure === undefined) throw new Error(`liquid: expected a name of the list, got ${name}`);
  return ok(pure);
}

const ruleOf = (rule: string | undefined): ViscosityRule => (rule === 'walther' ? 'walther' : 'andrade');

/** Only the tables of inhibited glycols convert a share of volume. */
const withMass = (basis: 'mass' | 'volume', own: (name: string) => string): Outcome<never> | undefined =>
  basis === 'mass' ? undefined : fail('concentration-basis', own('concentrationBasis'));

/** Liquids by name, table or petroleum density. */
export const liquid: FluidModel = {
  kind: 'liquid',
  fields: [
    { name: 'name', type: 'name', names: liquidNames, required: false },
    { name: 'concentration', type: 'share', required: false },
    { name: 'concentrationBasis', type: 'choice', choices: ['mass', 'volume'], required: false },
    {
      name: 'table',
      type: 'rows',
      columns: [
        { name: 'temperature', measures: ['temperature'] },
        { name: 'density', measures: ['density'] },
        { name: 'viscosity', measures: ['dynamic viscosity', 'kinematic viscosity'] },
      ],
      required: false,
    },
    { name: 'viscosityRule', type: 'choice', choices: ['andrade', 'walther'], required: false },
    { name: 'densityAt15', type: 'quantity', measures: ['density'], required: false },
    { name: 'densityAt60F', type: 'quantity', measures: ['density'], required: false },
    { name: 'apiGravity', type: 'number', required: false },
    {
      name: 'viscosities',
      type: 'rows',
      columns: [
        { name: 'temperature', measures: ['temperature'] },
        { name: 'viscosity', measures: ['dynamic viscosity', 'kinematic viscosity'] },
      ],
      required: false,
    },
    { name: 'viscosity', type: 'quantity', measures: ['dynamic viscosity', 'kinematic viscosity'], required: false },
    { name: 'vapourPressure', type: 'quantity', measures: ['absolute pressure', 'gauge pressure'], required: false },
    { name: 'bulkModulus', type: 'quantity', measures: ['pressure difference'], required: false },
    { name: 'baseDensity', type: 'quantity', measures: ['density'], required: false },
  ],
  state: liquidState,
  seams: ({ rows, choices }) => ({
    pressure: [],
    temperature: [
      ...[...(rows.table ?? []), ...(rows.viscosities ?? [])].map(({ temperature }) => temperature?.si as number),
      ...inhibitedTemperatures(choices.name),
    ],
  }),
};

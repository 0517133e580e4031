/** What the vectors of liquids put to the test: t in degC, concentration in per cent, viscosity in mPa.s. */
import type { FluidText } from '../../../src/core/document/project.ts';
import { glycols } from '../../../src/core/fluid/liquid/inhibited-glycol.table.ts';
import { stateOf } from '../../../src/core/fluid/state.ts';
import { interpolate } from '../../../src/core/numeric/interpolate.ts';
import { as } from '../../../src/core/quantity/brand.ts';
import { number } from './element.ts';

type Given = Readonly<Record<string, number | string>>;

/** The pressure of the laboratory, Pa. */
const atmosphere = as<'absolute pressure'>(101325);

function liquidState(given: Given): Record<string, number> {
  const temperature = as<'temperature'>(number(given, 't') + 273.15);
  const percent = given.massPercent ?? given.volumePercent;
  const fluid: FluidText = {
    kind: 'liquid',
    name: String(given.name),
    ...(percent === undefined ? {} : { concentration: `${percent} %` }),
    ...('volumePercent' in given ? { concentrationBasis: 'volume' } : {}),
  };
  const base = { pressure: atmosphere, temperature: as<'temperature'>(288.15) };
  const state = stateOf(fluid, { pressure: atmosphere, temperature }, base, atmosphere);
  if (!state.ok) throw new Error(`expected a state, got ${JSON.stringify(state.problems)}`);
  return { rho: state.value.density, mu: 1000 * state.value.viscosity };
}

/** Mass per cent of a volume per cent, by the conversion of the tables. */
function glycolMass(given: Given): Record<string, number> {
  const row = glycols.find(({ name }) => name === given.name);
  if (row === undefined) throw new Error(`expected an inhibited glycol, got ${given.name}`);
  return { mass: interpolate(row.massOfVolume, number(given, 'volumePercent')) };
}

export const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = {
  'liquid-state': liquidState,
  'glycol-state': (given) => ({ ...liquidState(given), ...glycolMass(given) }),
};

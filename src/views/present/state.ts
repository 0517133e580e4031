/** The fluid upstream: pressure and temperature as written, the properties as found. */
import type { Solved } from '../../core/result/record.ts';
import { overrideWords } from '../words/fluid-forms.ts';
import type { Role } from '../words/print.ts';
import { stateLabels } from '../words/rows.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { Row } from './model.ts';
import { pressureMeasures } from './units.ts';

type Id = keyof typeof stateLabels;

const symbols: Readonly<Record<Id, string>> = {
  pressure: 'p_1',
  temperature: 'T_1',
  density: 'ρ_1',
  viscosity: 'μ_1',
  isentropicExponent: 'κ',
  compressibility: 'Z',
  vapourPressure: 'p_v',
  saturationTemperature: 'T_s',
  baseDensity: 'ρ_b',
  molarMass: 'M',
  relativeDensity: 'd',
  quality: 'x',
};

/** How sure the formulation of a figure is, where it says so. */
function noteOn(id: string, { uncertainty_percent: known }: Solved['state'], at: Context): Pick<Row, 'note'> {
  const percent = known?.[id];
  return percent === undefined ? {} : { note: `±\u202f${at.value(percent, 'uncertainty').text}` };
}

export function stateRows(at: Context, result: Solved): readonly Row[] {
  const { state, working } = result;
  const { upstream } = at.meter;
  const liquid = state.phase === 'liquid';
  const given = (id: Id, value: Row['value']): Row => ({ id, label: stateLabels[id], symbol: symbols[id], value });
  const found = (id: Id, si: number | undefined, role: Role): readonly Row[] => {
    if (si === undefined) return [];
    const row = { ...given(id, at.value(si, role)), ...noteOn(id, state, at) };
    const line = working.find((one) => one.id === id);
    if (line === undefined) return [row];
    const own = state.overridden?.includes(id);
    return [
      own ? { ...row, working: id, own, note: overrideWords.note } : { ...row, working: id, cited: cited(line.source) },
    ];
  };
  return [
    given('pressure', at.given(upstream?.pressure, pressureMeasures, state.pressure_Pa, 'pressure')),
    given('temperature', at.given(upstream?.temperature, ['temperature'], state.temperature_K, 'temperature')),
    ...found('quality', state.quality === undefined ? undefined : 100 * state.quality, 'percent'),
    ...found('density', state.density_kg_m3, 'density'),
    ...found('viscosity', state.viscosity_Pa_s, 'viscosity'),
    ...(liquid ? [] : found('isentropicExponent', state.isentropicExponent, 'number')),
    ...(liquid ? [] : found('compressibility', state.compressibility, 'number')),
    ...(liquid ? found('vapourPressure', state.vapourPressure_Pa, 'pressure') : []),
    ...found('saturationTemperature', state.saturationTemperature_K, 'temperature'),
    ...found('baseDensity', state.baseDensity_kg_m3, 'density'),
    ...(state.phase === 'gas' ? found('molarMass', state.molarMass_kg_mol, 'molarMass') : []),
    ...found('relativeDensity', state.relativeDensity, 'factor'),
  ];
}

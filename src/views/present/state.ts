/** The fluid upstream: pressure and temperature as written, the properties as found. */
import type { Solved } from '../../core/result/record.ts';
import { boundsText } from '../words/findings.ts';
import { overrideWords } from '../words/fluid-forms.ts';
import type { Role } from '../words/print.ts';
import { asDownstream, fromDownstream, holdsFor, stateLabels } from '../words/rows.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { Row } from './model.ts';
import { pressureMeasures } from './units.ts';

type Id = keyof typeof stateLabels;
/** What a fluid's state is shown from: a meter, or a survey. */
type Stated = Pick<Solved, 'state' | 'working'>;

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

/** As written, or as found from what was measured behind the element. */
function temperatureRow(at: Context, { state, working }: Stated): Row {
  const { downstream, temperature_K: upstream } = state;
  const written = (si: number) => at.given(at.meter.upstream?.temperature, ['temperature'], si, 'temperature');
  const row = { id: 'temperature', label: stateLabels.temperature, symbol: symbols.temperature } as const;
  if (downstream === undefined) return { ...row, value: written(upstream) };
  if (downstream.loss_Pa === undefined) return { ...row, value: written(upstream), note: asDownstream };
  const source = working.find(({ id }) => id === 'temperature')?.source;
  return {
    ...row,
    value: at.value(upstream, 'temperature'),
    note: fromDownstream(written(downstream.measured_K).text),
    working: 'temperature',
    ...(source === undefined ? {} : { cited: cited(source) }),
  };
}

/** Where the formulation of a figure holds. */
function rangeOn(id: string, { ranges }: Solved['state'], { print }: Context): Pick<Row, 'range'> {
  const range = ranges?.[id];
  if (range === undefined) return {};
  const { minTemperature_K, maxTemperature_K, minPressure_Pa, maxPressure_Pa } = range;
  const bounds = (min: number | undefined, max: number | undefined, role: Role): string =>
    boundsText({ ...(min === undefined ? {} : { min }), ...(max === undefined ? {} : { max }) }, (bound) =>
      print.limit(bound, role),
    );
  const temperature = bounds(minTemperature_K, maxTemperature_K, 'temperature');
  const pressure = bounds(minPressure_Pa, maxPressure_Pa, 'pressure');
  return { range: holdsFor([temperature, pressure].filter((text) => text !== '')) };
}

export function stateRows(at: Context, result: Stated): readonly Row[] {
  const { state, working } = result;
  const { upstream } = at.meter;
  const liquid = state.phase === 'liquid';
  const given = (id: Id, value: Row['value']): Row => ({ id, label: stateLabels[id], symbol: symbols[id], value });
  const found = (id: Id, si: number | undefined, role: Role): readonly Row[] => {
    if (si === undefined) return [];
    const row = { ...given(id, at.value(si, role)), ...noteOn(id, state, at), ...rangeOn(id, state, at) };
    const line = working.find((one) => one.id === id);
    if (line === undefined) return [row];
    const own = state.overridden?.includes(id);
    return [
      own ? { ...row, working: id, own, note: overrideWords.note } : { ...row, working: id, cited: cited(line.source) },
    ];
  };
  return [
    given('pressure', at.given(upstream?.pressure, pressureMeasures, state.pressure_Pa, 'pressure')),
    temperatureRow(at, result),
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

/** The working of the water in air: what stands over water or ice, the mole fraction, the partial pressure. */
import { type Given, named, type Working } from '../../quantity/working.ts';
import { psychrometerSource, type Vapour } from './moisture.ts';
import type { Saturated } from './saturation.ts';

/** Saturation pressure, enhancement factor, mole fraction and partial pressure of the vapour. */
export function vapourWorking(vapour: Vapour, p: Given, T: Given): readonly Working[] {
  const { fraction, saturated } = vapour;
  const read = reading(vapour, T);
  const ps = named('p_s', saturated.pressure, 'Pa(a)', 'saturation-pressure');
  const f = named('f', saturated.factor, '', 'enhancement-factor');
  return [
    ...saturationWorking(saturated, read.at, p),
    {
      id: 'water-fraction',
      symbol: 'x_v',
      formula: read.formula,
      given: [...read.given, f, ps, p],
      value: fraction,
      unit: '',
      source: read.source,
    },
    {
      id: 'vapour-partial-pressure',
      symbol: 'p_w',
      formula: 'x_v * p_1',
      given: [named('x_v', fraction, '', 'water-fraction'), p],
      value: fraction * p.value,
      unit: 'Pa(a)',
      source: { clause: 'partial pressure: mole fraction times pressure', seen: 'derived' },
    },
  ];
}

/** What stands over water or ice at the temperature `at`, and how the air raises it. */
const saturationWorking = ({ pressure, factor, sources, remark }: Saturated, at: Given, p: Given): Working[] => [
  {
    id: 'saturation-pressure',
    symbol: 'p_s',
    given: [at],
    value: pressure,
    unit: 'Pa(a)',
    source: sources.pressure,
    remark,
  },
  {
    id: 'enhancement-factor',
    symbol: 'f',
    given: [at, p],
    value: factor,
    unit: '',
    source: sources.factor,
    remark: 'enhancement-factor',
  },
];

type Reading = Required<Pick<Working, 'formula' | 'given' | 'source'>> & { readonly at: Given };

/** The formula of the mole fraction for what was read, and the temperature at which the vapour is saturated. */
function reading({ moisture, psychrometer }: Vapour, T: Given): Reading {
  const cipm = { clause: 'CIPM-2007, Metrologia 45 (2008) 149, Eq. A1.3', seen: 'second-hand' } as const;
  if (moisture.by === 'relativeHumidity') {
    const given = [named('h', moisture.h, '', 'relative-humidity')];
    return { formula: 'h * f * p_s / p_1', given, source: cipm, at: T };
  }
  if (moisture.by === 'dewPoint') {
    const at = named('T_d', moisture.temperature, 'K', 'dew-point');
    return { formula: 'f * p_s / p_1', given: [], source: cipm, at };
  }
  if (psychrometer === undefined) throw new Error('expected a psychrometer coefficient with a wet bulb, got none');
  const at = named('T_w', moisture.temperature, 'K', 'wet-bulb');
  const given = [named('A', psychrometer, '1/K', 'psychrometer-coefficient'), T, at];
  return { formula: 'f * p_s / p_1 - A * (T_1 - T_w)', given, source: psychrometerSource, at };
}

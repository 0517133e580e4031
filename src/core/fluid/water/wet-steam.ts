/**
 * Wet steam of a stated quality, as one even mixture of both phases.
 * Standard: IAPWS R7-97(2012) for either phase; the mixture by mass. Symbols: x is the mass fraction of vapour; SI.
 */
import type { Density } from '../../quantity/kinds.ts';
import type { Source } from '../../quantity/source.ts';
import type { Working } from '../../quantity/working.ts';
import type { Caution, FluidState } from '../contract.ts';

const mixture: Source = {
  clause: 'IAPWS R7-97(2012) for both phases, mixed by mass at the stated quality',
  seen: 'derived',
};
const custom: Source = {
  clause: 'wet steam taken as saturated vapour for expansibility and viscosity',
  seen: 'practice',
};

/** ρ = 1/((1 - x)/ρ' + x/ρ''), kg/m3: the volumes of both phases add. */
export const mixtureDensity = (x: number, liquid: number, vapour: number): Density =>
  (1 / ((1 - x) / liquid + x / vapour)) as Density;

/**
 * The state of wet steam from its saturated vapour and the density of its saturated liquid. Isentropic exponent and
 * viscosity stay those of the vapour, with a finding, as neither is defined for the mixture; speed of sound,
 * compressibility factor and Joule-Thomson coefficient are left out.
 */
export function wetSteam(vapour: FluidState, liquid: Density, quality: number): FluidState {
  const {
    compressibility: _,
    speedOfSound: _w,
    jouleThomson: _j,
    phaseForced: _f,
    uncertainties: _u,
    ...kept
  } = vapour;
  const density = mixtureDensity(quality, liquid, vapour.density);
  return {
    ...kept,
    density,
    quality,
    sources: { ...vapour.sources, density: mixture },
    working: vapour.working.flatMap((line) => workingOf(line, { density, vapour: vapour.density, liquid, quality })),
    ...(quality < 1 ? { cautions: [cautionOf(quality)] } : {}),
  };
}

const cautionOf = (quality: number): Caution => ({
  id: 'wet-steam',
  verdict: 'caution',
  ofPhase: true,
  value: 100 * quality,
  unit: '%',
  limit: { min: 100 },
  source: custom,
});

interface Mixed {
  readonly density: number;
  readonly vapour: number;
  readonly liquid: number;
  readonly quality: number;
}

/** A line of the vapour as it stands for the mixture. */
function workingOf(line: Working, { density, vapour, liquid, quality }: Mixed): readonly Working[] {
  if (line.id === 'compressibility' || line.id === 'speedOfSound') return [];
  if (line.id === 'density') {
    const given = [
      { symbol: 'x', value: quality, unit: '', words: 'quality' },
      { symbol: 'ρ_l', value: liquid, unit: 'kg/m3', words: 'density-saturated-liquid' },
      { symbol: 'ρ_v', value: vapour, unit: 'kg/m3', words: 'density-saturated-vapour' },
    ];
    const formula = '1 / ((1 - x) / ρ_l + x / ρ_v)';
    return [{ id: line.id, symbol: line.symbol, formula, given, value: density, unit: line.unit, source: mixture }];
  }
  if (line.id !== 'viscosity' && line.id !== 'isentropicExponent') return [line];
  const { formula: _, ...plain } = line;
  return [{ ...plain, given: [], remark: 'wet-steam-vapour' }];
}

/** The working of a traverse: the velocity at its strongest reading, and the flow from the mean of the velocities. */
import type { TraverseInput } from '../input/traverse.ts';
import type { Source } from '../quantity/source.ts';
import { type Given, named as given, type Working } from '../quantity/working.ts';
import type { Flow, Measured, Survey } from '../traverse/survey.ts';
import { indicatedVelocity, pointVelocity } from '../traverse/velocity.ts';

const CLAUSE: Source = { clause: 'ISO 3966, clause 8', seen: 'derived' };
const FLOW: Source = { clause: 'continuity', seen: 'derived' };

/** Nothing before something is read, no flow before all of it is. */
export function traverseWorking(input: TraverseInput, survey: Survey): readonly Working[] {
  const [first, ...rest] = survey.measured;
  if (first === undefined) return [];
  const strongest = rest.reduce((most, point) => (point.differential > most.differential ? point : most), first);
  return [
    ...(strongest.differential > 0 ? [velocityWorking(input, survey, strongest)] : []),
    ...(survey.flow === undefined ? [] : flowWorking(survey, survey.flow, input)),
  ];
}

/** Without the corrections of the point, which are a choice. */
function velocityWorking({ probe }: TraverseInput, { state }: Survey, { differential }: Measured): Working {
  const indicated = indicatedVelocity(differential, state);
  const velocity = pointVelocity(indicated, probe);
  const kappa = state.expands ? state.isentropicExponent : undefined;
  const gas = kappa !== undefined && kappa !== 1;
  return {
    id: 'traverse-velocity',
    symbol: 'v',
    formula: gas ? 'K * sqrt(2 * κ / (κ - 1) * p / ρ_1 * ((1 + Δp / p)^((κ - 1) / κ) - 1))' : 'K * sqrt(2 * Δp / ρ_1)',
    given: [
      given('K', velocity / indicated, '', 'probe-coefficient'),
      given('Δp', differential, 'Pa', 'differential'),
      given('ρ_1', state.density, 'kg/m3', 'duct-density'),
      ...(gas
        ? [given('κ', kappa, '', 'isentropic-exponent'), given('p', state.pressure, 'Pa(a)', 'static-pressure')]
        : []),
    ],
    value: velocity,
    unit: 'm/s',
    source: CLAUSE,
    remark: 'traverse-strongest',
  };
}

function flowWorking({ plan, state, measured }: Survey, flow: Flow, { corrections }: TraverseInput): Working[] {
  const weighted = measured.reduce((sum, { weight, velocity }) => sum + weight * velocity, 0);
  const density = given('ρ_1', state.density, 'kg/m3', 'duct-density');
  const mass = given('q_m', flow.massFlow, 'kg/s', 'mass-flow');
  const mean: Working = {
    id: 'traverse-mean',
    symbol: 'V',
    formula: corrections.wall === undefined ? 'v_w' : 'F * v_w',
    given: [
      ...(corrections.wall === undefined ? [] : [given('F', corrections.wall, '', 'wall-factor')]),
      given('v_w', weighted, 'm/s', 'weighted-velocity'),
    ],
    value: flow.meanVelocity,
    unit: 'm/s',
    source: plan.source,
  };
  const area = given('A', plan.area, 'm2', 'duct-area');
  const volume: Working = {
    id: 'duct-volume-flow',
    symbol: 'q_V',
    formula: 'A * V',
    given: [area, given('V', flow.meanVelocity, 'm/s', 'mean-velocity')],
    value: flow.volumeFlow,
    unit: 'm3/s',
    source: FLOW,
  };
  const massLine: Working = {
    id: 'mass-flow',
    symbol: 'q_m',
    formula: 'ρ_1 * q_V',
    given: [density, given('q_V', flow.volumeFlow, 'm3/s', 'duct-volume-flow')],
    value: flow.massFlow,
    unit: 'kg/s',
    source: FLOW,
  };
  return [mean, volume, massLine, ...baseWorking(flow, mass, state)];
}

function baseWorking({ baseVolumeFlow }: Flow, mass: Given, state: Survey['state']): Working[] {
  if (baseVolumeFlow === undefined || state.baseDensity === undefined) return [];
  return [
    {
      id: 'base-volume-flow',
      symbol: 'q_Vb',
      formula: 'q_m / ρ_b',
      given: [mass, given('ρ_b', state.baseDensity, 'kg/m3', 'base-density')],
      value: baseVolumeFlow,
      unit: 'm3/s',
      source: state.sources.baseDensity ?? state.sources.density,
    },
  ];
}

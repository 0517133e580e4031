/** The working of every reported figure of one flow, in the order of the calculation. */

import { approachFactor } from '../element/shared/approach.ts';
import type { Source } from '../quantity/source.ts';
import { type Given, named as given, type Working } from '../quantity/working.ts';
import { type Meter, type Operation, velocityOf } from '../solve/equation.ts';
import { type Budget, EQUATION, isKnown, type TermName } from '../uncertainty/iso5167.ts';
import { barEquation, barUncertaintyWorking } from './bar-working.ts';
import { termOf } from './budget-term.ts';

const iso = (clause: string, seen: Source['seen'] = 'read'): Source => ({ clause: `ISO 5167-1:2022, ${clause}`, seen });

/** Whether the flow was found from the differential, or the differential from the flow. */
export type Direction = 'flow' | 'differential';

/** The lines of one flow, in SI; a line that the fluid or the direction does not need is left out. */
export function pointWorking(meter: Meter, operation: Operation, direction: Direction, budget: Budget): Working[] {
  const { primary, geometry, state } = meter;
  const { reynolds, coefficient, differential } = operation;
  const expansion = differential / state.pressure;
  const held = operation.heldAt;
  const bar = primary.insertion !== undefined;
  const equation = bar ? barEquation : boreEquation;
  const loss = primary.working.loss?.(geometry, coefficient, reynolds, differential);
  const discharge = primary.working.coefficient(geometry, Math.max(reynolds, held ?? 0));
  return [
    ...(bar ? [] : [ratioWorking(meter), approachWorking(meter)]),
    reynoldsWorking(meter, operation),
    held === undefined ? discharge : { ...discharge, remark: 'coefficient-held' },
    ...(state.expands && state.isentropicExponent !== undefined
      ? [primary.working.expansibility(geometry.ratio, state.isentropicExponent, expansion)]
      : []),
    equation[direction](meter, operation),
    volumeWorking(meter, operation),
    ...(state.baseDensity === undefined
      ? []
      : [baseWorking(operation, state.baseDensity, state.sources.baseDensity ?? state.sources.density)]),
    velocityWorking(meter, operation),
    ...(loss === undefined ? [] : [loss]),
    ...(isKnown(budget)
      ? [bar ? barUncertaintyWorking(budget, meter) : uncertaintyWorking(budget, geometry.ratio)]
      : []),
  ];
}

const common = { D: 'pipe-bore', d: 'element-bore' } as const;

const ratioWorking = ({ geometry: { pipe, bore, ratio } }: Meter): Working => ({
  id: 'diameter-ratio',
  symbol: 'β',
  formula: 'd / D',
  given: [given('d', bore, 'm', common.d), given('D', pipe, 'm', common.D)],
  value: ratio,
  unit: '',
  source: iso('3.2.4'),
});

const approachWorking = ({ geometry: { ratio } }: Meter): Working => ({
  id: 'approach-factor',
  symbol: 'E',
  formula: '1 / sqrt(1 - β^4)',
  given: [given('β', ratio, '', 'diameter-ratio')],
  value: approachFactor(ratio),
  unit: '',
  source: iso('Formula (1)'),
});

const reynoldsWorking = ({ geometry: { pipe }, state }: Meter, { massFlow, reynolds }: Operation): Working => ({
  id: 'reynolds-pipe',
  symbol: 'Re_D',
  formula: '4 * q_m / (π * μ_1 * D)',
  given: [
    given('q_m', massFlow, 'kg/s', 'mass-flow'),
    given('μ_1', state.viscosity, 'Pa.s', 'viscosity'),
    given('D', pipe, 'm', common.D),
  ],
  value: reynolds,
  unit: '',
  source: iso('3.3.2'),
});

/** Symbols of Formula (1), shared by both ways of reading it. */
const equationGiven = ({ geometry, state }: Meter, { coefficient, epsilon }: Operation): Given[] => [
  given('C', coefficient, '', 'discharge-coefficient'),
  given('E', approachFactor(geometry.ratio), '', 'approach-factor'),
  ...(state.expands ? [given('ε', epsilon, '', 'expansibility')] : []),
  given('d', geometry.bore, 'm', common.d),
  given('ρ_1', state.density, 'kg/m3', 'density'),
];

const flowWorking = (meter: Meter, operation: Operation): Working => ({
  id: 'mass-flow',
  symbol: 'q_m',
  formula: `C * E * ${meter.state.expands ? 'ε * ' : ''}π / 4 * d^2 * sqrt(2 * Δp * ρ_1)`,
  given: [...equationGiven(meter, operation), given('Δp', operation.differential, 'Pa', 'differential')],
  value: operation.massFlow,
  unit: 'kg/s',
  source: iso('Formula (1)'),
});

const differentialWorking = (meter: Meter, operation: Operation): Working => ({
  id: 'differential',
  symbol: 'Δp',
  formula: `(4 * q_m / (C * E * ${meter.state.expands ? 'ε * ' : ''}π * d^2))^2 / (2 * ρ_1)`,
  given: [...equationGiven(meter, operation), given('q_m', operation.massFlow, 'kg/s', 'mass-flow')],
  value: operation.differential,
  unit: 'Pa',
  source: iso('Formula (1)'),
});

const boreEquation = { flow: flowWorking, differential: differentialWorking } as const;

const volumeWorking = ({ state }: Meter, { massFlow }: Operation): Working => ({
  id: 'volume-flow',
  symbol: 'q_V',
  formula: 'q_m / ρ_1',
  given: [given('q_m', massFlow, 'kg/s', 'mass-flow'), given('ρ_1', state.density, 'kg/m3', 'density')],
  value: massFlow / state.density,
  unit: 'm3/s',
  source: iso('Formula (2)'),
});

const baseWorking = ({ massFlow }: Operation, density: number, source: Source): Working => ({
  id: 'base-volume-flow',
  symbol: 'q_Vb',
  formula: 'q_m / ρ_b',
  given: [given('q_m', massFlow, 'kg/s', 'mass-flow'), given('ρ_b', density, 'kg/m3', 'base-density')],
  value: massFlow / density,
  unit: 'm3/s',
  source,
});

const velocityWorking = ({ geometry: { pipe }, state }: Meter, { massFlow }: Operation): Working => ({
  id: 'velocity',
  symbol: 'V',
  formula: '4 * q_m / (π * ρ_1 * D^2)',
  given: [
    given('q_m', massFlow, 'kg/s', 'mass-flow'),
    given('ρ_1', state.density, 'kg/m3', 'density'),
    given('D', pipe, 'm', common.D),
  ],
  value: velocityOf(massFlow, state.density, pipe),
  unit: 'm/s',
  source: { clause: 'continuity', seen: 'derived' },
});

const uncertaintyWorking = (budget: Budget, ratio: number): Working => {
  const percent = (name: TermName) => termOf(budget, name).percent;
  return {
    id: 'uncertainty',
    symbol: 'U_q',
    formula:
      'sqrt(U_C^2 + U_ε^2 + (2 * β^4 / (1 - β^4))^2 * U_D^2 + (2 / (1 - β^4))^2 * U_d^2 + U_Δp^2 / 4 + U_ρ^2 / 4)',
    given: [
      given('β', ratio, '', 'diameter-ratio'),
      given('U_C', percent('C'), '%', 'uncertainty-coefficient'),
      given('U_ε', percent('epsilon'), '%', 'uncertainty-expansibility'),
      given('U_D', percent('pipe'), '%', 'uncertainty-pipe'),
      given('U_d', percent('bore'), '%', 'uncertainty-bore'),
      given('U_Δp', percent('differential'), '%', 'uncertainty-differential'),
      given('U_ρ', percent('density'), '%', 'uncertainty-density'),
    ],
    value: budget.expandedPercent,
    unit: '%',
    source: EQUATION,
    ...(budget.terms.some(({ stated }) => !stated) ? { remark: unstatedRemark(budget) } : {}),
  };
};

/** Which terms the user left to the standard's allowance, and which are left out. */
function unstatedRemark(budget: Budget): string {
  const open = new Set(budget.terms.filter(({ stated }) => !stated).map(({ name }) => name));
  const allowance = open.has('pipe') || open.has('bore');
  const leftOut = open.has('differential') || open.has('density');
  if (allowance && leftOut) return 'uncertainty-allowance-and-gaps';
  return allowance ? 'uncertainty-allowance' : 'uncertainty-gaps';
}

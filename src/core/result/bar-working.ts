/** The working of an averaging pitot where it leaves that of an element with a bore: its equation and its uncertainty. */
import type { Source } from '../quantity/source.ts';
import { type Given, named as given, type Working } from '../quantity/working.ts';
import type { Meter, Operation } from '../solve/equation.ts';
import type { Budget, TermName } from '../uncertainty/iso5167.ts';
import { termOf } from './budget-term.ts';

const equation: Source = {
  clause: 'Bernoulli’s equation between the ports, with the K of the maker’s sheet',
  seen: 'derived',
};
const propagation: Source = { clause: 'law of propagation, JCGM 100, on the equation of the flow', seen: 'derived' };

/** The area that K counts: a symbol of its own where it is not that of the pipe. */
const areaOf = ({ primary, geometry }: Meter): { readonly formula: string; readonly given: Given } => {
  const area = primary.insertion?.area?.(geometry.pipe);
  if (area === undefined) return { formula: 'π / 4 * D^2', given: given('D', geometry.pipe, 'm', 'pipe-bore') };
  return { formula: 'A', given: given('A', area.value, 'm2', 'clear-area') };
};

const common = (meter: Meter, { coefficient, epsilon }: Operation): Given[] => [
  given('K', coefficient, '', 'flow-coefficient'),
  ...(meter.state.expands ? [given('ε', epsilon, '', 'expansibility')] : []),
  areaOf(meter).given,
  given('ρ_1', meter.state.density, 'kg/m3', 'density'),
];

const flowWorking = (meter: Meter, operation: Operation): Working => ({
  id: 'mass-flow',
  symbol: 'q_m',
  formula: `K * ${meter.state.expands ? 'ε * ' : ''}${areaOf(meter).formula} * sqrt(2 * Δp * ρ_1)`,
  given: [...common(meter, operation), given('Δp', operation.differential, 'Pa', 'differential')],
  value: operation.massFlow,
  unit: 'kg/s',
  source: equation,
});

const differentialWorking = (meter: Meter, operation: Operation): Working => ({
  id: 'differential',
  symbol: 'Δp',
  formula: `(q_m / (K * ${meter.state.expands ? 'ε * ' : ''}${areaOf(meter).formula}))^2 / (2 * ρ_1)`,
  given: [...common(meter, operation), given('q_m', operation.massFlow, 'kg/s', 'mass-flow')],
  value: operation.differential,
  unit: 'Pa',
  source: equation,
});

/** The equation read both ways. */
export const barEquation = { flow: flowWorking, differential: differentialWorking } as const;

/** No bore, and D by its share of the area: twice where K counts the whole pipe. */
export function barUncertaintyWorking(budget: Budget, { primary, geometry }: Meter): Working {
  const percent = (name: TermName) => termOf(budget, name).percent;
  const area = primary.insertion?.area?.(geometry.pipe);
  const sensitivity = area === undefined ? '2' : '(1 + π * D^2 / (4 * A))';
  return {
    id: 'uncertainty',
    symbol: 'U_q',
    formula: `sqrt(U_K^2 + U_ε^2 + (${sensitivity} * U_D)^2 + U_Δp^2 / 4 + U_ρ^2 / 4)`,
    given: [
      ...(area === undefined
        ? []
        : [given('D', geometry.pipe, 'm', 'pipe-bore'), given('A', area.value, 'm2', 'clear-area')]),
      given('U_K', percent('C'), '%', 'uncertainty-flow-coefficient'),
      given('U_ε', percent('epsilon'), '%', 'uncertainty-expansibility'),
      given('U_D', percent('pipe'), '%', 'uncertainty-pipe'),
      given('U_Δp', percent('differential'), '%', 'uncertainty-differential'),
      given('U_ρ', percent('density'), '%', 'uncertainty-density'),
    ],
    value: budget.expandedPercent,
    unit: '%',
    source: propagation,
    ...(budget.terms.some(({ stated }) => !stated) ? { remark: 'uncertainty-left-out' } : {}),
  };
}

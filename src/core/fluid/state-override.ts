/** Single figures of a state that the user puts in place of the model's. */
import { at } from '../input/form.ts';
import type { AbsolutePressure, Density, DynamicViscosity } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import type { Working } from '../quantity/working.ts';
import type { FluidState } from './contract.ts';
import type { FluidField, Parsed } from './model.ts';
import { parseFields } from './state-fields.ts';
import { byUser, statedLine } from './working.ts';

const fields: readonly FluidField[] = [
  { name: 'density', type: 'quantity', measures: ['density'], required: false },
  { name: 'viscosity', type: 'quantity', measures: ['dynamic viscosity', 'kinematic viscosity'], required: false },
  { name: 'isentropicExponent', type: 'number', required: false },
  { name: 'vapourPressure', type: 'quantity', measures: ['absolute pressure', 'gauge pressure'], required: false },
];

/** What an isentropic exponent can be (practice), as for a stated fluid. */
const exponentBounds = { min: 0.5, max: 10 } as const;

const symbols = { density: 'ρ_1', viscosity: 'μ_1', isentropicExponent: 'κ', vapourPressure: 'p_v' } as const;
const units = { density: 'kg/m3', viscosity: 'Pa.s', isentropicExponent: '', vapourPressure: 'Pa(a)' } as const;

type Name = keyof typeof symbols;
type Figures = Readonly<Partial<Record<Name, number>>>;

/** Reads the group `override` of a fluid. Problems: group-expected, those of the fields, isentropic-exponent-implausible. */
export function readOverride(fluid: object, atmosphere: AbsolutePressure, field: string): Outcome<Parsed | undefined> {
  const path = `${field}.override`;
  const written = at(fluid, 'override');
  if (written === undefined) return ok(undefined);
  if (typeof written !== 'object' || written === null || Array.isArray(written))
    return fail('group-expected', path, { written: Array.isArray(written) ? 'a list' : typeof written });
  const parsed = parseFields(written, fields, atmosphere, path);
  if (!parsed.ok) return parsed;
  const kappa = parsed.value.numbers.isentropicExponent;
  const { min, max } = exponentBounds;
  if (kappa === undefined || (kappa >= min && kappa <= max)) return parsed;
  return fail('isentropic-exponent-implausible', `${path}.isentropicExponent`, { value: kappa, min, max });
}

/**
 * The state with the stated figures in it. A figure that follows from a replaced one is dropped with its working, as it
 * would contradict it: the compressibility factor from the density, the speed of sound from density and exponent.
 * Problem override-unused: this state has no use for the figure.
 */
export function override(state: FluidState, parsed: Parsed, field: string): Outcome<FluidState> {
  const figures = figuresOf(parsed, state.density);
  const names = Object.keys(figures) as Name[];
  if (names.length === 0) return ok(state);
  const unused = names.find((name) => isUnused(name, state));
  if (unused !== undefined) return fail('override-unused', `${field}.override.${unused}`, { phase: state.phase });
  const stale = [
    ...(figures.density === undefined ? [] : ['compressibility', 'speedOfSound']),
    ...(figures.isentropicExponent === undefined ? [] : ['speedOfSound']),
  ];
  return ok({
    ...without(state, stale),
    ...(figures as Partial<FluidState>),
    overridden: names,
    ...(state.uncertainties === undefined ? {} : { uncertainties: without(state.uncertainties, [...names, ...stale]) }),
    ...(state.ranges === undefined ? {} : { ranges: without(state.ranges, [...names, ...stale]) }),
    sources: { ...state.sources, ...Object.fromEntries(names.map((name) => [name, byUser])) },
    working: workingOf(state.working, figures, stale),
  });
}

/** A record without some of its optional keys. */
function without<Group extends object>(group: Group, keys: readonly string[]): Group {
  return Object.fromEntries(Object.entries(group).filter(([key]) => !keys.includes(key))) as Group;
}

function figuresOf({ quantities, numbers }: Parsed, density: Density): Figures {
  const rho = (quantities.density?.si ?? density) as Density;
  const viscosity = quantities.viscosity;
  const mu = viscosity?.measure === 'kinematic viscosity' ? rho * viscosity.si : viscosity?.si; // μ = ρ ν
  return {
    ...(quantities.density === undefined ? {} : { density: rho }),
    ...(mu === undefined ? {} : { viscosity: mu as DynamicViscosity }),
    ...(numbers.isentropicExponent === undefined ? {} : { isentropicExponent: numbers.isentropicExponent }),
    ...(quantities.vapourPressure === undefined ? {} : { vapourPressure: quantities.vapourPressure.si }),
  };
}

const isUnused = (name: Name, { expands, phase }: FluidState): boolean =>
  (name === 'isentropicExponent' && !expands) || (name === 'vapourPressure' && phase !== 'liquid');

/** The lines of the replaced figures in their old places, new ones at the end. */
function workingOf(working: readonly Working[], figures: Figures, stale: readonly string[]): readonly Working[] {
  const lines = new Map(
    Object.entries(figures).map(([id, value]) => {
      const name = id as Name;
      return [id, { ...statedLine(id, symbols[name], value, units[name]), remark: 'override' }] as const;
    }),
  );
  const kept = working.filter(({ id }) => !stale.includes(id)).map((line) => lines.get(line.id) ?? line);
  return [...kept, ...[...lines.values()].filter(({ id }) => !working.some((line) => line.id === id))];
}

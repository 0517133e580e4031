/** The fluid at the upstream tapping: reads what the document says of it and lets its model answer. */
import type { FluidText } from '../document/project.ts';
import type { AbsolutePressure } from '../quantity/kinds.ts';
import { fail, gather, type Outcome } from '../quantity/outcome.ts';
import type { FluidState } from './contract.ts';
import { bothOf, type FluidModel, type Parsed, type Paths, type Seams, type State } from './model.ts';
import { fluids } from './registry.ts';
import { parseFields } from './state-fields.ts';
import { override, readOverride } from './state-override.ts';

/**
 * The state of a fluid at an absolute pressure and a temperature, with the figures that the user overrides.
 * @param fluid the fluid as the document has it
 * @param upstream what is known of the state; a model may find one figure from the other
 * @param base the project's base state
 * @param atmosphere what a gauge pressure among the fluid's fields stands on
 * @param field path of the fluid in the document, for problems
 * @param stateField path of the group that holds the state, for problems with pressure and temperature
 * Problems: field-missing, fluid-unknown, those of the fields, of the model and of override.
 */
export function stateOf(
  fluid: FluidText,
  upstream: Partial<State>,
  base: State,
  atmosphere: AbsolutePressure,
  field = 'fluid',
  stateField = 'upstream',
): Outcome<FluidState> {
  const model = modelOf(fluid, field);
  if (!model.ok) return model;
  const parsed = parseFields(fluid, model.value.fields, atmosphere, field);
  const stated = readOverride(fluid, atmosphere, field);
  if (!parsed.ok || !stated.ok) return gather(parsed, stated);
  const paths = {
    pressure: `${stateField}.pressure`,
    temperature: `${stateField}.temperature`,
    own: (name: string) => `${field}.${name}`,
  };
  const at = completed(model.value, parsed.value, upstream, paths);
  if (!at.ok) return at;
  const state = model.value.state(parsed.value, { ...at.value, base, paths });
  return state.ok && stated.value !== undefined ? override(state.value, stated.value, field) : state;
}

/** Where the formulation of a fluid changes or bends; none of a fluid that cannot be read. */
export function seamsOf(fluid: FluidText, atmosphere: AbsolutePressure): Seams {
  const none: Seams = { pressure: [], temperature: [] };
  const model = modelOf(fluid, 'fluid');
  const parsed = model.ok ? parseFields(fluid, model.value.fields, atmosphere, 'fluid') : model;
  return (parsed.ok && model.ok ? model.value.seams?.(parsed.value) : undefined) ?? none;
}

/** Pressure and temperature of the state: as given, or as the fluid ties one to the other. */
function completed(model: FluidModel, parsed: Parsed, known: Partial<State>, paths: Paths): Outcome<State> {
  if (model.complete !== undefined) return model.complete(parsed, known, paths);
  return bothOf(known, paths);
}

function modelOf({ kind }: FluidText, field: string): Outcome<FluidModel> {
  const path = `${field}.kind`;
  const offered = fluids.map((candidate) => candidate.kind).join(', ');
  if (kind === undefined || kind === '') return fail('field-missing', path, { choices: offered });
  if (typeof kind !== 'string') return fail('text-expected', path, { written: typeof kind });
  const model = fluids.find((candidate) => candidate.kind === kind);
  if (model !== undefined) return { ok: true, value: model };
  return fail('fluid-unknown', path, { written: kind.slice(0, 40), offered });
}

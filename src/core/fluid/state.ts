/** The fluid at the upstream tapping: reads what the document says of it and lets its model answer. */
import type { FluidText } from '../document/project.ts';
import { type Form, openForm } from '../input/form.ts';
import type { AbsolutePressure } from '../quantity/kinds.ts';
import type { Measure } from '../quantity/measure.ts';
import { fail, type Outcome, type Problem } from '../quantity/outcome.ts';
import type { FluidState } from './contract.ts';
import type { Amount, FluidField, FluidModel, Parsed, State } from './model.ts';
import { fluids, notOffered } from './registry.ts';

/**
 * The state of a fluid at an absolute pressure and a temperature.
 * @param fluid the fluid as the document has it
 * @param base the project's base state
 * @param atmosphere what a gauge pressure among the fluid's fields stands on
 * @param field path of the fluid in the document, for problems
 * @param stateField path of the group that holds the state, for problems with pressure and temperature
 * Problems: field-missing, fluid-unknown, fluid-not-offered, those of the fields, and those of the model.
 */
export function stateOf(
  fluid: FluidText,
  upstream: State,
  base: State,
  atmosphere: AbsolutePressure,
  field = 'fluid',
  stateField = 'upstream',
): Outcome<FluidState> {
  const model = modelOf(fluid, field);
  if (!model.ok) return model;
  const parsed = parse(fluid, model.value.fields, atmosphere, field);
  if (!parsed.ok) return parsed;
  const paths = {
    pressure: `${stateField}.pressure`,
    temperature: `${stateField}.temperature`,
    own: (name: string) => `${field}.${name}`,
  };
  return model.value.state(parsed.value, { ...upstream, base, paths });
}

function modelOf({ kind }: FluidText, field: string): Outcome<FluidModel> {
  const path = `${field}.kind`;
  if (kind === undefined || kind === '') return fail('field-missing', path);
  if (typeof kind !== 'string') return fail('text-expected', path, { written: typeof kind });
  const model = fluids.find((candidate) => candidate.kind === kind);
  if (model !== undefined) return { ok: true, value: model };
  const offered = fluids.map((candidate) => candidate.kind).join(', ');
  return fail(notOffered.includes(kind) ? 'fluid-not-offered' : 'fluid-unknown', path, {
    written: kind.slice(0, 40),
    offered,
  });
}

/** Reads every field of the model, and answers with all that is wrong in them at once. */
function parse(
  fluid: FluidText,
  fields: readonly FluidField[],
  atmosphere: AbsolutePressure,
  path: string,
): Outcome<Parsed> {
  const form = openForm(fluid);
  const quantities: Record<string, Amount> = {};
  const numbers: Record<string, number> = {};
  const choices: Record<string, string> = {};
  for (const field of fields) {
    if (field.type === 'quantity')
      put(quantities, field.name, amount(form, field.name, field.measures, field.required, atmosphere));
    else if (field.type === 'number') put(numbers, field.name, form.number(field.name, field.required));
    else put(choices, field.name, form.choice(field.name, field.choices, field.required));
  }
  const [first, ...rest] = form.problems.map((problem): Problem => ({ ...problem, field: `${path}.${problem.field}` }));
  return first === undefined
    ? { ok: true, value: { quantities, numbers, choices } }
    : { ok: false, problems: [first, ...rest] };
}

function put<Value>(into: Record<string, Value>, name: string, value: Value | undefined): void {
  if (value !== undefined) into[name] = value;
}

/** A quantity above zero; a gauge pressure is read as the absolute pressure it stands for. */
function amount(
  form: Form,
  name: string,
  measures: readonly Measure[],
  required: boolean,
  atmosphere: AbsolutePressure,
): Amount | undefined {
  const absolute = !measures.includes('gauge pressure');
  const quantity = absolute ? form.positive(name, measures, required) : form.quantity(name, measures, required);
  if (quantity === undefined) return undefined;
  const gauge = quantity.measure === 'gauge pressure';
  const { measure, si } = gauge ? { measure: 'absolute pressure' as const, si: quantity.si + atmosphere } : quantity;
  if (si > 0) return { measure, si };
  return form.report('not-positive', name, { written: `${quantity.number} ${quantity.unit.symbol}` });
}

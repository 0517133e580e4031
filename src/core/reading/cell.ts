/** A cell at the end of two legs: from the pressure difference it sees to that of the flow equation. */
import { MEASURED_AT } from '../document/defaults.ts';
import type { Caution } from '../fluid/contract.ts';
import type { Form } from '../input/form.ts';
import { type InstrumentUncertainty, type Legs, readInstrumentUncertainty, readLegs } from '../input/instrument.ts';
import { as } from '../quantity/brand.ts';
import type { PressureDifference, Temperature } from '../quantity/kinds.ts';
import { named, type Working } from '../quantity/working.ts';
import { cellDifferential, hydrostatics } from './chain.ts';
import type { Conditions, Picture } from './contract.ts';
import { legTemperatureCautions } from './leg-temperature.ts';
import { fillingOf, type LegDensities, legsAt, legsGiven } from './legs.ts';

export interface CellFields {
  readonly legs: Legs;
  /** Of what fills the legs, where its density is not stated. */
  readonly ambient: Temperature;
  readonly uncertainty: InstrumentUncertainty;
}

export function readCellFields(form: Form, spanned: boolean): CellFields {
  const ambient = form.positive('instrument.temperature', ['temperature'])?.si ?? as<'temperature'>(MEASURED_AT);
  return { legs: readLegs(form), ambient, uncertainty: readInstrumentUncertainty(form, spanned) };
}

/** What a cell says through its legs. */
export interface ThroughLegs {
  readonly differential: PressureDifference;
  readonly cautions: readonly Caution[];
  readonly working: readonly Working[];
  readonly picture: Picture;
}

/** Takes what a cell sees, Pa, through its legs; legs full of the process fluid add nothing, and no line. */
export function readCell(cell: number, { legs, ambient }: CellFields, { state, gravity }: Conditions): ThroughLegs {
  const densities = legsAt(legs, state, ambient);
  const differential = cellDifferential(cell, densities, gravity);
  const lengths = { upstream: -legs.drop, downstream: legs.drop + legs.rise };
  const seen = { temperature: ambient, differential, state, gravity };
  const cautions = legTemperatureCautions(legs, lengths, seen);
  const picture = {
    cell_Pa: cell,
    upstreamLeg_kg_m3: densities.upstream,
    downstreamLeg_kg_m3: densities.downstream,
  };
  if (fillingOf(densities) === 'process')
    return { differential: as<'pressure difference'>(cell), cautions, working: [], picture };
  return { differential, cautions, working: [legsLine(cell, densities, gravity, differential)], picture };
}

function legsLine(cell: number, legs: LegDensities, gravity: number, value: number): Working {
  const formula =
    fillingOf(legs) === 'one' ? 'Δp_c + (ρ_L - ρ_1) * g * s' : 'Δp_c - ρ_L * g * z + ρ_M * g * (z + s) - ρ_1 * g * s';
  const given = [
    named('Δp_c', cell, 'Pa', 'differential-at-cell'),
    ...legsGiven(legs),
    named('g', gravity, 'm/s2', 'gravity'),
  ];
  return { id: 'differential', symbol: 'Δp', formula, given, value, unit: 'Pa', source: hydrostatics };
}

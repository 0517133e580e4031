/** Station 4: the permanent loss, the straight pipe around the element, and how sure the inputs are. */

import type { PresentedSizing } from '../../present/model.ts';
import { openingWord } from '../../words/elements.ts';
import { fittingChoices } from '../../words/fittings.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { FoundField } from '../field/FoundField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useMeterText, useSelectedMeter } from '../meter.ts';
import { Fold } from './Fold.tsx';
import { Station } from './Station.tsx';
import { StraightNeed } from './StraightNeed.tsx';

const upstream = fittingChoices.filter(({ value }) => value !== 'downstream' && value !== 'any');

export function Downstream() {
  const selected = useSelectedMeter();
  const sizing = selected?.sizing;
  const hasBore = openingWord(useMeterText('element.kind')) !== 'none';
  return (
    <Station number={4} title="Downstream">
      {(hasBore || sizing?.loss !== undefined) && (
        <FoundField
          label="Permanent loss"
          path="loss"
          value={sizing?.loss}
          stale={sizing !== undefined && selected?.stale === true}
        />
      )}
      {hasBore && (
        <ChoiceField
          path="installation.fitting"
          label="Fitting before"
          choices={fittingsOf(sizing)}
          open="not stated"
        />
      )}
      <QuantityField
        path="installation.before"
        label="Straight before"
        note={sizing && <StraightNeed sizing={sizing} side="upstream" />}
      />
      <QuantityField
        path="installation.after"
        label="Straight after"
        note={sizing && <StraightNeed sizing={sizing} side="downstream" />}
      />
      <Fold title="Uncertainty and steadiness">
        {hasBore && <QuantityField path="uncertainty.bore" label="Bore, ±" />}
        <QuantityField path="uncertainty.pipe" label="Pipe bore, ±" />
        <QuantityField path="uncertainty.differential" label="Differential, ±" />
        <QuantityField path="uncertainty.density" label="Density, ±" />
        <QuantityField path="installation.fluctuation" label="Fluctuation, rms" />
      </Fold>
    </Station>
  );
}

/** The fittings of the table for this element; all of them before there is a result. */
function fittingsOf(sizing: PresentedSizing | undefined) {
  const known = sizing?.straight.filter(({ side }) => side === 'upstream').map(({ fitting }) => fitting);
  return known === undefined || known.length === 0 ? upstream : upstream.filter(({ value }) => known.includes(value));
}

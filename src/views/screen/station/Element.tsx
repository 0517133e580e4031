/** Station 3: the primary element. */
import { elementChoices } from '../../words/elements.ts';
import { materialChoices } from '../../words/materials.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useMeterText } from '../meter.ts';
import { Calibration } from './Calibration.tsx';
import { Fold } from './Fold.tsx';
import { Station } from './Station.tsx';
import { Unknown } from './Unknown.tsx';

const kinds = elementChoices.map(({ kind, label }) => ({ value: kind, label }));

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);

export function Element() {
  const kind = useMeterText('element.kind');
  const choice = elementChoices.find((known) => known.kind === kind);
  const opening = choice?.opening ?? 'bore';
  return (
    <Station number={3} title="Element">
      <ChoiceField path="element.kind" label="Kind" choices={kinds} />
      {choice?.fields.map(({ name, label, choices }) => (
        <ChoiceField key={name} path={`element.${name}`} label={label} choices={choices} />
      ))}
      <Unknown unknown="bore" label={capital(opening)} name={opening} />
      <ChoiceField path="element.material" label="Material" choices={materialChoices} open="not stated" />
      {kind === 'orifice-plate' && (
        <>
          <QuantityField path="element.plateThickness" label="Plate, E" />
          <QuantityField path="element.edgeThickness" label="Edge, e" />
        </>
      )}
      <Fold title="Calibration and more">
        <QuantityField path="element.measuredAt" label={`${capital(opening)} measured at`} />
        <Calibration />
      </Fold>
    </Station>
  );
}

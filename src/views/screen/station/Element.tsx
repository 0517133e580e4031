/** Station 3: the primary element. */
import { elementChoices } from '../../words/elements.ts';
import { materialChoices } from '../../words/materials.ts';
import { useWorkbenchStore } from '../binding.tsx';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { MeterTextField } from '../field/MeterTextField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { kindTo } from '../field/turn.ts';
import { useMeterText } from '../meter.ts';
import { Calibration } from './Calibration.tsx';
import { Fold } from './Fold.tsx';
import { BarFields, MakersSheet } from './MakersSheet.tsx';
import { Station } from './Station.tsx';
import { Unknown } from './Unknown.tsx';

const kinds = elementChoices.map(({ kind, label }) => ({ value: kind, label }));

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);

export function Element() {
  const kind = useMeterText('element.kind');
  const choice = elementChoices.find((known) => known.kind === kind);
  const opening = choice?.opening ?? 'bore';
  const store = useWorkbenchStore();
  return (
    <Station number={3} title="Element">
      <ChoiceField path="element.kind" label="Kind" choices={kinds} choose={(to) => kindTo(to, store.getState())} />
      {opening === 'none' && <MeterTextField path="element.coefficient" label="Coefficient K" decimal />}
      {choice?.fields.map(({ name, label, choices, open }) => (
        <ChoiceField
          key={name}
          path={`element.${name}`}
          label={label}
          choices={choices}
          {...(open === undefined ? {} : { open })}
        />
      ))}
      {opening === 'none' ? <BarFields /> : <Bore opening={opening} />}
      {kind === 'orifice-plate' && (
        <>
          <QuantityField path="element.plateThickness" label="Plate, E" />
          <QuantityField path="element.edgeThickness" label="Edge, e" />
        </>
      )}
      {opening === 'none' && <MakersSheet />}
      <Fold title={opening === 'none' ? 'Calibration' : 'Calibration and more'}>
        {opening !== 'none' && <QuantityField path="element.measuredAt" label={`${capital(opening)} measured at`} />}
        <Calibration />
      </Fold>
    </Station>
  );
}

function Bore({ opening }: { readonly opening: string }) {
  return (
    <>
      <Unknown unknown="bore" label={capital(opening)} name={opening} />
      <ChoiceField path="element.material" label="Material" choices={materialChoices} open="not stated" />
    </>
  );
}

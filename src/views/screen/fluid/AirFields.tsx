/** Air, dry or moist. */
import { choiceWords } from '../../words/fluid-forms.ts';
import { baseBasisChoices } from '../../words/fluids.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useMeterText } from '../meter.ts';
import { OneOf } from './OneOf.tsx';
import { ShareField } from './ShareField.tsx';

const HUMIDITY = 'fluid.relativeHumidity';
const WAYS = [HUMIDITY, 'fluid.dewPoint', 'fluid.wetBulb'] as const;

export function AirFields() {
  const moist = WAYS.map(useMeterText).some((text) => text !== '');
  return (
    <>
      <OneOf id="moisture" label={choiceWords.moisture} paths={WAYS} none={choiceWords.dry}>
        {(path) =>
          path === HUMIDITY ? <ShareField key={path} path={path} /> : <QuantityField key={path} path={path} />
        }
      </OneOf>
      {moist && <ChoiceField path="fluid.baseBasis" choices={baseBasisChoices} open="the moist air" />}
    </>
  );
}

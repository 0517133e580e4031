/** Air, dry or moist. */
import { choiceWords } from '../../words/fluid-forms.ts';
import { baseBasisChoices } from '../../words/fluids.ts';
import { QuantityField } from '../field/QuantityField.tsx';
import { useMeterText } from '../meter.ts';
import { OneOf } from './OneOf.tsx';
import { ShareField } from './ShareField.tsx';
import { UsualChoice } from './UsualChoice.tsx';

const HUMIDITY = 'fluid.relativeHumidity';
const DEW_POINT = 'fluid.dewPoint';
const WET_BULB = 'fluid.wetBulb';

export function AirFields() {
  const humidity = useMeterText(HUMIDITY);
  const dewPoint = useMeterText(DEW_POINT);
  const wetBulb = useMeterText(WET_BULB);
  const moist = `${humidity}${dewPoint}${wetBulb}` !== '';
  return (
    <>
      <OneOf id="moisture" label={choiceWords.moisture} paths={[HUMIDITY, DEW_POINT, WET_BULB]} none={choiceWords.dry}>
        {(path) =>
          path === HUMIDITY ? <ShareField key={path} path={path} /> : <QuantityField key={path} path={path} />
        }
      </OneOf>
      {moist && <UsualChoice path="fluid.baseBasis" choices={baseBasisChoices} />}
    </>
  );
}

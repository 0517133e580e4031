/** The manometer, for readings that are lengths of a column. */
import { gaugeLiquidChoices, surveyPlace as words } from '../../words/surveys.ts';
import { useWorkbench } from '../binding.tsx';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useWrite, useWritten } from '../hand.tsx';

const PATH = 'manometer.liquid';
const OWN = '(own)'; // no liquid of the list has brackets

export function ManometerFields() {
  const liquid = useWritten(PATH);
  const described = useWritten('manometer') !== undefined;
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const chosen = typeof liquid === 'string' ? liquid : typeof liquid === 'object' ? OWN : '';
  const choose = (value: string): void => {
    settle();
    if (value === '') write('manometer', undefined);
    else write(PATH, value === OWN ? { density: '' } : value);
    settle();
  };
  return (
    <>
      <Frame
        id="field-manometer"
        label="Manometer"
        note={!described && <span>for readings in mm or in of liquid</span>}
      >
        <div className={box.box}>
          <select
            id="field-manometer"
            className={box.select}
            data-field={PATH}
            value={chosen}
            onChange={(event) => choose(event.target.value)}
          >
            <option value="">{words.none}</option>
            {gaugeLiquidChoices.map(({ value, label }) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
            <option value={OWN}>{words.ownLiquid}</option>
            {chosen !== '' && chosen !== OWN && !gaugeLiquidChoices.some(({ value }) => value === chosen) && (
              <option value={chosen}>{chosen}</option>
            )}
          </select>
        </div>
      </Frame>
      {chosen === OWN && <QuantityField path="manometer.liquid.density" label="Density of the liquid" />}
      {described && (
        <>
          <QuantityField path="manometer.temperature" label="Its temperature" />
          <QuantityField path="manometer.angle" label="Angle from level" />
        </>
      )}
    </>
  );
}

/** The manometer, for readings that are lengths of a column. */
import { surveyPlace as words } from '../../words/survey-place.ts';
import { gaugeLiquidChoices } from '../../words/surveys.ts';
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
  return (
    <>
      <Liquid liquid={liquid} described={described} />
      {typeof liquid === 'object' && <QuantityField path="manometer.liquid.density" label="Density of the liquid" />}
      {described && (
        <>
          <QuantityField path="manometer.temperature" label="Its temperature" />
          <QuantityField path="manometer.angle" label="Angle from level" />
        </>
      )}
    </>
  );
}

const known: readonly string[] = ['', OWN, ...gaugeLiquidChoices.map(({ value }) => value)];

function Liquid({ liquid, described }: { readonly liquid: unknown; readonly described: boolean }) {
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const chosen = typeof liquid === 'string' ? liquid : typeof liquid === 'object' ? OWN : '';
  const choose = (value: string): void => {
    settle();
    if (value === '') write('manometer', undefined);
    else write(PATH, value === OWN ? { density: '' } : value);
    settle();
  };
  const id = 'field-manometer';
  return (
    <Frame id={id} label="Manometer" note={!described && <span>{words.forColumns}</span>}>
      <div className={box.box}>
        <select
          id={id}
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
          {!known.includes(chosen) && <option value={chosen}>{chosen}</option>}
        </select>
      </div>
    </Frame>
  );
}

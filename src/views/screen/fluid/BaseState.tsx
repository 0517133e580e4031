/** The base state that volumes are counted at: said where a flow needs it, and chosen from those in use. */
import { asPrinted } from '../../present/base.ts';
import {
  baseStateChoices,
  baseStateNamed,
  baseStateOf,
  usualBase,
  baseStateWords as words,
} from '../../words/base-states.ts';
import { useWorkbench } from '../binding.tsx';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { QuantityBox } from '../field/QuantityField.tsx';
import { useProblem } from '../meter.ts';
import { Fold } from '../station/Fold.tsx';
import { textAt } from '../text.ts';

function useBase() {
  const temperature = useWorkbench((state) => textAt(state.project, 'base.temperature')) || usualBase.temperature;
  const pressure = useWorkbench((state) => textAt(state.project, 'base.pressure')) || usualBase.pressure;
  return { temperature, pressure };
}

/** The base state of the project, from the list of those in use or its own. */
export function BaseStateSelect({ id, note }: { readonly id: string; readonly note?: string }) {
  const write = useWorkbench((state) => state.writeProject);
  const settle = useWorkbench((state) => state.settle);
  const base = useWorkbench((state) => state.project.base);
  const named = baseStateNamed(useBase());
  const choose = (value: string): void => {
    const chosen = baseStateOf(value);
    if (chosen === undefined) return;
    settle();
    write('base', { ...base, pressure: chosen.pressure, temperature: chosen.temperature });
    settle();
  };
  return (
    <Frame id={id} label={words.label} note={note}>
      <div className={box.box}>
        <select id={id} className={box.select} value={named} onChange={(event) => choose(event.target.value)}>
          {named === '' && <option value="">{words.own}</option>}
          {baseStateChoices.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      </div>
    </Frame>
  );
}

/** The same in the station of the flow, with the two figures to be typed. */
export function BaseState() {
  const { temperature, pressure } = useBase();
  return (
    <>
      <BaseStateSelect id="station-base" note={words.line(asPrinted(temperature), asPrinted(pressure))} />
      <Fold title={words.more}>
        <BaseFigure path="base.pressure" />
        <BaseFigure path="base.temperature" />
      </Fold>
    </>
  );
}

function BaseFigure({ path }: { readonly path: string }) {
  const text = useWorkbench((state) => textAt(state.project, path));
  const write = useWorkbench((state) => state.writeProject);
  return (
    <QuantityBox
      path={path}
      place="station"
      text={text}
      problem={useProblem(path)}
      write={(next) => write(path, next)}
    />
  );
}

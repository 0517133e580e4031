/** Chooses the liquid out of the families of the list, or the user's own table. */
import { useState } from 'react';
import { fieldLabel } from '../../words/fields.ts';
import { choiceWords as words } from '../../words/fluid-forms.ts';
import { liquidGroups, liquidNamed } from '../../words/liquids.ts';
import { useWorkbench } from '../binding.tsx';
import box from '../field/box.module.css';
import { Frame, problemId } from '../field/Frame.tsx';
import { useMeterText, useProblem, useUntried } from '../meter.ts';
import { valueAt } from '../text.ts';

const PATH = 'fluid.name';
const OWN = '(table)'; // no name of the list has brackets

export interface OwnTable {
  /** True where the figures come from the user's table. */
  readonly chosen: boolean;
  want(wanted: boolean): void;
}

export function useOwnTable(): OwnTable {
  const written = useWorkbench((state) => valueAt(state.project.meters[state.selected], 'fluid.table') !== undefined);
  const name = useMeterText(PATH);
  const [wanted, want] = useState(false);
  return { chosen: written || (wanted && name === ''), want };
}

export function LiquidName({ own }: { readonly own: OwnTable }) {
  const name = useMeterText(PATH);
  const problem = useProblem(PATH);
  const writeAll = useWorkbench((state) => state.writeAll);
  const waiting = useUntried() && name === '';
  const invalid = problem !== undefined && !waiting && !own.chosen;
  const choose = (value: string): void => {
    own.want(value === OWN);
    writeAll([[PATH, value === OWN ? undefined : value], ...(value === OWN ? [] : [['fluid.table', undefined] as const]), ...unusedBy(value)]);
  };
  const id = `field-${PATH}`;
  return (
    <Frame id={id} label={fieldLabel(PATH)} problem={own.chosen ? undefined : problem} waiting={waiting}>
      <div className={box.box} data-invalid={invalid}>
        <select
          id={id}
          className={box.select}
          data-field={PATH}
          value={name === '' && own.chosen ? OWN : name}
          aria-invalid={invalid}
          aria-describedby={problem === undefined ? undefined : problemId(id)}
          onChange={(event) => choose(event.target.value)}
        >
          {name === '' && !own.chosen && <option value="">{words.chooseLiquid}</option>}
          {name !== '' && liquidNamed(name) === undefined && <option value={name}>{name}</option>}
          <Groups />
        </select>
      </div>
    </Frame>
  );
}

function Groups() {
  return (
    <>
      <optgroup label={words.ownFamily}>
        <option value={OWN}>{words.ownTable}</option>
      </optgroup>
      {liquidGroups.map(({ label, choices }) => (
        <optgroup key={label} label={label}>
          {choices.map(({ value, label: liquid }) => (
            <option key={value} value={value}>
              {liquid}
            </option>
          ))}
        </optgroup>
      ))}
    </>
  );
}

/** A concentration left over from another liquid would stand in the way of this one. */
function unusedBy(value: string): readonly (readonly [string, undefined])[] {
  const needs = liquidNamed(value)?.needs;
  return [
    ...(needs === 'concentration' || needs === 'concentration-and-basis' ? [] : [['fluid.concentration', undefined] as const]),
    ...(needs === 'concentration-and-basis' ? [] : [['fluid.concentrationBasis', undefined] as const]),
  ];
}

/** A number with its unit. The text stays as typed; the unit at the right converts it exactly. */

import type { ReactNode } from 'react';
import { fieldLabel } from '../../words/fields.ts';
import { useWorkbench } from '../binding.tsx';
import { useWrite } from '../hand.tsx';
import { useMeterText, useProblem } from '../meter.ts';
import styles from './box.module.css';
import { Frame } from './Frame.tsx';
import { UnitOptions } from './UnitOptions.tsx';
import { useFieldState } from './useFieldState.ts';
import { type QuantityBinding, useQuantity } from './useQuantity.ts';

export interface QuantityFieldProps {
  readonly path: string;
  readonly label?: string;
  readonly note?: ReactNode;
  readonly aside?: ReactNode;
  /** Whose kind it is, where what a field measures depends on another. */
  readonly kindPath?: string;
}

/** A quantity of the selected meter. */
export function QuantityField({ path, ...rest }: QuantityFieldProps) {
  const text = useMeterText(path);
  const problem = useProblem(path);
  const write = useWrite();
  return <QuantityBox path={path} text={text} problem={problem} write={(next) => write(path, next)} {...rest} />;
}

interface QuantityBoxProps extends QuantityFieldProps {
  readonly text: string;
  readonly problem: string | undefined;
  readonly write: (text: string) => void;
  /** Where it stands, for a field that the page may show twice. */
  readonly place?: string;
}

/** The same for any part of the project. */
export function QuantityBox({ path, label = fieldLabel(path), place = 'field', ...rest }: QuantityBoxProps) {
  const { text, problem, write, note, aside, kindPath = path } = rest;
  const display = useWorkbench((state) => state.project.display ?? 'SI');
  const quantity = useQuantity(kindPath, text, display, write);
  const noted = quantity.echo !== '' || Boolean(note);
  const { frame, invalid, box } = useFieldState({ path, text, problem, place, noted });
  return (
    <Frame {...frame} label={label} echo={quantity.echo} note={note} aside={aside}>
      <div className={styles.box} data-invalid={invalid}>
        <NumberInput quantity={quantity} box={box} needed={frame.waiting && problem !== undefined} />
        <UnitSelect path={path} quantity={quantity} />
      </div>
    </Frame>
  );
}

interface NumberProps {
  readonly quantity: QuantityBinding;
  readonly box: ReturnType<typeof useFieldState>['box'];
  readonly needed: boolean;
}

function NumberInput({ quantity, box, needed }: NumberProps) {
  const settle = useWorkbench((state) => state.settle);
  return (
    <input
      {...box}
      className={styles.input}
      type="text"
      inputMode="decimal"
      enterKeyHint="next"
      autoComplete="off"
      spellCheck={false}
      placeholder={needed ? 'needed' : undefined}
      value={quantity.shown}
      onChange={(event) => quantity.type(event.target.value)}
      onKeyDown={(event) => {
        if (event.key === 'Enter') quantity.settle();
      }}
      onBlur={() => {
        quantity.leave();
        settle();
      }}
    />
  );
}

function UnitSelect({ path, quantity }: { readonly path: string; readonly quantity: QuantityBinding }) {
  const { unit, kind } = quantity;
  return (
    <select
      className={styles.unit}
      aria-label={`${fieldLabel(path)}, unit`}
      title={unit.words}
      value={unit.symbol}
      onChange={(event) => quantity.chooseUnit(event.target.value)}
    >
      <UnitOptions measures={kind.measures} />
    </select>
  );
}

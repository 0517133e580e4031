/** A number with its unit. The text stays as typed; the unit at the right converts it exactly. */

import type { ReactNode } from 'react';
import { fieldLabel } from '../../words/fields.ts';
import { useWorkbench } from '../binding.tsx';
import { useMeterText, useProblem, useUntried } from '../meter.ts';
import styles from './box.module.css';
import { Frame, noteId, problemId } from './Frame.tsx';
import { unitMenu } from './split.ts';
import { useQuantity } from './useQuantity.ts';

export interface QuantityFieldProps {
  readonly path: string;
  readonly label?: string;
  readonly note?: ReactNode;
  readonly aside?: ReactNode;
}

/** A quantity of the selected meter. */
export function QuantityField({ path, ...rest }: QuantityFieldProps) {
  const text = useMeterText(path);
  const problem = useProblem(path);
  const write = useWorkbench((state) => state.write);
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
  const { text, problem, write, note, aside } = rest;
  const display = useWorkbench((state) => state.project.display ?? 'SI');
  const settle = useWorkbench((state) => state.settle);
  const { shown, unit, echo, kind, type, chooseUnit, ...field } = useQuantity(path, text, display, write);
  const id = `${place}-${path}`;
  const waiting = useUntried() && text === '';
  const described = [echo || note ? noteId(id) : '', problem ? problemId(id) : ''].filter(Boolean).join(' ');
  return (
    <Frame id={id} label={label} echo={echo} problem={problem} waiting={waiting} note={note} aside={aside}>
      <div className={styles.box} data-invalid={problem !== undefined && !waiting}>
        <input
          id={id}
          className={styles.input}
          data-field={path}
          type="text"
          inputMode="decimal"
          enterKeyHint="next"
          autoComplete="off"
          spellCheck={false}
          placeholder={waiting && problem !== undefined ? 'needed' : undefined}
          value={shown}
          aria-invalid={problem !== undefined && !waiting}
          aria-describedby={described === '' ? undefined : described}
          onChange={(event) => type(event.target.value)}
          onKeyDown={(event) => {
            if (event.key === 'Enter') field.settle();
          }}
          onBlur={() => {
            field.leave();
            settle();
          }}
        />
        <select
          className={styles.unit}
          aria-label={`${fieldLabel(path)}, unit`}
          title={unit.words}
          value={unit.symbol}
          onChange={(event) => chooseUnit(event.target.value)}
        >
          {unitMenu(kind.measures).map(({ measure, units }) => (
            <optgroup key={measure} label={measure}>
              {units.map(({ symbol, print }) => (
                <option key={symbol} value={symbol}>
                  {print}
                </option>
              ))}
            </optgroup>
          ))}
        </select>
      </div>
    </Frame>
  );
}

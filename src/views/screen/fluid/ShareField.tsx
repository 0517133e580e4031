/** A share of 1 of the selected meter, in per cent or as a plain fraction, as it is written. */
import { useState } from 'react';
import { fieldLabel } from '../../words/fields.ts';
import { useWorkbench } from '../binding.tsx';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { useFieldState } from '../field/useFieldState.ts';
import { useWrite } from '../hand.tsx';
import { useMeterText, useProblem } from '../meter.ts';
import { convertShare, fileShare, SHARE_UNITS, type ShareUnit, shownShare, unitOfShare } from './share.ts';
import { useDraft } from './useDraft.ts';

interface Props {
  readonly path: string;
  readonly label?: string;
}

export function ShareField({ path, label = fieldLabel(path) }: Props) {
  const text = useMeterText(path);
  const problem = useProblem(path);
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const [chosen, setChosen] = useState<ShareUnit>('%');
  const unit = unitOfShare(text) ?? chosen;
  const draft = useDraft(
    text,
    (own) => shownShare(own, unit),
    (typed) => fileShare(typed, unit),
    (next) => write(path, next),
  );
  const { frame, invalid, box: own } = useFieldState({ path, text, problem });
  return (
    <Frame {...frame} label={label}>
      <div className={box.box} data-invalid={invalid}>
        <input
          {...own}
          className={box.input}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          spellCheck={false}
          value={draft.value}
          onChange={(event) => draft.type(event.target.value)}
          onBlur={settle}
        />
        <UnitSelect
          label={`${label}, unit`}
          unit={unit}
          choose={(next) => {
            setChosen(next);
            if (text !== '') write(path, convertShare(text, next));
            settle();
          }}
        />
      </div>
    </Frame>
  );
}

interface UnitProps {
  readonly label: string;
  readonly unit: ShareUnit;
  readonly choose: (unit: ShareUnit) => void;
}

function UnitSelect({ label, unit, choose }: UnitProps) {
  return (
    <select
      className={box.unit}
      aria-label={label}
      value={unit}
      onChange={(event) => choose(event.target.value as ShareUnit)}
    >
      {unit === 'ppm' && <option value="ppm">ppm</option>}
      {SHARE_UNITS.map(({ value, label: words }) => (
        <option key={value} value={value}>
          {words}
        </option>
      ))}
    </select>
  );
}

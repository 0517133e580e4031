/** A liquid by its name, or by its density; the usual one where nothing is written. */
import type { Choice } from '../../words/elements.ts';
import { fieldLabel } from '../../words/fields.ts';
import { instrumentWords } from '../../words/instruments.ts';
import { useWorkbench } from '../binding.tsx';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useFieldState } from '../field/useFieldState.ts';
import { useWrite, useWritten } from '../hand.tsx';
import { useProblem } from '../meter.ts';

const OWN = '(own)'; // no liquid of a list has brackets

interface Props {
  readonly path: string;
  readonly choices: readonly Choice[];
  /** What holds where nothing is written. */
  readonly open?: string;
}

export function LiquidField({ path, choices, open }: Props) {
  const written = useWritten(path);
  const problem = useProblem(path);
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const chosen = typeof written === 'string' ? written : typeof written === 'object' && written !== null ? OWN : '';
  const { frame, invalid, box: field } = useFieldState({ path, text: chosen, problem });
  const foreign = chosen !== '' && chosen !== OWN && !choices.some(({ value }) => value === chosen);
  const choose = (value: string): void => {
    settle();
    write(path, value === OWN ? { density: '' } : value);
    settle();
  };
  return (
    <>
      <Frame {...frame} label={fieldLabel(path)}>
        <div className={box.box} data-invalid={invalid}>
          <select {...field} className={box.select} value={chosen} onChange={(event) => choose(event.target.value)}>
            {(open !== undefined || chosen === '') && <option value="">{open ?? 'Choose'}</option>}
            {foreign && <option value={chosen}>{chosen}</option>}
            {choices.map(({ value, label }) => (
              <option key={value} value={value}>
                {label}
              </option>
            ))}
            <option value={OWN}>{instrumentWords.own}</option>
          </select>
        </div>
      </Frame>
      {chosen === OWN && <QuantityField path={`${path}.density`} />}
    </>
  );
}

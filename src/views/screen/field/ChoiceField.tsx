/** One of a list. A value that is not in the list is kept and shown as it is written. */

import type { Choice } from '../../words/elements.ts';
import { fieldLabel } from '../../words/fields.ts';
import { useWorkbench } from '../binding.tsx';
import { useWrite } from '../hand.tsx';
import { useMeterText, useProblem } from '../meter.ts';
import styles from './box.module.css';
import { Frame } from './Frame.tsx';
import { useFieldState } from './useFieldState.ts';

interface Props {
  readonly path: string;
  readonly label?: string;
  readonly choices: readonly Choice[];
  /** Words for leaving the choice open; without them one of the list must be chosen. */
  readonly open?: string;
  /** Takes the choice, where it changes more than its own field. */
  readonly choose?: (value: string) => void;
}

export function ChoiceField({ path, label = fieldLabel(path), choices, open, choose }: Props) {
  const text = useMeterText(path);
  const problem = useProblem(path);
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const { frame, invalid, box } = useFieldState({ path, text, problem });
  const foreign = text !== '' && !choices.some((choice) => choice.value === text);
  return (
    <Frame {...frame} label={label}>
      <div className={styles.box} data-invalid={invalid}>
        <select
          {...box}
          className={styles.select}
          value={text}
          onChange={(event) => {
            if (choose) choose(event.target.value);
            else write(path, event.target.value);
            settle();
          }}
        >
          {(open !== undefined || text === '') && <option value="">{open ?? 'Choose'}</option>}
          {foreign && <option value={text}>{text}</option>}
          {choices.map(({ value, label: words }) => (
            <option key={value} value={value}>
              {words}
            </option>
          ))}
        </select>
      </div>
    </Frame>
  );
}

/** One of a list. A value that is not in the list is kept and shown as it is written. */

import type { Choice } from '../../words/elements.ts';
import { fieldLabel } from '../../words/fields.ts';
import { useWorkbench } from '../binding.tsx';
import { useMeterText, useProblem, useUntried } from '../meter.ts';
import styles from './box.module.css';
import { Frame, problemId } from './Frame.tsx';

interface Props {
  readonly path: string;
  readonly label?: string;
  readonly choices: readonly Choice[];
  /** Words for leaving the choice open; without them one of the list must be chosen. */
  readonly open?: string;
}

export function ChoiceField({ path, label = fieldLabel(path), choices, open }: Props) {
  const text = useMeterText(path);
  const problem = useProblem(path);
  const write = useWorkbench((state) => state.write);
  const settle = useWorkbench((state) => state.settle);
  const waiting = useUntried() && text === '';
  const id = `field-${path}`;
  const foreign = text !== '' && !choices.some((choice) => choice.value === text);
  return (
    <Frame id={id} label={label} problem={problem} waiting={waiting}>
      <div className={styles.box} data-invalid={problem !== undefined && !waiting}>
        <select
          id={id}
          className={styles.select}
          data-field={path}
          value={text}
          aria-invalid={problem !== undefined && !waiting}
          aria-describedby={problem === undefined ? undefined : problemId(id)}
          onChange={(event) => {
            write(path, event.target.value);
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

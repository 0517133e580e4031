/** One of a list for a field of the log; left open, it is decided from the log or taken as usual. */
import { logFields } from '../../words/logs.ts';
import { useWorkbench } from '../binding.tsx';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { useWrite } from '../hand.tsx';
import { useMeterText } from '../meter.ts';
import { useLogProblem } from './useLog.ts';

interface Props {
  readonly path: string;
  readonly label: string;
  readonly choices: readonly { readonly value: string; readonly label: string }[];
  readonly note: string;
}

export function LogChoice({ path, label, choices, note }: Props) {
  const text = useMeterText(path);
  const problem = useLogProblem(path);
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const id = `field-${path}`;
  const isForeign = text !== '' && !choices.some(({ value }) => value === text);
  return (
    <Frame id={id} label={label} problem={problem} note={note && <span>{note}</span>}>
      <div className={box.box} data-invalid={problem !== undefined}>
        <select
          id={id}
          className={box.select}
          data-field={path}
          aria-invalid={problem !== undefined}
          value={text}
          onChange={(event) => {
            write(path, event.target.value);
            settle();
          }}
        >
          <option value="">{logFields.decided}</option>
          {isForeign && <option value={text}>{text}</option>}
          {choices.map(({ value, label: name }) => (
            <option key={value} value={value}>
              {name}
            </option>
          ))}
        </select>
      </div>
    </Frame>
  );
}

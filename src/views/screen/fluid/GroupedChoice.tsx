/** One of a long list in groups. A value that is not in the list is kept and shown as it is written. */
import type { Choice } from '../../words/elements.ts';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { useFieldState } from '../field/useFieldState.ts';
import { useMeterText, useProblem } from '../meter.ts';

interface Props {
  readonly path: string;
  readonly label: string;
  /** Choices that stand before the groups. */
  readonly first: readonly Choice[];
  readonly groups: readonly { readonly label: string; readonly choices: readonly Choice[] }[];
  /** The choice shown in place of what is written. */
  readonly shown?: string | undefined;
  readonly choose: (value: string) => void;
}

export function GroupedChoice({ path, label, first, groups, shown, choose }: Props) {
  const written = useMeterText(path);
  const problem = useProblem(path);
  const value = shown ?? written;
  const { frame, invalid, box: own } = useFieldState({ path, text: written, problem });
  const known = [...first, ...groups.flatMap((group) => group.choices)].some((choice) => choice.value === value);
  return (
    <Frame {...frame} label={label}>
      <div className={box.box} data-invalid={invalid}>
        <select {...own} className={box.select} value={value} onChange={(event) => choose(event.target.value)}>
          {!known && <option value={value}>{value}</option>}
          <Options choices={first} />
          {groups.map((group) => (
            <optgroup key={group.label} label={group.label}>
              <Options choices={group.choices} />
            </optgroup>
          ))}
        </select>
      </div>
    </Frame>
  );
}

const Options = ({ choices }: { readonly choices: readonly Choice[] }) =>
  choices.map(({ value, label }) => (
    <option key={value} value={value}>
      {label}
    </option>
  ));

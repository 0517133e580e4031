/** One of the components; those that stand elsewhere in the table cannot be chosen again. */
import { componentLabel, components } from '../../words/components.ts';

interface Props {
  readonly label: string;
  /** As written in the file; one that is not known is kept and shown as it is. */
  readonly value: string;
  readonly taken?: readonly string[];
  /** Words for choosing none. */
  readonly open?: string;
  readonly choose: (name: string) => void;
}

export function ComponentSelect({ label, value, taken = [], open, choose }: Props) {
  const foreign = value !== '' && !components.some((component) => component.value === value);
  return (
    <select aria-label={label} value={value} onChange={(event) => choose(event.target.value)}>
      {open !== undefined && <option value="">{open}</option>}
      {foreign && <option value={value}>{componentLabel(value)}</option>}
      {components.map((component) => (
        <option
          key={component.value}
          value={component.value}
          disabled={component.value !== value && taken.includes(component.value)}
        >
          {component.label}, {component.formula}
        </option>
      ))}
    </select>
  );
}

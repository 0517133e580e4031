/** One of a list of which the usual one stands where nothing is written; it is listed by its name, once. */
import type { Choice } from '../../words/elements.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { useMeterText } from '../meter.ts';

interface Props {
  readonly path: string;
  readonly label?: string;
  /** The first is the usual one. */
  readonly choices: readonly [Choice, ...Choice[]];
}

export function UsualChoice({ choices, ...field }: Props) {
  const [usual, ...others] = choices;
  const written = useMeterText(field.path) === usual.value; // a file may say what goes without saying
  return written ? (
    <ChoiceField {...field} choices={choices} />
  ) : (
    <ChoiceField {...field} choices={others} open={usual.label} />
  );
}

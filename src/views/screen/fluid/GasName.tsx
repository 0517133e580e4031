/** A mixture, or one of the gases that can be named alone. */
import { choiceWords as words } from '../../words/fluid-forms.ts';
import { gasGroups } from '../../words/gases.ts';
import { GroupedChoice } from './GroupedChoice.tsx';
import { useWriteAll } from '../hand.tsx';

/** What belongs to a composition stands in the way of a name. */
const OF_MIXTURES = ['fluid.composition', 'fluid.basis', 'fluid.normalise'] as const;

export function GasName() {
  const writeAll = useWriteAll();
  const choose = (name: string): void =>
    writeAll([['fluid.name', name], ...(name === '' ? [] : OF_MIXTURES.map((path) => [path, undefined] as const))]);
  return (
    <GroupedChoice
      path="fluid.name"
      label={words.gas}
      first={[{ value: '', label: words.mixture }]}
      groups={gasGroups}
      choose={choose}
    />
  );
}

/** A mixture, or one of the gases that can be named alone. */
import { choiceWords as words } from '../../words/fluid-forms.ts';
import { gasGroups, isOther } from '../../words/gases.ts';
import { useWriteAll } from '../hand.tsx';
import { GroupedChoice } from './GroupedChoice.tsx';

/** What belongs to a composition stands in the way of a name. */
const OF_MIXTURES = ['fluid.composition', 'fluid.basis', 'fluid.normalise'] as const;

export function GasName() {
  const writeAll = useWriteAll();
  const choose = (name: string): void => {
    const inTheWay = name === '' ? [] : [...OF_MIXTURES, ...(isOther(name) ? ['fluid.equation'] : [])];
    writeAll([['fluid.name', name], ...inTheWay.map((path) => [path, undefined] as const)]);
  };
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

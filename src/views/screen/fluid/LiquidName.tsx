/** Chooses the liquid out of the families of the list, or the user's own table. */
import { useState } from 'react';
import { choiceWords as words } from '../../words/fluid-forms.ts';
import { liquidGroups, liquidNamed } from '../../words/liquids.ts';
import { useWriteAll, useWritten } from '../hand.tsx';
import { useMeterText } from '../meter.ts';
import { GroupedChoice } from './GroupedChoice.tsx';

const PATH = 'fluid.name';
const OWN = '(table)'; // no name of the list has brackets

export interface OwnTable {
  /** True where the figures come from the user's table. */
  readonly chosen: boolean;
  want(wanted: boolean): void;
}

export function useOwnTable(): OwnTable {
  const written = useWritten('fluid.table') !== undefined;
  const name = useMeterText(PATH);
  const [wanted, want] = useState(false);
  return { chosen: written || (wanted && name === ''), want };
}

export function LiquidName({ own }: { readonly own: OwnTable }) {
  const name = useMeterText(PATH);
  const writeAll = useWriteAll();
  const choose = (value: string): void => {
    const table = value === OWN;
    own.want(table);
    writeAll([[PATH, table ? undefined : value], ...unusedBy(value).map((path) => [path, undefined] as const)]);
  };
  const open = name === '' && !own.chosen ? [{ value: '', label: words.chooseLiquid }] : [];
  return (
    <GroupedChoice
      path={PATH}
      label={words.liquid}
      first={[...open, { value: OWN, label: words.ownTable }]}
      groups={liquidGroups}
      shown={name === '' && own.chosen ? OWN : undefined}
      choose={choose}
    />
  );
}

/** What is left over from another liquid and would stand in the way of this one. */
function unusedBy(value: string): readonly string[] {
  const needs = liquidNamed(value)?.needs;
  return [
    ...(value === OWN ? [] : ['fluid.table']),
    ...(needs === 'concentration' || needs === 'concentration-and-basis' ? [] : ['fluid.concentration']),
    ...(needs === 'concentration-and-basis' ? [] : ['fluid.concentrationBasis']),
  ];
}

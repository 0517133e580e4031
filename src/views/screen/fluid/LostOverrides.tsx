/**
 * Figures put in place of the model's that the panel of the state does not show: there is no result yet, or this state
 * has no use for them. They stay at hand so that they can be mended or taken back.
 */
import type { Row } from '../../present/model.ts';
import { stateLabels } from '../../words/rows.ts';
import { useItem } from '../hand.tsx';
import { textAt } from '../text.ts';
import { OverrideField } from './OverrideField.tsx';
import { OVERRIDES, overridePath } from './overrides.ts';

/** @param state rows of the state that is shown; undefined before there is a result */
export function LostOverrides({ state }: { readonly state: readonly Row[] | undefined }) {
  const item = useItem((one) => one);
  const lost = OVERRIDES.filter(
    (name) => textAt(item, overridePath(name)) !== '' && !state?.some(({ id }) => id === name),
  );
  return lost.map((name) => <OverrideField key={name} name={name} label={stateLabels[name]} />);
}

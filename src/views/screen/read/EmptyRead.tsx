/** A project without a meter that could be read: it is described first. */
import { readWords as words } from '../../words/readings.ts';
import { Beginning } from '../Beginning.tsx';
import { useWorkbench } from '../binding.tsx';
import { focusFieldSoon } from '../focus.ts';
import { goTo } from '../place.ts';

export function EmptyRead() {
  const addMeter = useWorkbench((state) => state.addMeter);
  const begin = () => {
    addMeter();
    goTo('size');
    focusFieldSoon('pipe.size');
  };
  return <Beginning title={words.empty} text={words.emptyText} begin={words.begin} onBegin={begin} />;
}

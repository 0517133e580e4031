/** A project without surveys: how to begin. */
import { surveyPlace as words } from '../../words/survey-place.ts';
import { Beginning } from '../Beginning.tsx';
import { useWorkbench } from '../binding.tsx';
import { focusFieldSoon } from '../focus.ts';

export function EmptySurvey() {
  const add = useWorkbench((state) => state.addTraverse);
  const begin = () => {
    add();
    focusFieldSoon('section.width');
  };
  return <Beginning title={words.empty} text={words.emptyText} begin={words.begin} onBegin={begin} />;
}

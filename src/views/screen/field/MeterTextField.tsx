/** A text of the selected meter: its tag, its service, a plain number. */
import { fieldLabel } from '../../words/fields.ts';
import { useWorkbench } from '../binding.tsx';
import { useWrite } from '../hand.tsx';
import { useMeterText, useProblem } from '../meter.ts';
import { TextField } from './TextField.tsx';

interface Props {
  readonly path: string;
  readonly label?: string;
  readonly decimal?: boolean;
}

export function MeterTextField({ path, label = fieldLabel(path), decimal = false }: Props) {
  const text = useMeterText(path);
  const problem = useProblem(path);
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  return (
    <TextField
      path={path}
      label={label}
      text={text}
      problem={problem}
      decimal={decimal}
      write={(next) => write(path, next)}
      settle={settle}
    />
  );
}

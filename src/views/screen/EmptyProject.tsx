/** A project without meters: the ways to begin. */
import { Beginning } from './Beginning.tsx';
import { useWorkbench } from './binding.tsx';
import { focusFieldSoon } from './focus.ts';

export function EmptyProject() {
  const addMeter = useWorkbench((state) => state.addMeter);
  const begin = () => {
    addMeter();
    focusFieldSoon('pipe.size');
  };
  return (
    <Beginning
      title="Which bore, which differential, which flow?"
      text="State two of them, the pipe and the fluid. The third is found as you type, with its limits, its uncertainty and its working."
      begin="Size a meter"
      onBegin={begin}
    >
      A project file can also be dropped anywhere on this window. Everything stays in this browser.
    </Beginning>
  );
}

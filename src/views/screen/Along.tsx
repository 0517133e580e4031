/** The pipe, and the form lying along it: under each station of the drawing the inputs that belong there. */
import { PipeDrawing } from '../drawing/pipe.tsx';
import type { PresentedSizing } from '../present/model.ts';
import styles from './Along.module.css';
import { useCommands, useWorkbenchStore } from './binding.tsx';
import { drawingLabels } from './drawing-labels.ts';
import { pullTo } from './field/turn.ts';
import { MeterHead } from './MeterHead.tsx';
import type { SelectedMeter } from './meter.ts';
import { Downstream } from './station/Downstream.tsx';
import { Element } from './station/Element.tsx';
import { Flow } from './station/Flow.tsx';
import { Upstream } from './station/Upstream.tsx';
import { useWidth } from './useWidth.ts';

export function Along({ selected }: { readonly selected: SelectedMeter }) {
  const { sizing, stale } = selected;
  const [frame, width] = useWidth();
  return (
    <div className={styles.along}>
      <MeterHead index={selected.index} />
      <div className={styles.drawing} data-stale={stale && sizing !== undefined} ref={frame}>
        {sizing ? width > 0 && <Drawn sizing={sizing} width={width} /> : <Blank />}
        {sizing && stale && <p className={styles.stale}>last good result</p>}
      </div>
      <form className={styles.stations} onSubmit={(event) => event.preventDefault()} autoComplete="off">
        <Upstream />
        <Flow />
        <Element />
        <Downstream />
      </form>
    </div>
  );
}

function Drawn({ sizing, width }: { readonly sizing: PresentedSizing; readonly width: number }) {
  const store = useWorkbenchStore();
  return (
    <PipeDrawing
      shape={sizing.shape}
      heads={sizing.heads}
      dimensions={sizing.dimensions}
      labels={drawingLabels(sizing)}
      width={width}
      onPullBore={(ratio) => pullTo(ratio, store.getState())}
    />
  );
}

function Blank() {
  const commands = useCommands();
  return (
    <p className={styles.blank}>
      The pipe is drawn to scale as soon as its figures are in. To look around first,{' '}
      <button type="button" onClick={() => void commands.openExample()}>
        open the example
      </button>
      .
    </p>
  );
}

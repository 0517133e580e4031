/** The pipe, and the form lying along it: under each station of the drawing the inputs that belong there. */
import { Fragment } from 'react';
import { PipeDrawing } from '../drawing/pipe.tsx';
import type { PresentedProblem, PresentedSizing } from '../present/model.ts';
import { openingWord } from '../words/elements.ts';
import styles from './Along.module.css';
import { useCommands, useWorkbenchStore } from './binding.tsx';
import buttons from './button.module.css';
import { drawingLabels } from './drawing-labels.ts';
import { pullTo } from './field/turn.ts';
import { ItemHead } from './ItemHead.tsx';
import type { SelectedMeter } from './meter.ts';
import { Way } from './ProblemList.tsx';
import { Downstream } from './station/Downstream.tsx';
import { Element } from './station/Element.tsx';
import { Flow } from './station/Flow.tsx';
import { Upstream } from './station/Upstream.tsx';
import { unsolved } from './unsolved.ts';
import { useWidth } from './useWidth.ts';

export function Along({ selected }: { readonly selected: SelectedMeter }) {
  const { sizing, stale } = selected;
  const [frame, width] = useWidth();
  return (
    <div className={styles.along}>
      <ItemHead index={selected.index} list="meters" />
      <div className={styles.drawing} data-stale={stale && sizing !== undefined} ref={frame}>
        {sizing ? width > 0 && <Drawn sizing={sizing} width={width} /> : <Blank selected={selected} />}
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
  const hasBore = openingWord(sizing.shape.element) !== 'none';
  return (
    <PipeDrawing
      shape={sizing.shape}
      heads={sizing.heads}
      dimensions={sizing.dimensions}
      labels={drawingLabels(sizing)}
      width={width}
      onPullBore={hasBore ? (ratio) => pullTo(ratio, store.getState()) : undefined}
    />
  );
}

/** No drawing yet: what it waits for, or the example where nothing is begun. */
function Blank({ selected }: { readonly selected: SelectedMeter }) {
  const { wrong, missing, begun } = unsolved(selected);
  return (
    <p className={styles.blank}>
      {begun ? (
        <>
          {wrong.length > 0
            ? 'The pipe is drawn to scale once this is put right: '
            : 'The pipe is drawn to scale once this is given: '}
          <Ways to={wrong.length > 0 ? wrong : missing} />.
        </>
      ) : (
        <Beginning />
      )}
    </p>
  );
}

const Ways = ({ to }: { readonly to: readonly PresentedProblem[] }) =>
  [...new Set(to.map(({ field }) => field))].map((field, at) => (
    <Fragment key={field}>
      {at > 0 && ', '}
      <Way field={field} />
    </Fragment>
  ));

function Beginning() {
  const commands = useCommands();
  return (
    <>
      The pipe is drawn to scale as soon as its figures are in. To look around first,{' '}
      <button type="button" className={buttons.word} onClick={() => void commands.openExample()}>
        open the example
      </button>
      .
    </>
  );
}

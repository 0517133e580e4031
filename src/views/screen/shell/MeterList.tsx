/** The meters of the project: a list at the side, a strip with one choice on a narrow screen. */
import { memo } from 'react';
import type { MeterText } from '../../../core/document/project.ts';
import type { MeterResult } from '../../../core/result/record.ts';
import { useWorkbench, useWorkbenchStore } from '../binding.tsx';
import { focusFieldSoon } from '../focus.ts';
import { goTo, usePlace } from '../place.ts';
import { presented } from '../presented.ts';
import { textAt } from '../text.ts';
import { VerdictMark } from '../VerdictMark.tsx';
import styles from './MeterList.module.css';

export function MeterList() {
  const meters = useWorkbench((state) => state.project.meters);
  const results = useWorkbench((state) => state.results.results);
  const keys = useWorkbench((state) => state.keys);
  const selected = useWorkbench((state) => state.selected);
  const addMeter = useWorkbench((state) => state.addMeter);
  const hand = useWorkbench((state) => state.hand);
  const place = usePlace();
  const shown = place === 'sheet' ? hand === 'meters' : place !== 'survey';
  const add = () => {
    addMeter();
    if (place === 'survey') goTo('size');
    focusFieldSoon('pipe.size');
  };
  return (
    <nav className={styles.part} aria-label="Meters">
      <h2 className={styles.title}>Meters</h2>
      <MeterStrip />
      <ul className={styles.list}>
        {meters.map((meter, index) => {
          const result = results[index];
          return (
            result && (
              <MeterItem
                key={keys[index]}
                meter={meter}
                result={result}
                index={index}
                current={shown && index === selected}
              />
            )
          );
        })}
      </ul>
      <button type="button" className={styles.add} onClick={add}>
        Add a meter
      </button>
    </nav>
  );
}

interface ItemProps {
  readonly meter: MeterText;
  readonly result: MeterResult;
  readonly index: number;
  readonly current: boolean;
}

/** Drawn again only when its own meter or the display changes. */
const MeterItem = memo(function MeterItem({ meter, result, index, current }: ItemProps) {
  useWorkbench((state) => state.project.display);
  const store = useWorkbenchStore();
  const place = usePlace();
  const { tag, service, element, verdict } = presented(meter, store.getState().project, result);
  return (
    <li>
      <button
        type="button"
        className={styles.item}
        aria-current={current ? 'true' : undefined}
        onClick={() => {
          store.getState().select(index);
          if (place === 'survey') goTo('size');
        }}
      >
        <span className={styles.tag}>{tag || 'no tag'}</span>
        <VerdictMark verdict={verdict.worst} words={verdict.words} />
        <span className={styles.service}>{[service, element].filter(Boolean).join(', ')}</span>
      </button>
    </li>
  );
});

/** The same choice in one line, for a phone. */
function MeterStrip() {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results.results);
  const selected = useWorkbench((state) => state.selected);
  const select = useWorkbench((state) => state.select);
  const words = (meter: MeterText, index: number): string => {
    const result = results[index];
    const verdict = result === undefined ? '' : presented(meter, project, result).verdict.words;
    return [textAt(meter, 'tag') || 'no tag', textAt(meter, 'service'), verdict].filter(Boolean).join(' · ');
  };
  if (project.meters.length === 0) return null;
  return (
    <select
      className={styles.strip}
      aria-label="Meter"
      value={selected}
      onChange={(event) => select(Number(event.target.value))}
    >
      {project.meters.map((meter, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: an option is its place in the list
        <option key={index} value={index}>
          {words(meter, index)}
        </option>
      ))}
    </select>
  );
}

/** The surveys of the project: a list at the side, a strip with one choice on a narrow screen. */
import { memo } from 'react';
import type { TraverseText } from '../../../core/document/project.ts';
import type { TraverseResult } from '../../../core/result/record.ts';
import { surveyPlace as words } from '../../words/survey-place.ts';
import { useWorkbench, useWorkbenchStore } from '../binding.tsx';
import { focusFieldSoon } from '../focus.ts';
import { goTo, usePlace } from '../place.ts';
import { listed } from '../presented.ts';
import { VerdictMark } from '../VerdictMark.tsx';
import styles from './MeterList.module.css';

export function SurveyList() {
  const traverses = useWorkbench((state) => state.project.traverses) ?? [];
  const results = useWorkbench((state) => state.results.traverses);
  const keys = useWorkbench((state) => state.traverseKeys);
  const selected = useWorkbench((state) => state.traverseSelected);
  const hand = useWorkbench((state) => state.hand);
  const addTraverse = useWorkbench((state) => state.addTraverse);
  const place = usePlace();
  const shown = place === 'survey' || (place === 'sheet' && hand === 'traverses');
  const add = () => {
    addTraverse();
    goTo('survey');
    focusFieldSoon('section.width');
  };
  return (
    <nav className={styles.part} aria-label={words.title}>
      <h2 className={styles.title}>{words.title}</h2>
      <SurveyStrip />
      <ul className={styles.list}>
        {traverses.map((traverse, index) => {
          const result = results[index];
          return (
            result && (
              <SurveyItem
                key={keys[index]}
                traverse={traverse}
                result={result}
                index={index}
                current={shown && index === selected}
              />
            )
          );
        })}
      </ul>
      <button type="button" className={styles.add} onClick={add}>
        {words.add}
      </button>
    </nav>
  );
}

interface ItemProps {
  readonly traverse: TraverseText;
  readonly result: TraverseResult;
  readonly index: number;
  readonly current: boolean;
}

/** Drawn again only when its own survey or the display changes. */
const SurveyItem = memo(function SurveyItem({ traverse, result, index, current }: ItemProps) {
  useWorkbench((state) => state.project.display);
  const store = useWorkbenchStore();
  const place = usePlace();
  const { tag, service, title, verdict } = listed(traverse, store.getState().project, result);
  return (
    <li>
      <button
        type="button"
        className={styles.item}
        aria-current={current ? 'true' : undefined}
        onClick={() => {
          store.getState().selectTraverse(index);
          if (place !== 'sheet') goTo('survey');
        }}
      >
        <span className={styles.tag}>{tag || 'no tag'}</span>
        <VerdictMark verdict={verdict.worst} words={verdict.words} />
        <span className={styles.service}>{[service, title].filter(Boolean).join(', ')}</span>
      </button>
    </li>
  );
});

/** The same choice in one line, for a phone. */
function SurveyStrip() {
  const project = useWorkbench((state) => state.project);
  const results = useWorkbench((state) => state.results.traverses);
  const selected = useWorkbench((state) => state.traverseSelected);
  const select = useWorkbench((state) => state.selectTraverse);
  const traverses = project.traverses ?? [];
  if (traverses.length === 0) return null;
  return (
    <select
      className={styles.strip}
      aria-label={words.choose}
      value={selected}
      onChange={(event) => select(Number(event.target.value))}
    >
      {traverses.map((traverse, index) => {
        const result = results[index];
        const one = result && listed(traverse, project, result);
        return (
          // biome-ignore lint/suspicious/noArrayIndexKey: an option is its place in the list
          <option key={index} value={index}>
            {one && [one.tag, one.service, one.verdict.words].filter(Boolean).join(' · ')}
          </option>
        );
      })}
    </select>
  );
}

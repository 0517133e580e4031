/** One figure out of several that say the same thing: choosing another way of saying it takes the last one back. */
import { type ReactNode, useState } from 'react';
import { fieldLabel } from '../../words/fields.ts';
import box from '../field/box.module.css';
import { Frame } from '../field/Frame.tsx';
import { useItem, useWriteAll } from '../hand.tsx';
import { textAt } from '../text.ts';

interface Props {
  readonly id: string;
  readonly label: string;
  /** Paths in the order of the list. */
  readonly paths: readonly string[];
  /** Words for none of them; without them the first is asked for. */
  readonly none?: string;
  readonly children: (path: string) => ReactNode;
}

export function OneOf({ id, label, paths, none, children }: Props) {
  const written = useItem((item) => paths.filter((path) => textAt(item, path) !== '').join(' '));
  const writeAll = useWriteAll();
  const [wanted, setWanted] = useState(none === undefined ? (paths[0] ?? '') : '');
  const given = written === '' ? [] : written.split(' ');
  const chosen = given.includes(wanted) ? wanted : (given[0] ?? wanted);
  const choose = (path: string): void => {
    setWanted(path);
    writeAll(paths.filter((other) => other !== path).map((other) => [other, undefined] as const));
  };
  return (
    <>
      <Frame id={id} label={label}>
        <div className={box.box}>
          <select id={id} className={box.select} value={chosen} onChange={(event) => choose(event.target.value)}>
            {none !== undefined && <option value="">{none}</option>}
            {paths.map((path) => (
              <option key={path} value={path}>
                {fieldLabel(path)}
              </option>
            ))}
          </select>
        </div>
      </Frame>
      {shownOf(paths, chosen, given).map((path) => children(path))}
    </>
  );
}

/** The chosen one, and every other that a file gives beside it: what stands in the way must be seen. */
const shownOf = (paths: readonly string[], chosen: string, given: readonly string[]): readonly string[] =>
  paths.filter((path) => path === chosen || given.includes(path));

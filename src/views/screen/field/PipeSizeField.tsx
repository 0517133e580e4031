/** Picks a pipe from the table of sizes and fills in its bore. The table is second-hand and says so. */
import { useId, useState } from 'react';
import { namedOutright, type PipeSize, pipeSizeNamed, searchPipeSizes } from '../../../core/document/pipe-sizes.ts';
import { useWorkbench } from '../binding.tsx';
import { Mark } from '../Clause.tsx';
import { useMeterText } from '../meter.ts';
import styles from './box.module.css';
import { Frame } from './Frame.tsx';
import { PipeSizeList } from './PipeSizeList.tsx';
import { usePicker } from './usePicker.ts';

const SHOWN = 60; // more than anyone reads; the search narrows it

export function PipeSizeField() {
  const { size, query, found, search, pick, leave } = usePipeSize();
  const listId = useId();
  const picker = usePicker(found, pick, (open) => search(open ? size : undefined));
  const id = 'field-pipe.size';
  return (
    <Frame id={id} label="Line size" note={size !== '' && <SizeNote size={size} />}>
      <div className={styles.box} data-anchor="true">
        <input
          id={id}
          className={styles.input}
          data-field="pipe.size"
          type="text"
          role="combobox"
          autoComplete="off"
          spellCheck={false}
          placeholder="DN or NPS"
          aria-expanded={query !== undefined}
          aria-controls={listId}
          aria-autocomplete="list"
          aria-activedescendant={picker.active === undefined ? undefined : `${listId}-${picker.active}`}
          value={query ?? size}
          onChange={(event) => search(event.target.value)}
          onClick={() => search(query ?? size)}
          onKeyDown={picker.onKeyDown}
          onBlur={leave}
        />
        {query !== undefined && <PipeSizeList id={listId} sizes={found} active={picker.active} pick={pick} />}
      </div>
    </Frame>
  );
}

/** The size as written, and what is being searched for. Leaving the field takes a size that is named outright, and keeps any other text. */
function usePipeSize() {
  const size = useMeterText('pipe.size');
  const write = useWorkbench((state) => state.write);
  const writeAll = useWorkbench((state) => state.writeAll);
  const [query, search] = useState<string>();
  const pick = (chosen: PipeSize): void => {
    writeAll([
      ['pipe.size', chosen.name],
      ['pipe.bore', `${chosen.bore} mm`],
    ]);
    search(undefined);
  };
  const leave = (): void => {
    const named = query === undefined || query === size ? undefined : namedOutright(query);
    if (named !== undefined) pick(named);
    else if (query !== undefined && query !== size) write('pipe.size', query.trim());
    search(undefined);
  };
  const found = query === undefined ? [] : searchPipeSizes(query === size ? '' : query).slice(0, SHOWN);
  return { size, query, found, search, pick, leave };
}

/** Whether the bore below is still that of the size, and where the table comes from. */
function SizeNote({ size }: { readonly size: string }) {
  const bore = useMeterText('pipe.bore');
  const known = pipeSizeNamed(size);
  if (known === undefined) return <span>not in the table of sizes</span>;
  if (bore !== `${known.bore} mm`) return <span>the bore below is not the {known.bore} mm of this size</span>;
  return (
    <span title={`${known.source.clause}: check against your copy`}>
      nominal wall, table second-hand
      <Mark mark="°" />
    </span>
  );
}

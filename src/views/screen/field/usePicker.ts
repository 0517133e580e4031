/** Keys of a list under a text box: arrows choose, Enter picks, Escape closes. */
import { type KeyboardEvent, useState } from 'react';

interface Picker {
  readonly active: number | undefined;
  readonly onKeyDown: (event: KeyboardEvent) => void;
}

export function usePicker<Item>(
  items: readonly Item[],
  pick: (item: Item) => void,
  open: (open: boolean) => void,
): Picker {
  const [wanted, setActive] = useState<number>();
  const active = wanted === undefined || wanted >= items.length ? undefined : wanted;

  const step = (by: 1 | -1): void => {
    if (items.length === 0) open(true);
    else
      setActive(active === undefined ? (by === 1 ? 0 : items.length - 1) : (active + by + items.length) % items.length);
  };

  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      step(event.key === 'ArrowDown' ? 1 : -1);
    } else if (event.key === 'Enter') {
      const item = items[active ?? (items.length === 1 ? 0 : -1)];
      if (item === undefined) return;
      event.preventDefault();
      event.stopPropagation();
      pick(item);
      setActive(undefined);
    } else if (event.key === 'Escape') {
      open(false);
      setActive(undefined);
    }
  };
  return { active, onKeyDown };
}

/** Finds a field by a part of its name and goes there. */
import { type KeyboardEvent, useMemo, useState } from 'react';
import { fieldEntries, focusField } from '../focus.ts';
import { useDialogs } from './dialogs.tsx';
import styles from './FindField.module.css';

export function FindField() {
  const { show } = useDialogs();
  const [query, setQuery] = useState('');
  const entries = useMemo(fieldEntries, []);
  const words = query.toLowerCase().split(/\s+/).filter(Boolean);
  const found = entries.filter(({ label, place, path }) =>
    words.every((word) => `${label} ${place} ${path}`.toLowerCase().includes(word)),
  );
  const go = (path: string): void => {
    show(undefined);
    // The dialog gives the focus back as it closes; the field takes it after that.
    setTimeout(() => focusField(path));
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.key === 'Enter' && found[0] !== undefined) go(found[0].path);
  };
  return (
    <>
      <input
        className={styles.query}
        type="search"
        data-first
        aria-label="Name of the field"
        value={query}
        onChange={(event) => setQuery(event.target.value)}
        onKeyDown={onKeyDown}
      />
      <ul className={styles.list}>
        {found.map(({ path, label, place }) => (
          <li key={path}>
            <button type="button" onClick={() => go(path)}>
              {label} <span>{place}</span>
            </button>
          </li>
        ))}
      </ul>
      {found.length === 0 && <p>No field has such a name.</p>}
    </>
  );
}

/** A place with nothing in it yet: what it answers, and the ways to begin. */
import type { ReactNode } from 'react';
import styles from './Beginning.module.css';
import { useCommands } from './binding.tsx';

interface Props {
  readonly title: string;
  readonly text: string;
  readonly begin: string;
  readonly onBegin: () => void;
  readonly children?: ReactNode;
}

export function Beginning({ title, text, begin, onBegin, children }: Props) {
  const commands = useCommands();
  return (
    <div className={styles.empty}>
      <h1>{title}</h1>
      <p>{text}</p>
      <div className={styles.ways}>
        <button type="button" className={styles.first} onClick={onBegin}>
          {begin}
        </button>
        <button type="button" onClick={() => void commands.openExample()}>
          Open the example
        </button>
        <button type="button" onClick={() => void commands.openFile()}>
          Open a file
        </button>
      </div>
      {children && <p className={styles.small}>{children}</p>}
    </div>
  );
}

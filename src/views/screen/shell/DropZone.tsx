/** The whole window takes a dropped project file, or a log for the meter at hand. */
import { type DragEvent, type ReactNode, useState } from 'react';
import { useCommands } from '../binding.tsx';
import styles from './DropZone.module.css';

const hasFile = (event: DragEvent): boolean => event.dataTransfer.types.includes('Files');

export function DropZone({ children }: { readonly children: ReactNode }) {
  const commands = useCommands();
  const [over, setOver] = useState(false);
  const onDrop = (event: DragEvent): void => {
    if (!hasFile(event)) return;
    event.preventDefault();
    setOver(false);
    const [file] = event.dataTransfer.files;
    if (file !== undefined) void commands.openDropped(file);
  };
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: a drop target; its keyboard twin is the command Open
    <div
      className={styles.zone}
      onDragOver={(event) => {
        if (!hasFile(event)) return;
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={(event) => event.currentTarget.contains(event.relatedTarget as Node | null) || setOver(false)}
      onDrop={onDrop}
    >
      {children}
      {over && <p className={styles.over}>Let go to open the project or the log</p>}
    </div>
  );
}

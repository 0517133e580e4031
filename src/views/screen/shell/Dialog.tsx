/** A modal dialog of the browser: it holds the focus, closes by Escape and gives the focus back. */
import { type ReactNode, useEffect, useRef } from 'react';
import buttons from '../button.module.css';
import styles from './Dialog.module.css';

interface Props {
  readonly title: string;
  readonly close: () => void;
  readonly children: ReactNode;
}

export function Dialog({ title, close, children }: Props) {
  const ref = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const dialog = ref.current;
    dialog?.showModal();
    dialog?.querySelector<HTMLElement>('[data-first]')?.focus(); // else the browser takes the button Close
    return () => dialog?.close();
  }, []);
  return (
    <dialog ref={ref} className={styles.dialog} aria-labelledby="dialog-title" onClose={close}>
      <header>
        <h2 id="dialog-title">{title}</h2>
        <button type="button" className={buttons.framed} onClick={() => ref.current?.close()}>
          Close
        </button>
      </header>
      {children}
    </dialog>
  );
}

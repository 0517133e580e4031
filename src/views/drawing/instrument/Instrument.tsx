/** The instrument of a meter at one reading, on screen and on paper. */
import { useId } from 'react';
import { frame, type InstrumentProps } from './contract.ts';
import styles from './instrument.module.css';
import { drawingOf } from './registry.ts';

interface Props extends InstrumentProps {
  readonly kind: string;
  readonly onPaper?: boolean;
}

export function Instrument({ kind, onPaper = false, ...props }: Props) {
  const id = useId();
  const Drawing = drawingOf(kind);
  return (
    <svg
      className={onPaper ? styles.paper : styles.picture}
      viewBox={`0 0 ${frame.width} ${frame.height}`}
      role="img"
      aria-labelledby={`${id}t`}
      aria-describedby={`${id}d`}
    >
      <title id={`${id}t`}>{props.texts.title}</title>
      <desc id={`${id}d`}>{props.texts.description}</desc>
      <Drawing {...props} />
    </svg>
  );
}

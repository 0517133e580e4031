/** Words inside the plot: at a duty point, and at a range outside the limits. */
import styles from './chart.module.css';

interface Box {
  readonly x?: number;
  readonly y?: number;
  readonly width?: number;
  readonly height?: number;
}

interface DutyLabelProps {
  readonly words: string;
  readonly highest: boolean;
  /** So near the axis that nothing can stand below it. */
  readonly grounded: boolean;
  readonly viewBox?: Box;
}

/** Below and to the right of its point, where the curve leaves room, or beside it; the highest above and to the left. */
export function DutyLabel({ words, highest, grounded, viewBox }: DutyLabelProps) {
  const { x = 0, y = 0, width = 0, height = 0 } = viewBox ?? {};
  return (
    <text
      className={styles.duty}
      x={x + width / 2 + (highest ? -6 : 8)}
      y={y + height / 2 + (highest ? -10 : grounded ? 6 : 16)}
      textAnchor={highest ? 'end' : 'start'}
    >
      {words}
    </text>
  );
}

interface OutsideLabelProps {
  readonly words: string;
  /** The range lies at the lower end of the axis. */
  readonly low: boolean;
  readonly plotRight: number;
  readonly viewBox?: Box;
}

const LETTER = 7; // px, more than these words take for each of theirs

/**
 * Beside the range, where the curve is not: at the top of a low range, at the foot of a high one, with a leader. Within
 * a low range that leaves no room beside it.
 */
export function OutsideLabel({ words, low, plotRight, viewBox }: OutsideLabelProps) {
  const { x = 0, y = 0, width = 0, height = 0 } = viewBox ?? {};
  if (low && x + width + 16 + words.length * LETTER > plotRight) {
    return (
      <text className={styles.outsideWords} x={x + 10} y={y + 18}>
        {words}
      </text>
    );
  }
  if (low) {
    return (
      <g>
        <path className={styles.leader} d={`M${x + width / 2} ${y + 14}H${x + width + 12}`} />
        <text className={styles.outsideWords} x={x + width + 16} y={y + 18}>
          {words}
        </text>
      </g>
    );
  }
  const foot = y + height - 14;
  return (
    <g>
      <path className={styles.leader} d={`M${Math.min(x + width / 2, plotRight)} ${foot}H${x - 12}`} />
      <text className={styles.outsideWords} x={x - 16} y={foot + 4} textAnchor="end">
        {words}
      </text>
    </g>
  );
}

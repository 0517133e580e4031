/** Transmitter: the cell at its legs, its loop, and the place of the signal between its two ends. */

import { CellAtLegs } from './Cell.tsx';
import { type InstrumentProps, taps } from './contract.ts';
import styles from './instrument.module.css';

const BAR = { x: 318, top: 176, bottom: 300 } as const;

export function Loop({ picture, plate, texts }: InstrumentProps) {
  const middle = (taps.upstream + taps.downstream) / 2;
  return (
    <g>
      <CellAtLegs plate={plate} texts={texts} />
      <rect className={styles.head} x={middle - 24} y={258} width={48} height={40} rx={8} />
      <path className={styles.wide} d={`M${middle} 248V258`} />
      <path
        className={styles.wire}
        d={`M${middle + 24} 270H${BAR.x - 26}V240H${BAR.x - 8}M${middle + 24} 286H${BAR.x - 18}V256H${BAR.x - 8}`}
      />
      <Scale share={picture.share} texts={texts} />
      {picture.lowRangeShare !== undefined && (
        <text className={styles.note} x={20} y={318}>
          {texts.second}
        </text>
      )}
    </g>
  );
}

/** The range as a bar with its ends; the pointer leaves it where the signal does. */
function Scale({ share, texts }: { readonly share: number | undefined } & Pick<InstrumentProps, 'texts'>) {
  const { x, top, bottom } = BAR;
  const place = Math.min(1.08, Math.max(-0.08, share ?? 0));
  const y = bottom - place * (bottom - top);
  const marks = [0, 0.25, 0.5, 0.75, 1].map((part) => `M${x} ${bottom - part * (bottom - top)}h12`).join('');
  const filled = Math.min(bottom, Math.max(top, y));
  return (
    <g>
      <path className={styles.water} d={`M${x} ${bottom}V${filled}h12V${bottom}Z`} />
      <rect className={styles.barFrame} x={x} y={top} width={12} height={bottom - top} />
      <path className={styles.thin} d={marks} />
      <text className={styles.note} x={x + 20} y={bottom + 4}>
        {texts.ends[0]}
      </text>
      <text className={styles.note} x={x + 20} y={top + 4}>
        {texts.ends[1]}
      </text>
      {share !== undefined && (
        <>
          <path className={styles.pointer} d={`M${x - 10} ${y - 6}L${x} ${y}L${x - 10} ${y + 6}Z`} />
          <text className={styles.reading} x={x - 4} y={top - 14} textAnchor="middle">
            {texts.reading}
          </text>
        </>
      )}
    </g>
  );
}

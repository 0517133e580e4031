/** Well and tube: a wide well under the upstream leg, an upright tube beside it, the zero mark between. */
import { type InstrumentProps, taps } from './contract.ts';
import styles from './instrument.module.css';
import { below, Fill, Height, Note, Pipe, Tube } from './parts.tsx';

const TOP = 14;
const ZERO = 246;
const FLOOR = 292;
const REACH = 130; // of the largest separation
const WELL = { left: 70, right: 170, top: 206 } as const;

export function Well({ picture, most, plate, texts }: InstrumentProps) {
  const scale = most > 0 ? REACH / most : 0;
  const y1 = ZERO - scale * (picture.levelUpstream_m ?? 0);
  const y2 = Math.min(FLOOR - 4, ZERO - scale * (picture.levelDownstream_m ?? 0));
  const start = below(TOP, plate);
  const x2 = taps.downstream;
  return (
    <g>
      <Tube d={`M${taps.upstream} ${start.upstream}V${WELL.top}`} filling="water" />
      <Tube d={`M${WELL.right - 20} ${FLOOR - 8}H${x2}V${start.downstream}`} filling="water" />
      <path className={styles.water} d={`M${WELL.left} ${WELL.top}H${WELL.right}V${FLOOR}H${WELL.left}Z`} />
      <path className={styles.liquid} d={`M${WELL.left} ${y1}H${WELL.right}V${FLOOR}H${WELL.left}Z`} />
      <path className={styles.wide} d={`M${WELL.left} ${WELL.top}H${WELL.right}V${FLOOR}H${WELL.left}Z`} />
      <Fill d={`M${WELL.right - 1} ${FLOOR - 8}H${x2}V${y2}`} filling="liquid" />
      <path className={styles.mark} d={`M${WELL.left - 12} ${ZERO}H${x2 + 60}`} />
      <Pipe top={TOP} plate={plate} />
      <Note x={8} y={110} lines={texts.upstream} />
      <Note x={x2 + 18} y={90} lines={texts.downstream} />
      <Note x={x2 + 18} y={292} lines={texts.liquid.split(', ')} />
      <Height x={300} from={y2} to={ZERO} fromX={x2 + 10} toX={x2 + 10} label={texts.reading} />
    </g>
  );
}

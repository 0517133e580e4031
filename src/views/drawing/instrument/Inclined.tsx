/** Inclined tube: a well under the upstream leg, a tube that climbs slowly; the reading runs along it. */
import { Dimension } from '../Dimension.tsx';
import { at } from '../path.ts';
import { type InstrumentProps, taps } from './contract.ts';
import styles from './instrument.module.css';
import { below, Fill, Note, Pipe, Tube } from './parts.tsx';

const TOP = 14;
const FOOT = { x: 160, y: 270 } as const;
const WELL = { left: 70, right: 150, top: 216, floor: 292 } as const;
const LENGTH = 190;
const FIRST = 36; // along the tube, to its zero mark
/** A picture keeps an angle that can be seen. */
const SEEN = { least: 0.12, most: 1.05 } as const; // rad

export function Inclined({ picture, most, plate, angle, texts }: InstrumentProps) {
  const seen = Math.min(SEEN.most, Math.max(SEEN.least, angle));
  const [across, up] = [Math.cos(seen), Math.sin(seen)];
  const along = (length: number) => at(FOOT.x + length * across, FOOT.y - length * up);
  const share = most > 0 ? (picture.levelDownstream_m ?? 0) / most : 0;
  const end = along(FIRST + Math.max(-FIRST, share * (LENGTH - FIRST - 30)));
  const zero = along(FIRST);
  const top = along(LENGTH);
  const start = below(TOP, plate);
  const beside = (point: { x: number; y: number }) => at(point.x + 20 * up, point.y + 20 * across);
  return (
    <g>
      <Tube d={`M${taps.upstream - 10} ${start.upstream}V${WELL.top}`} filling="water" />
      <Tube
        d={`M${WELL.right - 20} ${FOOT.y}H${FOOT.x}L${top.x} ${top.y}V${start.downstream + 30}H${taps.downstream}V${start.downstream}`}
        filling="water"
      />
      <path className={styles.water} d={`M${WELL.left} ${WELL.top}H${WELL.right}V${WELL.floor}H${WELL.left}Z`} />
      <path className={styles.liquid} d={`M${WELL.left} ${zero.y}H${WELL.right}V${WELL.floor}H${WELL.left}Z`} />
      <path className={styles.wide} d={`M${WELL.left} ${WELL.top}H${WELL.right}V${WELL.floor}H${WELL.left}Z`} />
      <Fill d={`M${WELL.right - 1} ${FOOT.y}H${FOOT.x}L${end.x} ${end.y}`} filling="liquid" />
      <path className={styles.mark} d={`M${WELL.left - 12} ${zero.y}H${zero.x + 30}`} />
      <Pipe top={TOP} plate={plate} />
      <Dimension
        from={beside(zero)}
        to={beside(end)}
        head={7}
        className={styles.height}
        headClassName={styles.heightHead}
      />
      <text className={styles.reading} x={beside(end).x + 8} y={beside(end).y + 18}>
        {texts.reading}
      </text>
      <Note x={8} y={110} lines={texts.upstream} />
      <Note x={8} y={318} lines={[texts.liquid]} />
    </g>
  );
}

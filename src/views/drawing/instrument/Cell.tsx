/** A cell for the pressure difference at the end of two legs, with its three valves. */
import { type InstrumentProps, taps } from './contract.ts';
import styles from './instrument.module.css';
import { below, Note, Pipe, Tube } from './parts.tsx';

const TOP = 14;
const VALVES = 178;

/** The two legs, their block valves, the equaliser between them, and the body of the cell. */
export function CellAtLegs({ plate, texts }: Pick<InstrumentProps, 'plate' | 'texts'>) {
  const start = below(TOP, plate);
  const [x1, x2] = [taps.upstream, taps.downstream];
  return (
    <g>
      <Tube d={`M${x1} ${start.upstream}V232H${x1 + 30}`} filling="water" />
      <Tube d={`M${x2} ${start.downstream}V232H${x2 - 30}`} filling="water" />
      <path className={styles.wide} d={`M${x1 + 8} ${VALVES + 24}H${x2 - 8}`} />
      <Pipe top={TOP} plate={plate} />
      <Valve x={x1} y={VALVES} />
      <Valve x={x2} y={VALVES} />
      <Valve x={(x1 + x2) / 2} y={VALVES + 24} lying />
      <rect className={styles.body} x={x1 + 22} y={218} width={x2 - x1 - 44} height={30} rx={4} />
      <Note x={8} y={118} lines={texts.upstream} />
      <Note x={x2 + 18} y={90} lines={texts.downstream} />
      <Note x={x2 + 18} y={128} lines={texts.above} />
    </g>
  );
}

function Valve({ x, y, lying = false }: { readonly x: number; readonly y: number; readonly lying?: boolean }) {
  const d = lying
    ? `M${x - 11} ${y - 7}L${x + 11} ${y + 7}V${y - 7}L${x - 11} ${y + 7}Z`
    : `M${x - 7} ${y - 11}L${x + 7} ${y + 11}H${x - 7}L${x + 7} ${y - 11}Z`;
  return <path className={styles.valve} d={d} />;
}

export function Cell({ plate, texts }: InstrumentProps) {
  const middle = (taps.upstream + taps.downstream) / 2;
  return (
    <g>
      <CellAtLegs plate={plate} texts={texts} />
      <circle className={styles.dial} cx={middle} cy={282} r={26} />
      <path className={styles.wide} d={`M${middle} 248V256`} />
      <path className={styles.needle} d={`M${middle} 282L${middle + 11} 270`} />
      <text className={styles.reading} x={middle + 40} y={288}>
        {texts.reading}
      </text>
    </g>
  );
}

/** Two gauges: each above its tapping, what it shows beside it. */
import { type InstrumentProps, taps } from './contract.ts';
import styles from './instrument.module.css';
import { above, Note, Pipe, Tube } from './parts.tsx';

const TOP = 210;
const DIAL = 34;

export function Gauges({ plate, texts }: InstrumentProps) {
  const start = above(TOP, plate);
  return (
    <g>
      <Tube d={`M${taps.upstream - 20} ${start.upstream}V130`} filling="water" />
      <Tube d={`M${taps.downstream + 20} ${start.downstream}V150`} filling="water" />
      <Pipe top={TOP} plate={plate} />
      <Dial x={taps.upstream - 20} y={100} />
      <Dial x={taps.downstream + 20} y={120} />
      <text className={styles.reading} x={taps.upstream - 20} y={50} textAnchor="middle">
        {texts.reading}
      </text>
      <text className={styles.reading} x={taps.downstream + 20} y={70} textAnchor="middle">
        {texts.second}
      </text>
      <Note x={20} y={274} lines={texts.upstream} />
      <Note x={taps.downstream} y={274} lines={texts.downstream} />
      <Note x={20} y={312} lines={[texts.rise].filter((line) => line !== '')} />
    </g>
  );
}

const Dial = ({ x, y }: { readonly x: number; readonly y: number }) => (
  <g>
    <circle className={styles.dial} cx={x} cy={y} r={DIAL} />
    <path className={styles.thin} d={`M${x - 22} ${y + 14}A26 26 0 1 1 ${x + 22} ${y + 14}`} />
    <path className={styles.needle} d={`M${x} ${y}L${x + 14} ${y - 16}`} />
    <circle className={styles.hub} cx={x} cy={y} r={3} />
  </g>
);

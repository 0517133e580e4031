/** U-tube: two legs down from the tappings, the gauge liquid in their bend. */
import { type InstrumentProps, taps } from './contract.ts';
import { below, Fill, Height, Note, Pipe, Tube } from './parts.tsx';

const TOP = 14;
const MIDDLE = 205;
const BEND = 252;
const REACH = 84; // of the largest separation

export function UTube({ picture, most, plate, texts }: InstrumentProps) {
  const scale = most > 0 ? REACH / most : 0;
  const y1 = MIDDLE - scale * (picture.levelUpstream_m ?? 0);
  const y2 = MIDDLE - scale * (picture.levelDownstream_m ?? 0);
  const start = below(TOP, plate);
  const [x1, x2] = [taps.upstream, taps.downstream];
  const radius = (x2 - x1) / 2;
  const bend = `V${BEND}A${radius} ${radius * 0.9} 0 0 0 ${x2} ${BEND}`;
  return (
    <g>
      <Tube d={`M${x1} ${start.upstream}${bend}V${start.downstream}`} filling="water" />
      <Fill d={`M${x1} ${y1}${bend}V${y2}`} filling="liquid" />
      <Pipe top={TOP} plate={plate} />
      <Note x={8} y={118} lines={texts.upstream} />
      <Note x={x2 + 18} y={96} lines={texts.downstream} />
      <Note x={x2 + 18} y={134} lines={texts.above} />
      <Note x={x2 + 18} y={292} lines={texts.liquid.split(', ')} />
      <Height x={300} from={y2} to={y1} fromX={x2 + 10} toX={x1 + 10} label={texts.reading} />
    </g>
  );
}

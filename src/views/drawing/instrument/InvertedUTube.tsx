/** Inverted U-tube: two legs up from the tappings, the lighter fluid in their bend. */
import { type InstrumentProps, taps } from './contract.ts';
import { above, Fill, Height, Note, Pipe, Tube } from './parts.tsx';

const TOP = 278;
const MIDDLE = 150;
const BEND = 92;
const REACH = 84; // of the largest separation

export function InvertedUTube({ picture, most, plate, texts }: InstrumentProps) {
  const scale = most > 0 ? REACH / most : 0;
  const y1 = MIDDLE - scale * (picture.levelUpstream_m ?? 0);
  const y2 = MIDDLE - scale * (picture.levelDownstream_m ?? 0);
  const start = above(TOP, plate);
  const [x1, x2] = [taps.upstream, taps.downstream];
  const radius = (x2 - x1) / 2;
  const bend = `V${BEND}A${radius} ${radius * 0.9} 0 0 1 ${x2} ${BEND}`;
  return (
    <g>
      <Tube d={`M${x1} ${start.upstream}${bend}V${start.downstream}`} filling="water" />
      <Fill d={`M${x1} ${y1}${bend}V${y2}`} filling="air" />
      <Pipe top={TOP} plate={plate} />
      <Note x={8} y={228} lines={texts.upstream} />
      <Note x={x2 + 18} y={228} lines={texts.downstream} />
      <Note x={x2 + 18} y={36} lines={texts.liquid.split(', ')} />
      <Height x={300} from={y1} to={y2} fromX={x1 + 10} toX={x2 + 10} label={texts.reading} />
    </g>
  );
}

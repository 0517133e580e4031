/** The dimensions of the section: lengths in rows outside the metal, diameters across it, angles and notes. */
import type { Measure } from './contract.ts';
import { arrowhead, Dimension } from './Dimension.tsx';
import { paper, type SheetLayout } from './paper.ts';
import { at, onPage, type Point } from './path.ts';
import styles from './section.module.css';
import { widthOf } from './spread.ts';

type Of<Kind extends Measure['kind']> = Extract<Measure, { kind: Kind }>;
interface Of1<Kind extends Measure['kind']> {
  readonly measure: Of<Kind>;
  readonly layout: SheetLayout;
}

const past = 1.2; // extension lines run past the arrow
const lift = 0.9; // a figure stands this far above its line

export function Measures({ layout }: { readonly layout: SheetLayout }) {
  return layout.measures.map((measure) => {
    const key = `${measure.kind} ${measure.text} ${JSON.stringify(measure)}`;
    if (measure.kind === 'length') return <Length key={key} measure={measure} layout={layout} />;
    if (measure.kind === 'diameter') return <Diameter key={key} measure={measure} layout={layout} />;
    if (measure.kind === 'angle') return <Angle key={key} measure={measure} layout={layout} />;
    return <Note key={key} measure={measure} layout={layout} />;
  });
}

const Line = ({ from, to }: { readonly from: Point; readonly to: Point }) => (
  <line className={styles.thin} x1={from.x} y1={from.y} x2={to.x} y2={to.y} />
);

function Length({ measure, layout }: Of1<'length'>) {
  const [from, to] = [onPage(measure.from, layout.scale), onPage(measure.to, layout.scale)];
  const up = measure.row > 0;
  const y = up ? layout.above - measure.row * paper.row + 2 : layout.below - measure.row * paper.row - 2;
  const beyond = up ? -past : past;
  const wide = widthOf(measure.text, paper.type);
  const inside = wide + 2 * paper.head < to.x - from.x;
  const leftwards = measure.from.x < 0 && measure.to.x <= 0;
  const outer = 2.2 * paper.head + 1;
  const x = inside ? (from.x + to.x) / 2 : leftwards ? from.x - outer : to.x + outer;
  const anchor = inside ? 'middle' : leftwards ? 'end' : 'start';
  const shelf = leftwards ? [at(from.x, y), at(x - wide, y)] : [at(to.x, y), at(x + wide, y)];
  return (
    <g>
      <Line from={from} to={at(from.x, y + beyond)} />
      <Line from={to} to={at(to.x, y + beyond)} />
      <Dimension
        from={at(from.x, y)}
        to={at(to.x, y)}
        head={paper.head}
        className={styles.thin}
        headClassName={styles.arrow}
      />
      {inside ? null : <Line from={shelf[0] ?? from} to={shelf[1] ?? to} />}
      <text className={styles.figure} x={x} y={y - lift} textAnchor={anchor}>
        {measure.text}
      </text>
    </g>
  );
}

function Diameter({ measure, layout }: Of1<'diameter'>) {
  const { scale } = layout;
  const [top, bottom] = [at(measure.x, measure.radius), at(measure.x, -measure.radius)].map((point) =>
    onPage(point, scale),
  );
  if (top === undefined || bottom === undefined) return null;
  const edge = scale.originX + scale.factor * measure.edge;
  const away = Math.sign(top.x - edge) * past;
  const tight = bottom.y - top.y < 3.2 * paper.type;
  return (
    <g>
      {edge === top.x
        ? null
        : [top, bottom].map((end) => <Line key={end.y} from={at(edge, end.y)} to={at(end.x + away, end.y)} />)}
      <Dimension from={top} to={bottom} head={paper.head} className={styles.thin} headClassName={styles.arrow} />
      <text className={styles.figure} x={top.x + 1} y={tight ? top.y - 1.4 : scale.originY - lift}>
        {measure.text}
      </text>
    </g>
  );
}

function Angle({ measure, layout }: Of1<'angle'>) {
  const centre = onPage(measure.apex, layout.scale);
  const radius = measure.distance * layout.scale.factor; // below zero: the cone opens upstream
  const half = (measure.half * Math.PI) / 180;
  const end = (sign: 1 | -1): Point =>
    at(centre.x + radius * Math.cos(half), centre.y - sign * Math.abs(radius) * Math.sin(half));
  const tangent = (sign: 1 | -1): Point => at(-Math.sin(half) * Math.sign(radius), -sign * Math.cos(half));
  const [upper, lower] = [end(1), end(-1)];
  const size = Math.abs(radius);
  const sweep = radius > 0 ? 1 : 0;
  return (
    <g>
      <path className={styles.thin} d={`M${upper.x} ${upper.y}A${size} ${size} 0 0 ${sweep} ${lower.x} ${lower.y}`} />
      <polygon className={styles.arrow} points={arrowhead(upper, tangent(1), paper.head)} />
      <polygon className={styles.arrow} points={arrowhead(lower, tangent(-1), paper.head)} />
      <text className={styles.figure} x={centre.x + radius + 1} y={layout.scale.originY - lift}>
        {measure.text}
      </text>
    </g>
  );
}

function Note({ measure, layout }: Of1<'note'>) {
  const tip = onPage(measure.at, layout.scale);
  const knee = at(tip.x + measure.shift.x, tip.y - measure.shift.y);
  const length = Math.hypot(knee.x - tip.x, knee.y - tip.y);
  const along = at((tip.x - knee.x) / length, (tip.y - knee.y) / length);
  const left = measure.shift.x < 0;
  const wide = widthOf(measure.text, paper.type);
  return (
    <g>
      <Line from={knee} to={tip} />
      <Line from={knee} to={at(knee.x + (left ? -wide : wide), knee.y)} />
      <polygon className={styles.arrow} points={arrowhead(tip, along, paper.head)} />
      <text className={styles.figure} x={knee.x} y={knee.y - lift} textAnchor={left ? 'end' : 'start'}>
        {measure.text}
      </text>
    </g>
  );
}

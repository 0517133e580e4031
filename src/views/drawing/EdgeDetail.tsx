/** The edge of an orifice plate, enlarged at a stated scale: thicknesses, bevel, limit of the edge's radius. */
import type { DimensionRow, Shape } from '../present/model.ts';
import { figureOf, rowOf } from './casing.ts';
import { arrowhead, Dimension } from './Dimension.tsx';
import { plateOf } from './orifice-plate.ts';
import { paper, statedScale } from './paper.ts';
import { at } from './path.ts';
import styles from './section.module.css';
import { widthOf } from './spread.ts';
import type { SectionLabels } from './words.ts';

const frame = { left: 122, top: 1, width: 54, height: 54 };
const thick = 12.5; // widest drawing of the plate, mm
const edgeY = 36;
const topY = 15;

interface EdgeDetailProps {
  readonly shape: Shape;
  readonly dimensions: readonly DimensionRow[];
  readonly labels: SectionLabels;
  readonly hatch: string;
}

const named = (rows: readonly DimensionRow[], id: string): string | undefined => {
  const figure = figureOf(rows, id);
  const symbol = rowOf(rows, id)?.symbol;
  return figure === undefined ? undefined : `${symbol === undefined ? '' : `${symbol} `}${figure}`;
};

export function EdgeDetail({ shape, dimensions, labels, hatch }: EdgeDetailProps) {
  const plate = plateOf(shape, dimensions);
  const [drawn, real] = statedScale(thick / (1000 * plate.thickness));
  const factor = (1000 * drawn) / real;
  const face = frame.left + 13;
  const back = face + plate.thickness * factor;
  const edge = face + plate.edge * factor;
  const rise = Math.min((back - edge) * Math.tan((plate.bevel * Math.PI) / 180), edgeY - topY - 2);
  const solid = `M${face} ${topY}V${edgeY}H${edge}L${back} ${edgeY - rise}V${topY}`;
  return (
    <g>
      <rect className={styles.frame} x={frame.left} y={frame.top} width={frame.width} height={frame.height} />
      <text
        className={styles.figure}
        x={frame.left + 2}
        y={frame.top + 4.4}
      >{`${labels.edge}, ${drawn} : ${real}`}</text>
      <path fill={`url(#${hatch})`} stroke="none" d={`${solid}Z`} />
      <path className={styles.outline} fill="none" d={solid} />
      <path className={styles.thin} d={zigzag(face - 1.5, back + 1.5, topY)} />
      <EdgeFigures rows={dimensions} face={face} edge={edge} back={back} rise={rise} />
    </g>
  );
}

/** Break line across, with one tooth. */
function zigzag(from: number, to: number, y: number): string {
  const middle = (from + to) / 2;
  return `M${from} ${y}H${middle - 1}l0.7 -1.5l0.8 3l0.7 -1.5H${to}`;
}

interface EdgeFiguresProps {
  readonly rows: readonly DimensionRow[];
  readonly face: number;
  readonly edge: number;
  readonly back: number;
  readonly rise: number;
}

function EdgeFigures({ rows, face, edge, back, rise }: EdgeFiguresProps) {
  const whole = named(rows, 'plate-thickness');
  const short = named(rows, 'plate-thickness-edge');
  const bevel = figureOf(rows, 'bevel-angle');
  const radius = named(rows, 'edge-radius');
  const upper = topY - 4;
  const lower = edgeY + 5;
  const slope = at((edge + back) / 2, edgeY - rise / 2);
  const knee = at(Math.max(back, slope.x) + 4, slope.y + 3);
  return (
    <g>
      {whole === undefined ? null : (
        <Thickness text={whole} from={face} to={back} y={upper} foot={topY} past={-1.2} gap={3} />
      )}
      {short === undefined ? null : (
        <Thickness text={short} from={face} to={edge} y={lower} foot={edgeY} past={1.2} gap={6} />
      )}
      {bevel === undefined ? null : (
        <g>
          <path
            className={styles.thin}
            d={`M${slope.x} ${slope.y}L${knee.x} ${knee.y}h${widthOf(bevel, paper.type)}`}
          />
          <text className={styles.figure} x={knee.x} y={knee.y - 0.9}>
            {bevel}
          </text>
        </g>
      )}
      {radius === undefined ? null : <EdgeRadius text={radius} x={face} />}
    </g>
  );
}

interface ThicknessProps {
  readonly text: string;
  readonly from: number;
  readonly to: number;
  readonly y: number; // of the dimension line
  readonly foot: number; // where the extension lines start
  readonly past: number; // how far they run on
  readonly gap: number; // from the second arrow to the text
}

/** A thickness between two extension lines, its text beside it. */
function Thickness({ text, from, to, y, foot, past, gap }: ThicknessProps) {
  return (
    <g>
      <path className={styles.thin} d={`M${from} ${foot}V${y + past}M${to} ${foot}V${y + past}`} />
      <Dimension
        from={at(from, y)}
        to={at(to, y)}
        head={paper.head}
        className={styles.thin}
        headClassName={styles.arrow}
      />
      <path className={styles.thin} d={`M${to} ${y}H${to + gap + widthOf(text, paper.type)}`} />
      <text className={styles.figure} x={to + gap} y={y - 0.9}>
        {text}
      </text>
    </g>
  );
}

function EdgeRadius({ text, x }: { readonly text: string; readonly x: number }) {
  const knee = at(x - 5, edgeY + 14);
  const length = Math.hypot(5, 14);
  return (
    <g>
      <path
        className={styles.thin}
        d={`M${x} ${edgeY}L${knee.x} ${knee.y}H${knee.x + 1 + widthOf(text, paper.type)}`}
      />
      <polygon className={styles.arrow} points={arrowhead(at(x, edgeY), at(5 / length, -14 / length), paper.head)} />
      <text className={styles.figure} x={knee.x + 1.5} y={knee.y - 0.9}>
        {text}
      </text>
    </g>
  );
}

/** Parts that the pictures of instruments share: pipe, tubes with their liquids, notes, heights. */
import { Dimension } from '../Dimension.tsx';
import { at } from '../path.ts';
import { taps } from './contract.ts';
import styles from './instrument.module.css';

const BORE = 34;

/** The pipe with its element, the upper wall at `top`; the flow goes to the right. */
export function Pipe({ top, plate }: { readonly top: number; readonly plate: boolean }) {
  const [left, right, low] = [20, 380, top + BORE];
  const middle = (taps.upstream + taps.downstream) / 2;
  const throat = (y: number, depth: number): string =>
    `M${left} ${y}H${taps.upstream + 24}L${taps.downstream - 18} ${y + depth}H${taps.downstream + 18}L${right - 40} ${y}H${right}`;
  const wall = (y: number, depth: number): string => (plate ? `M${left} ${y}H${right}` : throat(y, depth));
  const inside = plate
    ? `M${left} ${top}H${right}V${low}H${left}Z`
    : `${throat(top, 9)}V${low}${throatBack(low, left, right)}Z`;
  return (
    <g>
      <path className={styles.water} d={inside} />
      <path className={styles.wide} d={wall(top, 9)} />
      <path className={styles.wide} d={wall(low, -9)} />
      {plate && <path className={styles.plate} d={`M${middle} ${top}V${top + 10}M${middle} ${low}V${low - 10}`} />}
      <path
        className={styles.flow}
        d={`M40 ${top + BORE / 2}H74M66 ${top + BORE / 2 - 5}L75 ${top + BORE / 2}L66 ${top + BORE / 2 + 5}`}
      />
    </g>
  );
}

const throatBack = (y: number, left: number, right: number): string =>
  `H${right - 40}L${taps.downstream + 18} ${y - 9}H${taps.downstream - 18}L${taps.upstream + 24} ${y}H${left}`;

/** Heights of the outside of the pipe at the tappings. */
export const below = (top: number, plate: boolean) => ({
  upstream: top + BORE,
  downstream: top + BORE - (plate ? 0 : 9),
});
export const above = (top: number, plate: boolean) => ({ upstream: top, downstream: top + (plate ? 0 : 9) });

export type Filling = 'water' | 'liquid' | 'air';

/** A tube along a path, and what stands in it. */
export function Tube({ d, filling }: { readonly d: string; readonly filling: Filling }) {
  return (
    <>
      <path className={styles.tube} d={d} />
      <path className={styles[`${filling}Tube`]} d={d} />
    </>
  );
}

/** A stretch of liquid in a tube that is drawn already. */
export const Fill = ({ d, filling }: { readonly d: string; readonly filling: Filling }) => (
  <path className={styles[`${filling}Tube`]} d={d} />
);

interface NoteProps {
  readonly x: number;
  readonly y: number;
  readonly lines: readonly string[];
  readonly end?: boolean;
}

export const Note = ({ x, y, lines, end = false }: NoteProps) => (
  <text className={styles.note} x={x} y={y} textAnchor={end ? 'end' : 'start'}>
    {lines.map((line, row) => (
      <tspan key={line} x={x} dy={row === 0 ? 0 : 15}>
        {line}
      </tspan>
    ))}
  </text>
);

interface HeightProps {
  readonly x: number;
  readonly from: number;
  readonly to: number;
  /** Where the lines to the levels begin. */
  readonly fromX: number;
  readonly toX: number;
  readonly label: string;
}

/** The height between two levels, with its label at the right. */
export function Height({ x, from, to, fromX, toX, label }: HeightProps) {
  return (
    <g>
      <path className={styles.leader} d={`M${fromX} ${from}H${x + 8}M${toX} ${to}H${x + 8}`} />
      <Dimension
        from={at(x, from)}
        to={at(x, to)}
        head={7}
        className={styles.height}
        headClassName={styles.heightHead}
      />
      <text className={styles.reading} x={x + 14} y={(from + to) / 2 + 5}>
        {label}
      </text>
    </g>
  );
}

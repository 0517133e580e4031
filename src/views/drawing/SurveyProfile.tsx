/** The velocities along each line, side by side on one scale, as far as they are read; the mean runs through all of them. */
import { useId } from 'react';
import type { SurveyProfile as Profile } from '../present/survey-model.ts';
import { surveyPicture as words } from '../words/surveys.ts';
import styles from './survey.module.css';

interface Props {
  readonly profile: Profile;
  readonly width: number;
  readonly height: number;
  readonly type?: number;
  readonly current?: number | undefined;
}

interface Frame {
  readonly left: number;
  readonly top: number;
  readonly bottom: number;
  /** Width of the panel of one line, and from one to the next. */
  readonly panel: number;
  readonly pitch: number;
  readonly y: (velocity: number) => number;
}

function frameOf({ lines, top }: Profile, width: number, height: number, type: number): Frame {
  const left = type * 3.4;
  const pitch = (width - left - type) / lines.length;
  const [high, bottom] = [type * 1.6, height - type * 1.8];
  const y = (velocity: number): number => bottom - (velocity / top.at) * (bottom - high);
  return { left, top: high, bottom, pitch, panel: pitch - Math.min(10, pitch * 0.12), y };
}

export function SurveyProfile({ profile, width, height, type = 10.5, current }: Props) {
  const id = useId();
  const frame = frameOf(profile, width, height, type);
  return (
    <svg
      className={styles.picture}
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-labelledby={`${id}t`}
      aria-describedby={`${id}d`}
      fontSize={type}
    >
      <title id={`${id}t`}>{words.profile}</title>
      <desc id={`${id}d`}>{profile.summary}</desc>
      <Scale profile={profile} frame={frame} type={type} />
      {profile.lines.map((line) => (
        <Panel key={line.at} line={line} frame={frame} current={current} />
      ))}
      <Mean profile={profile} frame={frame} width={width} type={type} />
    </svg>
  );
}

function Scale({ profile, frame, type }: { readonly profile: Profile; readonly frame: Frame; readonly type: number }) {
  const { left, y } = frame;
  return (
    <g>
      {[{ at: 0, text: '0' }, profile.half, profile.top].map(({ at, text }) => (
        <text key={at} className={styles.words} x={left - 5} y={y(at)} textAnchor="end" dominantBaseline="central">
          {text}
        </text>
      ))}
      <text className={styles.words} x={0} y={type * 0.8}>
        {profile.unit}
      </text>
    </g>
  );
}

type Line = Profile['lines'][number];

function Panel({ line, frame, current }: { line: Line; frame: Frame; current: number | undefined }) {
  const { left, top, bottom, panel, pitch, y } = frame;
  const from = left + line.at * pitch;
  const x = (share: number): number => from + share * panel;
  return (
    <g>
      <rect className={styles.panel} x={from} y={top} width={panel} height={bottom - top} />
      <path className={styles.grid} d={`M${from} ${(top + bottom) / 2}h${panel}`} />
      {line.points.map((point) =>
        point.velocity === undefined ? (
          <path
            key={point.number}
            className={point.number === current ? styles.next : styles.awaited}
            d={`M${x(point.at)} ${top}V${bottom}`}
          />
        ) : null,
      )}
      <path
        className={styles.curve}
        d={runs(line.points)
          .map((run) => strokeOf(run, x, y))
          .join('')}
      />
      {line.mean !== undefined && <path className={styles.lineMean} d={`M${from} ${y(line.mean)}h${panel}`} />}
      {line.points.map(({ number, at, velocity }) =>
        velocity === undefined ? null : (
          <circle
            key={number}
            className={number === current ? styles.ringed : styles.read}
            cx={x(at)}
            cy={y(velocity)}
            r={panel < 40 ? 2.2 : 3.2}
          />
        ),
      )}
      <text className={styles.words} x={from + panel / 2} y={bottom + 13} textAnchor="middle">
        {panel < 38 ? line.at + 1 : line.title}
      </text>
    </g>
  );
}

type Point = Line['points'][number];

/** Neighbours that are both read are joined; an open point parts the curve. */
function runs(points: readonly Point[]): readonly (readonly Point[])[] {
  const found: Point[][] = [[]];
  for (const point of points) {
    if (point.velocity === undefined) found.push([]);
    else found.at(-1)?.push(point);
  }
  return found.filter((run) => run.length > 1);
}

const strokeOf = (run: readonly Point[], x: (share: number) => number, y: (velocity: number) => number): string =>
  run.map(({ at, velocity = 0 }, order) => `${order === 0 ? 'M' : 'L'}${x(at)} ${y(velocity)}`).join('');

interface MeanProps {
  readonly profile: Profile;
  readonly frame: Frame;
  readonly width: number;
  readonly type: number;
}

/** The mean of all, or of what is read so far. */
function Mean({ profile: { mean }, frame, width, type }: MeanProps) {
  if (mean === undefined) return null;
  const y = frame.y(mean.at);
  return (
    <g>
      <path className={styles.mean} d={`M${frame.left} ${y}H${width - type}`} />
      <text className={styles.meanText} x={width - type} y={type * 0.8} textAnchor="end">
        {words.mean(mean.text)}
      </text>
    </g>
  );
}

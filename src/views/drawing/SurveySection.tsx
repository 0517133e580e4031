/** The section of a survey to scale: its ports, its lines, and its points numbered in the order of measuring. */
import { useId } from 'react';
import type { PresentedSurvey } from '../present/survey-model.ts';
import { surveyPicture as words } from '../words/surveys.ts';
import styles from './survey.module.css';
import { type Port, type Spot, type SurveyLayout, surveyLayout } from './survey-layout.ts';

interface Props {
  readonly survey: Pick<PresentedSurvey, 'shape' | 'section' | 'points' | 'measured' | 'lines'>;
  readonly width: number;
  readonly height: number;
  readonly type?: number;
  /** The point that is to be read next. */
  readonly current?: number | undefined;
  /** Takes the user to a point; its keyboard twin is the table. */
  readonly onPoint?: (number: number) => void;
}

export function SurveySection({ survey, width, height, type = 10.5, current, onPoint }: Props) {
  const id = useId();
  const layout = surveyLayout(survey.shape, { width, height, type });
  return (
    <svg
      className={styles.picture}
      width={layout.width}
      height={layout.height}
      viewBox={`0 0 ${layout.width} ${layout.height}`}
      role="img"
      aria-labelledby={`${id}t`}
      aria-describedby={`${id}d`}
      fontSize={type}
    >
      <title id={`${id}t`}>{words.section}</title>
      <desc id={`${id}d`}>{words.sectionText(survey.section, survey.lines.length, survey.points)}</desc>
      <Duct layout={layout} text={survey.section} />
      {layout.ports.map((port) => (
        <Way key={port.line} port={port} />
      ))}
      {layout.spots.map((spot) => (
        <Mark
          key={spot.number}
          spot={spot}
          radius={layout.radius}
          current={spot.number === current}
          onPoint={onPoint}
        />
      ))}
    </svg>
  );
}

const WALL = 3; // drawn thickness of the wall

function Duct({ layout: { outline, width, height }, text }: { readonly layout: SurveyLayout; readonly text: string }) {
  const caption = (
    <text className={styles.words} x={width / 2} y={height - 5} textAnchor="middle">
      {text}
    </text>
  );
  if (outline.shape === 'circle')
    return (
      <>
        <circle className={styles.inside} cx={outline.x} cy={outline.y} r={outline.radius} />
        <circle className={styles.wall} cx={outline.x} cy={outline.y} r={outline.radius + WALL / 2} />
        {caption}
      </>
    );
  const { x, y, width: w, height: h } = outline;
  return (
    <>
      <rect className={styles.inside} x={x} y={y} width={w} height={h} />
      <rect className={styles.wall} x={x - WALL / 2} y={y - WALL / 2} width={w + WALL} height={h + WALL} />
      {caption}
    </>
  );
}

/** A line of the probe, its port and the number of the line. */
function Way({ port: { from, to, end, title, label } }: { readonly port: Port }) {
  return (
    <g>
      <path className={styles.way} d={`M${to[0]} ${to[1]}L${end[0]} ${end[1]}`} />
      <path className={styles.port} d={`M${from[0]} ${from[1]}L${to[0]} ${to[1]}`} />
      <text className={styles.portNumber} x={label.x} y={label.y} textAnchor="middle" dominantBaseline="central">
        {title}
      </text>
    </g>
  );
}

interface MarkProps {
  readonly spot: Spot;
  readonly radius: number;
  readonly current: boolean;
  readonly onPoint: ((number: number) => void) | undefined;
}

/** A disc; a square where the wall rule moved the point. Filled once it is read, ringed while it is to be read. */
function Mark({ spot, radius, current, onPoint }: MarkProps) {
  const { x, y, number, moved, read, label } = spot;
  const kind = read ? styles.read : styles.open;
  const go = onPoint === undefined ? {} : { onClick: () => onPoint(number), className: styles.reach };
  return (
    <g data-point={number} {...go}>
      {onPoint && <circle className={styles.target} cx={x} cy={y} r={12} />}
      {current && <circle className={styles.ring} cx={x} cy={y} r={radius + 4} />}
      {moved ? (
        <rect className={kind} x={x - radius} y={y - radius} width={2 * radius} height={2 * radius} />
      ) : (
        <circle className={kind} cx={x} cy={y} r={radius} />
      )}
      {label && (
        <text className={styles.number} x={label.x} y={label.y} textAnchor="middle" dominantBaseline="central">
          {number}
        </text>
      )}
    </g>
  );
}

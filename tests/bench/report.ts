/** One line of the report, and the table of all of them. */
import type { Ratio } from './pairs.ts';

export interface Line {
  readonly name: string;
  readonly value: number;
  /** Quartiles and times, where the value is a ratio of pairs. */
  readonly ratio?: Ratio;
  readonly unit?: string;
  /** What the project wants of it; a report, not a gate. */
  readonly target?: string;
}

export const ratioLine = (name: string, ratio: Ratio, target?: string): Line => ({
  name,
  value: ratio.median,
  ratio,
  ...(target === undefined ? {} : { target }),
});

const spelled = (value: number): string =>
  value !== 0 && (Math.abs(value) < 1e-3 || Math.abs(value) >= 1e6) ? value.toExponential(1) : value.toPrecision(3);

const scales: readonly (readonly [number, string])[] = [
  [1, 's'],
  [1e-3, 'ms'],
  [1e-6, 'us'],
  [1e-9, 'ns'],
];
const time = (seconds: number): string => {
  const [scale, unit] = scales.find(([from]) => seconds >= from) ?? [1e-9, 'ns'];
  return `${(seconds / scale).toPrecision(3)} ${unit}`;
};

export function table(lines: readonly Line[]): string {
  const rows = lines.map(({ name, value, ratio, unit, target }) => [
    name,
    unit === 's' ? time(value) : `${spelled(value)}${unit === undefined ? '' : ` ${unit}`}`,
    ratio ? `${spelled(ratio.lower)} to ${spelled(ratio.upper)}` : '',
    ratio ? `${time(ratio.above)} / ${time(ratio.below)}` : '',
    target ?? '',
  ]);
  const head = ['what', 'median', 'quartiles', 'times', 'wanted'];
  const widths = head.map((title, at) => Math.max(title.length, ...rows.map((row) => row[at]?.length ?? 0)));
  return [head, widths.map((width) => '-'.repeat(width)), ...rows]
    .map((row) =>
      row
        .map((cell, at) => cell.padEnd(widths[at] ?? 0))
        .join('  ')
        .trimEnd(),
    )
    .join('\n');
}

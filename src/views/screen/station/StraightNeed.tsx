/** The straight pipe that the table asks for: column A, and column B with its price. */
import type { PresentedSizing } from '../../present/model.ts';
import { Mark } from '../Clause.tsx';

interface Props {
  readonly sizing: PresentedSizing;
  readonly side: 'upstream' | 'downstream';
}

export function StraightNeed({ sizing, side }: Props) {
  const rows = sizing.straight.filter((row) => row.side === side);
  const row =
    side === 'upstream'
      ? rows.find(({ chosen, fitting }) => chosen || fitting === 'any')
      : (rows.find(({ chosen }) => chosen) ?? rows[0]);
  if (row === undefined) return null;
  const hasShorter = row.reduced.includes('D');
  return (
    <span
      title={hasShorter ? `${row.cited.clause}. Column B adds 0.5\u00a0% to the uncertainty of C.` : row.cited.clause}
    >
      needs {row.full}
      {hasShorter && `, or ${row.reduced} with 0.5\u00a0% more`}
      <Mark mark={row.cited.mark} />
    </span>
  );
}

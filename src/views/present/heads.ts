/** The two head lines above the pipe, in metres or feet of the flowing fluid. */
import { fromSI } from '../../core/quantity/units.ts';
import type { HeadPoint, Solved } from '../../core/result/record.ts';
import type { Context } from './context.ts';
import type { Heads } from './model.ts';

/** None where the loss is not known. */
export function headsOf(at: Context, { heads }: Solved): Heads | undefined {
  if (heads.length === 0) return undefined;
  const { head } = at.units;
  const station = (name: string): HeadPoint => {
    const found = heads.find((point) => point.station === name);
    if (found === undefined)
      throw new Error(`expected the head at ${name}, got ${heads.map((point) => point.station)}`);
    return found;
  };
  const drop = station('tapping-upstream').pressure_m - station('tapping-downstream').pressure_m;
  const loss = station('inlet').total_m - station('recovered').total_m;
  return {
    points: heads.map(({ station: name, position_D, total_m, pressure_m, computed }) => ({
      station: name,
      position_D,
      total: fromSI(total_m, head),
      pressure: fromSI(pressure_m, head),
      computed,
    })),
    tappingDrop: at.value(drop, 'head'),
    loss: at.value(loss, 'head'),
  };
}

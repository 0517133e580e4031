/** What the two nozzles share: they are clamped between flanges and send a free jet into the pipe. */
import type { Shape } from '../present/model.ts';
import { flangedWalls, pipeFluid, radii, tappingAt } from './casing.ts';
import type { Reach, Section } from './contract.ts';
import { easing, fillingAgain, streamlinesAlong } from './jet.ts';
import { at, bothSides, closedThrough, endOf, type Path, type Point } from './path.ts';

interface Nozzle {
  readonly profile: Path;
  /** Outer contour of the metal from the exit back to the flange. */
  readonly back: readonly Point[];
  readonly flange: number; // H, thickness between the pipe's flanges
  readonly upstream: number; // x of the tapping holes
  readonly downstream: number;
  readonly hole: number; // their width
}

/** Section of a nozzle in its pipe. */
export function nozzleSection(shape: Shape, nozzle: Nozzle, reach: Reach): Section {
  const { profile, flange: thickness } = nozzle;
  const outside = radii(shape.pipe).flange + 0.05 * shape.pipe;
  const length = 0.2 * shape.pipe;
  const joint = { from: 0, to: thickness, upstream: length, downstream: length };
  const exit = endOf(profile).x;
  const end = at(exit, shape.bore / 2);
  const throat = profile.segments.at(-2)?.to ?? end;
  const jet = [...easing(at(-0.9 * shape.pipe, shape.pipe / 2), throat), end, ...fillingAgain(shape, end)];
  const ring = [at(thickness, outside), at(0, outside)];
  return {
    profile,
    walls: flangedWalls(shape.pipe, joint, reach),
    metal: bothSides([closedThrough(profile, [...nozzle.back, ...ring])]),
    fluid: pipeFluid(shape.pipe, reach),
    streamlines: streamlinesAlong(jet, reach),
    tappings: [nozzle.upstream, nozzle.downstream].map((x) => tappingAt(shape, x, joint, nozzle.hole)),
    edge: end,
    outside,
  };
}

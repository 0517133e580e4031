/**
 * Streamlines: the edge of the jet narrows to the element, leaves it, and fills the pipe again. Drawn, not computed;
 * only their meeting with the metal is to scale.
 */
import type { Shape } from '../present/model.ts';
import type { Reach } from './contract.ts';
import { smoothThrough } from './curve.ts';
import { at, bothSides, type Path, type Point, polyline } from './path.ts';

/** Shares of the jet's radius at which streamlines run. */
const lanes = [0.32, 0.62, 0.9];
const steps = 12;

const ease = (share: number): number => share * share * (3 - 2 * share);
const easeInverse = (eased: number): number => 0.5 - Math.sin(Math.asin(1 - 2 * eased) / 3);

/** Points of a level start, a smooth change of radius and a level end. */
export function easing(from: Point, to: Point): readonly Point[] {
  return Array.from({ length: steps + 1 }, (_, index) => {
    const share = index / steps;
    return at(from.x + share * (to.x - from.x), from.y + ease(share) * (to.y - from.y));
  });
}

/** Where an easing from a radius must start, to pass through a point on its way to the waist. */
export function startThrough(radius: number, through: Point, waist: Point): Point {
  const share = easeInverse((through.y - radius) / (waist.y - radius));
  return at((through.x - share * waist.x) / (1 - share), radius);
}

/** From the waist of a jet to where it fills the pipe and the pressure has recovered. */
export function fillingAgain(shape: Shape, waist: Point): readonly Point[] {
  const end = Math.max(waist.x + shape.pipe, shape.recovery_D * shape.pipe);
  return easing(waist, at(end, shape.pipe / 2)).slice(1);
}

/** Streamlines that follow the edge of the jet, upper and lower, and the axis. */
export function streamlinesAlong(jet: readonly Point[], reach: Reach): readonly Path[] {
  const inside = jet.filter((point) => point.x > reach.from && point.x < reach.to);
  const first = jet[0] ?? at(0, 0);
  const last = jet.at(-1) ?? first;
  const edge = [at(reach.from, first.y), ...inside, at(reach.to, last.y)];
  const upper = lanes.map((lane) => smoothThrough(edge.map((point) => at(point.x, lane * point.y))));
  return [...bothSides(upper), polyline([at(reach.from, 0), at(reach.to, 0)])];
}

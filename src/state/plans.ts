/** What a change of shape writes to a survey: the shape, and a plan that the shape has. */
import { planForShape, type WrittenPlan } from '../core/run/plan-for-shape.ts';

type Values = readonly (readonly [path: string, value: unknown])[];

export function withShape(written: WrittenPlan, shape: string): Values {
  const own = ['section.shape', shape] as const;
  if (shape !== 'circular' && shape !== 'rectangular') return [own];
  const plan = planForShape(shape, written);
  return plan === undefined ? [own] : [own, ...Object.entries(plan)];
}

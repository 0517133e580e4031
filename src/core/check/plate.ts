/** The plate itself, once its thickness and material are given: edge, thickness, and whether it stays flat. */
import { materialOf } from '../element/shared/growth.ts';
import type { Source } from '../quantity/source.ts';
import { type Case, flowsOf, largest, within } from './case.ts';
import type { Finding } from './finding.ts';

/** E/D' >= sqrt(dp (0.681 - 0.651 beta)/yield strength); the support is taken as D. */
const BENDING: Source = { clause: 'ISO/TR 9464, plate against yielding', seen: 'memory' };

/** Findings for what is stated of the plate: nothing of it is asked of other elements. */
export function checkPlate(subject: Case): readonly Finding[] {
  return [
    ...thickness(subject, 'plate-thickness', subject.input.element.plateThickness),
    ...thickness(subject, 'plate-thickness-edge', subject.input.element.edgeThickness),
    ...order(subject),
    ...bending(subject),
  ];
}

/** Against the element's own dimension of that name. */
function thickness({ solution }: Case, id: string, value: number | undefined): Finding[] {
  const { primary, geometry } = solution.meter;
  const dimension = primary.dimensions(geometry).find((one) => one.id === id);
  if (value === undefined || dimension === undefined) return [];
  const limit = {
    ...(dimension.min === undefined ? {} : { min: dimension.min }),
    ...(dimension.max === undefined ? {} : { max: dimension.max }),
  };
  return [
    {
      id,
      assumption: 'range-and-span',
      verdict: within(value, limit),
      value,
      unit: 'm',
      limit,
      source: dimension.source,
    },
  ];
}

/** The edge is no thicker than the plate it is cut from. */
function order({ input, solution }: Case): Finding[] {
  const { plateThickness: plate, edgeThickness: edge } = input.element;
  const dimension = solution.meter.primary
    .dimensions(solution.meter.geometry)
    .find((one) => one.id === 'plate-thickness');
  if (plate === undefined || edge === undefined || dimension === undefined || edge <= plate) return [];
  const common = { id: 'plate-edge-order', assumption: 'range-and-span', verdict: 'outside' } as const;
  return [{ ...common, value: edge, unit: 'm', limit: { max: plate }, source: dimension.source }];
}

/** Least thickness that does not yield at the largest differential, where the material's strength is known. */
function bending(subject: Case): Finding[] {
  const { input, solution } = subject;
  const { plateThickness: plate, material: key } = input.element;
  const { primary, geometry } = solution.meter;
  const strength = key === undefined ? undefined : materialOf(key)?.strength;
  const bends = primary.dimensions(geometry).some((one) => one.id === 'plate-thickness');
  if (plate === undefined || strength === undefined || !bends) return [];
  const flow = largest(flowsOf(subject), ({ differential }) => differential);
  const load = flow.differential * (0.681 - 0.651 * geometry.ratio); // ISO/TR 9464
  const min = geometry.pipe * Math.sqrt(Math.max(0, load) / strength.yieldStrength); // ISO/TR 9464
  return [
    {
      id: 'plate-bending',
      assumption: 'range-and-span',
      verdict: within(plate, { min }),
      value: plate,
      unit: 'm',
      limit: { min },
      source: BENDING,
      at: flow.name,
      detail: { yieldStrength: strength.yieldStrength },
    },
  ];
}

/** The plan of a traverse whose section takes another shape: its own where that shape has it, else the usual one. */
import { RULES, type Section } from '../input/traverse-section.ts';
import { fits } from '../traverse/plan.ts';
import { usualPlan } from '../traverse/suggest.ts';

/** Rule, lines and points as a file holds them. */
export type WrittenPlan = Readonly<Record<'rule' | 'lines' | 'pointsPerLine', unknown>>;

export interface ProposedPlan {
  readonly rule: string;
  readonly lines: number;
  readonly pointsPerLine: number;
}

/** The usual plan of the shape, where rule, lines and points as written do not fit it; undefined where they do. */
export function planForShape(shape: Section['shape'], written: WrittenPlan): ProposedPlan | undefined {
  const own = RULES.find((one) => one === written.rule);
  const counts = { ...counted('lines', written), ...counted('pointsPerLine', written) };
  if (own !== undefined && fits(shape, { rule: own, ...counts })) return undefined;
  const { rule, lines, pointsPerLine } = usualPlan({ shape });
  return { rule, lines, pointsPerLine };
}

type Count = 'lines' | 'pointsPerLine';

/** A count, a number or its text; what is neither fits no rule. */
const counted = (name: Count, { [name]: written }: WrittenPlan): { readonly [Name in Count]?: number } =>
  written === undefined || written === '' ? {} : { [name]: Number(written) };

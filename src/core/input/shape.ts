/**
 * Is this a meter at all? Types of the document's keys, checked at the edge with the path in each problem. What the
 * texts say is read afterwards, by form.ts; keys that are not named here pass through untouched.
 */
import * as v from 'valibot';
import type { MeterText } from '../document/project.ts';
import { fail, type Outcome, type Problem } from '../quantity/outcome.ts';

const text = v.optional(v.string());
const number = v.optional(v.union([v.string(), v.number()]));

const Meter = v.looseObject({
  tag: text,
  service: text,
  fluid: v.optional(v.looseObject({ kind: text })),
  upstream: v.optional(v.looseObject({ pressure: text, temperature: text, temperatureAt: text })),
  pipe: v.optional(v.looseObject({ size: text, bore: text, material: text, measuredAt: text, roughness: text })),
  element: v.optional(
    v.looseObject({
      kind: text,
      bore: text,
      material: text,
      measuredAt: text,
      plateThickness: text,
      edgeThickness: text,
      calibration: v.optional(v.array(v.looseObject({ reynolds: number, coefficient: number }))),
    }),
  ),
  duty: v.optional(v.looseObject({ maximum: text, normal: text, minimum: text })),
  differential: text,
  find: text,
  uncertainty: v.optional(v.looseObject({ bore: text, pipe: text, differential: text, density: text })),
  installation: v.optional(v.looseObject({ fitting: text, before: text, after: text, fluctuation: text })),
});

/** The meter as written, when every key has its type. Problems: text-expected, number-expected, group-expected, list-expected. */
export function meterShape(meter: unknown): Outcome<MeterText> {
  if (Array.isArray(meter)) return fail('group-expected', '', { written: 'a list' });
  const parsed = v.safeParse(Meter, meter);
  if (parsed.success) return { ok: true, value: meter as MeterText };
  const [first, ...rest] = parsed.issues;
  return { ok: false, problems: [problemOf(first), ...rest.map(problemOf)] };
}

const EXPECTED: Readonly<Record<string, string>> = {
  string: 'text-expected',
  '(string | number)': 'number-expected',
  Object: 'group-expected',
  Array: 'list-expected',
};

function problemOf(issue: v.InferIssue<typeof Meter>): Problem {
  return {
    code: EXPECTED[issue.expected ?? ''] ?? 'group-expected',
    field: v.getDotPath(issue) ?? '',
    detail: { written: issue.received },
  };
}

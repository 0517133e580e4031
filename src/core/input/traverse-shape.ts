/** Is this a traverse at all? Types of its keys, checked at the edge with the path in each problem, as for a meter. */
import * as v from 'valibot';
import type { TraverseText } from '../document/project.ts';
import { fail, type Outcome, type Problem } from '../quantity/outcome.ts';

const text = v.optional(v.string());
const number = v.optional(v.union([v.string(), v.number()]));
const group = <Entries extends v.ObjectEntries>(entries: Entries) => v.optional(v.looseObject(entries));

const Traverse = v.looseObject({
  tag: text,
  service: text,
  section: group({ shape: text, diameter: text, width: text, height: text, ports: text }),
  rule: text,
  lines: number,
  pointsPerLine: number,
  wallRule: text,
  profile: group({ kind: text, at: text, exponent: number, meanOverCentre: number }),
  port: text,
  straight: group({ before: text, after: text }),
  probe: group({
    kind: text,
    coefficient: number,
    calibration: v.optional(v.array(v.looseObject({ velocity: text, coefficient: number }))),
    head: text,
    stem: text,
    hole: text,
    alignment: text,
  }),
  fluid: group({ kind: text }),
  state: group({ pressure: text, temperature: text }),
  manometer: group({
    liquid: v.optional(v.union([v.string(), v.looseObject({ density: text })])),
    temperature: text,
    angle: text,
  }),
  readings: v.optional(v.array(v.array(v.string()))),
  reference: v.optional(v.array(v.string())),
  nullAngle: text,
  corrections: group({ blockage: text, turbulence: text, wall: number }),
  uncertainty: group({ reading: text, coefficient: text, density: text, area: text, points: text }),
});

/** The traverse as written, when every key has its type. Problems: text-expected, number-expected, group-expected, list-expected. */
export function traverseShape(traverse: unknown): Outcome<TraverseText> {
  if (Array.isArray(traverse)) return fail('group-expected', '', { written: 'a list' });
  const parsed = v.safeParse(Traverse, traverse);
  if (parsed.success) return { ok: true, value: traverse as TraverseText };
  const [first, ...rest] = parsed.issues.map(problemOf);
  return { ok: false, problems: [first as Problem, ...rest] };
}

const EXPECTED: Readonly<Record<string, string>> = {
  string: 'text-expected',
  '(string | number)': 'number-expected',
  '(string | Object)': 'text-expected',
  Object: 'group-expected',
  Array: 'list-expected',
};

function problemOf(issue: v.InferIssue<typeof Traverse>): Problem {
  return {
    code: EXPECTED[issue.expected ?? ''] ?? 'group-expected',
    field: v.getDotPath(issue) ?? '',
    detail: { written: issue.received },
  };
}

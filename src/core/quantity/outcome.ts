/**
 * An answer that can fail: the value, or a problem. A problem is input that cannot be read or solved; it names its
 * place and its cause by code, views/words turns it into a sentence. It is never thrown.
 */
export interface Problem {
  /** Code in kebab case, for example `unit-unknown`. Every code has a sentence in views/words. */
  readonly code: string;
  /** Path of the field in the document, dots between keys, for example `upstream.pressure`. */
  readonly field: string;
  /** What the sentence needs: what was written, what was expected, bounds, figures in SI. */
  readonly detail: Readonly<Record<string, string | number>>;
}

export type Outcome<Value> =
  | { readonly ok: true; readonly value: Value }
  | { readonly ok: false; readonly problems: readonly [Problem, ...Problem[]] };

/** An outcome that succeeded. */
export const ok = <Value>(value: Value): Outcome<Value> => ({ ok: true, value });

/** An outcome that failed with one problem. */
export const fail = (code: string, field: string, detail: Problem['detail'] = {}): Outcome<never> => ({
  ok: false,
  problems: [{ code, field, detail }],
});

/** The problems of several outcomes together, in their order; at least one of them must have failed. */
export function gather(...outcomes: readonly Outcome<unknown>[]): Outcome<never> {
  const [first, ...rest] = outcomes.flatMap((outcome) => (outcome.ok ? [] : outcome.problems));
  if (first === undefined) throw new Error('gather: expected a failed outcome, got none');
  return { ok: false, problems: [first, ...rest] };
}

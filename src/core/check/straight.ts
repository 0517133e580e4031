/** One streamline: the straight pipe that stands against the straight pipe that the table asks for. */
import type { Part, StraightLength } from '../element/contract.ts';
import type { MeterInput } from '../input/meter.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import type { Solution } from '../solve/solve.ts';
import type { Open } from '../uncertainty/iso5167.ts';
import type { Finding } from './finding.ts';

/** What a length between columns B and A adds to the uncertainty of C. */
const REDUCED_PERCENT = 0.5; // ISO 5167-2:2003, 6.2.4; ISO 5167-3:2003, 6.2.4; ISO 5167-4:2003, 6.2.4

/** A row that holds for every fitting. */
const ANY = 'any';

export interface Straightness {
  readonly findings: readonly Finding[];
  /** Additional parts of the uncertainty of C. */
  readonly parts: readonly Part[];
  readonly lengths: readonly StraightLength[];
  /** Shorter than any length of the table: what that does to C the standard does not say. */
  readonly open: readonly Open[];
}

/** Judges the installation. Problem choice-unknown: the element's table has no such fitting. */
export function straightness(input: MeterInput, solution: Solution): Outcome<Straightness> {
  const { primary, geometry } = solution.meter;
  const lengths = primary.straightLengths(geometry.ratio, solution.duty.maximum.reynolds);
  const { fitting, before, after } = input.installation;
  const table = lengths.filter(({ side }) => side === 'upstream');
  const upstream = table.find((length) => length.fitting === ANY || length.fitting === fitting);
  if (fitting !== undefined && upstream === undefined && primary.insertion === undefined) {
    const choices = table.map((length) => length.fitting);
    return fail('choice-unknown', 'installation.fitting', { written: fitting, choices: choices.join(', ') });
  }
  const downstream = lengths.find((length) => length.side === 'downstream');
  const judged = [judge('straight-upstream', before, upstream), judge('straight-downstream', after, downstream)];
  const findings = judged.flatMap((finding) => (finding === undefined ? [] : [finding]));
  const reduced = findings.filter(({ verdict }) => verdict === 'caution');
  const both = reduced.length === 2; // shortened on both sides: beyond the standard's allowance
  return ok({
    findings: both
      ? findings.map(
          (finding): Finding => ({ ...finding, verdict: 'outside', detail: { ...finding.detail, both: 'yes' } }),
        )
      : findings,
    parts: reduced.map(({ source }) => ({ id: 'straight-length', percent: REDUCED_PERCENT, source })).slice(0, 1),
    lengths,
    open: both || findings.some(({ verdict }) => verdict === 'outside') ? ['straight-length'] : [],
  });
}

function judge(id: string, length: number | undefined, needed: StraightLength | undefined): Finding | undefined {
  if (length === undefined || needed === undefined) return undefined;
  const { full, reduced, source, fitting, note } = needed;
  const verdict = length >= full ? 'inside' : reduced !== undefined && length >= reduced ? 'caution' : 'outside';
  return {
    id,
    assumption: 'one-streamline',
    verdict,
    value: length,
    unit: 'D',
    limit: { min: full },
    source,
    detail: { fitting, ...(reduced === undefined ? {} : { reduced }), ...(note === undefined ? {} : { note }) },
  };
}

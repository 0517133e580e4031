/** What could not be checked of a traverse because the file does not say enough; silence is no pass. */
import type { TraverseInput } from '../input/traverse.ts';
import type { Assumption } from './finding.ts';
import type { Unchecked } from './unchecked.ts';

/** The checks that are open for want of an input, in the order of the assumptions. */
export function uncheckedTraverse({ straight, nullAngle, probe, reference }: TraverseInput): readonly Unchecked[] {
  const open = (id: string, assumption: Assumption, needs: string, wanting: boolean): Unchecked[] =>
    wanting ? [{ id, assumption, needs }] : [];
  return [
    ...open('traverse-drift', 'steady', 'reference', reference.length < 2),
    ...open('traverse-hole-reynolds', 'frictionless', 'probe.hole', probe.hole === undefined),
    ...open('traverse-straight-before', 'one-streamline', 'straight.before', straight.before === undefined),
    ...open('traverse-straight-after', 'one-streamline', 'straight.after', straight.after === undefined),
    ...open('traverse-swirl', 'one-streamline', 'nullAngle', nullAngle === undefined),
    ...open('traverse-head-size', 'one-streamline', 'probe.head', probe.head === undefined),
    ...open('traverse-stem-blockage', 'one-streamline', 'probe.stem', probe.stem === undefined),
    ...open('traverse-alignment', 'one-streamline', 'probe.alignment', probe.alignment === undefined),
  ];
}

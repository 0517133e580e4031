/** What could not be checked because the file does not say enough; silence is no pass. */
import type { Case } from './case.ts';
import type { Assumption } from './finding.ts';

export interface Unchecked {
  /** Id of the finding that is missing. */
  readonly id: string;
  readonly assumption: Assumption;
  /** Field that would have to be filled in. */
  readonly needs: string;
}

/** The checks that are open for want of an input, in the order of the assumptions. */
export function unchecked({ input, solution }: Case): readonly Unchecked[] {
  const { primary, geometry, state } = solution.meter;
  const { fluctuation } = input.installation;
  const limited = primary.limits(geometry, 0).some(({ id }) => id === 'pipe-roughness');
  const ranged = primary.limits(geometry, 0).some(({ id }) => id === 'reynolds-pipe');
  const plate = primary.dimensions(geometry).some(({ id }) => id === 'plate-thickness');
  return [
    ...open('fluctuation', 'steady', 'installation.fluctuation', fluctuation === undefined),
    ...open('pipe-roughness', 'frictionless', 'pipe.roughness', limited && input.pipe.roughness === undefined),
    ...open('reynolds-pipe', 'frictionless', 'element.reynoldsMin', !ranged),
    ...straightNeeds({ input, solution }),
    ...open(
      'cavitation',
      'one-phase',
      'fluid.vapourPressure',
      state.phase === 'liquid' && state.vapourPressure === undefined,
    ),
    ...open(
      'plate-thickness',
      'range-and-span',
      'element.plateThickness',
      plate && input.element.plateThickness === undefined,
    ),
  ];
}

const open = (id: string, assumption: Assumption, needs: string, wanting: boolean): readonly Unchecked[] =>
  wanting ? [{ id, assumption, needs }] : [];

/** First what says how much straight pipe is needed, the fitting or the sheet; then how much there is. */
function straightNeeds({ input, solution }: Case): readonly Unchecked[] {
  const { primary, geometry } = solution.meter;
  const { fitting, before, after } = input.installation;
  const bar = primary.insertion !== undefined;
  const lengths = bar ? primary.straightLengths(geometry.ratio, 0) : [];
  const asked = (side: 'upstream' | 'downstream') => !bar || lengths.some((length) => length.side === side);
  const known = bar ? asked('upstream') : fitting !== undefined;
  const says = bar ? 'element.straightBefore' : 'installation.fitting';
  return [
    ...open('straight-upstream', 'one-streamline', says, !known),
    ...open('straight-upstream', 'one-streamline', 'installation.before', known && before === undefined),
    ...open('straight-downstream', 'one-streamline', 'element.straightAfter', !asked('downstream')),
    ...open('straight-downstream', 'one-streamline', 'installation.after', asked('downstream') && after === undefined),
  ];
}

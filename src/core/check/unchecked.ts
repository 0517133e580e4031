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
  const { fluctuation, fitting, before, after } = input.installation;
  const limited = primary.limits(geometry, 0).some(({ id }) => id === 'pipe-roughness');
  const plate = primary.dimensions(geometry).some(({ id }) => id === 'plate-thickness');
  const open = (id: string, assumption: Assumption, needs: string, wanting: boolean): Unchecked[] =>
    wanting ? [{ id, assumption, needs }] : [];
  return [
    ...open('fluctuation', 'steady', 'installation.fluctuation', fluctuation === undefined),
    ...open('pipe-roughness', 'frictionless', 'pipe.roughness', limited && input.pipe.roughness === undefined),
    ...open('straight-upstream', 'one-streamline', 'installation.fitting', fitting === undefined),
    ...open(
      'straight-upstream',
      'one-streamline',
      'installation.before',
      fitting !== undefined && before === undefined,
    ),
    ...open('straight-downstream', 'one-streamline', 'installation.after', after === undefined),
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

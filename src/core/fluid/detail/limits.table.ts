/**
 * Gas of pipeline quality: mole fractions of a component, or of a group in sum, and the limit of each.
 * Source: ISO 20765-1:2005, from memory: check against your copy.
 */

/** A limit of a mole fraction, one side of it. */
export interface ShareLimit {
  readonly min?: number;
  readonly max?: number;
}

export const limits: readonly (readonly [names: readonly string[], limit: ShareLimit])[] = [
  [['methane'], { min: 0.7 }],
  [['nitrogen'], { max: 0.2 }],
  [['carbon-dioxide'], { max: 0.2 }],
  [['ethane'], { max: 0.1 }],
  [['propane'], { max: 0.035 }],
  [['isobutane', 'n-butane'], { max: 0.015 }],
  [['isopentane', 'n-pentane'], { max: 0.005 }],
  [['n-hexane', 'n-heptane', 'n-octane', 'n-nonane', 'n-decane'], { max: 0.002 }],
  [['hydrogen'], { max: 0.1 }],
  [['carbon-monoxide'], { max: 0.03 }],
  [['helium'], { max: 0.005 }],
  [['water'], { max: 0.00015 }],
];

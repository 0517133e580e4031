/** Remarks on the figures of air and of gases by the cubic equation. */
export const airRemarks: Readonly<Record<string, string>> = {
  'over-water': 'Over liquid water.',
  'over-ice': 'Over ice: below 0\u00a0°C a dew point is read as a frost point.',
  'over-supercooled-water': 'Over liquid water, also below 0\u00a0°C: that is the custom for relative humidity.',
  'enhancement-factor': 'What the air adds to the vapour that stands over water or ice alone.',
  'air-compressibility': 'From the formula for moist air at pressure and temperature.',
  'viscosity-of-air': 'From the reference correlation of dry air; too long to print here.',
  'viscosity-of-moist-air': 'From the reference correlation of dry air, times what the vapour changes in the mixture.',
  'air-base-wet': 'The moist air, all its water counted as vapour also at the base state.',
  'air-base-dry': 'The dry air alone: the mass flow over this density is its base volume flow.',
  'cubic-compressibility': 'From the largest root of the cubic equation.',
  'cubic-exponent': 'From the cubic equation and the heat capacity of the ideal gas.',
};

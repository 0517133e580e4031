/** Remarks on the figures of liquids and of wet steam. */
const group = (words: string): string => `By the tables of ${words}, from the density at 60\u00a0°F.`;

export const liquidRemarks: Readonly<Record<string, string>> = {
  override: 'Put in by the user in place of the figure of the fluid.',
  'liquid-saturated-density': 'Along saturation from the equation of the handbook, then corrected for pressure.',
  'liquid-viscosity-curve': 'From the equation of the handbook, along saturation.',
  'liquid-vapour-curve': 'From the equation of the handbook.',
  'liquid-mixture-density': 'From the polynomial of the mixture, then corrected for pressure.',
  'liquid-mixture-viscosity': 'From the polynomial of the mixture.',
  'liquid-solution-density': 'From the correlation of the solution, then corrected for pressure.',
  'liquid-solution-viscosity': 'From the correlation of the solution.',
  'liquid-vapour-of-water': 'Of water alone, an upper bound over the solution.',
  'liquid-table-between': 'Between the points of the table.',
  'liquid-own-density': 'Between the rows of the table, a straight line over the temperature.',
  'liquid-own-andrade': 'Between the rows, the logarithm a straight line over the inverse of the temperature.',
  'liquid-own-walther': 'Along the line of an oil through the stated points.',
  'liquid-at-base': 'The same liquid at the base state of the project.',
  'wet-steam-vapour': 'That of the dry saturated vapour; none is defined for the mixture.',
  'petroleum-crude': group('crude oil'),
  'petroleum-fuel-oil': group('fuel oil'),
  'petroleum-jet-kerosene': group('jet fuel and kerosene'),
  'petroleum-transition': group('products between petrol and kerosene'),
  'petroleum-gasoline': group('petrol'),
  'petroleum-lubricating': group('lubricating oil'),
};

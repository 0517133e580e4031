/** Names of the liquids as they stand in the file, by what is asked beside each. */
export const petroleum = ['crude-oil', 'refined-product', 'lubricating-oil'];
export const mixtures = [
  'ethylene-glycol-water', 'propylene-glycol-water', 'ethanol-water', 'methanol-water', 'glycerol-water',
  'ammonia-water', 'potassium-carbonate-brine', 'calcium-chloride-brine', 'magnesium-chloride-brine',
  'sodium-chloride-brine', 'potassium-acetate-brine', 'potassium-formate-brine',
];
export const inhibited = ['ethylene-glycol-water-inhibited', 'propylene-glycol-water-inhibited'];
export const solutions = [
  'calcium-chloride-solution', 'sulfuric-acid-solution', 'phosphoric-acid-solution', 'hydrochloric-acid-solution',
  'nitric-acid-solution', 'potassium-carbonate-solution', 'potassium-chloride-solution',
  'potassium-hydroxide-solution', 'magnesium-chloride-solution', 'sodium-carbonate-solution',
  'sodium-chloride-solution', 'sodium-hydroxide-solution', 'ammonia-solution',
];
export const pure = [
  'methanol', 'ethanol', '2-propanol', '1-propanol', '1-butanol', 'acetone', 'methyl-ethyl-ketone', 'benzene',
  'toluene', 'p-xylene', 'o-xylene', 'ethylbenzene', 'styrene', 'cyclohexane', 'acetic-acid', 'ethyl-acetate',
  'ethylene-glycol', 'propylene-glycol', 'ammonia', 'propane', 'butane', 'isobutane', 'pentane', 'hexane', 'heptane',
  'octane', 'decane', 'ethylene', 'propylene', 'chlorine', 'sulfur-dioxide', 'dichloromethane', 'chloroform',
  'carbon-tetrachloride', 'methyl-tert-butyl-ether', 'phenol', 'hydrogen-sulfide', 'ethane', 'carbon-dioxide',
  'vinyl-chloride', 'acrylonitrile', 'nonane',
];

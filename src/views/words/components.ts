/** The components of a gas as a form shows them, and the names and formulae under which a table may bring them. */

export interface Component {
  /** As written in the file. */
  readonly value: string;
  readonly label: string;
  readonly formula: string;
}

const row = (value: string, formula: string, ...others: readonly string[]) => ({
  value,
  label: labelOf(value),
  formula,
  others,
});

/** 'carbon-dioxide' as 'Carbon dioxide'; the n of a straight chain stays with its hyphen. */
function labelOf(value: string): string {
  if (value.startsWith('n-')) return value;
  const words = value.replaceAll('-', ' ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** In the order of the list: hydrocarbons by size, then the other gases. */
const rows = [
  row('methane', 'CH4', 'C1'),
  row('ethane', 'C2H6', 'C2'),
  row('propane', 'C3H8', 'C3'),
  row('isobutane', 'i-C4H10', 'i-butane', 'iC4', '2-methylpropane'),
  row('n-butane', 'n-C4H10', 'butane', 'nC4'),
  row('isopentane', 'i-C5H12', 'i-pentane', 'iC5', '2-methylbutane'),
  row('n-pentane', 'n-C5H12', 'pentane', 'nC5'),
  row('n-hexane', 'C6H14', 'hexane', 'n-C6H14', 'nC6', 'C6'),
  row('n-heptane', 'C7H16', 'heptane', 'n-C7H16', 'nC7', 'C7'),
  row('n-octane', 'C8H18', 'octane', 'n-C8H18', 'nC8', 'C8'),
  row('n-nonane', 'C9H20', 'nonane', 'n-C9H20', 'nC9', 'C9'),
  row('n-decane', 'C10H22', 'decane', 'n-C10H22', 'nC10', 'C10'),
  row('nitrogen', 'N2'),
  row('carbon-dioxide', 'CO2'),
  row('carbon-monoxide', 'CO'),
  row('hydrogen', 'H2'),
  row('oxygen', 'O2'),
  row('argon', 'Ar'),
  row('helium', 'He'),
  row('water', 'H2O', 'water vapour', 'water vapor', 'moisture', 'steam'),
  row('hydrogen-sulfide', 'H2S', 'hydrogen sulphide'),
];

export const components: readonly Component[] = rows;

/** A name without case, blanks, hyphens and lowered digits. */
const plain = (name: string): string =>
  name
    .normalize('NFKC')
    .toLowerCase()
    .replaceAll(/[^a-z0-9]/g, '');

const byName = new Map(
  rows.flatMap((known) =>
    [known.value, known.formula, ...known.others].map((name): [string, Component] => [plain(name), known]),
  ),
);

/**
 * The component that a name or formula stands for, also with its formula in brackets behind it. Undefined for any other,
 * and for a lump such as 'C6+': which component shall stand for it the user has to say.
 */
export function componentOf(name: string): Component | undefined {
  if (name.includes('+')) return undefined;
  const [, before = name, inside = ''] = /^(.*?)[([]([^)\]]*)[)\]]\s*$/.exec(name) ?? [];
  return byName.get(plain(name)) ?? byName.get(plain(before)) ?? byName.get(plain(inside));
}

/** Label of a component of the file; one that is not known stands as written. */
export const componentLabel = (value: string): string =>
  rows.find((known) => known.value === value)?.label ?? componentOf(value)?.label ?? value;

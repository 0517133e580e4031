/**
 * Members of a record that are worked out when a view first asks for them, and kept: a list of five hundred meters asks
 * for no curve. To whoever reads the record they are values like the others.
 */
export function withLate<Base extends object, Late extends object>(
  base: Base,
  late: { readonly [Key in keyof Late]: () => Late[Key] },
): Base & Late {
  for (const key of Object.keys(late) as (keyof Late)[]) {
    Object.defineProperty(base, key, {
      enumerable: true,
      configurable: true,
      get: () => {
        const value = late[key]();
        Object.defineProperty(base, key, { enumerable: true, value });
        return value;
      },
    });
  }
  return base as Base & Late;
}

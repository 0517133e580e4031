/** What an instrument asks of a row: rows are read by it, so that one without it never comes here. */

/** The figure asked for; a row without it is a defect. */
export function asked<Figure>(figure: Figure | undefined, what: string): Figure {
  if (figure === undefined) throw new Error(`reading: expected ${what}, got none`);
  return figure;
}

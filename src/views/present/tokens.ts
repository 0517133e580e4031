/** The words of the formula notation: numbers, names, operators. */
export interface Token {
  readonly type: 'number' | 'name' | 'mark';
  readonly text: string;
}

const pattern = /(\d+(?:\.\d+)?(?:[eE][+-]?\d+)?)|(\p{L}[\p{L}\p{N}']*(?:_[\p{L}\p{N}]+)?)|([-+*/^();])/uy;

/** The formula cut into tokens, spaces left out. Throws a defect at a sign that the notation does not have. */
export function tokens(text: string): readonly Token[] {
  const found: Token[] = [];
  pattern.lastIndex = 0;
  let at = 0;
  while (at < text.length) {
    if (text[at] === ' ') {
      at += 1;
      continue;
    }
    pattern.lastIndex = at;
    const match = pattern.exec(text);
    if (match === null) throw new Error(`expected formula notation, got '${text[at]}' in '${text}'`);
    const [whole, number, name] = match;
    found.push({ type: number !== undefined ? 'number' : name !== undefined ? 'name' : 'mark', text: whole });
    at += whole.length;
  }
  return found;
}

/** A list of words by code. A code that is not in it is our own mistake: a defect, never a silent gap. */
export const catalogue =
  (what: string, words: Readonly<Record<string, string>>) =>
  (code: string): string => {
    const text = words[code];
    if (text === undefined) throw new Error(`expected words for the ${what} ${code}, got none`);
    return text;
  };

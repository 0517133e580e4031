import { describe, expect, it } from 'vitest';
import { asHtml, asTabs, number, words } from '../../../src/views/screen/panel/clipboard.ts';

describe('a table on the clipboard', () => {
  const cells = [
    [words('Duty'), words('Δp / mbar')],
    [words('=maximum'), number('-250.5')],
    [words('two\tcells\nof text'), number('6.25e5')],
  ];

  it('writes tabs and line ends only between cells', () => {
    expect(asTabs(cells)).toBe("Duty\tΔp / mbar\r\n'=maximum\t-250.5\r\ntwo cells of text\t6.25e5");
  });

  it('guards words that begin like a formula, never numbers', () => {
    expect(asTabs([[words('+1'), words('-x'), words('@y'), number('-1')]])).toBe("'+1\t'-x\t'@y\t-1");
  });

  it('has the same cells in both forms, with marks escaped', () => {
    const html = asHtml([[words('a < b & "c"'), number('1')]]);
    expect(html).toBe('<table><tbody><tr><td>a &lt; b &amp; &quot;c&quot;</td><td>1</td></tr></tbody></table>');
    expect(asHtml(cells).match(/<td>/g)).toHaveLength(6);
  });

  it('turns the narrow spaces of print into plain ones', () => {
    expect(asTabs([[words('1\u202f000\u00a0mm')]])).toBe('1 000 mm');
  });
});

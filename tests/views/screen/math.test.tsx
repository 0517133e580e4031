import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { MathExpression } from '../../../src/views/screen/panel/MathExpression.tsx';
import { Formula } from '../../../src/views/sheet/Formula.tsx';

const drawn = (symbol: string, formula?: string): string =>
  renderToStaticMarkup(
    <MathExpression symbol={parseFormula(symbol)} equals={formula === undefined ? undefined : parseFormula(formula)} />,
  );

describe('formulas as MathML', () => {
  it('sets subscripts, fractions, powers and roots', () => {
    expect(drawn('q_m')).toContain('<msub><mi>q</mi><mi>m</mi></msub>');
    expect(drawn('E', '1/sqrt(1 - β^4)')).toContain('<mfrac><mrow><mn>1</mn></mrow><mrow><msqrt>');
    expect(drawn('x', 'β^4')).toContain('<msup><mi>β</mi><mrow><mn>4</mn></mrow></msup>');
  });

  it('draws no parentheses around what a fraction or an exponent already holds together', () => {
    expect(drawn('x', '(a + b)/(c - d)')).not.toContain('(');
    expect(drawn('x', '(a + b)*c')).toContain('<mo>(</mo>');
  });

  it('writes a cross between figures, and nothing between symbols', () => {
    expect(drawn('x', '2*3')).toContain('<mo>×</mo>');
    expect(drawn('x', 'C*E')).toContain('<mo>\u2062</mo>');
  });

  it('may break a sum between its terms, each with its sign', () => {
    const markup = drawn('C', 'a + b - c');
    expect(markup.match(/<math/g)).toHaveLength(4);
    expect(markup).toContain('<mo form="infix">−</mo>');
  });

  it('keeps the parentheses of a power that is raised again', () => {
    expect(drawn('x', '(β^2)^3')).toContain('<msup><mrow><mo>(</mo><msup>');
  });

  it('is the same on the screen and on the sheet', () => {
    const [symbol, equals] = [parseFormula('C'), parseFormula('0.5961 + 0.0261*β^2 - 0.216*(β^2)^4/sqrt(1 - β^4)')];
    const markup = [MathExpression, Formula].map((One) =>
      renderToStaticMarkup(<One symbol={symbol} equals={equals} />),
    );
    const [screen, sheet] = markup.map((text) => text.match(/(?<=<math[^>]*>).+?(?=<\/math>)/g));
    expect(screen).toHaveLength(4);
    expect(sheet).toEqual(screen);
  });

  it('names a function and its arguments', () => {
    expect(drawn('x', 'max(a; b)')).toContain(
      '<mi>max</mi><mo>\u2061</mo><mo>(</mo><mi>a</mi><mo>;</mo><mi>b</mi><mo>)</mo>',
    );
    expect(drawn('x', 'abs(a)')).toContain('<mo>|</mo>');
  });
});

import { describe, expect, it } from 'vitest';
import { formulas as exact } from '../../../../src/pages/basis/_formulas.ts';
import { realFormulas } from '../../../../src/pages/basis/_formulas-real.ts';
import { mathml } from '../../../../src/pages/basis/_mathml.ts';

const formulas = [...exact, ...realFormulas];
const bare = (text: string) => mathml(text).replace(/<\/?math[^>]*>/gu, '');

describe('mathml(text)', () => {
  it('sets a letter with its index, the index upright', () => {
    expect(bare('Z_S')).toBe('<mrow><msub><mi>Z</mi><mi mathvariant="normal">S</mi></msub></mrow>');
  });

  it('sets a fraction and a root', () => {
    expect(bare('frac(a; b)')).toBe('<mrow><mfrac><mrow><mi>a</mi></mrow><mrow><mi>b</mi></mrow></mfrac></mrow>');
    expect(bare('sqrt(2)')).toBe('<mrow><msqrt><mrow><mn>2</mn></mrow></msqrt></mrow>');
  });

  it('sets a sign close to what it belongs to', () => {
    expect(bare('− x')).toContain('<mo form="prefix">−</mo>');
    expect(bare('a − x')).toContain('<mo>−</mo>');
  });

  it.each(['frac(a; b', 'sqrt(a', '(a', '|a', 'a)'])('refuses "%s"', (text) => {
    expect(() => mathml(text)).toThrow(SyntaxError);
  });
});

describe('formulas', () => {
  it('are numbered in order, without a gap', () => {
    expect(formulas.map(({ number }) => number)).toEqual(formulas.map((_, k) => `B${k + 1}`));
  });

  it('can all be set', () => {
    const texts = formulas.flatMap(({ lines, symbols }) => [...lines, ...symbols.map(([symbol]) => symbol)]);
    for (const text of texts) expect(() => mathml(text)).not.toThrow();
  });
});

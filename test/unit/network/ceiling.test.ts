import { describe, expect, it } from 'vitest';
import { bestReflection, bestReflectionOf } from '../../../src/network/ceiling.ts';

describe('bestReflection(g)', () => {
  it('is exp(−π/g); nothing without reactance, nearly all of a Q without end', () => {
    expect(bestReflection(Math.PI)).toBeCloseTo(Math.exp(-1), 15);
    expect(bestReflection(0)).toBe(0);
    expect(bestReflection(1e-4)).toBe(0);
    expect(bestReflection(1e12)).toBeCloseTo(1, 11);
  });
});

describe('bestReflectionOf(g, n)', () => {
  it.each([1, 2, 3, 6, 20])('%i resonators: nothing without reactance', (n) => {
    expect(bestReflectionOf(0, n)).toBe(0);
  });

  it.each([0.03, 0.3, 1, 3, 30, 1e3])('two resonators, g = %s: solved by hand', (g) => {
    // tanh(2t)/cosh t = 2·sinh t/(1 + 2·sinh² t): the same for s and 1/(2s), so sinh a·sinh b = 1/2; with
    // sinh a − sinh b = √2/g, sinh a = (√2/g + √(2/g² + 2))/2. And cosh 2t = 1 + 2·sinh² t.
    const a = (Math.SQRT2 / g + Math.sqrt(2 / g ** 2 + 2)) / 2;
    const b = 1 / (2 * a);
    const wanted = (1 + 2 * b * b) / (1 + 2 * a * a);
    expect(Math.abs(bestReflectionOf(g, 2) / wanted - 1)).toBeLessThan(1e-9);
  });

  it.each([1e-6, 1e-3, 0.1, 1, 10, 1e3, 1e6])('g = %s: finite, between 0 and 1, falling with n', (g) => {
    const figures = [1, 2, 3, 4, 5, 6].map((n) => bestReflectionOf(g, n));
    for (const [k, gamma] of figures.entries()) {
      expect(Number.isFinite(gamma)).toBe(true);
      expect(gamma).toBeGreaterThanOrEqual(bestReflection(g) * (1 - 1e-12));
      expect(gamma).toBeLessThan(1);
      if (k > 0) expect(gamma).toBeLessThanOrEqual(figures[k - 1]!);
    }
  });
});

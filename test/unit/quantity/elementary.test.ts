import { describe, expect, it } from 'vitest';
import * as elementary from '../../../src/quantity/elementary.ts';

/** Largest relative difference from the machine's own, which is itself good to a bit or so. */
function furthest(name: keyof typeof elementary & keyof Math, values: readonly number[]): number {
  const ours = (x: number): number => elementary[name](x, 0);
  const machine = (x: number): number => Math[name](x, 0);
  return Math.max(
    ...values.map((x) => {
      const expected = machine(x);
      return expected === 0 ? Math.abs(ours(x)) : Math.abs(ours(x) / expected - 1);
    }),
  );
}

const even = (low: number, high: number): number[] =>
  Array.from({ length: 4001 }, (_, k) => low + (k * (high - low)) / 4000);
const decades = (low: number, high: number): number[] => even(low, high).map((exponent) => 10 ** exponent);

describe('elementary functions against those of the machine', () => {
  it.each([
    ['exp', even(-700, 700)],
    ['exp', even(-1, 1)],
    ['log', decades(-300, 300)],
    ['log', even(0.5, 2)],
    ['log10', decades(-30, 30)],
    ['log2', decades(-30, 30)],
    ['expm1', decades(-15, 2)],
    ['log1p', decades(-15, 2)],
    ['sinh', even(-30, 30)],
    ['cosh', even(-30, 30)],
    ['tanh', even(-25, 25)],
    ['asinh', decades(-10, 10)],
    ['acosh', even(1, 50)],
    ['atan', even(-50, 50)],
    ['asin', even(-1, 1)],
  ] as const)('%s is the same to a few bits', (name, values) => {
    expect(furthest(name, values)).toBeLessThan(name === 'acosh' ? 1e-13 : 2e-15);
  });

  it.each(['sin', 'cos'] as const)('%s is the same to a few bits of 1', (name) => {
    for (const x of [...even(-10, 10), ...even(-1e4, 1e4)]) expect(elementary[name](x)).toBeCloseTo(Math[name](x), 14);
  });

  it('atan2(y, x) tells the quadrant', () => {
    for (const y of [-2, -1, 0, 0.5, 3]) {
      for (const x of [-2, -1, 0, 0.5, 3]) expect(elementary.atan2(y, x)).toBeCloseTo(Math.atan2(y, x), 14);
    }
  });

  it('is exact where the value is: powers of ten, of two, and nothing', () => {
    for (let k = -300; k <= 300; k += 1) expect(elementary.log10(Number(`1e${String(k)}`))).toBe(k);
    for (let k = -1000; k <= 1000; k += 100) expect(elementary.log2(2 ** k)).toBe(k);
    expect([elementary.exp(0), elementary.log(1), elementary.sin(0), elementary.cos(0)]).toEqual([1, 0, 0, 1]);
    expect([elementary.exp(-800), elementary.exp(800), elementary.log(0)]).toEqual([0, Infinity, -Infinity]);
    expect(elementary.log(5e-324)).toBeCloseTo(-744.4400719213812, 10);
    expect(elementary.exp(-744)).toBeGreaterThan(0);
  });
});

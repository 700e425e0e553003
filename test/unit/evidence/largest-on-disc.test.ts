import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { largestOnDisc } from '../../../src/evidence/largest-on-disc.ts';

const c = (re: number, im = 0): Complex => new Complex(re, im);

describe('largestOnDisc(a, b, c, d, rho)', () => {
  it('of 1 + Γ is 1 + ρ', () => expect(largestOnDisc(c(1), c(1), c(1), c(0), 0.5)).toBeCloseTo(1.5, 15));

  it('of 1/(1 − Γ) is 1/(1 − ρ)', () => expect(largestOnDisc(c(1), c(0), c(1), c(-1), 0.5)).toBeCloseTo(2, 14));

  it('of (1 + Γ)/(1 − Γ) is the VSWR', () => expect(largestOnDisc(c(1), c(1), c(1), c(-1), 0.6)).toBeCloseTo(4, 14));

  it('of (3 + 4j)/2 with no disc is its size', () => {
    expect(largestOnDisc(c(3, 4), c(9, -2), c(2), c(1, 1), 0)).toBe(2.5);
  });

  it('turns with the angles of its coefficients: (j + 2Γ)/(3 − jΓ), scanned', () => {
    let most = 0;
    for (let k = 0; k < 20000; k += 1) {
      const gamma = new Complex({ abs: 0.9, arg: (k * Math.PI) / 10000 });
      const value = c(0, 1)
        .add(gamma.mul(2))
        .div(c(3).sub(gamma.mul(c(0, 1))));
      most = Math.max(most, value.abs());
    }
    const found = largestOnDisc(c(0, 1), c(2), c(3), c(0, -1), 0.9);
    expect(found).toBeGreaterThanOrEqual(most);
    expect(found).toBeCloseTo(most, 6);
  });
});

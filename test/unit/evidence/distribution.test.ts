import { describe, expect, it } from 'vitest';
import { deviate, distributions } from '../../../src/evidence/distribution.ts';

describe('deviate(u, distribution)', () => {
  it.each(distributions)('of %s is odd about the middle, rises, and stays within the tolerance', (distribution) => {
    expect(deviate(0.5, distribution)).toBeCloseTo(0, 15);
    let last = -1;
    for (const u of [2 ** -33, 0.001, 0.1, 0.3, 0.5, 0.7, 0.999, 1 - 2 ** -33]) {
      const value = deviate(u, distribution);
      expect(value).toBeGreaterThanOrEqual(last);
      expect(value).toBeLessThanOrEqual(1);
      expect(value).toBeCloseTo(-deviate(1 - u, distribution), 9);
      last = value;
    }
  });

  it('of a uniform one is linear: three quarters of all parts are below half the tolerance', () => {
    expect(deviate(0.75, 'uniform')).toBe(0.5);
  });

  it('of a triangular one: (1 − d)²/2 of all parts are above d, so 1/8 above one half', () => {
    expect(deviate(7 / 8, 'triangular')).toBeCloseTo(0.5, 15);
  });

  it('of a normal one: within a third of the tolerance are 68.2689 of 99.7300 %', () => {
    // Φ(1) − Φ(−1) = 0.682689492 and Φ(3) − Φ(−3) = 0.997300204, any table of the normal distribution.
    const u = 0.5 + 0.682689492137 / 0.997300203937 / 2;
    expect(deviate(u, 'normal')).toBeCloseTo(1 / 3, 10);
  });
});

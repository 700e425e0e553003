import { describe, expect, it } from 'vitest';
import { terminationAt } from '../../../src/network/termination-at.ts';
import type { Behaviour } from '../../../src/network/termination.ts';

const f0 = 10e6;

describe('terminationAt(termination, f0, frequency)', () => {
  it.each<[Behaviour, number, number, number, number, number]>([
    // Held constant.
    ['constant', 3, 4, 2, 3, 4],
    ['constant', 3, -4, 0.5, 3, -4],
    // 3 Ω with an inductor: X doubles at 2f0. With a capacitor: X halves.
    ['series', 3, 4, 2, 3, 8],
    ['series', 3, 4, 0.5, 3, 2],
    ['series', 3, -4, 2, 3, -2],
    ['series', 3, -4, 0.5, 3, -8],
    // 1/(3 + j4) = 0.12 − j0.16: an inductor across. At 2f0, 1/(0.12 − j0.08) = (0.12 + j0.08)/0.0208.
    ['parallel', 3, 4, 2, 0.12 / 0.0208, 0.08 / 0.0208],
    // 1/(3 − j4) = 0.12 + j0.16: a capacitor across. At 2f0, 1/(0.12 + j0.32) = (0.12 − j0.32)/0.1168.
    ['parallel', 3, -4, 2, 0.12 / 0.1168, -0.32 / 0.1168],
    ['parallel', 3, -4, 0.5, 0.12 / 0.0208, -0.08 / 0.0208],
    // A resistance is one whatever is said of it.
    ['series', 50, 0, 7, 50, 0],
    ['parallel', 50, 0, 7, 50, 0],
  ])('%s: %s + j%s Ω is, at %s·f0, %s + j%s Ω', (behaviour, r, x, u, wantedR, wantedX) => {
    const z = terminationAt({ r, x, behaviour }, f0, u * f0);
    expect(z.re).toBeCloseTo(wantedR, 12);
    expect(z.im).toBeCloseTo(wantedX, 12);
  });

  it.each<Behaviour>(['constant', 'series', 'parallel'])('%s: is what was given at f0', (behaviour) => {
    const z = terminationAt({ r: 9.4, x: -61, behaviour }, f0, f0);
    expect(z.re).toBeCloseTo(9.4, 13);
    expect(z.im).toBeCloseTo(-61, 12);
  });

  it('parallel: keeps the parallel resistance, R + X²/R, at every frequency', () => {
    for (const u of [0.1, 0.5, 2, 10]) {
      const z = terminationAt({ r: 9.4, x: -61, behaviour: 'parallel' }, f0, u * f0);
      expect(1 / z.inverse().re).toBeCloseTo(9.4 + 61 ** 2 / 9.4, 9);
    }
  });
});

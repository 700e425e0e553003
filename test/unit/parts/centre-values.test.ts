import { describe, expect, it } from 'vitest';
import { realArm } from '../../../src/network/real-arm.ts';
import { centreValues, worstOf } from '../../../src/parts/centre-values.ts';
import { armsOf, decibels, interfaces, real } from './parts-of.ts';
import { plainWorst } from './plain.ts';

const aim = 'conjugate';
const anyLimits = { low: 1e-15, high: 1 };

describe('worstOf(problem, values)', () => {
  it('is the largest |Γ|² by input impedance, strays and load states included', () => {
    const arms = armsOf('series L 84.27n, shunt L 686.3n, series C 26.04p, shunt L 39.12n');
    const states = interfaces(
      [
        [12, -20],
        [20, 15],
      ],
      100e6,
      [90e6, 110e6],
    );
    const armFor = (k: number, value: number) => real(arms[k]!, value);
    const problem = { armFor, strayF: 0.3e-12, states, f0: 100e6, aim } as const;
    const values = arms.map(({ value }) => value);
    const wanted = plainWorst(
      values.map((value, k) => armFor(k, value)),
      0.3e-12,
      states,
      100e6,
    );
    expect(worstOf(problem, values) / wanted).toBeCloseTo(1, 10);
  });
});

describe('centreValues(problem, start, limits)', () => {
  it('finds the match that a lossy coil has: 50 Ω from C across and L + 10 Ω with R = ωL/20', () => {
    // R = 10 + ωL/20 and Q = ωL/R with Q² + 1 = 50/R: R² + (20·(R − 10))² = 50·R.
    const r = (8050 + Math.sqrt(8050 ** 2 - 4 * 401 * 40000)) / (2 * 401);
    const x = 20 * (r - 10);
    const omega = 2 * Math.PI * 10e6;
    const arms = armsOf('shunt C 636.6p, series L 318.3n');
    const states = interfaces([[10, 0]], 10e6, [10e6, 10e6]);
    const armFor = (k: number, value: number) => realArm({ ...arms[k]!, value, ...(k === 1 ? { q: 20 } : {}) });
    const problem = { armFor, strayF: 0, states, f0: 10e6, aim } as const;
    const { values, gammaSquared } = centreValues(problem, [636.6e-12, 318.3e-9], [anyLimits, anyLimits]);
    expect(decibels(gammaSquared)).toBeGreaterThan(100);
    expect(values[0]).toBeCloseTo(x / (r * r + x * x) / omega, 15);
    expect(values[1]).toBeCloseTo(x / omega, 12);
  });

  it('brings a three-section match with real parts from 17.9 dB to better than 40 dB over the band', () => {
    const arms = armsOf(
      'shunt C 114p, series L 132.3n, shunt C 245.6p, series L 61.4n, shunt C 529.2p, series L 28.5n',
    );
    const states = interfaces([[5, 0]], 30e6, [26e6, 34e6]);
    const armFor = (k: number, value: number) => real(arms[k]!, value);
    const start = arms.map(({ value }) => value);
    const problem = { armFor, strayF: 0.2e-12, states, f0: 30e6, aim } as const;
    const found = centreValues(
      problem,
      start,
      arms.map(() => anyLimits),
    );
    const worst = (values: readonly number[]): number =>
      decibels(
        plainWorst(
          values.map((value, k) => armFor(k, value)),
          0.2e-12,
          states,
          30e6,
        ),
      );
    expect(worst(start)).toBeCloseTo(17.9, 1);
    expect(worst(found.values)).toBeGreaterThan(40);
    expect(worst(found.values)).toBeCloseTo(decibels(found.gammaSquared), 6);
  });

  it('stays inside the limits, moves nothing whose limits are one value, and is never worse than the start', () => {
    const arms = armsOf('shunt C 43p, series L 53n');
    const states = interfaces([[12, -20]], 100e6, [95e6, 105e6]);
    const armFor = (k: number, value: number) => real(arms[k]!, value);
    const problem = { armFor, strayF: 0, states, f0: 100e6, aim } as const;
    const limits = [
      { low: 43e-12, high: 43e-12 },
      { low: 50e-9, high: 51e-9 },
    ];
    const { values, gammaSquared } = centreValues(problem, [43e-12, 50.5e-9], limits);
    expect(values[0]! / 43e-12).toBeCloseTo(1, 9);
    expect(values[1]).toBeGreaterThanOrEqual(50e-9);
    expect(values[1]).toBeLessThanOrEqual(51e-9);
    expect(gammaSquared).toBeLessThanOrEqual(worstOf(problem, [43e-12, 50.5e-9]));
  });

  it('has nothing to do for no arms', () => {
    const states = interfaces([[10, 0]], 10e6, [10e6, 10e6]);
    const problem = { armFor: () => real(armsOf('shunt C 1p')[0]!, 1), strayF: 0, states, f0: 10e6, aim } as const;
    // (40/60)²
    expect(centreValues(problem, [], [])).toEqual({ values: [], gammaSquared: expect.closeTo(4 / 9, 12) as number });
  });
});

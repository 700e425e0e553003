import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { measuredTermination } from '../../src/measured/measured-termination.ts';
import { interpolate, intervalOf, slopesOf } from '../../src/measured/shape-preserving.ts';
import { modelImpedance } from '../model-impedance.ts';
import { terminationAt } from '../../src/network/termination-at.ts';
import { decades } from './random-loads.ts';
import { resonant, sampled } from './sampled.ts';

const f0 = 100e6;

describe('terminationAt(measured, f0, hz)', () => {
  it('stays within 0.01 of the exact reflection between samples of an RLC load 1/50 of its half-power band apart', () => {
    fc.assert(
      fc.property(
        fc.constantFrom('rlc-series' as const, 'rlc-parallel' as const),
        // As steep against 50 Ω as the load's own band says, or less: the system only lowers its Q.
        decades(2, 1250),
        decades(3, 1000),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (kind, r, q, offset) => {
          const model = resonant(kind, r, q, f0);
          const step = f0 / q / 50;
          const hz = Array.from({ length: 151 }, (_, k) => f0 + (k - 75 + offset) * step);
          const termination = measuredTermination(sampled(model, hz), 'load.s1p');
          for (let k = 0; k < 150; k += 1) {
            for (const part of [0.2, 0.5, 0.8]) {
              const f = hz[k]! + part * step;
              const [z, exact] = [terminationAt(termination, f0, f), modelImpedance(model, f)];
              // Γ difference of two impedances in 50 Ω: 100·(z − e)/((z + 50)(e + 50)).
              const apart = z
                .sub(exact)
                .mul(100)
                .div(z.add(50).mul(exact.add(50)))
                .abs();
              expect(apart).toBeLessThan(0.01);
            }
          }
        },
      ),
      { numRuns: 100 },
    );
  });

  it('gives the samples themselves back at their frequencies', () => {
    fc.assert(
      fc.property(decades(2, 1250), decades(3, 300), (r, q) => {
        const model = resonant('rlc-series', r, q, f0);
        const hz = Array.from({ length: 21 }, (_, k) => f0 * (0.9 + 0.01 * k));
        const termination = measuredTermination(sampled(model, hz), 'load.s1p');
        for (const f of hz) {
          const [z, exact] = [terminationAt(termination, f0, f), modelImpedance(model, f)];
          expect(
            z
              .sub(exact)
              .mul(100)
              .div(z.add(50).mul(exact.add(50)))
              .abs(),
          ).toBeLessThan(1e-9);
        }
      }),
      { numRuns: 50 },
    );
  });
});

describe('interpolate(x, y, slopes, k, at)', () => {
  const steps = fc.array(fc.tuple(decades(1e-3, 1e3), fc.double({ min: -1, max: 1, noNaN: true })), {
    minLength: 2,
    maxLength: 12,
  });

  it('never leaves the range of the two samples that it stands between, however unevenly they stand', () => {
    fc.assert(
      fc.property(
        steps,
        fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 5, maxLength: 5 }),
        (data, parts) => {
          let at = 0;
          const x = Float64Array.from(data, ([width]) => (at += width));
          const y = Float64Array.from(data, ([, value]) => value);
          const slopes = slopesOf(x, y);
          for (let k = 0; k + 1 < x.length; k += 1) {
            const [low, high] = [Math.min(y[k]!, y[k + 1]!), Math.max(y[k]!, y[k + 1]!)];
            for (const part of parts) {
              const value = interpolate(x, y, slopes, k, x[k]! + part * (x[k + 1]! - x[k]!));
              expect(value).toBeGreaterThanOrEqual(low - 1e-12);
              expect(value).toBeLessThanOrEqual(high + 1e-12);
            }
          }
        },
      ),
      { numRuns: 500 },
    );
  });

  it('rises and falls only as the samples do', () => {
    fc.assert(
      fc.property(steps, (data) => {
        let at = 0;
        const x = Float64Array.from(data, ([width]) => (at += width));
        const y = Float64Array.from(data, ([, value]) => value);
        const slopes = slopesOf(x, y);
        for (let k = 0; k + 1 < x.length; k += 1) {
          const direction = Math.sign(y[k + 1]! - y[k]!);
          let before = y[k]!;
          for (let part = 1; part <= 20; part += 1) {
            const value = interpolate(x, y, slopes, k, x[k]! + (part / 20) * (x[k + 1]! - x[k]!));
            expect((value - before) * direction).toBeGreaterThanOrEqual(-1e-12);
            before = value;
          }
        }
      }),
      { numRuns: 300 },
    );
  });

  it('passes a straight line through samples of one, and a third-order error through those of a smooth curve', () => {
    const x = Float64Array.of(0, 1, 2.5, 3, 7);
    const y = x.map((value) => 3 - 2 * value);
    for (const at of [0, 0.3, 1, 2.9, 5, 7]) {
      expect(interpolate(x, y, slopesOf(x, y), intervalOf(x, at), at)).toBeCloseTo(3 - 2 * at, 12);
    }
    const worst = (n: number): number => {
      const grid = Float64Array.from({ length: n + 1 }, (_, k) => 0.2 + k / n);
      const values = grid.map((value) => Math.sin(value));
      const slopes = slopesOf(grid, values);
      return Math.max(
        ...Array.from({ length: 10 * n + 1 }, (_, k) => {
          const at = 0.2 + k / (10 * n);
          return Math.abs(interpolate(grid, values, slopes, intervalOf(grid, at), at) - Math.sin(at));
        }),
      );
    };
    expect(worst(20) / worst(40)).toBeGreaterThan(6);
  });
});

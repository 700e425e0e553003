import { Complex } from 'complex.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ladderInput } from '../../src/network/ladder-input.ts';
import { prepareLadder } from '../../src/network/ladder.ts';
import { endsOver, sweep } from '../../src/network/sweep.ts';
import type { Aim } from '../../src/network/termination.ts';
import { leastQ, piTee } from '../../src/synthesis/pi-tee.ts';
import { targetOf } from '../../src/synthesis/target.ts';
import { decades } from './random-loads.ts';

const end = fc.oneof(
  decades(0.1, 1e4).map((r) => ({ r, x: 0 })),
  fc
    .tuple(decades(0.1, 1e4), decades(1e-3, 30), fc.constantFrom(-1, 1))
    .map(([r, q, sign]) => ({ r, x: sign * q * r })),
);
const problem = fc.record({
  kind: fc.constantFrom('pi' as const, 'tee' as const),
  source: end,
  load: end,
  aim: fc.constantFrom<Aim>('conjugate', 'reflectionless'),
  f0: decades(1e4, 1e10),
  above: decades(1.0001, 30),
});

/** Parallel resistance, Ω: |Z|²/R. */
const parallel = (z: Complex): number => (z.re ** 2 + z.im ** 2) / z.re;

describe('piTee(kind, target, load, f0, Q)', () => {
  it('matches any complex ends for any Q above the least: seen is what was aimed at, gain 1 for the conjugate aim', () => {
    fc.assert(
      fc.property(problem, ({ kind, source, load, aim, f0, above }) => {
        const target = targetOf(new Complex(source.r, source.x), aim);
        const zl = new Complex(load.r, load.x);
        const q = Math.max(0.01, leastQ(kind, target, zl)) * above;
        const { candidates, absent } = piTee(kind, target, zl, f0, q);
        expect(absent).toEqual([]);
        expect(candidates.length).toBeGreaterThanOrEqual(1);
        expect(candidates.length).toBeLessThanOrEqual(4);
        // Rounding of a double, times the Q of both sections and of the ends that the arms must add up to.
        const own = (z: Complex): number => 1 + Math.abs(z.im) / z.re;
        const tolerance = 1e-14 * (1 + q) ** 2 * own(target) ** 2 * own(zl) ** 2 + 1e-12;
        for (const { arms } of candidates) {
          expect(arms.length).toBeLessThanOrEqual(3);
          arms.forEach(({ value }) => expect(value > 0 && Number.isFinite(value)).toBe(true));
          const seen = ladderInput(arms, zl, f0);
          expect(seen.sub(target).abs() / target.abs()).toBeLessThan(tolerance);
          if (aim !== 'conjugate') continue;
          const constant = (z: { r: number; x: number }) => ({ ...z, behaviour: 'constant' as const });
          const ends = endsOver(constant(source), constant(load), f0, Float64Array.of(f0));
          expect(Math.abs(sweep(prepareLadder(arms), ends, aim).gain[0]! - 1)).toBeLessThan(tolerance);
        }
      }),
      { numRuns: 1500 },
    );
  });

  it('has four networks of three parts between resistances, the steeper end of the Q chosen', () => {
    fc.assert(
      fc.property(
        fc.constantFrom('pi' as const, 'tee' as const),
        decades(1, 1000),
        decades(1, 1000),
        decades(1.01, 20),
        (kind, rs, rl, above) => {
          fc.pre(Math.abs(rs / rl - 1) > 0.01);
          const q = leastQ(kind, new Complex(rs, 0), new Complex(rl, 0)) * above;
          const { candidates } = piTee(kind, new Complex(rs, 0), new Complex(rl, 0), 1e8, q);
          expect(candidates).toHaveLength(4);
          const wanted = kind === 'pi' ? ['shunt', 'series', 'shunt'] : ['series', 'shunt', 'series'];
          const omega = 2 * Math.PI * 1e8;
          for (const { arms, sectionQ } of candidates) {
            expect(arms.map(({ arm }) => arm)).toEqual(wanted);
            expect(Math.abs(sectionQ / q - 1)).toBeLessThan(1e-12);
            // Q of an outer arm with its own end: R/|X| across (Pi), |X|/R in series (T); the larger is Q.
            const qs = [arms[0]!, arms[2]!].map(({ part, value }, k) => {
              const x = part === 'inductor' ? omega * value : 1 / (omega * value);
              const r = k === 0 ? rs : rl;
              return kind === 'pi' ? r / x : x / r;
            });
            expect(Math.abs(Math.max(...qs) / q - 1)).toBeLessThan(1e-12);
          }
        },
      ),
      { numRuns: 300 },
    );
  });

  it('refuses any Q below the least, which is √(Rhigh/Rlow − 1) of the parallel (Pi) or series (T) resistances', () => {
    fc.assert(
      fc.property(problem, ({ kind, source, load, aim, f0, above }) => {
        const target = targetOf(new Complex(source.r, source.x), aim);
        const zl = new Complex(load.r, load.x);
        const [a, b] = kind === 'pi' ? [parallel(target), parallel(zl)] : [target.re, zl.re];
        const least = Math.sqrt(Math.max(a, b) / Math.min(a, b) - 1);
        fc.pre(least > 0.01);
        expect(Math.abs(leastQ(kind, target, zl) / least - 1)).toBeLessThan(1e-9);
        const { candidates, absent } = piTee(kind, target, zl, f0, least / above);
        expect(candidates).toEqual([]);
        expect(absent).toHaveLength(1);
        expect(absent[0]!.why).toMatch(/needs Q ≥ .* = \d/u);
      }),
      { numRuns: 300 },
    );
  });
});

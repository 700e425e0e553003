import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ceilingOf } from '../../src/design/ceiling.ts';
import { bestReflection, bestReflectionOf } from '../../src/network/ceiling.ts';
import { prepareLadder } from '../../src/network/ladder.ts';
import { endsOver, sweep } from '../../src/network/sweep.ts';
import { terminationAt } from '../../src/network/termination-at.ts';
import type { Termination } from '../../src/network/termination.ts';
import { logGrid } from '../../src/network/worst-in-band.ts';
import type { Span } from '../../src/quantity/span.ts';
import { cascade } from '../../src/synthesis/cascade.ts';
import { targetOf } from '../../src/synthesis/target.ts';
import { recordOf } from '../unit/record-of.ts';
import type { Arm } from '../../src/network/arm.ts';
import { anyLadder, bandAround, decades, reactive } from './random-loads.ts';

const f0 = 100e6;
const base = recordOf({ frequency: String(f0), source: '50', load: '50' });
const resistance: fc.Arbitrary<Termination> = decades(2, 1000).map((r) => ({ r, x: 0, behaviour: 'constant' }));

const problem = fc
  .oneof(fc.constant('load' as const), fc.constant('source' as const), fc.constant('both' as const))
  .chain((where) =>
    fc.record({
      source: where === 'load' ? resistance : reactive(f0),
      load: where === 'source' ? resistance : reactive(f0),
      band: bandAround(f0),
      ladder: anyLadder(f0),
    }),
  );

/** The largest |Γ| on 101 samples: no more than the true one, so that the check is the stricter. */
function worst(arms: readonly Arm[], source: Termination, load: Termination, band: Span): number {
  const ends = endsOver(source, load, f0, logGrid(band.low, band.high, 101));
  const { gammaRe, gammaIm } = sweep(prepareLadder(arms), ends, 'conjugate');
  return gammaRe.reduce((most, re, k) => Math.max(most, Math.hypot(re, gammaIm[k]!)), 0);
}

function ceilingFor(source: Termination, load: Termination, band: Span) {
  const { ceiling } = ceilingOf({
    ...base,
    source,
    loads: [{ name: '', termination: load }],
    requirement: { ...base.requirement, bandHz: band },
  });
  return ceiling!;
}

describe('ceilingOf(record)', () => {
  it('is beaten by no ladder of any parts over any band, the load, the source or both reactive (6000 of them)', () => {
    fc.assert(
      fc.property(problem, ({ source, load, band, ladder }) => {
        const { bestReflection: best, estimate } = ceilingFor(source, load, band);
        expect(estimate).toBe(false);
        expect(worst(ladder, source, load, band)).toBeGreaterThanOrEqual(best * (1 - 1e-9));
      }),
      { numRuns: 6000 },
    );
  });

  it('is beaten by no network that matches at the design frequency, of 1 to 6 sections (1000 loads)', () => {
    fc.assert(
      fc.property(problem, ({ source, load, band }) => {
        const { bestReflection: best } = ceilingFor(source, load, band);
        const target = targetOf(terminationAt(source, f0, f0), 'conjugate');
        const { candidates } = cascade(target, terminationAt(load, f0, f0), f0, [1, 2, 4, 6]);
        for (const { arms } of candidates) {
          // A perfect match at a sample is 1e-15 or so, rounding.
          expect(worst(arms, source, load, band)).toBeGreaterThanOrEqual(best * (1 - 1e-9) - 1e-12);
        }
      }),
      { numRuns: 1000 },
    );
  });

  it('rises with Q, falls with resonators, and ends in the ceiling of unlimited sections', () => {
    fc.assert(
      fc.property(decades(1e-2, 1e3), (g) => {
        const figures = Array.from({ length: 12 }, (_, k) => bestReflectionOf(g, k + 1));
        figures.forEach((gamma, k) => {
          expect(gamma).toBeGreaterThan(0);
          expect(gamma).toBeLessThan(1);
          expect(gamma).toBeGreaterThanOrEqual(bestReflection(g));
          expect(gamma).toBeLessThan(bestReflectionOf(g * 1.01, k + 1));
          if (k > 0) expect(gamma).toBeLessThan(figures[k - 1]!);
        });
        // Convergence is as 1/n², in Q·w for a given |Γ|.
        if (g > 0.5) {
          expect(Math.log(bestReflectionOf(g, 200)) / Math.log(bestReflection(g))).toBeGreaterThan(0.99);
        }
      }),
      { numRuns: 200 },
    );
  });
});

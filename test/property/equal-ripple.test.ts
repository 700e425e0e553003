import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Complex } from 'complex.js';
import type { Arm } from '../../src/network/arm.ts';
import { prepareLadder } from '../../src/network/ladder.ts';
import { endsOver, sweep, sweepInto, type SweepResult } from '../../src/network/sweep.ts';
import type { Termination } from '../../src/network/termination.ts';
import { worstInBand } from '../../src/network/worst-in-band.ts';
import type { Span } from '../../src/quantity/span.ts';
import { equalRipple } from '../../src/synthesis/equal-ripple.ts';
import { decades } from './random-loads.ts';

/** Band edges of a fractional width about a centre: low·high = f0², high − low = w·f0. */
function edges(f0: number, w: number): Span {
  const half = Math.asinh(w / 2);
  return { low: f0 * Math.exp(-half), high: f0 * Math.exp(half) };
}

/**
 * Worst return loss in closed form, dB, worked out here by the recurrence of the Chebyshev polynomials:
 * ε = (r − 1)/(2√r)/T_n(x0), x0 = (ωa² + ωb²)/(ωb² − ωa²), |Γ|² = ε²/(1 + ε²).
 */
function closedFormDb(r: number, { low, high }: Span, n: number): number {
  const x0 = (low ** 2 + high ** 2) / (high ** 2 - low ** 2);
  let [before, t] = [1, x0];
  for (let k = 1; k < n; k += 1) [before, t] = [t, 2 * x0 * t - before];
  const epsilon = (r - 1) / (2 * Math.sqrt(r)) / t;
  return 10 * Math.log10(1 + 1 / epsilon ** 2);
}

const resistor = (r: number): Termination => ({ r, x: 0, behaviour: 'constant' });

/** Swept worst return loss, dB: 401 samples, crowded at the edges as the ripples are, every hump refined. */
function sweptDb(arms: readonly Arm[], source: number, load: number, { low, high }: Span): number {
  const centre = Math.sqrt(low * high);
  const half = Math.log(high / low) / 2;
  const hz = Float64Array.from({ length: 401 }, (_, k) => centre * Math.exp(-half * Math.cos((Math.PI * k) / 400)));
  [hz[0], hz[400]] = [low, high];
  const ladder = prepareLadder(arms);
  const ends = endsOver(resistor(source), resistor(load), centre, hz);
  const { gammaRe, gammaIm } = sweep(ladder, ends, 'conjugate');
  const one = endsOver(resistor(source), resistor(load), centre, Float64Array.of(centre));
  const result: SweepResult = { gain: new Float64Array(1), gammaRe: new Float64Array(1), gammaIm: new Float64Array(1) };
  const at = (f: number): number => {
    one.frequencyHz[0] = f;
    sweepInto(ladder, one, 'conjugate', result);
    return result.gammaRe[0]! ** 2 + result.gammaIm[0]! ** 2;
  };
  return (
    -10 *
    Math.log10(
      worstInBand(
        hz,
        gammaRe.map((re, k) => re ** 2 + gammaIm[k]! ** 2),
        at,
      ).gammaSquared,
    )
  );
}

const sections = [1, 2, 3, 4, 5, 6];
const end = (r: number) => ({ z: new Complex(r, 0), behaviour: 'constant' as const });

/** Both forms of every number of sections, or a refusal, against the closed form. */
function check(ratio: number, w: number, low: number, f0: number): void {
  const band = edges(f0, w);
  const { candidates, absent } = equalRipple(end(low), end(low * ratio), f0, band, sections);
  for (const n of sections) {
    const wanted = closedFormDb(ratio, band, n);
    const found = candidates.filter((candidate) => candidate.sections === n);
    if (found.length === 0) {
      // Double precision ends at about 150 dB; the refusal says so.
      expect(wanted).toBeGreaterThan(150);
      continue;
    }
    expect(found.map(({ pass }) => pass)).toEqual(['low-pass', 'high-pass']);
    for (const { arms, closedFormDb: told } of found) {
      expect(arms).toHaveLength(2 * n);
      expect(Math.abs(told - wanted)).toBeLessThan(1e-6);
      expect(Math.abs(sweptDb(arms, low, low * ratio, band) - wanted)).toBeLessThan(1e-3);
    }
  }
  absent.forEach(({ why }) => expect(why).toMatch(/double precision/u));
}

describe('equalRipple(source, load, f0, band, sections) between two resistances', () => {
  const ratios = [1.1, 1.5, 2, 5, 10, 30, 100];
  const widths = [0.05, 0.1, 0.3, 0.7, 1.2];

  it.each(ratios)(
    '1 to %s, widths from 0.05 to 1.2, 1 to 6 sections: sweeps to its closed form within 0.001 dB',
    (r) => {
      for (const w of widths) check(r, w, 50, 100e6);
    },
  );

  it('does so for any ratio, width, resistance and frequency (120 of them)', () => {
    fc.assert(fc.property(decades(1.1, 100), decades(0.05, 1.2), decades(0.1, 1e4), decades(1e4, 1e10), check), {
      numRuns: 120,
    });
  });

  it('is its own mirror image with the lower resistance at the load', () => {
    fc.assert(
      fc.property(decades(1.1, 100), decades(0.2, 1.2), (r, w) => {
        const band = edges(1e8, w);
        const up = equalRipple(end(50), end(50 * r), 1e8, band, sections).candidates;
        const down = equalRipple(end(50 * r), end(50), 1e8, band, sections).candidates;
        expect(down.map(({ arms }) => arms)).toEqual(up.map(({ arms }) => arms.toReversed()));
        expect(down.every(({ shuntAt }) => shuntAt === 'source')).toBe(true);
      }),
      { numRuns: 50 },
    );
  });

  it('absorbs a series part at the lower end and a parallel one at the higher, or says that the outer part is smaller', () => {
    fc.assert(
      fc.property(
        decades(2, 50),
        decades(0.2, 1),
        decades(0.05, 20),
        decades(0.05, 20),
        fc.constantFrom(1, 2, 3),
        (r, w, partLow, partHigh, n) => {
          const band = edges(1e8, w);
          const omega = 2 * Math.PI * 1e8;
          const bare = equalRipple(end(50), end(50 * r), 1e8, band, [n]).candidates.find(
            ({ pass }) => pass === 'low-pass',
          )!;
          const [first, last] = [bare.arms[0]!, bare.arms[2 * n - 1]!];
          const x = omega * first.value * partLow;
          const b = omega * last.value * partHigh;
          const source = { z: new Complex(50, x), behaviour: 'series' as const };
          const load = { z: new Complex(1 / (50 * r), b).inverse(), behaviour: 'parallel' as const };
          const { candidates, absent } = equalRipple(source, load, 1e8, band, [n]);
          const made = candidates.find(({ pass, shuntAt }) => pass === 'low-pass' && shuntAt === 'load');
          if (partLow < 0.999 && partHigh < 0.999) {
            const [outer, inner] = [made!.arms[0]!, made!.arms.at(-1)!];
            expect(outer.value / first.value).toBeCloseTo(1 - partLow, 9);
            expect(inner.value / last.value).toBeCloseTo(1 - partHigh, 9);
          } else if (partLow > 1.001 || partHigh > 1.001) {
            expect(made).toBeUndefined();
            expect(absent.some(({ why }) => /does not hold the end's own/u.test(why))).toBe(true);
          }
        },
      ),
      { numRuns: 200 },
    );
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { clopperPearson } from '../../src/evidence/clopper-pearson.ts';
import type { Distribution } from '../../src/evidence/distribution.ts';
import { drawsOf, type VariedPart } from '../../src/evidence/spread.ts';
import { prepareSubject, type PreparedSubject } from '../../src/evidence/subject.ts';
import { passedOf, yieldOf } from '../../src/evidence/yield.ts';
import type { RealArm } from '../../src/network/real-arm.ts';
import { endsOver } from '../../src/network/sweep.ts';

const f0 = 1e6;
const omega = 2 * Math.PI * f0;
const r = 50;

interface Case {
  readonly arms: readonly RealArm[];
  /** Ω */
  readonly load: { readonly r: number; readonly x: number };
  readonly distribution: Distribution;
  readonly tolerance: number;
  readonly loadSpread?: number;
}

const lossless = { q: null, qSlope: 0, parallelF: 0, seriesH: 0 } as const;
const inductor = (ohm: number): RealArm => ({ arm: 'series', part: 'inductor', value: ohm / omega, ...lossless });
const capacitor = (ohm: number): RealArm => ({
  arm: 'series',
  part: 'capacitor',
  value: 1 / (omega * ohm),
  ...lossless,
});

function subject({ arms, load, distribution, tolerance, loadSpread = 0 }: Case): PreparedSubject {
  const parts = arms.map(({ part }, armIndex): VariedPart => {
    return { designator: `${part}${armIndex}`, armIndex, tolerance, weight: 1, adds: true };
  });
  const source = { r, x: 0, behaviour: 'constant' } as const;
  const ends = endsOver(source, { ...load, behaviour: 'constant' }, f0, Float64Array.of(f0));
  const spread = { source: 0, load: loadSpread };
  const states = [{ name: '', ends }];
  return prepareSubject({ ladder: { arms, strayF: 0 }, states, f0, aim: 'conjugate', parts, spread, distribution });
}

/** Fraction of deviations below `d`, as a fraction of the tolerance; Φ to 1e-7 (Abramowitz and Stegun, 26.2.17). */
function below(d: number, distribution: Distribution): number {
  if (d <= -1) return 0;
  if (d >= 1) return 1;
  if (distribution === 'uniform') return (1 + d) / 2;
  if (distribution === 'triangular') return d < 0 ? (1 + d) ** 2 / 2 : 1 - (1 - d) ** 2 / 2;
  const phi = (z: number): number => {
    if (z < 0) return 1 - phi(-z);
    const t = 1 / (1 + 0.2316419 * z);
    const terms = [0.31938153, -0.356563782, 1.781477937, -1.821255978, 1.330274429];
    const sum = terms.reduceRight((tail, term) => (tail + term) * t, 0);
    return 1 - (Math.exp((-z * z) / 2) / Math.sqrt(2 * Math.PI)) * sum;
  };
  return (phi(3 * d) - phi(-3)) / (phi(3) - phi(-3));
}

const distributions = ['uniform', 'triangular', 'normal'] as const;
const requiredDb = 20;
const limit = 10 ** (-requiredDb / 20);
/** A reactance X left over between equal resistances R has |Γ|² = X²/(4R² + X²): the largest that Ω. */
const largest = (2 * r * limit) / Math.sqrt(1 - limit ** 2);

const cases = distributions.flatMap((distribution) => {
  const between = (low: number, high: number, tolerance: number): number =>
    below((high - 1) / tolerance, distribution) - below((low - 1) / tolerance, distribution);
  // Alone in series: X·s is at most the largest. It is reached 2 % above the nominal value.
  const alone: Case = { arms: [inductor(largest / 1.02)], load: { r, x: 0 }, distribution, tolerance: 0.05 };
  // Cancelling a load's 200 Ω: 200·|1 − 1/s| is at most the largest.
  const off = largest / 200;
  const cancelling: Case = { arms: [capacitor(200)], load: { r, x: 200 }, distribution, tolerance: 0.2 };
  return [
    { name: `${distribution}, an inductor alone`, given: alone, truth: between(0, 1.02, 0.05) },
    {
      name: `${distribution}, a capacitor that cancels`,
      given: cancelling,
      truth: between(1 / (1 + off), 1 / (1 - off), 0.2),
    },
  ];
});

describe('yieldOf(subject, requiredDb, seed, samples) of closed-form cases, over 1000 seeds', () => {
  const seeds = 1000;
  const samples = 100;
  const intervals = Array.from({ length: samples + 1 }, (_, passed) => clopperPearson(passed, samples));
  const inside = (passed: number, truth: number): boolean =>
    intervals[passed]!.low <= truth && truth <= intervals[passed]!.high;

  it.each(cases)('has the true yield in its interval as often as it should: $name', ({ given, truth }) => {
    // How often exact intervals hold it: 95 % at least, and more where a fraction of 100 can't be finer.
    let binomial = (1 - truth) ** samples;
    let coverage = 0;
    for (let k = 0; k <= samples; k += 1) {
      if (inside(k, truth)) coverage += binomial;
      binomial *= ((samples - k) / (k + 1)) * (truth / (1 - truth));
    }
    expect(coverage).toBeGreaterThanOrEqual(0.95);

    const prepared = subject(given);
    let all = 0;
    let held = 0;
    for (let seed = 1; seed <= seeds; seed += 1) {
      const found = yieldOf(prepared, requiredDb, seed, samples);
      all += found.passed;
      if (found.low <= truth && truth <= found.high) held += 1;
    }
    const deviation = Math.sqrt(seeds * coverage * (1 - coverage));
    expect(Math.abs(held - seeds * coverage)).toBeLessThan(4 * deviation);
    const draws = seeds * samples;
    expect(Math.abs(all - draws * truth)).toBeLessThan(4 * Math.sqrt(draws * truth * (1 - truth)));
  });
});

describe('passedOf(subject, requiredDb, seed, from, count)', () => {
  const seed = fc.integer({ min: 0, max: Number.MAX_SAFE_INTEGER });
  const [{ given }] = cases as [(typeof cases)[number]];
  const prepared = subject({ ...given, arms: [...given.arms, capacitor(3), inductor(5)], loadSpread: 0.1 });

  it('adds up over any split', () => {
    fc.assert(
      fc.property(
        seed,
        fc.integer({ min: 1, max: 9000 }),
        fc.array(fc.nat(9000), { maxLength: 5 }),
        (s, count, cuts) => {
          const edges = [0, ...cuts.filter((cut) => cut < count).toSorted((a, b) => a - b), count];
          const sum = edges
            .slice(1)
            .reduce((total, to, k) => total + passedOf(prepared, requiredDb, s, edges[k]!, to - edges[k]!), 0);
          expect(sum).toBe(passedOf(prepared, requiredDb, s, 0, count));
        },
      ),
      { numRuns: 30 },
    );
  });
});

describe('drawsOf(parts, arms, spread, distribution, seed, from, count)', () => {
  it('gives a network the same values whatever range it is drawn in', () => {
    const { parts } = subject({
      arms: [inductor(1), capacitor(1)],
      load: { r, x: 0 },
      distribution: 'normal',
      tolerance: 0.1,
    });
    const draw = (from: number, count: number) =>
      drawsOf(parts, 2, { source: 0.1, load: 0.2 }, 'normal', 7, from, count);
    const whole = draw(0, 100);
    const piece = draw(40, 30);
    const columns = ({ scale, loadR, loadX, sourceR, sourceX }: typeof whole) => [
      ...scale,
      loadR!,
      loadX!,
      sourceR!,
      sourceX!,
    ];
    expect(columns(piece)).toEqual(columns(whole).map((column) => column.slice(40, 70)));
  });
});

import { Complex } from 'complex.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Arm } from '../../src/network/arm.ts';
import { ladderInput } from '../../src/network/ladder-input.ts';
import { readQuantity } from '../../src/quantity/read-quantity.ts';
import { pairQ, resistivePair } from '../../src/synthesis/resistive-pair.ts';
import { twoElement } from '../../src/synthesis/two-element.ts';
import { aim, anyTermination, frequency, resistance, termination } from './arbitraries.ts';
import { aimed, alike, attainable, impedance, parallelR, seenApart, swept } from './circuit.ts';

const problem = fc.record({ source: anyTermination, load: anyTermination, f0: frequency, aim });
const runs = { numRuns: 600 };

describe('twoElement(target, load, f0) of any terminations', () => {
  it('gives networks through which the source sees what was aimed at', () => {
    fc.assert(
      fc.property(problem, ({ source, load, f0, aim: sought }) => {
        const target = aimed(source, sought);
        for (const network of twoElement(target, impedance(load), f0).candidates) {
          const tolerance = attainable(target, impedance(load), network);
          expect(seenApart(network.arms, impedance(load), target, f0)).toBeLessThanOrEqual(tolerance);
        }
      }),
      runs,
    );
  });

  it('gives, for the conjugate aim, networks of gain 1 and no reflection at f0', () => {
    fc.assert(
      fc.property(problem, ({ source, load, f0 }) => {
        const target = aimed(source, 'conjugate');
        for (const network of twoElement(target, impedance(load), f0).candidates) {
          const { gain, gammaRe, gammaIm } = swept(network.arms, source, load, f0, [f0], 'conjugate');
          const tolerance = attainable(target, impedance(load), network);
          expect(Math.abs(gain[0]! - 1)).toBeLessThanOrEqual(tolerance);
          expect(Math.hypot(gammaRe[0]!, gammaIm[0]!)).toBeLessThanOrEqual(tolerance);
        }
      }),
      runs,
    );
  });

  it('gives, for the reflectionless aim, no reflection and the gain of a direct mismatch ZS against ZS', () => {
    fc.assert(
      fc.property(problem, ({ source, load, f0 }) => {
        const target = aimed(source, 'reflectionless');
        for (const network of twoElement(target, impedance(load), f0).candidates) {
          const { gain, gammaRe, gammaIm } = swept(network.arms, source, load, f0, [f0], 'reflectionless');
          const tolerance = attainable(target, impedance(load), network);
          expect(Math.hypot(gammaRe[0]!, gammaIm[0]!)).toBeLessThanOrEqual(tolerance);
          // 4·RS·Rin/|ZS + Zin|² with Zin = ZS is RS²/|ZS|².
          const wanted = source.r ** 2 / (source.r ** 2 + source.x ** 2);
          expect(Math.abs(gain[0]! / wanted - 1)).toBeLessThanOrEqual(tolerance);
        }
      }),
      runs,
    );
  });

  it('gives one network at least and four at most, none twice, of at most one series and one shunt arm', () => {
    fc.assert(
      fc.property(problem, ({ source, load, f0, aim: sought }) => {
        const { candidates } = twoElement(aimed(source, sought), impedance(load), f0);
        expect(candidates.length).toBeGreaterThanOrEqual(1);
        expect(candidates.length).toBeLessThanOrEqual(4);
        const twice = candidates.filter(({ arms }, k) =>
          candidates.slice(0, k).some((other) => alike(other.arms, arms)),
        );
        expect(twice).toEqual([]);
        expect(new Set(candidates.map(({ id }) => id)).size).toBe(candidates.length);
        for (const { arms } of candidates) {
          expect(new Set(arms.map(({ arm }) => arm)).size).toBe(arms.length);
          for (const { value } of arms) expect(value > 0 && Number.isFinite(value)).toBe(true);
        }
      }),
      runs,
    );
  });

  it('has a form exactly where its inequality holds, and tells the numbers where it fails', () => {
    fc.assert(
      fc.property(problem, ({ source, load, f0, aim: sought }) => {
        const target = aimed(source, sought);
        const { candidates, absent } = twoElement(target, impedance(load), f0);
        const forms = [
          { shunt: 'load', low: target.re, high: parallelR(impedance(load)) },
          { shunt: 'source', low: load.r, high: parallelR(target) },
        ] as const;
        // At equality to the last digits either answer is right.
        fc.pre(forms.every(({ low, high }) => Math.abs(high / low - 1) > 1e-12));
        expect(absent).toHaveLength(forms.filter(({ low, high }) => low > high).length);
        expect(candidates.length > 0).toBe(absent.length < 2);
        for (const { form, why } of absent) {
          const { low, high } = forms.find(({ shunt }) => form.includes(`at the ${shunt}`))!;
          expect(low).toBeGreaterThan(high);
          const [, above, below] = /here (.+) > (.+) \(ratio/.exec(why)!;
          for (const [text, wanted] of [
            [above!, low],
            [below!, high],
          ] as const) {
            const reading = readQuantity(text, 'Ω');
            expect(reading.ok && Math.abs(reading.value / wanted - 1) < 1e-3).toBe(true);
          }
        }
      }),
      runs,
    );
  });

  it('works backwards: the mirrored ladders match the conjugates with source and load exchanged', () => {
    fc.assert(
      fc.property(problem, ({ source, load, f0 }) => {
        const forwards = twoElement(aimed(source, 'conjugate'), impedance(load), f0).candidates;
        const backwards = twoElement(aimed(load, 'conjugate'), impedance(source), f0).candidates;
        expect(backwards).toHaveLength(forwards.length);
        for (const { arms } of backwards) {
          expect(forwards.filter((other) => alike(other.arms, arms.toReversed()))).toHaveLength(1);
        }
      }),
      runs,
    );
  });

  it('is its own dual: with Z → R²/Z, series L for shunt C of L/R² and shunt L for series C, the same match holds', () => {
    const ordinary = termination(0.1, 1e4, 100);
    fc.assert(
      fc.property(ordinary, ordinary, frequency, aim, (source, load, f0, sought) => {
        const size = 50 ** 2;
        const invert = (z: Complex): Complex => new Complex(size, 0).div(z);
        const target = aimed(source, sought);
        const { candidates } = twoElement(target, impedance(load), f0);
        const duals = twoElement(invert(target), invert(impedance(load)), f0).candidates;
        // Where an arm is next to nothing, rounding decides whether it is there.
        fc.pre([...candidates, ...duals].every(({ arms }) => arms.length === 2));
        expect(duals).toHaveLength(candidates.length);
        for (const network of candidates) {
          const dual = network.arms.map((arm): Arm => dualOf(arm, size));
          const apart = seenApart(dual, invert(impedance(load)), invert(target), f0);
          expect(apart).toBeLessThanOrEqual(attainable(target, impedance(load), network));
        }
      }),
      runs,
    );
  });

  it('scales with impedance and with frequency, to the last digit for powers of two', () => {
    fc.assert(
      fc.property(problem, fc.integer({ min: -6, max: 6 }), fc.integer({ min: -6, max: 6 }), (given, a, b) => {
        const target = aimed(given.source, given.aim);
        const load = impedance(given.load);
        const [z, f] = [2 ** a, 2 ** b];
        const plain = twoElement(target, load, given.f0).candidates;
        const scaled = twoElement(target.mul(z), load.mul(z), given.f0 * f).candidates;
        expect(scaled.map(({ id }) => id)).toEqual(plain.map(({ id }) => id));
        expect(scaled.map(({ arms }) => arms)).toEqual(
          plain.map(({ arms }) =>
            arms.map((arm) => ({ ...arm, value: arm.part === 'inductor' ? (arm.value * z) / f : arm.value / z / f })),
          ),
        );
      }),
      runs,
    );
  });

  it('needs no part where the load is what is aimed at', () => {
    fc.assert(
      fc.property(anyTermination, frequency, aim, (source, f0, sought) => {
        const target = aimed(source, sought);
        const { candidates } = twoElement(target, target, f0);
        const [direct] = candidates.filter(({ arms }) => arms.length === 0);
        expect(direct).toMatchObject({ id: 'direct', sections: 0 });
        for (const network of candidates) {
          expect(seenApart(network.arms, target, target, f0)).toBeLessThanOrEqual(attainable(target, target, network));
        }
      }),
      runs,
    );
  });
});

describe('resistivePair(RS, RL, f0) of any two resistances', () => {
  it('agrees with the general equations to 1 part in 10¹²', () => {
    fc.assert(
      fc.property(resistance, resistance, frequency, (rs, rl, f0) => {
        fc.pre(Math.abs(rs / rl - 1) > 1e-12);
        const byQ = resistivePair(rs, rl, f0).candidates;
        const general = twoElement(new Complex(rs, 0), new Complex(rl, 0), f0).candidates;
        expect(byQ.map(({ id }) => id)).toEqual(general.map(({ id }) => id));
        byQ.forEach(({ arms }, k) =>
          arms.forEach((arm, n) => {
            const other = general[k]!.arms[n]!;
            expect([arm.arm, arm.part]).toEqual([other.arm, other.part]);
            expect(Math.abs(arm.value / other.value - 1)).toBeLessThanOrEqual(1e-12);
          }),
        );
      }),
      runs,
    );
  });

  it('has series reactance Q·Rlow and shunt reactance Rhigh/Q with Q² + 1 = Rhigh/Rlow', () => {
    fc.assert(
      fc.property(resistance, resistance, frequency, (rs, rl, f0) => {
        const [low, high] = [Math.min(rs, rl), Math.max(rs, rl)];
        const q = pairQ(rs, rl);
        expect(Math.abs((q * q + 1) / (high / low) - 1)).toBeLessThan(1e-14);
        for (const { arms } of resistivePair(rs, rl, f0).candidates) {
          for (const arm of arms) {
            const x = Math.abs(ladderInput([{ ...arm, arm: 'series' }], new Complex(0, 0), f0).im);
            expect(Math.abs(x / (arm.arm === 'series' ? q * low : high / q) - 1)).toBeLessThan(1e-14);
          }
        }
      }),
      runs,
    );
  });
});

/** Series L of value L becomes shunt C of L/R²; series C becomes shunt L of C·R²; and back. */
function dualOf({ arm, part, value }: Arm, size: number): Arm {
  return {
    arm: arm === 'series' ? 'shunt' : 'series',
    part: part === 'inductor' ? 'capacitor' : 'inductor',
    value: part === 'inductor' ? value / size : value * size,
  };
}

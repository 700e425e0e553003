import { Complex } from 'complex.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Arm } from '../../src/network/arm.ts';
import { impedanceOf } from '../../src/network/immittance.ts';
import { ladderInput } from '../../src/network/ladder-input.ts';
import { terminationAt } from '../../src/network/termination-at.ts';
import { anyTermination, frequency, logUniform, termination } from './arbitraries.ts';
import { swept } from './circuit.ts';

/** Any ladder whose parts have reactances of 1 mΩ to 1 MΩ at f0, whether it matches anything or not. */
const ladder = (f0: number, q?: number): fc.Arbitrary<Arm[]> =>
  fc.array(
    fc
      .tuple(
        fc.constantFrom<Arm['arm']>('series', 'shunt'),
        fc.constantFrom<Arm['part']>('inductor', 'capacitor'),
        logUniform(1e-3, 1e6),
      )
      .map(([arm, part, x]): Arm => {
        const omega = 2 * Math.PI * f0;
        const value = part === 'inductor' ? x / omega : 1 / (omega * x);
        return q === undefined ? { arm, part, value } : { arm, part, value, q };
      }),
    { maxLength: 8 },
  );

const runs = { numRuns: 600 };

describe('sweep(ladder, ends, aim) of any ladder between any terminations', () => {
  it('has GT + |Γ|² = 1 for lossless parts and the conjugate aim', () => {
    fc.assert(
      fc.property(
        frequency.chain((f0) => fc.tuple(fc.constant(f0), ladder(f0))),
        anyTermination,
        anyTermination,
        logUniform(0.1, 10),
        ([f0, arms], source, load, u) => {
          const hz = f0 * u;
          const { gain, gammaRe, gammaIm } = swept(arms, source, load, f0, [hz], 'conjugate');
          const sum = gain[0]! + gammaRe[0]! ** 2 + gammaIm[0]! ** 2;
          const zs = terminationAt(source, f0, hz);
          expect(Math.abs(sum - 1)).toBeLessThanOrEqual(rounding(arms, zs, terminationAt(load, f0, hz), hz));
        },
      ),
      runs,
    );
  });

  it('agrees with the impedance seen, of lossy parts and either aim', () => {
    const ordinary = termination(0.1, 1e4, 100);
    fc.assert(
      fc.property(
        frequency.chain((f0) => fc.tuple(fc.constant(f0), ladder(f0, 50))),
        ordinary,
        ordinary,
        logUniform(0.5, 2),
        ([f0, arms], source, load, u) => {
          const hz = f0 * u;
          const zs = terminationAt(source, f0, hz);
          const zin = ladderInput(arms, terminationAt(load, f0, hz), hz);
          for (const [aim, z] of [
            ['conjugate', zs.conjugate()],
            ['reflectionless', zs],
          ] as const) {
            const { gammaRe, gammaIm } = swept(arms, source, load, f0, [hz], aim);
            const wanted = zin.sub(z).div(zin.add(zs));
            expect(new Complex(gammaRe[0]!, gammaIm[0]!).sub(wanted).abs()).toBeLessThan(1e-9);
          }
        },
      ),
      runs,
    );
  });

  it('never gains: 0 < GT <= 1, with losses or without', () => {
    fc.assert(
      fc.property(
        frequency.chain((f0) => fc.tuple(fc.constant(f0), fc.oneof(ladder(f0), ladder(f0, 30)))),
        termination(0.1, 1e4, 100),
        termination(0.1, 1e4, 100),
        logUniform(0.1, 10),
        ([f0, arms], source, load, u) => {
          const { gain } = swept(arms, source, load, f0, [f0 * u], 'conjugate');
          expect(gain[0]!).toBeGreaterThan(0);
          expect(gain[0]!).toBeLessThanOrEqual(1 + 1e-12);
        },
      ),
      runs,
    );
  });
});

/**
 * What rounding can do to GT + |Γ|². |V + I·ZS|² − |V − I·ZS*|² is 4·RS·Re(V·I*), which every lossless arm leaves at RL;
 * an arm's own rounding moves it by ε·(|V| + |X·I|)·|I| (or the dual) once and for all, whatever follows.
 */
function rounding(arms: readonly Arm[], zs: Complex, zl: Complex, hz: number): number {
  let v = zl;
  let i = new Complex(1, 0);
  let moved = v.abs();
  for (const arm of arms.toReversed()) {
    const z = impedanceOf(arm, hz);
    if (arm.arm === 'series') {
      moved += (v.abs() + z.abs() * i.abs()) * i.abs();
      v = v.add(z.mul(i));
    } else {
      moved += (i.abs() + v.abs() / z.abs()) * v.abs();
      i = i.add(v.div(z));
    }
  }
  moved += v.abs() * i.abs();
  const sum = v.add(i.mul(zs)).abs();
  const ends = (v.abs() + i.abs() * zs.abs()) / sum;
  return 8 * Number.EPSILON * (1 + ends + (4 * zs.re * moved) / sum ** 2);
}

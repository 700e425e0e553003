import { Complex } from 'complex.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { realBranches } from '../../src/evidence/branch.ts';
import { builtEvidence } from '../../src/evidence/built-evidence.ts';
import { realPoint } from '../../src/evidence/real-point.ts';
import { stressOf } from '../../src/evidence/stress.ts';
import type { RealArm } from '../../src/network/real-arm.ts';
import { endsOver } from '../../src/network/sweep.ts';
import { logUniform, termination } from './arbitraries.ts';

const f0 = 100e6;
const omega = 2 * Math.PI * f0;
const q = fc.double({ min: 10, max: 1000, noNaN: true });

/** Of 1 Ω to 1 kΩ at f0, lossy, resonating by itself at 2·f0 or above. */
const realArm: fc.Arbitrary<RealArm> = fc
  .record({
    arm: fc.constantFrom('series' as const, 'shunt' as const),
    part: fc.constantFrom('inductor' as const, 'capacitor' as const),
    x: logUniform(1, 1000),
    q,
    qSlope: fc.constantFrom(-1, 0, 0.5),
    strays: fc.double({ min: 0, max: 0.25, noNaN: true }),
  })
  .map(({ arm, part, x, q: quality, qSlope, strays }) => ({
    arm,
    part,
    value: part === 'inductor' ? x / omega : 1 / (omega * x),
    q: quality,
    qSlope,
    parallelF: part === 'inductor' ? strays / (omega * x) : 0,
    seriesH: part === 'capacitor' ? (strays * x) / omega : 0,
  }));
const ladder = fc.record({
  arms: fc.array(realArm, { minLength: 1, maxLength: 6 }),
  strayF: fc.double({ min: 0, max: 3e-12, noNaN: true }),
});
const end = termination(2, 500, 5);
const unknown = { ratedVolts: null, ratedAmps: null, ratedWatts: null };
const relative = fc.double({ min: 0.7, max: 1.4, noNaN: true });

describe('builtEvidence(ladder, states, f0, powerW)', () => {
  it('balances power to 1e-9 with loss and strays, and finds every figure the same by nodal equations', () => {
    fc.assert(
      fc.property(ladder, end, end, relative, (network, source, load, multiple) => {
        const ends = endsOver(source, load, f0, Float64Array.of(f0, multiple * f0));
        const checks = builtEvidence(network, [ends], f0, 10);
        expect(checks.filter(({ pass }) => !pass)).toEqual([]);
      }),
      { numRuns: 500 },
    );
  });
});

describe('stressOf(subject, powerW, vswr, ratings, derating)', () => {
  const unit = fc.double({ min: 0, max: 1, noNaN: true });

  it('is exceeded by no load up to the VSWR, and met by one of exactly that VSWR', () => {
    fc.assert(
      fc.property(
        ladder,
        end,
        end,
        fc.double({ min: 1, max: 8, noNaN: true }),
        fc.array(fc.tuple(unit, unit), { minLength: 40, maxLength: 40 }),
        (network, source, load, vswr, inside) => {
          const ends = endsOver(source, load, f0, Float64Array.of(f0));
          const parts = network.arms.map((alone, armIndex) => ({
            designator: String(armIndex),
            armIndex,
            pair: null,
            alone,
            ratedVolts: null,
            ratedAmps: null,
          }));
          const stress = stressOf({ ladder: network, f0, parts, states: [ends] }, 10, vswr, unknown, 1);
          const branches = realBranches(network, f0, f0);
          const zs = new Complex(source.r, source.x);
          const zl = new Complex(load.r, load.x);
          const rho = (vswr - 1) / (vswr + 1);
          const borneAt = (size: number, turn: number) => {
            const gamma = new Complex({ abs: size, arg: 2 * Math.PI * turn });
            const z = zl.add(gamma.mul(zl.conjugate())).div(new Complex(1, 0).sub(gamma));
            return realPoint(branches, zs, z, 10).arms.map(({ volts, amps, watts }) => [
              volts.abs(),
              amps.abs() / Math.SQRT2,
              watts,
            ]);
          };
          const found = stress.parts.map(({ mismatched }) => {
            const { voltsPeak, ampsRms, watts } = mismatched!;
            return [voltsPeak, ampsRms, watts];
          });
          const most = found.map(() => [0, 0, 0]);
          const scan = (size: number, turn: number): void =>
            borneAt(size, turn).forEach((figures, n) =>
              figures.forEach((figure, k) => (most[n]![k] = Math.max(most[n]![k]!, figure))),
            );
          // The square root spreads them evenly over the disc.
          for (const [size, turn] of inside) scan(rho * Math.sqrt(size), turn);
          for (let k = 0; k < 360; k += 1) scan(rho, k / 360);
          found.forEach((figures, n) =>
            figures.forEach((figure, k) => {
              expect(most[n]![k]!).toBeLessThanOrEqual(figure * (1 + 1e-9));
              // Half a degree off the worst angle, with ρ up to 7/9.
              expect(most[n]![k]!).toBeGreaterThan(figure * (1 - 5e-3));
            }),
          );
        },
      ),
      { numRuns: 60 },
    );
  });

  it('is finite whatever the VSWR, and no less with a mismatch than without', () => {
    fc.assert(
      fc.property(ladder, end, end, logUniform(1, 1e6), (network, source, load, vswr) => {
        const parts = network.arms.map((alone, armIndex) => ({
          designator: String(armIndex),
          armIndex,
          pair: null,
          alone,
          ratedVolts: null,
          ratedAmps: null,
        }));
        const states = [endsOver(source, load, f0, Float64Array.of(0.9 * f0, f0, 1.1 * f0))];
        const stress = stressOf({ ladder: network, f0, parts, states }, 10, vswr, { ...unknown, ratedVolts: 50 }, 0.8);
        for (const { voltsPeak, ampsRms, watts, mismatched, limitW } of stress.parts) {
          expect(mismatched!.voltsPeak).toBeGreaterThanOrEqual(voltsPeak * (1 - 1e-12));
          expect(mismatched!.ampsRms).toBeGreaterThanOrEqual(ampsRms * (1 - 1e-12));
          expect(mismatched!.watts).toBeGreaterThanOrEqual(watts * (1 - 1e-12));
          expect(Object.values(mismatched!).every(Number.isFinite)).toBe(true);
          expect(limitW).toBeCloseTo(10 * (40 / mismatched!.voltsPeak) ** 2, 9);
        }
      }),
      { numRuns: 200 },
    );
  });
});

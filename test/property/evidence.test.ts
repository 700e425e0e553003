import type { Complex } from 'complex.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evidence } from '../../src/evidence/evidence.ts';
import type { Arm } from '../../src/network/arm.ts';
import { impedanceOf } from '../../src/network/immittance.ts';
import { cascade } from '../../src/synthesis/cascade.ts';
import { twoElement } from '../../src/synthesis/two-element.ts';
import { aim, frequency, termination } from './arbitraries.ts';
import { aimed, impedance } from './circuit.ts';

// A Q up to 1000, over a band of 10 %: beyond any load that a lumped network is built for.
const ordinary = termination(0.1, 1e4, 1e3);

describe('evidence(subject, frequencies)', () => {
  it('passes for every network between ordinary terminations, at f0 and at the edges of a band', () => {
    fc.assert(
      fc.property(ordinary, ordinary, frequency, aim, fc.integer({ min: 1, max: 6 }), (source, load, f0, sought, n) => {
        const target = aimed(source, sought);
        const zl = impedance(load);
        const found = [...twoElement(target, zl, f0).candidates, ...cascade(target, zl, f0, [n]).candidates];
        for (const { arms, sections } of found.filter((one) => one.arms.every((arm) => counts(arm, target, zl, f0)))) {
          const { checks } = evidence([{ arms, source, load, f0 }], [f0, 0.95 * f0, 1.05 * f0], sections <= 1);
          expect(checks.filter(({ pass }) => !pass)).toEqual([]);
        }
      }),
      { numRuns: 200 },
    );
  });

  it('fails when a part is not what the terminations need: the Q method disagrees from a part in 10¹¹ on', () => {
    fc.assert(
      fc.property(frequency, fc.double({ min: 1.5, max: 100, noNaN: true }), (f0, ratio) => {
        const source = { r: 50, x: 0, behaviour: 'series' } as const;
        const load = { r: 50 * ratio, x: 0, behaviour: 'series' } as const;
        const { candidates } = twoElement(impedance(source), impedance(load), f0);
        const arms = candidates[0]!.arms.map((arm) => ({ ...arm, value: arm.value * (1 + 1e-11) }));
        const { checks } = evidence([{ arms, source, load, f0 }], [f0], true);
        const values = checks.find(({ subject }) => subject === 'element values by the Q method')!;
        expect(values.pass).toBe(false);
      }),
      { numRuns: 50 },
    );
  });
});

/** A part of a millionth of the impedances around it leaves nodal equations without digits; it is no part of a design. */
function counts(arm: Arm, source: Complex, load: Complex, hz: number): boolean {
  const size = impedanceOf(arm, hz).abs();
  return arm.arm === 'series'
    ? size > 1e-6 * Math.min(source.abs(), load.abs())
    : size < 1e6 * Math.max(source.abs(), load.abs());
}

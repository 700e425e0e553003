import { Complex } from 'complex.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { twoPortFile } from '../../src/evidence/two-port-file.ts';
import { readTouchstone } from '../../src/measured/read-touchstone.ts';
import type { Arm } from '../../src/network/arm.ts';
import { ladderInput } from '../../src/network/ladder-input.ts';
import { anyLadder } from './random-loads.ts';

const f0 = 100e6;
const hz = [50e6, 80e6, 100e6, 130e6, 200e6];

/** The same network looked into from the load: arms the other way round. */
const reflection = (arms: readonly Arm[], f: number): Complex => {
  const z = ladderInput(arms, new Complex(50, 0), f);
  return z.sub(50).div(z.add(50));
};

describe('twoPortFile(arms, hz, comments)', () => {
  it('is read back by the reader of measured data as the reflection seen into either port, the other closed with 50 Ω', () => {
    fc.assert(
      fc.property(anyLadder(f0), (arms) => {
        // A sample that reflects all but a part in 1e12 is no termination; it is refused, as it should be.
        fc.pre(hz.every((f) => reflection(arms, f).abs() < 1 - 1e-9));
        const text = twoPortFile(arms, hz, ['a comment of any kind: # [Version] 9', 'Ω − "quoted"']);
        const one = readTouchstone(text, 'network.s2p', 1);
        const two = readTouchstone(text, 'network.s2p', 2);
        expect([...one.frequencyHz]).toEqual(hz);
        expect([one.referenceOhm, two.referenceOhm]).toEqual([50, 50]);
        hz.forEach((f, k) => {
          const [s11, s22] = [reflection(arms, f), reflection(arms.toReversed(), f)];
          expect(Math.hypot(one.re[k]! - s11.re, one.im[k]! - s11.im)).toBeLessThan(1e-9);
          expect(Math.hypot(two.re[k]! - s22.re, two.im[k]! - s22.im)).toBeLessThan(1e-9);
        });
      }),
      { numRuns: 400 },
    );
  });
});

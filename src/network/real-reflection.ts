import { Complex } from 'complex.js';
import { realImpedance, type RealLadder } from './real-arm.ts';
import { terminationAt } from './termination-at.ts';
import type { Aim, Termination } from './termination.ts';

/**
 * Reflection coefficient for the aim in force and transducer gain of a network of real parts at one frequency, by
 * complex numbers: for the few frequencies where the sweep's own grid isn't enough.
 */
export function realReflection(
  { arms, strayF }: RealLadder,
  source: Termination,
  load: Termination,
  f0: number,
  aim: Aim,
  frequencyHz: number,
): { readonly gamma: Complex; readonly gain: number } {
  const stray = new Complex(0, 2 * Math.PI * frequencyHz * strayF);
  const zl = terminationAt(load, f0, frequencyHz);
  const zs = terminationAt(source, f0, frequencyHz);
  let v = zl;
  let i = new Complex(1, 0).add(v.mul(stray));
  for (const arm of arms.toReversed()) {
    const z = realImpedance(arm, f0, frequencyHz);
    if (arm.arm === 'series') {
      v = v.add(i.mul(z));
      i = i.add(v.mul(stray));
    } else i = i.add(v.div(z));
  }
  const sum = v.add(i.mul(zs));
  return {
    gamma: v.sub(i.mul(aim === 'conjugate' ? zs.conjugate() : zs)).div(sum),
    gain: (4 * zs.re * zl.re) / sum.abs() ** 2,
  };
}

import type { Complex } from 'complex.js';
import type { Arm } from '../network/arm.ts';
import { impedanceOf } from '../network/immittance.ts';
import { realImpedance, type RealLadder } from '../network/real-arm.ts';

/** An arm at one frequency. */
export interface Branch {
  readonly arm: Arm['arm'];
  /** Ω */
  readonly z: Complex;
}

/** A ladder at one frequency, source side first, with a susceptance from each of its nodes to ground. */
export interface Branches {
  readonly arms: readonly Branch[];
  /** S */
  readonly strayB: number;
}

export const branchesOf = (arms: readonly Arm[], frequencyHz: number): Branches => ({
  arms: arms.map((each) => ({ arm: each.arm, z: impedanceOf(each, frequencyHz) })),
  strayB: 0,
});

/** @param f0 design frequency, at which the Q of each part is stated, Hz */
export const realBranches = ({ arms, strayF }: RealLadder, f0: number, frequencyHz: number): Branches => ({
  arms: arms.map((each) => ({ arm: each.arm, z: realImpedance(each, f0, frequencyHz) })),
  strayB: 2 * Math.PI * frequencyHz * strayF,
});

/** What one arm bears: peak phasors of the voltage across it and the current through it, and the heat in it. */
export interface Borne {
  readonly volts: Complex;
  readonly amps: Complex;
  readonly watts: number;
}

/** Heat of a peak current through an impedance: |I|²·R/2, W. */
export const heat = (amps: Complex, z: Complex): number => ((amps.re ** 2 + amps.im ** 2) * z.re) / 2;

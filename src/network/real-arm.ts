import { Complex } from 'complex.js';
import type { Arm } from './arm.ts';
import { power } from '../quantity/elementary.ts';

/**
 * An arm as a real part has it. An inductor: L in series with ωL/Q, a capacitance across both. A capacitor: C in series
 * with 1/(ωCQ). In series with either: an inductance of leads and of its own. Q(f) = Q0·(f/f0)^slope, f0 being the
 * design frequency.
 */
export interface RealArm extends Omit<Arm, 'q'> {
  /** Q at the design frequency; null: lossless. */
  readonly q: number | null;
  readonly qSlope: number;
  /** Across an inductor: what makes it resonate by itself, F; 0: none. */
  readonly parallelF: number;
  /** Equivalent series inductance and, in a shunt arm, that of its leads, H; 0: none. */
  readonly seriesH: number;
}

/** Real arms from the source to the load, and a stray capacitance from every node of them to ground. */
export interface RealLadder {
  readonly arms: readonly RealArm[];
  /** F; 0: none. Nodes: the source's, one after each series arm. */
  readonly strayF: number;
}

/** Quality factor at a frequency; null: lossless. */
export const qAt = ({ q, qSlope }: RealArm, f0: number, frequencyHz: number): number | null =>
  q === null ? null : q * power(frequencyHz / f0, qSlope);

/** Impedance of a real arm, Ω. */
export function realImpedance(arm: RealArm, f0: number, frequencyHz: number): Complex {
  const omega = 2 * Math.PI * frequencyHz;
  const q = qAt(arm, f0, frequencyHz);
  const x = arm.part === 'inductor' ? omega * arm.value : -1 / (omega * arm.value);
  const z = new Complex(q === null ? 0 : Math.abs(x) / q, x);
  const own = arm.parallelF === 0 ? z : z.div(z.mul(new Complex(0, omega * arm.parallelF)).add(1));
  return own.add(new Complex(0, omega * arm.seriesH));
}

/** An ideal arm with nothing but the constant Q that it states. */
export const realArm = (arm: Arm): RealArm => ({
  arm: arm.arm,
  part: arm.part,
  value: arm.value,
  q: arm.q ?? null,
  qSlope: 0,
  parallelF: 0,
  seriesH: 0,
});

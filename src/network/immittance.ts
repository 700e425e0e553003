import { Complex } from 'complex.js';
import type { Arm } from './arm.ts';

/** Impedance of an arm's part at one frequency, Ω, its series loss resistance included. */
export function impedanceOf({ part, value, q }: Arm, frequencyHz: number): Complex {
  const omega = 2 * Math.PI * frequencyHz;
  const x = part === 'inductor' ? omega * value : -1 / (omega * value);
  return new Complex(q === undefined ? 0 : Math.abs(x) / q, x);
}

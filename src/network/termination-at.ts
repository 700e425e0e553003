import { Complex } from 'complex.js';
import type { Termination } from './termination.ts';

/**
 * Impedances of a termination over frequency, written into typed arrays for the sweep.
 *
 * @param f0     frequency at which r + jx holds, Hz
 * @param r, x   filled, Ω; as long as `frequencyHz`
 */
export function fillTermination(
  { r: r0, x: x0, behaviour }: Termination,
  f0: number,
  frequencyHz: Float64Array,
  r: Float64Array,
  x: Float64Array,
): void {
  const n = frequencyHz.length;
  if (behaviour === 'constant' || x0 === 0) {
    r.fill(r0);
    x.fill(x0);
    return;
  }
  if (behaviour === 'series') {
    r.fill(r0);
    for (let k = 0; k < n; k += 1) {
      const u = frequencyHz[k]! / f0;
      x[k] = x0 > 0 ? x0 * u : x0 / u;
    }
    return;
  }
  const size = r0 * r0 + x0 * x0;
  const g = r0 / size;
  const b0 = -x0 / size;
  for (let k = 0; k < n; k += 1) {
    const u = frequencyHz[k]! / f0;
    const b = b0 > 0 ? b0 * u : b0 / u;
    const d = g * g + b * b;
    r[k] = g / d;
    x[k] = -b / d;
  }
}

/** Impedance of a termination at one frequency, Ω. */
export function terminationAt(termination: Termination, f0: number, frequencyHz: number): Complex {
  const r = new Float64Array(1);
  const x = new Float64Array(1);
  fillTermination(termination, f0, Float64Array.of(frequencyHz), r, x);
  return new Complex(r[0]!, x[0]!);
}

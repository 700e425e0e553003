import { Complex } from 'complex.js';
import type { Arm } from './arm.ts';
import { impedanceOf } from './immittance.ts';

/**
 * Impedance seen into a ladder closed by a load, at one frequency. Voltage and current are carried from the load back
 * to the source, so an inner resonance never divides by zero.
 *
 * @param arms  n >= 0 arms, source side first
 * @param load  load impedance at that frequency, Ω
 * @returns     Zin, Ω; `load` itself when n = 0
 * @throws RangeError when no current flows into the ladder (an open input)
 */
export function ladderInput(arms: readonly Arm[], load: Complex, frequencyHz: number): Complex {
  let v = load;
  let i = new Complex(1, 0);
  for (const arm of arms.toReversed()) {
    const z = impedanceOf(arm, frequencyHz);
    if (arm.arm === 'series') v = v.add(z.mul(i));
    else i = i.add(v.div(z));
  }
  if (i.re === 0 && i.im === 0) {
    throw new RangeError(`ladderInput: ${String(arms.length)} arms leave the input open; check the shunt arms`);
  }
  return v.div(i);
}

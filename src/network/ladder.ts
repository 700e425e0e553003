import type { Arm } from './arm.ts';

/**
 * A ladder prepared for the sweep: every arm's immittance is (a + jb)·ω + (c + jd)/ω, in Ω for a series arm and S for a
 * shunt arm, so that the loop over frequency divides by nothing.
 */
export interface Ladder {
  readonly length: number;
  /** 1 for a shunt arm, 0 for a series arm; load side first, the order in which the sweep meets them. */
  readonly shunt: Uint8Array;
  /** a, b, c, d of each arm, load side first. */
  readonly coefficients: Float64Array;
}

/** @param arms source side first */
export function prepareLadder(arms: readonly Arm[]): Ladder {
  const length = arms.length;
  const shunt = new Uint8Array(length);
  const coefficients = new Float64Array(4 * length);
  for (let k = 0; k < length; k += 1) {
    const arm = arms[length - 1 - k]!;
    shunt[k] = arm.arm === 'shunt' ? 1 : 0;
    coefficients.set(coefficientsOf(arm), 4 * k);
  }
  return { length, shunt, coefficients };
}

/** Series resistance is reactance/Q: L has ωL(1/Q + j), C has (1/Q − j)/(ωC); a shunt arm is the reciprocal. */
function coefficientsOf({ arm, part, value, q }: Arm): readonly [number, number, number, number] {
  const loss = q === undefined ? 0 : 1 / q;
  const shrink = 1 / (1 + loss * loss);
  if (arm === 'series') {
    return part === 'inductor' ? [value * loss, value, 0, 0] : [0, 0, loss / value, -1 / value];
  }
  return part === 'capacitor'
    ? [value * loss * shrink, value * shrink, 0, 0]
    : [0, 0, (loss * shrink) / value, -shrink / value];
}

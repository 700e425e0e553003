import type { Ladder } from './ladder.ts';
import { fillTermination } from './termination-at.ts';
import type { Aim, Termination } from './termination.ts';

/** Frequencies with both terminations' impedances at them; arrays of equal length. Hz and Ω. */
export interface Ends {
  readonly frequencyHz: Float64Array;
  readonly rs: Float64Array;
  readonly xs: Float64Array;
  readonly rl: Float64Array;
  readonly xl: Float64Array;
}

/** Transducer gain (0 to 1) and reflection coefficient for the aim in force, at each frequency. */
export interface SweepResult {
  readonly gain: Float64Array;
  readonly gammaRe: Float64Array;
  readonly gammaIm: Float64Array;
}

export function endsOver(source: Termination, load: Termination, f0: number, frequencyHz: Float64Array): Ends {
  const n = frequencyHz.length;
  const ends: Ends = {
    frequencyHz,
    rs: new Float64Array(n),
    xs: new Float64Array(n),
    rl: new Float64Array(n),
    xl: new Float64Array(n),
  };
  fillTermination(source, f0, frequencyHz, ends.rs, ends.xs);
  fillTermination(load, f0, frequencyHz, ends.rl, ends.xl);
  return ends;
}

/**
 * Voltage and current are carried from a load current of 1 A back to the source, so an inner resonance divides by
 * nothing. Transducer gain 4·RS·RL/|V + I·ZS|²; Γ = (V − I·ZS*)/(V + I·ZS) for the conjugate aim,
 * (V − I·ZS)/(V + I·ZS) for the reflectionless one.
 */
export function sweep(ladder: Ladder, ends: Ends, aim: Aim): SweepResult {
  const n = ends.frequencyHz.length;
  const result: SweepResult = {
    gain: new Float64Array(n),
    gammaRe: new Float64Array(n),
    gammaIm: new Float64Array(n),
  };
  sweepInto(ladder, ends, aim, result);
  return result;
}

/**
 * The same, into arrays that are there already. Two frequencies go hand in hand: each step along the ladder waits for
 * the one before it, and the processor fills the wait with the other frequency's.
 */
export function sweepInto(ladder: Ladder, ends: Ends, aim: Aim, result: SweepResult): void {
  const { frequencyHz, rl, xl } = ends;
  const { length, shunt, coefficients } = ladder;
  const n = frequencyHz.length;
  const sign = aim === 'conjugate' ? -1 : 1;
  for (let k = 0; k < n; k += 2) {
    const next = k + 1 < n ? k + 1 : k;
    const omega = 2 * Math.PI * frequencyHz[k]!;
    const omega2 = 2 * Math.PI * frequencyHz[next]!;
    const inverse = 1 / omega;
    const inverse2 = 1 / omega2;
    let vr = rl[k]!;
    let vi = xl[k]!;
    let ir = 1;
    let ii = 0;
    let vr2 = rl[next]!;
    let vi2 = xl[next]!;
    let ir2 = 1;
    let ii2 = 0;
    for (let arm = 0, at = 0; arm < length; arm += 1, at += 4) {
      const a = coefficients[at]!;
      const b = coefficients[at + 1]!;
      const c = coefficients[at + 2]!;
      const d = coefficients[at + 3]!;
      const p = a * omega + c * inverse;
      const q = b * omega + d * inverse;
      const p2 = a * omega2 + c * inverse2;
      const q2 = b * omega2 + d * inverse2;
      if (shunt[arm] === 1) {
        ir += p * vr - q * vi;
        ii += p * vi + q * vr;
        ir2 += p2 * vr2 - q2 * vi2;
        ii2 += p2 * vi2 + q2 * vr2;
      } else {
        vr += p * ir - q * ii;
        vi += p * ii + q * ir;
        vr2 += p2 * ir2 - q2 * ii2;
        vi2 += p2 * ii2 + q2 * ir2;
      }
    }
    finish(k, vr, vi, ir, ii, ends, sign, result);
    finish(next, vr2, vi2, ir2, ii2, ends, sign, result);
  }
}

/** Gain and reflection at one frequency from the voltage and current at the source; `sign` −1 for the conjugate aim. */
function finish(
  k: number,
  vr: number,
  vi: number,
  ir: number,
  ii: number,
  { rs, xs, rl }: Ends,
  sign: 1 | -1,
  { gain, gammaRe, gammaIm }: SweepResult,
): void {
  const zr = rs[k]!;
  const zi = xs[k]!;
  const sumRe = vr + ir * zr - ii * zi;
  const sumIm = vi + ir * zi + ii * zr;
  const xAim = sign * zi;
  const differenceRe = vr - ir * zr + ii * xAim;
  const differenceIm = vi - ir * xAim - ii * zr;
  const scale = 1 / (sumRe * sumRe + sumIm * sumIm);
  gain[k] = 4 * zr * rl[k]! * scale;
  gammaRe[k] = (differenceRe * sumRe + differenceIm * sumIm) * scale;
  gammaIm[k] = (differenceIm * sumRe - differenceRe * sumIm) * scale;
}

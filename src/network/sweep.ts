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

/** The same, into arrays that are there already. */
export function sweepInto(ladder: Ladder, ends: Ends, aim: Aim, { gain, gammaRe, gammaIm }: SweepResult): void {
  const { frequencyHz, rs, xs, rl, xl } = ends;
  const { length, shunt, coefficients } = ladder;
  const conjugate = aim === 'conjugate';
  for (let k = 0; k < frequencyHz.length; k += 1) {
    const omega = 2 * Math.PI * frequencyHz[k]!;
    const inverse = 1 / omega;
    let vr = rl[k]!;
    let vi = xl[k]!;
    let ir = 1;
    let ii = 0;
    for (let arm = 0, c = 0; arm < length; arm += 1, c += 4) {
      const p = coefficients[c]! * omega + coefficients[c + 2]! * inverse;
      const q = coefficients[c + 1]! * omega + coefficients[c + 3]! * inverse;
      if (shunt[arm] === 1) {
        ir += p * vr - q * vi;
        ii += p * vi + q * vr;
      } else {
        vr += p * ir - q * ii;
        vi += p * ii + q * ir;
      }
    }
    const zr = rs[k]!;
    const zi = xs[k]!;
    const sumRe = vr + ir * zr - ii * zi;
    const sumIm = vi + ir * zi + ii * zr;
    const xAim = conjugate ? -zi : zi;
    const differenceRe = vr - ir * zr + ii * xAim;
    const differenceIm = vi - ir * xAim - ii * zr;
    const scale = 1 / (sumRe * sumRe + sumIm * sumIm);
    gain[k] = 4 * zr * rl[k]! * scale;
    gammaRe[k] = (differenceRe * sumRe + differenceIm * sumIm) * scale;
    gammaIm[k] = (differenceIm * sumRe - differenceRe * sumIm) * scale;
  }
}

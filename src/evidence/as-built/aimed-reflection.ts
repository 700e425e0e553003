import type { Ends } from '../../network/sweep.ts';
import type { Aim } from '../../network/termination.ts';

/** Reflection coefficients at each of some frequencies. */
export interface Reflections {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/**
 * Reflection for the aim in force from voltage and current at the source: (V − I·ZA)/(V + I·ZS), where ZA is ZS* for the
 * conjugate aim (power waves: K. Kurokawa, IEEE Trans. MTT-13, 1965) and ZS for the reflectionless one.
 *
 * @param k which of the frequencies
 */
export function aimedReflection(
  k: number,
  vr: number,
  vi: number,
  ir: number,
  ii: number,
  { rs, xs }: Pick<Ends, 'rs' | 'xs'>,
  aim: Aim,
  { re, im }: Reflections,
): void {
  const [r, x] = [rs[k]!, xs[k]!];
  const xAim = aim === 'conjugate' ? -x : x;
  const sumRe = vr + ir * r - ii * x;
  const sumIm = vi + ir * x + ii * r;
  const differenceRe = vr - ir * r + ii * xAim;
  const differenceIm = vi - ir * xAim - ii * r;
  const size = sumRe * sumRe + sumIm * sumIm;
  re[k] = (differenceRe * sumRe + differenceIm * sumIm) / size;
  im[k] = (differenceIm * sumRe - differenceRe * sumIm) / size;
}

import { log2 } from '../quantity/elementary.ts';

/**
 * Fixed-point numbers as BigInt with 192 fractional bits, and complex ones. Extracting a ladder from its polynomials
 * loses up to half of the digits at every few elements, which double precision can't carry for six sections.
 */
const bits = 192n;

export type Fixed = bigint;
export const unity: Fixed = 1n << bits;

/** Exact for every finite double of ordinary size. */
export function toFixedPoint(value: number): Fixed {
  const exponent = value === 0 ? 0 : Math.floor(log2(Math.abs(value))) - 53;
  const mantissa = BigInt(Math.round(value / 2 ** exponent));
  const shift = bits + BigInt(exponent);
  return shift >= 0n ? mantissa << shift : mantissa >> -shift;
}

export function toNumber(value: Fixed): number {
  const size = value < 0n ? -value : value;
  const length = BigInt(size.toString(2).length);
  const drop = length > 64n ? length - 64n : 192n;
  return Math.sign(Number(value)) * Number(size >> drop) * 2 ** Number(drop - bits);
}

export const times = (a: Fixed, b: Fixed): Fixed => (a * b) >> bits;
export const over = (a: Fixed, b: Fixed): Fixed => (a << bits) / b;

export interface FixedComplex {
  readonly re: Fixed;
  readonly im: Fixed;
}

export const complexTimes = (a: FixedComplex, b: FixedComplex): FixedComplex => ({
  re: times(a.re, b.re) - times(a.im, b.im),
  im: times(a.re, b.im) + times(a.im, b.re),
});

export function complexOver(a: FixedComplex, b: FixedComplex): FixedComplex {
  const size = times(b.re, b.re) + times(b.im, b.im);
  const top = complexTimes(a, { re: b.re, im: -b.im });
  return { re: over(top.re, size), im: over(top.im, size) };
}

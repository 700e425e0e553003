import type { Complex } from 'complex.js';

/**
 * Largest |(a + bΓ)/(c + dΓ)| over the disc |Γ| <= ρ, in closed form. Such a function maps a disc without its pole onto
 * a disc, whose centre is the image of the point that mirrors the pole in the rim, −ρ²·d̄/c̄ (any textbook of
 * linear-fractional maps): centre (a·c̄ − ρ²·b·d̄)/D and radius ρ·|bc − ad|/D, with D = |c|² − ρ²·|d|². The largest
 * size is that of the centre and the radius together, and lies on the rim.
 *
 * @param rho 0 to below 1, with |c| > ρ·|d|: no pole in the disc
 */
export function largestOnDisc(a: Complex, b: Complex, c: Complex, d: Complex, rho: number): number {
  const rho2 = rho * rho;
  const centreRe = a.re * c.re + a.im * c.im - rho2 * (b.re * d.re + b.im * d.im);
  const centreIm = a.im * c.re - a.re * c.im - rho2 * (b.im * d.re - b.re * d.im);
  const crossRe = b.re * c.re - b.im * c.im - a.re * d.re + a.im * d.im;
  const crossIm = b.re * c.im + b.im * c.re - a.re * d.im - a.im * d.re;
  const square = c.re * c.re + c.im * c.im - rho2 * (d.re * d.re + d.im * d.im);
  return (Math.hypot(centreRe, centreIm) + rho * Math.hypot(crossRe, crossIm)) / square;
}

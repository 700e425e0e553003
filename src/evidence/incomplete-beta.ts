import { exp, log, log1p } from '../quantity/elementary.ts';

/** ln Γ(x) for x > 0: Stirling's series where it has settled, Γ(x + 1) = x·Γ(x) up to there. */
function logGamma(x: number): number {
  let shift = 0;
  let at = x;
  for (; at < 15; at += 1) shift += log(at);
  const s = 1 / (at * at);
  const series = (1 / 12 - s * (1 / 360 - s * (1 / 1260 - s * (1 / 1680 - s / 1188)))) / at;
  return (at - 0.5) * log(at) - at + log(2 * Math.PI) / 2 + series - shift;
}

/**
 * Regularised incomplete beta function I_x(a, b) for a, b > 0 and x from 0 to 1, by its continued fraction (M. Abramowitz,
 * I. A. Stegun, Handbook of Mathematical Functions, 26.5.8), evaluated forwards by Lentz's method.
 */
export function incompleteBeta(a: number, b: number, x: number): number {
  if (x <= 0) return 0;
  if (x >= 1) return 1;
  // The fraction settles fast on this side of the mean.
  if (x > (a + 1) / (a + b + 2)) return 1 - incompleteBeta(b, a, 1 - x);
  const front = logGamma(a + b) - logGamma(a) - logGamma(b) + a * log(x) + b * log1p(-x);
  const tiny = 1e-300;
  const orTiny = (value: number): number => (Math.abs(value) < tiny ? tiny : value);
  let c = 1;
  let d = 1 / orTiny(1 - ((a + b) * x) / (a + 1));
  let fraction = d;
  // As many terms as the square root of the larger parameter, and some.
  const terms = 200 + 10 * Math.sqrt(Math.max(a, b));
  for (let m = 1; m < terms; m += 1) {
    const even = (m * (b - m) * x) / ((a + 2 * m - 1) * (a + 2 * m));
    d = 1 / orTiny(1 + even * d);
    c = orTiny(1 + even / c);
    fraction *= d * c;
    const odd = (-(a + m) * (a + b + m) * x) / ((a + 2 * m) * (a + 2 * m + 1));
    d = 1 / orTiny(1 + odd * d);
    c = orTiny(1 + odd / c);
    fraction *= d * c;
    if (Math.abs(d * c - 1) < 1e-15) break;
  }
  return (exp(front) * fraction) / a;
}

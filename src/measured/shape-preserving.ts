/**
 * Shape-preserving piecewise cubic interpolation (F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput. 5, 1984):
 * between samples the curve rises and falls only as they do, so it invents no ripple.
 *
 * @param x at least two, ascending
 * @param y as many
 * @returns slopes at the samples, for `interpolate`
 */
export function slopesOf(x: Float64Array, y: Float64Array): Float64Array {
  const n = x.length;
  const slopes = new Float64Array(n);
  if (n < 2) return slopes;
  const width = (k: number): number => x[k + 1]! - x[k]!;
  const secant = (k: number): number => (y[k + 1]! - y[k]!) / width(k);
  if (n === 2) return slopes.fill(secant(0));
  for (let k = 1; k < n - 1; k += 1) {
    const [before, after] = [secant(k - 1), secant(k)];
    if (before * after <= 0) continue;
    const [w1, w2] = [2 * width(k) + width(k - 1), width(k) + 2 * width(k - 1)];
    slopes[k] = (w1 + w2) / (w1 / before + w2 / after);
  }
  slopes[0] = endSlope(width(0), width(1), secant(0), secant(1));
  slopes[n - 1] = endSlope(width(n - 2), width(n - 3), secant(n - 2), secant(n - 3));
  return slopes;
}

/** Three-point slope at an end, limited so that the shape is kept. */
function endSlope(h0: number, h1: number, d0: number, d1: number): number {
  const slope = ((2 * h0 + h1) * d0 - h0 * d1) / (h0 + h1);
  if (slope * d0 <= 0) return 0;
  return d0 * d1 <= 0 && Math.abs(slope) > 3 * Math.abs(d0) ? 3 * d0 : slope;
}

/** Index of the interval that holds `at`: the last k with x[k] <= at, at most n − 2. */
export function intervalOf(x: Float64Array, at: number): number {
  let low = 0;
  let high = x.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (x[middle]! <= at) low = middle;
    else high = middle;
  }
  return low;
}

/** Value at a point of interval k, from samples and slopes. */
export function interpolate(x: Float64Array, y: Float64Array, slopes: Float64Array, k: number, at: number): number {
  if (x.length === 1) return y[0]!;
  const h = x[k + 1]! - x[k]!;
  const t = (at - x[k]!) / h;
  const u = 1 - t;
  return (
    u * u * (1 + 2 * t) * y[k]! + t * t * (1 + 2 * u) * y[k + 1]! + h * t * u * (u * slopes[k]! - t * slopes[k + 1]!)
  );
}

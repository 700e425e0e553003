/**
 * Where a function that changes sign between two points is zero: regula falsi with the Illinois correction (a stale end's
 * value is halved), to a part in 1e14 of the abscissa.
 */
export function zeroBetween(f: (x: number) => number, from: number, to: number): number {
  let [a, b] = [from, to];
  let [fa, fb] = [f(a), f(b)];
  for (let k = 0; k < 200 && fb !== 0 && Math.abs(b - a) > 1e-14 * Math.abs(b); k += 1) {
    const secant = b - (fb * (b - a)) / (fb - fa);
    // Where rounding leaves the secant on an end, halve.
    const c = secant === a || secant === b ? a + (b - a) / 2 : secant;
    const fc = f(c);
    if (fc * fb < 0) [a, fa] = [b, fb];
    else fa /= 2;
    [b, fb] = [c, fc];
  }
  return b;
}

/**
 * Largest value of a function with one hump between two points (golden section).
 *
 * @param steps each leaves 0.618 of the interval: 48 come to 1e-10 of it, 18 to 2e-4
 */
export function goldenMaximum(
  f: (x: number) => number,
  low: number,
  high: number,
  steps = 48,
): { readonly at: number; readonly value: number } {
  const ratio = (Math.sqrt(5) - 1) / 2;
  let [a, b] = [low, high];
  let c = b - ratio * (b - a);
  let d = a + ratio * (b - a);
  let [fc, fd] = [f(c), f(d)];
  for (let k = 0; k < steps; k += 1) {
    if (fc > fd) {
      [b, d, fd] = [d, c, fc];
      c = b - ratio * (b - a);
      fc = f(c);
    } else {
      [a, c, fc] = [c, d, fd];
      d = a + ratio * (b - a);
      fd = f(d);
    }
  }
  return fc > fd ? { at: c, value: fc } : { at: d, value: fd };
}

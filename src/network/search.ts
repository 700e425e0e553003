/** Where a function that changes sign between two points is zero, to the last bit or 200 halvings. */
export function bisect(f: (x: number) => number, from: number, to: number): number {
  let [a, b] = [from, to];
  const positiveAtA = f(a) >= 0;
  for (let k = 0; k < 200; k += 1) {
    const middle = a + (b - a) / 2;
    if (middle === a || middle === b) break;
    if (f(middle) >= 0 === positiveAtA) a = middle;
    else b = middle;
  }
  return a;
}

/** Largest value of a function with one hump between two points (golden section, to 1e-10 of the interval). */
export function goldenMaximum(
  f: (x: number) => number,
  low: number,
  high: number,
): { readonly at: number; readonly value: number } {
  const ratio = (Math.sqrt(5) - 1) / 2;
  let [a, b] = [low, high];
  let c = b - ratio * (b - a);
  let d = a + ratio * (b - a);
  let [fc, fd] = [f(c), f(d)];
  for (let k = 0; k < 48; k += 1) {
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

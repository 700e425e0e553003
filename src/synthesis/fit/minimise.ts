/** Value and slope of a smooth function of n variables. */
export type Objective = (x: Float64Array, slope: Float64Array) => number;

/**
 * Minimum of a smooth function by BFGS with a backtracking line search (J. Nocedal and S. J. Wright, Numerical
 * Optimization, 2nd ed., 2006, ch. 3 and 6). The kept general-purpose optimisers of the registry find no slope of their
 * own accord or bring a matrix library; n is at most eight here.
 *
 * @param x start, left at the minimum found
 * @returns the value there
 */
export function minimise(f: Objective, x: Float64Array, steps: number): number {
  const n = x.length;
  const slope = new Float64Array(n);
  const trial = new Float64Array(n);
  const trialSlope = new Float64Array(n);
  const direction = new Float64Array(n);
  const inverse = new Float64Array(n * n);
  const hy = new Float64Array(n);
  const reset = (): void => {
    inverse.fill(0);
    for (let k = 0; k < n; k += 1) inverse[k * n + k] = 1;
  };
  reset();
  let value = f(x, slope);
  let fresh = true;
  for (let step = 0; step < steps; step += 1) {
    let down = 0;
    for (let r = 0; r < n; r += 1) {
      let sum = 0;
      for (let c = 0; c < n; c += 1) sum -= inverse[r * n + c]! * slope[c]!;
      direction[r] = sum;
      down += sum * slope[r]!;
    }
    if (!(down < 0)) {
      if (fresh) break;
      reset();
      fresh = true;
      continue;
    }
    // No variable moves by more than one natural logarithm at once.
    const longest = direction.reduce((most, d) => Math.max(most, Math.abs(d)), 0);
    let length = Math.min(1, 1 / longest);
    let next = value;
    for (let halving = 0; halving < 30; halving += 1, length /= 2.5) {
      for (let k = 0; k < n; k += 1) trial[k] = x[k]! + length * direction[k]!;
      next = f(trial, trialSlope);
      if (next <= value + 1e-4 * length * down) break;
    }
    if (!(next < value)) {
      if (fresh) break;
      reset();
      fresh = true;
      continue;
    }
    let sy = 0;
    let yhy = 0;
    for (let r = 0; r < n; r += 1) {
      let sum = 0;
      for (let c = 0; c < n; c += 1) sum += inverse[r * n + c]! * (trialSlope[c]! - slope[c]!);
      hy[r] = sum;
      sy += (trial[r]! - x[r]!) * (trialSlope[r]! - slope[r]!);
      yhy += sum * (trialSlope[r]! - slope[r]!);
    }
    if (sy > 1e-14) {
      for (let r = 0; r < n; r += 1) {
        const sr = trial[r]! - x[r]!;
        for (let c = 0; c < n; c += 1) {
          const sc = trial[c]! - x[c]!;
          inverse[r * n + c]! += ((1 + yhy / sy) * sr * sc - hy[r]! * sc - sr * hy[c]!) / sy;
        }
      }
      fresh = false;
    }
    const gained = value - next;
    x.set(trial);
    slope.set(trialSlope);
    value = next;
    if (gained < 1e-10 * (1 + Math.abs(value)) && fresh) break;
    if (gained < 1e-12 * (1 + Math.abs(value))) break;
  }
  return value;
}

import { incompleteBeta } from './incomplete-beta.ts';

/** Two-sided confidence of the intervals stated. */
export const usualConfidence = 0.95;

/**
 * Exact interval for a fraction of which `passed` of `samples` were found: whatever the true fraction, the interval
 * holds it at least as often as the confidence says. C. J. Clopper, E. S. Pearson, Biometrika 26, 1934.
 *
 * @param passed     0 to `samples`
 * @param samples    1 or more
 * @param confidence 0 to 1, both excluded
 */
export function clopperPearson(
  passed: number,
  samples: number,
  confidence = usualConfidence,
): { readonly low: number; readonly high: number } {
  const beyond = (1 - confidence) / 2;
  return {
    low: passed === 0 ? 0 : betaQuantile(passed, samples - passed + 1, beyond),
    high: passed === samples ? 1 : betaQuantile(passed + 1, samples - passed, 1 - beyond),
  };
}

/** x where I_x(a, b) = p, by bisection until no double lies between. */
function betaQuantile(a: number, b: number, p: number): number {
  let low = 0;
  let high = 1;
  for (;;) {
    const middle = (low + high) / 2;
    if (middle <= low || middle >= high) return middle;
    if (incompleteBeta(a, b, middle) < p) low = middle;
    else high = middle;
  }
}

import { normalQuantile } from './normal.ts';

/** How a part's value is distributed within its tolerance; `normal`: standard deviation a third of it, cut off at it. */
export const distributions = ['uniform', 'triangular', 'normal'] as const;
export type Distribution = (typeof distributions)[number];

/** Fraction of a normal distribution below three standard deviations under its mean. */
const cutOff = 0.0013498980316300946;

/**
 * Deviation as a fraction of the tolerance, −1 to 1, below which a fraction `u` of all parts lies.
 *
 * @param u 0 to 1, both excluded
 */
export function deviate(u: number, distribution: Distribution): number {
  switch (distribution) {
    case 'uniform':
      return 2 * u - 1;
    case 'triangular':
      return u < 0.5 ? Math.sqrt(2 * u) - 1 : 1 - Math.sqrt(2 * (1 - u));
    case 'normal':
      return normalQuantile(cutOff + u * (1 - 2 * cutOff)) / 3;
  }
}

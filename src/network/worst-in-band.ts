import { goldenMaximum } from './search.ts';
import { exp, log } from '../quantity/elementary.ts';

/** Largest |Γ|² in a band, and where. Hz. */
export interface Worst {
  readonly gammaSquared: number;
  readonly atHz: number;
}

/** Log-spaced frequencies over a closed band, both edges exact; a single one when the edges coincide. Hz. */
export function logGrid(lowHz: number, highHz: number, points: number): Float64Array {
  if (lowHz === highHz) return Float64Array.of(lowHz);
  const grid = new Float64Array(points);
  const step = log(highHz / lowHz) / (points - 1);
  for (let k = 0; k < points; k += 1) grid[k] = lowHz * exp(k * step);
  grid[points - 1] = highHz;
  return grid;
}

/**
 * Worst reflection of a sampled curve, every inner hump refined.
 *
 * @param frequencyHz  ascending over the band
 * @param gammaSquared |Γ|² at each
 * @param at           |Γ|² at any frequency, Hz
 */
export function worstInBand(frequencyHz: Float64Array, gammaSquared: Float64Array, at: (hz: number) => number): Worst {
  let worst: Worst = { gammaSquared: gammaSquared[0]!, atHz: frequencyHz[0]! };
  const consider = (value: number, hz: number): void => {
    if (value > worst.gammaSquared) worst = { gammaSquared: value, atHz: hz };
  };
  const last = frequencyHz.length - 1;
  consider(gammaSquared[last]!, frequencyHz[last]!);
  for (let k = 1; k < last; k += 1) {
    const here = gammaSquared[k]!;
    if (here < gammaSquared[k - 1]! || here < gammaSquared[k + 1]!) continue;
    consider(here, frequencyHz[k]!);
    // A hump can't rise far between samples: below half the worst so far it isn't worth refining.
    if (here < worst.gammaSquared / 2) continue;
    const hump = goldenMaximum(at, frequencyHz[k - 1]!, frequencyHz[k + 1]!);
    consider(hump.value, hump.at);
  }
  return worst;
}

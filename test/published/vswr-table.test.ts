import { describe, expect, it } from 'vitest';
import { mismatchLossDb, returnLossDb, vswr } from '../../src/network/figures-of-merit.ts';

/** As any handbook prints it: VSWR, return loss dB, mismatch loss dB, power reflected %. */
const table = [
  [1.1, 26.44, 0.01, 0.23],
  [1.2, 20.83, 0.036, 0.83],
  [1.5, 13.98, 0.177, 4.0],
  [2, 9.54, 0.512, 11.11],
  [3, 6.02, 1.249, 25.0],
  [5, 3.52, 2.553, 44.44],
  [10, 1.74, 4.807, 66.94],
] as const;

describe("a handbook's VSWR table, to half a unit of the last printed digit", () => {
  it.each(table)(
    'VSWR %s: return loss %s dB, mismatch loss %s dB, %s %% reflected',
    (ratio, loss, mismatch, percent) => {
      // |Γ| = (s − 1)/(s + 1), from the definition of the standing wave ratio.
      const gamma = (ratio - 1) / (ratio + 1);
      const squared = gamma * gamma;
      expect(Math.abs(100 * squared - percent)).toBeLessThanOrEqual(0.005);
      expect(vswr(gamma)).toBeCloseTo(ratio, 12);
      expect(Math.abs(returnLossDb(squared) - loss)).toBeLessThanOrEqual(0.005);
      expect(Math.abs(mismatchLossDb(squared) - mismatch)).toBeLessThanOrEqual(0.0005);
    },
  );
});

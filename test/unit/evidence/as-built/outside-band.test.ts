import { describe, expect, it } from 'vitest';
import { outsideBand } from '../../../../src/evidence/as-built/outside-band.ts';
import type { Percentiles } from '../../../../src/evidence/tolerance-figures.ts';

/** A band from 10 to 20 dB at 1 Hz, narrowing to 14 to 16 dB at 5 Hz. */
const percentiles: Percentiles = {
  fractions: [0.95, 0.05, 0.5],
  states: [
    {
      state: 'a',
      frequencyHz: [1, 5],
      nominalDb: [15, 15],
      curvesDb: [
        [20, 16],
        [10, 14],
        [15, 15],
      ],
    },
  ],
};
const overlay = (frequencyHz: number[], measuredDb: number[]) => ({
  frequencyHz,
  measuredDb,
  measuredRe: [],
  measuredIm: [],
  predictedRe: [],
  predictedIm: [],
  predictedDb: [],
});

describe('outsideBand(overlay, percentiles, state)', () => {
  it('gives runs on either side, by how much and where most', () => {
    // At 2, 3, 4 Hz the band is 11 to 19, 12 to 18, 13 to 17.
    const spans = outsideBand(overlay([1, 2, 3, 4, 5], [15, 10, 8, 18, 15]), percentiles, 'a');
    expect(spans).toEqual([
      { low: 2, high: 3, side: 'below', byDb: 4, atHz: 3 },
      { low: 4, high: 4, side: 'above', byDb: 1, atHz: 4 },
    ]);
  });

  it('starts anew after a sample within', () => {
    const spans = outsideBand(overlay([1, 2, 3], [9, 15, 9]), percentiles, 'a');
    expect(spans!.map(({ low, high }) => [low, high])).toEqual([
      [1, 1],
      [3, 3],
    ]);
  });

  it('leaves out what is beyond the curves, and knows none for another state', () => {
    expect(outsideBand(overlay([0.5, 5.5], [0, 0]), percentiles, 'a')).toEqual([]);
    expect(outsideBand(overlay([1], [0]), percentiles, 'b')).toBeNull();
    expect(outsideBand(overlay([1], [0]), null, 'a')).toBeNull();
  });
});

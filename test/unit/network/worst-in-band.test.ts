import { describe, expect, it } from 'vitest';
import { logGrid, worstInBand } from '../../../src/network/worst-in-band.ts';

const worstOf = (f: (hz: number) => number, low: number, high: number, points = 101) => {
  const grid = logGrid(low, high, points);
  return worstInBand(grid, grid.map(f), f);
};

describe('logGrid(low, high, points)', () => {
  it('has equal ratios and exact ends', () => {
    const grid = logGrid(1e6, 16e6, 5);
    [1e6, 2e6, 4e6, 8e6, 16e6].forEach((hz, k) => expect(grid[k]! / hz).toBeCloseTo(1, 14));
    expect([grid[0], grid[4]]).toEqual([1e6, 16e6]);
  });

  it('is one frequency where the ends coincide', () => {
    expect(Array.from(logGrid(5e6, 5e6, 101))).toEqual([5e6]);
  });
});

describe('worstInBand(frequencies, squared, at)', () => {
  it('takes an edge of the band when that is worst, exactly', () => {
    expect(worstOf((hz) => hz / 100, 10, 20)).toEqual({ gammaSquared: 0.2, atHz: 20 });
    expect(worstOf((hz) => 1 / hz, 10, 20)).toEqual({ gammaSquared: 0.1, atHz: 10 });
  });

  it('finds a hump between the samples', () => {
    const { gammaSquared, atHz } = worstOf((hz) => 0.5 - (hz - 14.3337) ** 2 / 100, 10, 20, 11);
    expect(gammaSquared).toBeCloseTo(0.5, 12);
    expect(atHz).toBeCloseTo(14.3337, 6);
  });

  it('finds the higher of several humps, wherever it stands', () => {
    const hump = (hz: number, at: number, height: number): number => height / (1 + (5 * (hz - at)) ** 2);
    for (const [a, b] of [
      [0.4, 0.3],
      [0.3, 0.4],
    ] as const) {
      const { gammaSquared, atHz } = worstOf((hz) => hump(hz, 12, a) + hump(hz, 17, b), 10, 20);
      expect(atHz).toBeCloseTo(a > b ? 12 : 17, 2);
      expect(gammaSquared).toBeGreaterThan(0.4);
    }
  });

  it('takes a band of no width for its one frequency', () => {
    expect(worstOf(() => 0.25, 10, 10)).toEqual({ gammaSquared: 0.25, atHz: 10 });
  });
});

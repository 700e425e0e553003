import { describe, expect, it } from 'vitest';
import { decadeTicks, ticks } from '../../../src/figures/ticks.ts';

describe('ticks(low, high, most)', () => {
  it('steps by 1, 2 or 5 times a power of ten, whichever gives at most so many intervals', () => {
    expect(ticks(0, 40, 4)).toEqual({ values: [0, 10, 20, 30, 40], decimals: 0 });
    expect(ticks(0, 40, 3)).toEqual({ values: [0, 20, 40], decimals: 0 });
    expect(ticks(-20, 0, 4)).toEqual({ values: [-20, -15, -10, -5, 0], decimals: 0 });
  });

  it('says how many decimals tell its values apart', () => {
    expect(ticks(150.5, 152, 3)).toEqual({ values: [150.5, 151, 151.5, 152], decimals: 1 });
    expect(ticks(0.1, 0.11, 5)).toEqual({ values: [0.1, 0.102, 0.104, 0.106, 0.108, 0.11], decimals: 3 });
  });

  it('keeps a step of 2 where the division rounds up', () => {
    // 0.6 / 3 is 0.19999999999999998, 1.2 / 6 is 0.19999999999999998, 0.3 - 0.1 is 0.19999999999999998.
    expect(ticks(0, 0.6, 3).values).toEqual([0, 0.2, 0.4, 0.6]);
  });

  it('gives one value for a span without width', () => {
    expect(ticks(5, 5, 4)).toEqual({ values: [5], decimals: 0 });
  });
});

describe('decadeTicks(low, high)', () => {
  it('gives 1, 2 and 5 of every decade, ends included', () => {
    expect(decadeTicks(20, 1000)).toEqual([20, 50, 100, 200, 500, 1000]);
  });
});

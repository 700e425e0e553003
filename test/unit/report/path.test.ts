import { describe, expect, it } from 'vitest';
import { pathOperators } from '../../../src/report/pdf/path.ts';

describe('pathOperators(d, x, y, scale)', () => {
  it('puts points on the page, y upwards', () => {
    // x: 100 + 2·10 = 120, y: 500 − 2·5 = 490.
    expect(pathOperators('M10 5L0 0Z', 100, 500, 2)).toBe('120 490 m 100 500 l h');
  });

  it('draws a half circle over its chord as two curves through its top', () => {
    // From (0, 0) to (10, 0), radius 5, turning with the sweep flag: over the chord, so up the page.
    const found =
      pathOperators('M0 0A5 5 0 0 1 10 0', 0, 0, 1)
        .match(/-?[\d.]+/gu)
        ?.map(Number) ?? [];
    const [, , , , , , topX, topY, , , , , endX, endY] = found;
    expect([topX, topY, endX, endY]).toEqual([5, 5, 10, 0]);
    // Control points of a quarter circle lie 4/3·(√2 − 1)·r = 2.76 along the tangents.
    expect(found.slice(2, 6)).toEqual([0, 2.76, 2.24, 5]);
  });

  it('turns the other way without the sweep flag', () => {
    const found =
      pathOperators('M0 0A5 5 0 0 0 10 0', 0, 0, 1)
        .match(/-?[\d.]+/gu)
        ?.map(Number) ?? [];
    expect(found.slice(6, 8)).toEqual([5, -5]);
  });

  it('refuses other commands', () => {
    expect(() => pathOperators('M0 0Q1 1 2 2', 0, 0, 1)).toThrow(RangeError);
    expect(() => pathOperators('M0 0l1 1', 0, 0, 1)).toThrow(RangeError);
  });
});

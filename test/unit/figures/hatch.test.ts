import { describe, expect, it } from 'vitest';
import { hatch } from '../../../src/figures/hatch.ts';

const pointsOf = (d: string): readonly (readonly number[])[] =>
  [...d.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/gu)].map((match) => [Number(match[1]), Number(match[2])]);

describe('hatch(x, y, X, Y)', () => {
  it.each([
    [10, 20, 110, 50],
    [10, 20, 13, 120],
    [0, 0, 50, 50],
  ])('of %d, %d to %d, %d ends every line on a side, at 45 degrees', (x, y, X, Y) => {
    const shape = hatch(x, y, X, Y);
    const points = shape.kind === 'path' ? pointsOf(shape.d) : [];
    expect(points.length).toBeGreaterThan(4);
    for (let k = 0; k < points.length; k += 2) {
      const [ax = 0, ay = 0] = points[k]!;
      const [bx = 0, by = 0] = points[k + 1]!;
      expect(ax - bx).toBeCloseTo(ay - by, 1);
      for (const [px, py] of [
        [ax, ay],
        [bx, by],
      ] as const) {
        expect(px >= x && px <= X && py >= y && py <= Y).toBe(true);
        expect(px === x || px === X || py === y || py === Y).toBe(true);
      }
    }
  });
});

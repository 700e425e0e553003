import { describe, expect, it } from 'vitest';
import { drawsWith, type VariedPart } from '../../../src/evidence/spread.ts';

describe('drawsWith(parts, arms, deviation, count)', () => {
  it('adds up a pair in which values add, and one in which inverses do', () => {
    const deviation = [Float64Array.of(1), Float64Array.of(-1)];
    const pair = (adds: boolean): VariedPart[] => [
      { designator: 'L1a', armIndex: 0, tolerance: 0.1, weight: 0.75, adds },
      { designator: 'L1b', armIndex: 0, tolerance: 0.2, weight: 0.25, adds },
    ];
    // 0.75·1.1 + 0.25·0.8, and 1/(0.75/1.1 + 0.25/0.8).
    expect(drawsWith(pair(true), 2, deviation, 1).scale.map(([s]) => s)).toEqual([expect.closeTo(1.025, 14), 1]);
    expect(drawsWith(pair(false), 1, deviation, 1).scale[0]![0]).toBeCloseTo(1 / (0.75 / 1.1 + 0.25 / 0.8), 14);
  });
});

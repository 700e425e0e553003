import { describe, expect, it } from 'vitest';
import type { Frame } from '../../../src/figures/chart-frame.ts';
import { curve } from '../../../src/figures/curve.ts';

/** One pt per hertz and per unit of value, values growing upwards from y = 10. */
const frame: Frame = {
  left: 0,
  right: 10,
  top: 0,
  bottom: 10,
  x: (hertz) => hertz,
  y: (value) => 10 - value,
  valueSpan: { low: 0, high: 10 },
  height: 10,
  shapes: [],
};

describe('curve(frame, xs, ys)', () => {
  it('joins points within the frame', () => {
    expect(curve(frame, [0, 1, 2], [1, 2, 3])).toBe('M0 9L1 8L2 7');
  });

  it('ends where the line crosses the edge and begins again where it comes back', () => {
    // From 5 to 15 over one hertz the edge at 10 lies half way; back from 15 to 5 likewise.
    expect(curve(frame, [0, 1, 2], [5, 15, 5])).toBe('M0 5L0.5 0M1.5 0L2 5');
  });

  it('crosses the whole frame between two samples outside it', () => {
    // From -5 to 15: the edges lie a quarter and three quarters along.
    expect(curve(frame, [0, 1], [-5, 15])).toBe('M0.25 10L0.75 0');
  });

  it('draws nothing outside', () => {
    expect(curve(frame, [0, 1, 2], [11, 12, 200])).toBe('');
    expect(curve(frame, [0], [5])).toBe('');
  });
});

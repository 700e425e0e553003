import { describe, expect, it } from 'vitest';
import { edgeGrid, halfPowerEdges } from '../../../src/network/half-power.ts';

/** Edges of any gain, a function of u = f/f0. */
function edgesOf(gain: (u: number) => number, f0 = 100e6) {
  const grid = edgeGrid(f0);
  const found = halfPowerEdges(
    grid,
    grid.map((hz) => gain(hz / f0)),
    (hz) => gain(hz / f0),
    f0,
  );
  return {
    low: found.lowHz === null ? null : found.lowHz / f0,
    high: found.highHz === null ? null : found.highHz / f0,
    peak: found.peakHz / f0,
    value: found.peakGain,
  };
}

/** One resonance at `at`, of any Q; half power where u/at − at/u = ±1/Q. */
const resonance =
  (q: number, at = 1) =>
  (u: number): number =>
    1 / (1 + (q * (u / at - at / u)) ** 2);
const edges = (q: number, at = 1): [number, number] => {
  const root = Math.sqrt(1 + 1 / (4 * q * q));
  return [at * (root - 1 / (2 * q)), at * (root + 1 / (2 * q))];
};

describe('edgeGrid(f0)', () => {
  it('ascends from a millionth of f0 to a million times it, f0 itself in the middle', () => {
    const grid = edgeGrid(10.7e6);
    const middle = (grid.length - 1) / 2;
    expect(grid[middle]).toBe(10.7e6);
    expect(grid.every((hz, k) => k === 0 || hz > grid[k - 1]!)).toBe(true);
    expect(grid[0]! / 10.7).toBeLessThan(1.6);
    expect(grid.at(-1)! / 10.7e12).toBeGreaterThan(0.6);
  });
});

describe('halfPowerEdges(frequencies, gain, gainAt)', () => {
  it.each([0.6, 5, 100, 1e6, 1e9])('finds the edges of a resonance of Q = %s at f0', (q) => {
    const { low, high, peak, value } = edgesOf(resonance(q));
    const [wantedLow, wantedHigh] = edges(q);
    // Half power is as steep as 1/Q: the edge is known to a part in 1e10 of the band at least.
    expect(Math.abs(low! - wantedLow)).toBeLessThan(1e-13 + 1e-10 / q);
    expect(Math.abs(high! - wantedHigh)).toBeLessThan(1e-13 + 1e-10 / q);
    expect([peak, value]).toEqual([1, 1]);
  });

  it.each([
    [20, 1.05],
    [1e3, 1.05],
    [1e5, 1.05],
    [1e7, 0.93],
    [1e5, 0.5],
  ])('finds a resonance of Q = %s at %s·f0, though it may be narrower than the grid there', (q, at) => {
    const { low, high, peak, value } = edgesOf(resonance(q, at));
    const [wantedLow, wantedHigh] = edges(q, at);
    expect(Math.abs(peak / at - 1)).toBeLessThan(1e-8);
    expect(value).toBeGreaterThan(1 - 1e-4);
    expect(low).toBeLessThan(peak);
    expect(high).toBeGreaterThan(peak);
    // Its width to a thousandth: the height of so narrow a peak is known to no more.
    expect((high! - low!) / (wantedHigh - wantedLow)).toBeCloseTo(1, 3);
  });

  it('takes the hump nearest f0 where there are two', () => {
    const two = (u: number): number => resonance(40, 1.1)(u) + 0.9 * resonance(40, 0.7)(u);
    const { low, high, peak } = edgesOf(two);
    expect(peak).toBeCloseTo(1.1, 3);
    // The far hump adds about 0.0007 there, which moves the edges by less than a thousandth.
    expect(low).toBeCloseTo(edges(40, 1.1)[0], 2);
    expect(high).toBeCloseTo(edges(40, 1.1)[1], 2);
  });

  it('reaches across a dip that stays above half', () => {
    // Two resonances of equal height, so close that the dip between them is shallow.
    const two = (u: number): number => resonance(10, 0.96)(u) + resonance(10, 1.04)(u);
    const { low, high, value } = edgesOf(two);
    expect(two(1)).toBeGreaterThan(value / 2);
    expect(two(low!)).toBeCloseTo(value / 2, 9);
    expect(two(high!)).toBeCloseTo(value / 2, 9);
    expect(low).toBeLessThan(0.96);
    expect(high).toBeGreaterThan(1.04);
  });

  it('finds no lower edge of a low-pass and no upper edge of a high-pass', () => {
    // 16/(25 − 18u² + 9u⁴) is 0.64 at DC and half of its peak at u² = 7/3.
    const lowPass = (u: number): number => 16 / (25 - 18 * u ** 2 + 9 * u ** 4);
    const below = edgesOf(lowPass);
    expect(below.low).toBeNull();
    expect(below.high).toBeCloseTo(Math.sqrt(7 / 3), 12);
    const above = edgesOf((u) => lowPass(1 / u));
    expect(above.low).toBeCloseTo(Math.sqrt(3 / 7), 12);
    expect(above.high).toBeNull();
  });

  it('finds none at all where nothing varies', () => {
    expect(edgesOf(() => 0.36)).toEqual({ low: null, high: null, peak: 1, value: 0.36 });
  });

  it('keeps the peak at f0 when only rounding lifts its neighbour', () => {
    const { peak } = edgesOf((u) => (Math.abs(u - 1) < 1e-5 && u !== 1 ? 1 + 2e-16 : resonance(3)(u)));
    expect(peak).toBe(1);
  });
});

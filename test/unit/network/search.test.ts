import { describe, expect, it } from 'vitest';
import { goldenMaximum, zeroBetween } from '../../../src/network/search.ts';

describe('zeroBetween(f, from, to)', () => {
  it.each<[string, (x: number) => number, number, number, number]>([
    ['a straight line', (x) => x - 1.25, 0, 10, 1.25],
    ['from above', (x) => x - 1.25, 10, 0, 1.25],
    ['a parabola', (x) => x * x - 2, 0, 2, Math.SQRT2],
    ['a curve flat at one end', (x) => x ** 9 - 1e-9, 0, 1, 0.1],
    ['a sine', Math.sin, 2, 4, Math.PI],
    ['at the start', (x) => x, 0, 1, 0],
    ['at the end', (x) => x - 1, 0, 1, 1],
  ])('finds the zero of %s', (_, f, from, to, zero) => {
    expect(zeroBetween(f, from, to)).toBeCloseTo(zero, 12);
  });
});

describe('goldenMaximum(f, low, high)', () => {
  it.each<[string, (x: number) => number, number, number]>([
    ['a parabola', (x) => 3 - (x - 1.1) ** 2, 1.1, 3],
    ['a corner', (x) => -Math.abs(x - 0.3), 0.3, 0],
    ['a rise up to the end', (x) => x, 2, 2],
  ])('finds the top of %s', (_, f, at, value) => {
    const found = goldenMaximum(f, 0, 2);
    expect(found.at).toBeCloseTo(at, 7);
    expect(found.value).toBeCloseTo(value, 7);
  });
});

import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { check, relativeSpread } from '../../../src/evidence/evidence-check.ts';

const c = (re: number, im = 0): Complex => new Complex(re, im);

describe('relativeSpread(values, floor)', () => {
  it('is the largest difference over the largest size', () => {
    expect(relativeSpread([c(4), c(3, 0), c(0, 3)])).toBeCloseTo(5 / 4, 14);
  });
  it('takes a difference of small values relative to the floor', () => {
    expect(relativeSpread([c(1e-9), c(3e-9)], 1e-6)).toBeCloseTo(2e-3, 14);
  });
  it('of zeros alone is zero', () => expect(relativeSpread([c(0), c(0)])).toBe(0));
});

describe('check(subject, spread, tolerance, note)', () => {
  it('passes up to the tolerance', () => {
    expect(check('gain', 1e-9, 1e-9, '').pass).toBe(true);
    expect(check('gain', 1.1e-9, 1e-9, '').pass).toBe(false);
    expect(check('gain', NaN, 1e-9, '').pass).toBe(false);
  });
});

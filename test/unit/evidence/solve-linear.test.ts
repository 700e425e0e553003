import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { solveLinear } from '../../../src/evidence/solve-linear.ts';

const c = (re: number, im = 0): Complex => new Complex(re, im);

describe('solveLinear(a, b)', () => {
  it('solves a complex system', () => {
    // x = (1, j): (2 + j)·1 + j·j = 1 + j and 1·1 + (1 − j)·j = 2 + j.
    const x = solveLinear(
      [
        [c(2, 1), c(0, 1)],
        [c(1), c(1, -1)],
      ],
      [c(1, 1), c(2, 1)],
    );
    [c(1), c(0, 1)].forEach((wanted, k) => expect(x[k]!.sub(wanted).abs()).toBeLessThan(1e-14));
  });

  it('exchanges rows where a pivot is zero, and changes neither argument', () => {
    const a = [
      [c(0), c(2)],
      [c(4), c(0)],
    ];
    const b = [c(6), c(8)];
    const x = solveLinear(a, b);
    expect(x.map(({ re }) => re)).toEqual([2, 3]);
    expect([a[0]![0]!.re, b[0]!.re]).toEqual([0, 6]);
  });

  it('throws a RangeError for a singular matrix', () => {
    const a = [
      [c(1), c(2)],
      [c(2), c(4)],
    ];
    expect(() => solveLinear(a, [c(1), c(2)])).toThrow(RangeError);
  });
});

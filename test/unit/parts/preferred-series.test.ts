import { describe, expect, it } from 'vitest';
import { neighbours, preferredValues } from '../../../src/parts/preferred-series.ts';

describe('preferredValues(series, low, high)', () => {
  it('gives the doubles that decimal literals give', () => {
    expect(preferredValues('E12', 1e-12, 1e-11)).toEqual([
      1e-12, 1.2e-12, 1.5e-12, 1.8e-12, 2.2e-12, 2.7e-12, 3.3e-12, 3.9e-12, 4.7e-12, 5.6e-12, 6.8e-12, 8.2e-12, 1e-11,
    ]);
  });

  it('goes over the decades, both ends included', () => {
    expect(preferredValues('E3', 4.7e-9, 2.2e-7)).toEqual([4.7e-9, 1e-8, 2.2e-8, 4.7e-8, 1e-7, 2.2e-7]);
  });

  it('takes an end that rounding has moved by a few bits', () => {
    expect(preferredValues('E6', 1e-9 + 2e-25, 3.3e-9 - 1e-24)).toEqual([1e-9, 1.5e-9, 2.2e-9, 3.3e-9]);
  });

  it('is empty where no value lies between the ends', () => {
    expect(preferredValues('E3', 1.1e-9, 2.1e-9)).toEqual([]);
  });

  it.each([
    ['E6', 6],
    ['E24', 24],
    ['E48', 48],
    ['E96', 96],
    ['E192', 192],
  ] as const)('%s has %i values in a decade, ascending', (series, count) => {
    const values = preferredValues(series, 1e-9, 0.999e-8);
    expect(values).toHaveLength(count);
    expect(values).toEqual(values.toSorted((a, b) => a - b));
  });
});

describe('neighbours(values, near, below, above)', () => {
  const values = [1, 2.2, 4.7, 10, 22, 47];
  it.each([
    ['two either side', 5, 2, 2, [2.2, 4.7, 10, 22]],
    ['none asked for below', 5, 0, 1, [10]],
    ['none asked for above', 5, 1, 0, [4.7]],
    ['a value itself, on both sides', 4.7, 1, 1, [4.7]],
    ['a value itself and one more either side', 4.7, 2, 2, [2.2, 4.7, 10]],
    ['a value itself but for rounding', 4.7 * (1 + 1e-15), 1, 1, [4.7]],
    ['fewer below than asked for', 1.5, 3, 1, [1, 2.2]],
    ['only those above', 0.5, 2, 2, [1, 2.2]],
    ['only those below', 100, 2, 2, [22, 47]],
  ])('gives %s', (_, near, below, above, wanted) => {
    expect(neighbours(values, near, below, above)).toEqual(wanted);
  });

  it('gives none of none', () => expect(neighbours([], 1, 2, 2)).toEqual([]));
});

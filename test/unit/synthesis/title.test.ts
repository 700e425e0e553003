import { describe, expect, it } from 'vitest';
import { sameArms, titleOf } from '../../../src/synthesis/title.ts';

const l = { arm: 'series', part: 'inductor', value: 1e-9 } as const;
const c = { arm: 'shunt', part: 'capacitor', value: 1e-12 } as const;

describe('titleOf(arms)', () => {
  it.each([
    [[], 'No network needed'],
    [[l], 'Series L'],
    [[l, c], 'Series L, shunt C'],
    [[c, l], 'Shunt C, series L'],
  ])('names them from the source on: %#', (arms, title) => {
    expect(titleOf(arms)).toBe(title);
  });
});

describe('sameArms(a, b)', () => {
  it('is true within a part in 1e9 of every value', () => {
    expect(sameArms([l, c], [{ ...l, value: 1e-9 * (1 + 5e-10) }, c])).toBe(true);
    expect(sameArms([l, c], [{ ...l, value: 1e-9 * (1 + 5e-9) }, c])).toBe(false);
    expect(sameArms([], [])).toBe(true);
  });

  it('is false for another order, number, arm or part', () => {
    expect(sameArms([l, c], [c, l])).toBe(false);
    expect(sameArms([l, c], [l])).toBe(false);
    expect(sameArms([l], [{ ...l, arm: 'shunt' }])).toBe(false);
    expect(sameArms([l], [{ ...l, part: 'capacitor' }])).toBe(false);
  });
});

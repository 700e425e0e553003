import { describe, expect, it } from 'vitest';
import { pairQ, resistivePair } from '../../../src/synthesis/resistive-pair.ts';

describe('pairQ(source, load)', () => {
  it.each([
    [50, 10, 2],
    [10, 50, 2],
    [50, 50, 0],
    [12.5, 50, Math.sqrt(3)],
  ])('of %s Ω and %s Ω is %s', (source, load, q) => {
    expect(pairQ(source, load)).toBe(q);
  });

  it('keeps its digits for resistances that are nearly the same', () => {
    // 50.001/50 − 1 = 2e-5 in exact arithmetic; 50.001 itself is rounded to 7e-15.
    expect(Math.abs(pairQ(50, 50.001) / Math.sqrt(2e-5) - 1)).toBeLessThan(1e-9);
    expect(pairQ(1, 1 + 2 ** -40)).toBe(2 ** -20);
  });
});

describe('resistivePair(source, load, frequency)', () => {
  it('puts the shunt arm across the higher resistance', () => {
    const shapes = (source: number, load: number): string[] =>
      resistivePair(source, load, 1e6).candidates.map(({ title }) => title);
    expect(shapes(10, 50)).toEqual(['Series L, shunt C', 'Series C, shunt L']);
    expect(shapes(50, 10)).toEqual(['Shunt C, series L', 'Shunt L, series C']);
  });

  it('needs no part for equal resistances', () => {
    const { candidates, absent } = resistivePair(50, 50, 1e6);
    expect(candidates.map(({ id, arms }) => [id, arms.length])).toEqual([['direct', 0]]);
    expect(absent).toEqual([]);
  });

  it('tells why the other arrangement has no network', () => {
    expect(resistivePair(10, 50, 1e6).absent).toEqual([
      { form: 'shunt arm at the source', why: expect.stringMatching(/higher.*10\.00 Ω < 50\.00 Ω/) },
    ]);
  });
});

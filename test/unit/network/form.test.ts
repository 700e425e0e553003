import { describe, expect, it } from 'vitest';
import type { Arm } from '../../../src/network/arm.ts';
import { dcPath } from '../../../src/network/dc-path.ts';
import { formOf } from '../../../src/network/form.ts';

const arms = (short: string): Arm[] =>
  short
    .split(' ')
    .filter((word) => word !== '')
    .map((word) => ({
      arm: word.startsWith('s') ? 'series' : 'shunt',
      part: word.endsWith('L') ? 'inductor' : 'capacitor',
      value: 1e-9,
    }));

// "sL pC" is a series inductor, then a shunt (parallel) capacitor, from source to load.
describe('formOf(arms)', () => {
  it.each([
    ['', 'all-pass'],
    ['sL', 'low-pass'],
    ['pC', 'low-pass'],
    ['sL pC', 'low-pass'],
    ['pC sL', 'low-pass'],
    ['sC', 'high-pass'],
    ['pL', 'high-pass'],
    ['sC pL', 'high-pass'],
    ['pL sC pL', 'high-pass'],
    // A series L stops what is high and a shunt L what is low.
    ['sL pL', 'band-pass'],
    ['sC pC', 'band-pass'],
    ['sL pC sC pL', 'band-pass'],
  ])('of "%s" is %s', (short, form) => {
    expect(formOf(arms(short))).toBe(form);
  });
});

describe('dcPath(arms)', () => {
  it.each([
    ['', false, false, false],
    ['sL pC', false, false, false],
    ['sC', true, false, false],
    // A shunt L shorts both ends unless a series C stands between.
    ['sL pL', false, true, true],
    ['pL sL', false, true, true],
    ['sC pL', true, false, true],
    ['pL sC', true, true, false],
    ['pL sC pL', true, true, true],
    ['sL pC sC pL', true, false, true],
    ['sC pL sC', true, false, false],
  ])('of "%s": blocked %s, source shorted %s, load shorted %s', (short, blocked, sourceShorted, loadShorted) => {
    expect(dcPath(arms(short))).toEqual({ blocked, sourceShorted, loadShorted });
  });
});

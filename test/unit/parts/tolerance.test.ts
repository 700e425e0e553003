import { describe, expect, it } from 'vitest';
import { formatTolerance, readTolerance, relativeTolerance, type Tolerance } from '../../../src/parts/tolerance.ts';

const relative = (value: number): Tolerance => ({ kind: 'relative', value });
const absolute = (value: number): Tolerance => ({ kind: 'absolute', value });

describe('readTolerance(text, part)', () => {
  it.each<[string, 'inductor' | 'capacitor', Tolerance]>([
    ['5%', 'inductor', relative(0.05)],
    ['5 %', 'capacitor', relative(0.05)],
    ['±5 %', 'inductor', relative(0.05)],
    ['+/-2%', 'inductor', relative(0.02)],
    ['0.1%', 'capacitor', relative(0.001)],
    ['2,5 %', 'inductor', relative(0.025)],
    ['0%', 'inductor', relative(0)],
    ['99.9%', 'inductor', relative(0.999)],
    ['0.25 pF', 'capacitor', absolute(0.25e-12)],
    ['±0,1 pF', 'capacitor', absolute(0.1e-12)],
    ['0.2nH', 'inductor', absolute(0.2e-9)],
    ['0 pF', 'capacitor', absolute(0)],
    [' J ', 'inductor', relative(0.05)],
  ])('reads "%s" of an %s', (text, part, value) => {
    expect(readTolerance(text, part)).toEqual({ ok: true, value });
  });

  it.each<[string, 'inductor' | 'capacitor', string]>([
    ['', 'inductor', 'nothing is given'],
    ['±', 'inductor', 'nothing is given'],
    ['5', 'inductor', 'per cent or a unit is missing'],
    ['0,25', 'capacitor', 'per cent or a unit is missing'],
    ['%', 'inductor', 'not a number of per cent'],
    ['± %', 'inductor', 'not a number of per cent'],
    ['abc%', 'inductor', 'not a number of per cent'],
    ['0x5%', 'inductor', 'not a number of per cent'],
    ['Infinity%', 'inductor', 'not a number of per cent'],
    ['-5%', 'inductor', 'a tolerance is not negative'],
    ['-0.1 pF', 'capacitor', 'a tolerance is not negative'],
    ['100%', 'inductor', 'at 100 % or more a part could be nothing at all'],
    ['150 %', 'capacitor', 'at 100 % or more a part could be nothing at all'],
    ['C', 'inductor', 'C means ±0.25 pF, which is for capacitors'],
    ['0.25 pF', 'inductor', 'not a tolerance'],
    ['0.2 nH', 'capacitor', 'not a tolerance'],
    ['Z', 'capacitor', 'not a tolerance'],
    ['j', 'capacitor', 'not a tolerance'],
    ['constructor', 'capacitor', 'not a tolerance'],
  ])('refuses "%s" of an %s: %s', (text, part, why) => {
    expect(readTolerance(text, part)).toMatchObject({ ok: false, why, would: expect.stringMatching(/^write /u) });
  });
});

describe('readTolerance(text, part, value) of a known value', () => {
  it.each<[string, number, Tolerance]>([
    ['C', 8.2e-12, absolute(0.25e-12)],
    ['J', 8.2e-12, relative(0.05)],
    ['F', 10e-12, relative(0.01)],
    ['0.25 pF', 0.5e-12, absolute(0.25e-12)],
  ])('reads "%s" at %s F', (text, of, value) => {
    expect(readTolerance(text, 'capacitor', of)).toEqual({ ok: true, value });
  });

  it.each<[string, number, string, string]>([
    ['F', 8.2e-12, 'F can mean per cent or pF below 10 pF', 'write 1% or 1 pF'],
    ['G', 8.2e-12, 'G can mean per cent or pF below 10 pF', 'write 2% or 2 pF'],
    ['D', 10e-12, 'D can mean per cent or pF from 10 pF up', 'write 0.5% or 0.5 pF'],
  ])('refuses "%s" at %s F, where lists differ', (text, of, why, would) => {
    expect(readTolerance(text, 'capacitor', of)).toEqual({ ok: false, why, would });
  });

  it.each<[string, 'inductor' | 'capacitor', number]>([
    ['0.5 pF', 'capacitor', 0.5e-12],
    ['2 nH', 'inductor', 1e-9],
  ])('refuses "%s" of an %s of %s', (text, part, of) => {
    const why = 'with as much as its value a part could be nothing at all';
    expect(readTolerance(text, part, of)).toMatchObject({ ok: false, why });
  });

  it('takes F for per cent of an inductor of any value', () => {
    expect(readTolerance('F', 'inductor', 1e-12)).toEqual({ ok: true, value: relative(0.01) });
  });
});

describe('formatTolerance(tolerance, part)', () => {
  it.each<[Tolerance, 'inductor' | 'capacitor', string]>([
    [relative(0.05), 'inductor', '±5 %'],
    [relative(0.025), 'inductor', '±2.5 %'],
    [relative(0), 'capacitor', '±0 %'],
    [absolute(0.25e-12), 'capacitor', '±0.25 pF'],
    [absolute(0.2e-9), 'inductor', '±0.2 nH'],
    [relative(0.00005), 'capacitor', '±0.005 %'],
    [relative(0.07), 'capacitor', '±7 %'],
    [absolute(2e-6), 'inductor', '±2.00 µH'],
    [absolute(5e-16), 'capacitor', '±500 aF'],
    [absolute(0), 'capacitor', '±0 F'],
  ])('writes %j of an %s as %s', (tolerance, part, text) => {
    expect(formatTolerance(tolerance, part)).toBe(text);
  });
});

describe('relativeTolerance(tolerance, of)', () => {
  it('is a fraction of the value', () => {
    expect(relativeTolerance(relative(0.05), 1e-9)).toBe(0.05);
    // 0.25 pF of 1 pF.
    expect(relativeTolerance(absolute(0.25e-12), 1e-12)).toBe(0.25);
    expect(relativeTolerance(absolute(0), 1e-12)).toBe(0);
  });

  it('stays below 1', () => {
    expect(relativeTolerance(absolute(2e-12), 1e-12)).toBe(0.999);
  });
});

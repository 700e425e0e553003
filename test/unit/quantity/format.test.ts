import { describe, expect, it } from 'vitest';
import {
  formatFixed,
  formatImpedance,
  formatImpedanceRead,
  formatQuantity,
  formatRead,
} from '../../../src/quantity/format.ts';
import type { Unit } from '../../../src/quantity/unit.ts';

describe('formatQuantity(value, unit, digits)', () => {
  it.each<[number, string, number, string]>([
    [1.5125e8, 'Hz', 4, '151.3 MHz'],
    [1.5125e8, 'Hz', 5, '151.25 MHz'],
    [4.7e-9, 'H', 4, '4.700 nH'],
    [8.2e-12, 'F', 3, '8.20 pF'],
    [999.94e6, 'Hz', 4, '999.9 MHz'],
    [999.96e6, 'Hz', 4, '1.000 GHz'],
    [0.99996, 'Ω', 4, '1.000 Ω'],
    [1e15, 'Hz', 4, '1000 THz'],
    [-4.7e-12, 'F', 4, '−4.700 pF'],
    [0, 'Hz', 4, '0 Hz'],
    [-0, 'Hz', 4, '0 Hz'],
    [1e-15, 'F', 4, '1.000 fF'],
    [1e-19, 'F', 4, '0.1000 aF'],
    [12.5, '', 3, '12.5'],
    [5e-6, 'H', 2, '5.0 µH'],
  ])('writes %s %s with %s significant digits as "%s"', (value, unit, digits, text) => {
    expect(formatQuantity(value, unit, digits)).toBe(text);
  });

  it.each([NaN, Infinity, -Infinity])('throws at %s rather than write it', (value) => {
    expect(() => formatQuantity(value, 'Hz')).toThrow(RangeError);
  });
});

describe('formatRead(value, unit)', () => {
  it.each<[number, Unit, string]>([
    [151.25e6, 'Hz', '151.25 MHz'],
    [50, 'Ω', '50 Ω'],
    [1500, 'Ω', '1.5 kΩ'],
    [4.7e-9, 'H', '4.7 nH'],
    [100e-9, 'F', '100 nF'],
    [1000, 'Hz', '1 kHz'],
    [123456789.012, 'Hz', '123.456789012 MHz'],
    [14, 'dB', '14 dB'],
    [-3.5, 'dB', '−3.5 dB'],
    [0, 'Ω', '0 Ω'],
  ])('writes what was read, %s %s, as "%s": no digit lost, none added', (value, unit, text) => {
    expect(formatRead(value, unit)).toBe(text);
  });
});

describe('formatFixed(value, decimals)', () => {
  it.each([
    [-1.5, 1, '−1.5'],
    [-0.001, 2, '0.00'],
    [0, 0, '0'],
    [2.345, 1, '2.3'],
  ])('writes %s with %s decimals as "%s"', (value, decimals, text) => {
    expect(formatFixed(value, decimals)).toBe(text);
  });

  it('throws at NaN', () => {
    expect(() => formatFixed(NaN, 2)).toThrow(RangeError);
  });
});

describe('formatImpedance(r, x, digits)', () => {
  it.each([
    [9.4, -61, '9.400 − j61.00 Ω'],
    [50, 0, '50.00 + j0 Ω'],
    [50, 1e-12, '50.00 + j0 Ω'],
    [50, -1e-12, '50.00 + j0 Ω'],
    [1.5e6, -2, '1.500M − j2.000 Ω'],
    [5e-4, 1, '500.0µ + j1.000 Ω'],
    [9.9996, 100.04, '10.00 + j100.0 Ω'],
    [1234.5, 0.5, '1235 + j0.5000 Ω'],
  ])('writes %s and %s as "%s"', (r, x, text) => {
    expect(formatImpedance(r, x)).toBe(text);
  });
});

describe('formatImpedanceRead(r, x)', () => {
  it.each([
    [9.4, -61, '9.4 − j61 Ω'],
    [1500, 0, '1.5 kΩ'],
    [50, 0, '50 Ω'],
    [17, 100, '17 + j100 Ω'],
    [1e-6, 5, '1µ + j5 Ω'],
  ])('writes %s and %s as "%s"', (r, x, text) => {
    expect(formatImpedanceRead(r, x)).toBe(text);
  });
});

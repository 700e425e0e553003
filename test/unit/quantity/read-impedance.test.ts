import { describe, expect, it } from 'vitest';
import { readImpedance } from '../../../src/quantity/read-impedance.ts';

describe('readImpedance(text)', () => {
  it.each([
    ['50', 50, 0],
    ['1k5', 1500, 0],
    ['50 Ω', 50, 0],
    ['9.4-j61', 9.4, -61],
    ['9.4 - j61', 9.4, -61],
    ['9.4 - 61j', 9.4, -61],
    ['9.4-61j Ω', 9.4, -61],
    ['9.4 − j61 Ω', 9.4, -61],
    ['(9.4-j61)', 9.4, -61],
    ['9.4-i61', 9.4, -61],
    ['-j61+9.4', 9.4, -61],
    ['17+j', 17, 1],
    ['j61', 0, 61],
    ['1k5 + j200', 1500, 200],
    ['1k5+j2k2', 1500, 2200],
    ['9,4 - j61,5', 9.4, -61.5],
    ['1e-3+j1e3', 1e-3, 1e3],
    ['1.5e+3-j2E-1', 1500, -0.2],
    ['-5+j3', -5, 3],
    ['9.4 -61', 9.4, -61],
    ['9.4\t-61', 9.4, -61],
    ['9.4 61', 9.4, 61],
    ['1 500', 1500, 0],
  ])('reads "%s" as %s and %s', (text, r, x) => {
    expect(readImpedance(text)).toEqual({ ok: true, value: { r, x } });
  });

  // cos 30° = √3/2, sin 30° = 1/2.
  it.each([
    ['50∠-30°', 25 * Math.sqrt(3), -25],
    ['50∠−30', 25 * Math.sqrt(3), -25],
    ['50<-30', 25 * Math.sqrt(3), -25],
    ['50 < -30 deg', 25 * Math.sqrt(3), -25],
    ['50 ∠ 30° Ω', 25 * Math.sqrt(3), 25],
    ['50∠-0.5235987755982988 rad', 25 * Math.sqrt(3), -25],
    ['1k<0', 1000, 0],
    ['50∠90', 0, 50],
  ])('reads "%s", magnitude and angle', (text, r, x) => {
    const reading = readImpedance(text);
    expect(reading.ok).toBe(true);
    if (reading.ok) {
      expect(reading.value.r).toBeCloseTo(r, 10);
      expect(reading.value.x).toBeCloseTo(x, 10);
    }
  });

  it.each([
    ['', /nothing is given/],
    ['abc', /not an impedance/],
    ['NaN', /not an impedance/],
    ['9.4-jj61', /not an impedance/],
    ['9.4-j61-j3', /two imaginary parts/],
    ['9.4-61', /two real parts and no j/],
    ['9.4-j1e400', /beyond the range/],
    ['1,500-j61', /the comma can mean/],
    ['50∠', /not a magnitude and an angle/],
    ['50∠abc', /not a magnitude and an angle/],
    ['∠30', /not a magnitude and an angle/],
    ['-50∠30', /a magnitude is not negative/],
    ['9.4-j61 pF', /is not a prefix/],
  ])('refuses "%s" and says how to write one', (text, why) => {
    const reading = readImpedance(text);
    expect(reading.ok).toBe(false);
    if (!reading.ok) {
      expect(reading.why).toMatch(why);
      expect(reading.would).toMatch(/write|9\.4-j61/);
    }
  });
});

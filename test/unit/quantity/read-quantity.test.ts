import { describe, expect, it } from 'vitest';
import { readQuantity } from '../../../src/quantity/read-quantity.ts';
import type { Unit } from '../../../src/quantity/unit.ts';

describe('readQuantity(text, unit)', () => {
  it.each<[string, Unit, number]>([
    ['151.25M', 'Hz', 151.25e6],
    ['151.25 MHz', 'Hz', 151.25e6],
    ['151.25MHz', 'Hz', 151.25e6],
    ['151.25e6', 'Hz', 151.25e6],
    ['1.5125E+8 Hz', 'Hz', 151.25e6],
    ['151 250 000', 'Hz', 151.25e6],
    ['151 250 000 Hz', 'Hz', 151.25e6],
    ['1.2 GHz', 'Hz', 1.2e9],
    ['10.7 khz', 'Hz', 10.7e3],
    ['1 THz', 'Hz', 1e12],
    ['4.7n', 'H', 4.7e-9],
    ['4n7', 'H', 4.7e-9],
    ['4n7H', 'H', 4.7e-9],
    ['4,7 nH', 'H', 4.7e-9],
    ['0.5 uH', 'H', 0.5e-6],
    ['0.5 µH', 'H', 0.5e-6],
    ['0.5 μH', 'H', 0.5e-6],
    ['2m2', 'H', 2.2e-3],
    ['1 H', 'H', 1],
    ['8p2', 'F', 8.2e-12],
    ['8.2 pf', 'F', 8.2e-12],
    ['.5p', 'F', 0.5e-12],
    ['5f', 'F', 5e-15],
    ['1F', 'F', 1],
    ['1k5', 'Ω', 1500],
    ['1K5', 'Ω', 1500],
    ['4R7', 'Ω', 4.7],
    ['50R', 'Ω', 50],
    ['50 Ω', 'Ω', 50],
    ['50 ohm', 'Ω', 50],
    ['1.5 kOhms', 'Ω', 1500],
    ['1 500', 'Ω', 1500],
    ['5.', 'Ω', 5],
    ['+5', 'Ω', 5],
    ['−61', 'Ω', -61],
    ['-61', 'Ω', -61],
    ['500m', 'W', 0.5],
    ['2 W', 'W', 2],
    ['50', 'V', 50],
    ['2.5 kV', 'V', 2500],
    ['2k5', 'V', 2500],
    ['50v', 'V', 50],
    ['300m', 'A', 0.3],
    ['1.5 A', 'A', 1.5],
    ['300 ma', 'A', 0.3],
    ['1 mm', 'm', 1e-3],
    ['0.8mm', 'm', 0.8e-3],
    ['0,8 mm', 'm', 0.8e-3],
    ['250 µm', 'm', 250e-6],
    ['250u', 'm', 250e-6],
    ['0.5 metre', 'm', 0.5],
    ['0.002', 'm', 0.002],
    ['2e-3', 'm', 0.002],
    ['14', 'dB', 14],
    ['14 dB', 'dB', 14],
    ['  50  ', 'Ω', 50],
  ])('reads "%s" in %s as %s', (text, unit, value) => {
    expect(readQuantity(text, unit)).toEqual({ ok: true, value });
  });

  it.each<[string, Unit, number]>([
    ['4,7', 'H', 4.7],
    ['0,470', 'H', 0.47],
    ['12,34', 'H', 12.34],
    ['1234,567', 'Hz', 1234.567],
    ['1,2345', 'H', 1.2345],
    ['1,5k', 'Ω', 1500],
  ])('takes the comma of "%s" in %s for a decimal one: it can be nothing else', (text, unit, value) => {
    expect(readQuantity(text, unit)).toEqual({ ok: true, value });
  });

  it.each([
    ['1,500', '1.500 or 1500'],
    ['151,250', '151.250 or 151250'],
    ['12,345 MHz', '12.345 or 12345'],
  ])('refuses "%s", whose comma can mean two things', (text, both) => {
    const reading = readQuantity(text, 'Hz');
    expect(reading).toMatchObject({ ok: false, why: `the comma can mean ${both}`, would: `write ${both}` });
  });

  it.each<[string, Unit, RegExp]>([
    ['', 'Hz', /nothing is given/],
    ['   ', 'Hz', /nothing is given/],
    ['NaN', 'Hz', /not a quantity/],
    ['Infinity', 'Hz', /not a quantity/],
    ['abc', 'Ω', /not a quantity/],
    ['--5', 'Ω', /not a quantity/],
    ['M', 'Hz', /not a quantity/],
    ['1e400', 'Hz', /beyond the range of numbers/],
    ['-1e400', 'Ω', /beyond the range of numbers/],
    ['1e99999999999999999999', 'Hz', /beyond the range of numbers/],
    ['5..6', 'Ω', /more than one point/],
    ['1.234,5', 'Hz', /more than one point or comma/],
    ['1,500,000', 'Hz', /more than one point or comma/],
    ['0x10', 'Hz', /"x10" is not a prefix with Hz/],
    ['1e', 'Hz', /"e" is not a prefix with Hz/],
    ['4.7 nF', 'H', /"nF" is not a prefix with H/],
    ['50 Hz', 'Ω', /"Hz" is not a prefix with Ω/],
    ['1 5', 'Ω', /"5" is not a prefix with Ω/],
    ['1R5', 'Hz', /not a prefix with Hz/],
    ['151.25 mHz', 'Hz', /"m" makes it less than a hertz/],
    ['151.25mhz', 'Hz', /"m" makes it less than a hertz/],
    ['5u', 'Hz', /"u" makes it less than a hertz/],
    ['1m', 'm', /the m can mean metre or milli/],
    ['0.5 m', 'm', /the m can mean metre or milli/],
    ['1 M', 'm', /the m can mean metre or milli/],
    ['1m5', 'm', /the m can mean metre or milli/],
    ['1e-3 m', 'm', /the m can mean metre or milli/],
    ['0.8 MM', 'm', /"M" makes it more than a kilometre/],
    ['0.8 inch', 'm', /"inch" is not a prefix with m/],
    ['2 a', 'A', /"a" means atto/],
    ['5 A', 'V', /"A" is not a prefix with V/],
    ['14k', 'dB', /decibels take no prefix/],
  ])('refuses "%s" in %s', (text, unit, why) => {
    const reading = readQuantity(text, unit);
    expect(reading.ok).toBe(false);
    if (!reading.ok) {
      expect(reading.why).toMatch(why);
      expect(reading.would).toMatch(/^write /);
    }
  });
});

import { describe, expect, it } from 'vitest';
import { readTypeface } from '../../../src/report/page/typeface.ts';
import { fonts } from './records.ts';

describe('readTypeface(file)', () => {
  it.each(['regular', 'bold'] as const)('finds in the %s weight every sign that the reports use', (weight) => {
    const { glyphs } = readTypeface(fonts[weight]);
    const signs = 'Ωµμ°∠−±∓√Γ∞≤≥·×ηφω–—“”’²³⁻⁹₀∥□ÅéßŁőЩЖ';
    expect(Array.from(signs).filter((sign) => !glyphs.has(sign.codePointAt(0)!))).toEqual([]);
  });

  it.each(['regular', 'bold'] as const)('reads figures of one width in the %s weight', (weight) => {
    const { glyphs, advance, unitsPerEm } = readTypeface(fonts[weight]);
    const widths = new Set(
      Array.from('0123456789').map((digit) => advance(glyphs.get(digit.charCodeAt(0))!) / unitsPerEm),
    );
    expect([...widths]).toEqual([0.6]);
  });

  it('refuses what is no TrueType font', () => {
    expect(() => readTypeface(new Uint8Array(64))).toThrow('no "head" table; give a TrueType font');
  });
});

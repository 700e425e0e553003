import { describe, expect, it } from 'vitest';
import { coil, selfCapacitance } from '../../src/parts/coil.ts';
import { readWire } from '../../src/parts/read-wire.ts';

const inch = 0.0254;

describe('H. A. Wheeler, Proc. IRE 16, 1928, L(µH) = r²N²/(9r + 10l), r and l in inches, exact', () => {
  // r = 0.5, pitch 0.05: L = 0.25·N²/(4.5 + 0.5·N), so 10 turns are 25/9.5 µH and 20 turns 100/14.5 µH.
  it.each([
    [10, 25 / 9.5],
    [20, 100 / 14.5],
    [1, 0.25 / 5],
  ])('%i turns 0.05 inch apart, of radius 0.5 inch', (turns, microhenry) => {
    const wound = coil('L1', microhenry * 1e-6, { wireM: 0.04 * inch, formM: 0.96 * inch, gapM: 0.01 * inch });
    expect(wound.turns / turns).toBeCloseTo(1, 12);
    expect(wound.lengthM / (turns * 0.05 * inch)).toBeCloseTo(1, 12);
    expect(wound.diameterM / inch).toBeCloseTo(1, 12);
  });
});

describe('R. G. Medhurst, Wireless Engineer 24, 1947, self-capacitance (pF) = K·D(cm), exact; outside 1 to 5 from memory', () => {
  it.each([
    [0.1, 0.96],
    [0.25, 0.64],
    [0.5, 0.5],
    [1, 0.46],
    [1.5, 0.47],
    [2, 0.5],
    [2.5, 0.56],
    [3, 0.61],
    [3.5, 0.67],
    [4, 0.72],
    [4.5, 0.77],
    [5, 0.81],
    [10, 1.32],
  ])('length/diameter %s: K = %s', (ratio, k) => {
    // A diameter of 2 cm.
    expect(selfCapacitance(ratio * 0.02, 0.02)! / (k * 2e-12)).toBeCloseTo(1, 9);
  });
});

describe('ASTM B258, American wire gauge', () => {
  it.each([
    ['AWG 36', 0.127, 1e-9],
    ['AWG 18', 1.024, 5e-4],
  ])('%s is %s mm', (text, millimetres, within) => {
    const reading = readWire(text);
    expect(reading.ok).toBe(true);
    if (reading.ok) expect(Math.abs(reading.value * 1e3 - millimetres)).toBeLessThan(within);
  });
});

import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { ladderInput } from '../../../src/network/ladder-input.ts';

/** 1 Hz, so that an inductance of x/2π has a reactance of x. */
const hz = 1;
const l = (x: number): number => x / (2 * Math.PI);
const c = (x: number): number => 1 / (2 * Math.PI * x);

describe('ladderInput(arms, load, frequency)', () => {
  it('is the load itself without arms', () => {
    const load = new Complex(9.4, -61);
    expect(ladderInput([], load, hz).equals(load)).toBe(true);
  });

  it('adds a series arm and puts a shunt arm in parallel, from the load to the source', () => {
    const load = new Complex(50, 0);
    // 50 Ω ∥ −j50 Ω = 25 − j25 Ω; and +j25 in series is 25 Ω.
    const seriesFirst = ladderInput(
      [
        { arm: 'series', part: 'inductor', value: l(25) },
        { arm: 'shunt', part: 'capacitor', value: c(50) },
      ],
      load,
      hz,
    );
    expect(seriesFirst.re).toBeCloseTo(25, 12);
    expect(seriesFirst.im).toBeCloseTo(0, 12);
    // 50 + j25 Ω has Y = (50 − j25)/3125 = 0.016 − j0.008 S; −j50 across adds j0.02: 1/(0.016 + j0.012) = 40 − j30 Ω.
    const shuntFirst = ladderInput(
      [
        { arm: 'shunt', part: 'capacitor', value: c(50) },
        { arm: 'series', part: 'inductor', value: l(25) },
      ],
      load,
      hz,
    );
    expect(shuntFirst.re).toBeCloseTo(40, 12);
    expect(shuntFirst.im).toBeCloseTo(-30, 12);
  });

  it('passes through an inner resonance: a tank across nothing lets a series arm see no current', () => {
    // L and C of 50 Ω across each other are open together; only the load remains.
    const z = ladderInput(
      [
        { arm: 'shunt', part: 'inductor', value: l(50) },
        { arm: 'shunt', part: 'capacitor', value: c(50) },
      ],
      new Complex(75, 0),
      hz,
    );
    expect(z.re).toBeCloseTo(75, 12);
    expect(z.im).toBeCloseTo(0, 12);
  });

  it('throws a RangeError where no current flows in: a lossless load resonated by a shunt arm', () => {
    const load = new Complex(0, 1);
    const arm = { arm: 'shunt', part: 'capacitor', value: c(1) } as const;
    expect(() => ladderInput([arm], load, hz)).toThrow(RangeError);
  });
});

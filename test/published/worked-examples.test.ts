import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import type { Arm } from '../../src/network/arm.ts';
import { pairQ, resistivePair } from '../../src/synthesis/resistive-pair.ts';
import { twoElement } from '../../src/synthesis/two-element.ts';

/** Values as a book prints them, source side first: "shunt C 12.7e-12". */
type Printed = readonly (readonly [arm: Arm['arm'], part: Arm['part'], value: number])[];

/** The one network among those found that has these arms, or a failure that lists what was found. */
function expectAmong(found: readonly { readonly arms: readonly Arm[] }[], printed: Printed, within: number): void {
  const alike = found.filter(
    ({ arms }) =>
      arms.length === printed.length &&
      printed.every(([arm, part], k) => arms[k]!.arm === arm && arms[k]!.part === part),
  );
  expect(alike.map(({ arms }) => arms)).toHaveLength(1);
  printed.forEach(([, , value], k) => {
    const { value: computed } = alike[0]!.arms[k]!;
    expect(Math.abs(computed / value - 1), `${String(computed)} against ${String(value)}`).toBeLessThanOrEqual(within);
  });
}

describe('D. M. Pozar, Microwave Engineering, 4th ed., Wiley 2012, example 5.1 (quoted from memory)', () => {
  // Load 200 − j100 Ω, line 100 Ω, 500 MHz. The book rounds its normalised intermediate values, so 1 %.
  const { candidates, absent } = twoElement(new Complex(100, 0), new Complex(200, -100), 500e6);

  it('38.8 nH in series, 0.92 pF across the load, within 1 %', () => {
    expectAmong(
      candidates,
      [
        ['series', 'inductor', 38.8e-9],
        ['shunt', 'capacitor', 0.92e-12],
      ],
      0.01,
    );
  });

  it('2.61 pF in series, 46.1 nH across the load, within 1 %', () => {
    expectAmong(
      candidates,
      [
        ['series', 'capacitor', 2.61e-12],
        ['shunt', 'inductor', 46.1e-9],
      ],
      0.01,
    );
  });

  it('has no other: the load lies inside the circle 1 + jx, so the shunt arm is at the load', () => {
    expect(candidates).toHaveLength(2);
    expect(absent).toHaveLength(1);
  });
});

describe('G. Gonzalez, Microwave Transistor Amplifiers, 2nd ed., Prentice Hall 1997, example 2.4.1 (from memory)', () => {
  // Load 10 + j10 Ω to 50 Ω at 500 MHz.
  const { candidates } = twoElement(new Complex(50, 0), new Complex(10, 10), 500e6);

  it('shunt 12.7 pF, series 3.18 nH, within 0.5 %', () => {
    expectAmong(
      candidates,
      [
        ['shunt', 'capacitor', 12.7e-12],
        ['series', 'inductor', 3.18e-9],
      ],
      0.005,
    );
  });

  it('shunt 7.96 nH, series 10.6 pF, within 0.5 %', () => {
    expectAmong(
      candidates,
      [
        ['shunt', 'inductor', 7.96e-9],
        ['series', 'capacitor', 10.6e-12],
      ],
      0.005,
    );
  });
});

describe('C. Bowick, RF Circuit Design, Sams 1982, example 4-1 (quoted from memory)', () => {
  it('100 Ω to 1000 Ω has Q = 3, exactly', () => {
    expect(pairQ(100, 1000)).toBe(3);
  });

  it.each([
    ['the Q method', resistivePair(100, 1000, 100e6)],
    ['the general equations', twoElement(new Complex(100, 0), new Complex(1000, 0), 100e6)],
  ])('477 nH in series, 4.8 pF across 1000 Ω, within 0.6 %, by %s', (_, { candidates }) => {
    expectAmong(
      candidates,
      [
        ['series', 'inductor', 477e-9],
        ['shunt', 'capacitor', 4.8e-12],
      ],
      0.006,
    );
  });
});

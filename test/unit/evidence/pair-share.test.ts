import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { shares } from '../../../src/evidence/pair-share.ts';

const z = (re: number, im: number): Complex => new Complex(re, im);

describe('shares(impedances, pair)', () => {
  it('leaves all to a part alone', () => {
    expect(shares([z(1, 20)], null)).toEqual([{ volts: 1, amps: 1, watts: 1 }]);
  });

  it('in series: one current, voltage as the impedances, heat as the resistances', () => {
    expect(shares([z(0.3, 4), z(0.9, 12)], 'in series')).toEqual([
      { volts: expect.closeTo(0.25, 14), amps: 1, watts: expect.closeTo(0.25, 14) },
      { volts: expect.closeTo(0.75, 14), amps: 1, watts: expect.closeTo(0.75, 14) },
    ]);
  });

  it('in parallel: one voltage, current as the admittances', () => {
    // −j10 and −j30 Ω: 3 of 4 parts of the current in the first; heat 0.1·9 to 0.9·1: half each.
    expect(shares([z(0.1, -10), z(0.9, -30)], 'in parallel')).toEqual([
      { volts: 1, amps: expect.closeTo(0.75, 3), watts: expect.closeTo(0.5, 3) },
      { volts: 1, amps: expect.closeTo(0.25, 3), watts: expect.closeTo(0.5, 3) },
    ]);
  });

  it('gives no heat to lossless parts', () => {
    for (const { watts } of shares([z(0, 5), z(0, 5)], 'in parallel')) expect(watts).toBe(0);
  });
});

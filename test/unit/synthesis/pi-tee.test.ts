import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { leastQ, piTee } from '../../../src/synthesis/pi-tee.ts';

const ohm = (r: number, x = 0): Complex => new Complex(r, x);
const hz = 1e9 / (2 * Math.PI);
/** At ω = 10⁹ a reactance of X Ω is X nH, or 1000/X pF. */
const reactances = (arms: readonly { part: string; value: number }[]): number[] =>
  arms.map(({ part, value }) => (part === 'inductor' ? value * 1e9 : -1e-9 / value));

describe('leastQ(kind, target, load)', () => {
  it('is that of the two-element network of the same resistances', () => {
    expect(leastQ('pi', ohm(50), ohm(500))).toBeCloseTo(3, 12);
    expect(leastQ('tee', ohm(50), ohm(500))).toBeCloseTo(3, 12);
    expect(leastQ('tee', ohm(500), ohm(50))).toBeCloseTo(3, 12);
  });

  it('takes parallel resistances for a Pi, series ones for a T', () => {
    // 20 + j40 Ω is 100 Ω in parallel with something: (20² + 40²)/20.
    expect(leastQ('pi', ohm(50), ohm(20, 40))).toBeCloseTo(1, 12);
    expect(leastQ('tee', ohm(50), ohm(20, 40))).toBeCloseTo(Math.sqrt(1.5), 12);
  });

  it('is zero between equal resistances', () => {
    expect(leastQ('pi', ohm(50), ohm(50))).toBe(0);
    expect(leastQ('tee', ohm(50), ohm(50, 10))).toBe(0);
  });
});

describe('piTee(kind, target, load, hz, q)', () => {
  it('Pi, 50 Ω to 50 Ω with Q = 2: Rv = 50/5 = 10 Ω, 25 Ω across both ends and 2·2·10 = 40 Ω between', () => {
    const { candidates } = piTee('pi', ohm(50), ohm(50), hz, 2);
    // With parts of unlike kind the series reactances cancel: two shunt arms that resonate with each other, one network.
    expect(candidates.map(({ arms }) => reactances(arms).map((x) => Number(x.toFixed(9))))).toEqual([
      [-25, 40, -25],
      [-25, 25],
      [25, -25],
      [25, -40, 25],
    ]);
  });

  it('T, 50 Ω to 50 Ω with Q = 2: Rv = 50·5 = 250 Ω, 100 Ω in series at both ends and 250/(2 + 2) = 62.5 Ω across', () => {
    const { candidates } = piTee('tee', ohm(50), ohm(50), hz, 2);
    expect(reactances(candidates[0]!.arms).map((x) => Number(x.toFixed(9)))).toEqual([100, -62.5, 100]);
    expect(reactances(candidates[3]!.arms).map((x) => Number(x.toFixed(9)))).toEqual([-100, 62.5, -100]);
  });

  it('of the least Q itself is the two-element network: the outer arm at the lower end of a Pi vanishes', () => {
    const { candidates } = piTee('pi', ohm(50), ohm(500), hz, 3);
    expect(candidates).toHaveLength(2);
    // Q = 3: 150 Ω in series, 500/3 Ω across the 500 Ω end.
    expect(reactances(candidates[0]!.arms).map((x) => Number(x.toFixed(6)))).toEqual([150, -166.666667]);
    expect(candidates.every(({ arms }) => arms.length === 2)).toBe(true);
  });

  it('absorbs the reactance of the ends: parallel susceptance in a Pi, series reactance in a T', () => {
    const bare = reactances(piTee('tee', ohm(50), ohm(20), hz, 4).candidates[0]!.arms);
    const seen = reactances(piTee('tee', ohm(50, 7), ohm(20, 11), hz, 4).candidates[0]!.arms);
    // To be seen is 50 + j7: the arm at the source has 7 Ω more; the load brings 11 Ω of its own.
    expect(seen[0]! - bare[0]!).toBeCloseTo(7, 9);
    expect(seen[1]!).toBeCloseTo(bare[1]!, 9);
    expect(seen[2]! - bare[2]!).toBeCloseTo(-11, 9);
  });

  it('leaves an outer arm out where the end brings exactly its reactance', () => {
    const bare = reactances(piTee('tee', ohm(50), ohm(20), hz, 4).candidates[0]!.arms);
    const { candidates } = piTee('tee', ohm(50), ohm(20, bare[2]!), hz, 4);
    expect(candidates[0]!.arms.map(({ arm }) => arm)).toEqual(['series', 'shunt']);
  });

  it('says what Q is needed where the chosen one is less, with the resistances', () => {
    const { candidates, absent } = piTee('pi', ohm(50), ohm(1000), hz, 2);
    expect(candidates).toEqual([]);
    expect(absent).toEqual([
      { form: 'Pi of Q 2.000', why: 'needs Q ≥ √(Rhigh/Rlow − 1) = 4.359 for 1.000 kΩ and 50.00 Ω' },
    ]);
    expect(piTee('tee', ohm(50), ohm(1000), hz, 2).absent[0]!.form).toBe('T of Q 2.000');
  });

  it('has a name for each of the four that does not change with Q', () => {
    const names = [5, 9].map((q) => piTee('pi', ohm(50), ohm(1000), hz, q).candidates.map(({ id }) => id));
    expect(names[0]).toEqual(names[1]);
    expect(new Set(names[0]).size).toBe(4);
  });
});

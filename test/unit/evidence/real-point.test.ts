import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { realBranches } from '../../../src/evidence/branch.ts';
import { realPoint } from '../../../src/evidence/real-point.ts';
import { f0, reactance } from './real-arms.ts';

const fifty = new Complex(50, 0);

describe('realPoint(ladder, source, load, availableW)', () => {
  it('of no part is the plain mismatch of the two ends', () => {
    // Γ = (100 − 50)/(100 + 50) = 1/3: 8/9 of 9 W are taken.
    const point = realPoint({ arms: [], strayB: 0 }, fifty, new Complex(100, 0), 9);
    expect(point.seen.re).toBeCloseTo(100, 12);
    expect(point.arms).toEqual([]);
    expect(point.loadW).toBeCloseTo(8, 12);
    expect(point.inputW).toBeCloseTo(8, 12);
    expect(point.reflectedW).toBeCloseTo(1, 12);
    expect([point.lostW, point.efficiency]).toEqual([0, expect.closeTo(1, 12)]);
  });

  it('divides power between load, heat and reflection', () => {
    // 5 + j50 Ω in series with 50 Ω: |Zin + ZS|² = 105² + 50² = 13525; load 4·50·50/13525, heat 4·50·5/13525.
    const ladder = { arms: [reactance('series', 50, { q: 10 })], strayF: 0 };
    const point = realPoint(realBranches(ladder, f0, f0), fifty, fifty, 1);
    expect(point.gain).toBeCloseTo(10000 / 13525, 13);
    expect(point.lostW).toBeCloseTo(1000 / 13525, 13);
    expect(point.reflectedW).toBeCloseTo(2525 / 13525, 13);
    expect(point.efficiency).toBeCloseTo(50 / 55, 13);
    expect(point.arms[0]!.watts).toBe(point.lostW);
    // 1 W from 50 Ω is 20 V peak behind 50 Ω.
    expect(point.arms[0]!.amps.abs()).toBeCloseTo(20 / Math.sqrt(13525), 13);
  });

  it('counts the stray of every node', () => {
    // 50 Ω beside j0.02 S is 25 − j25 Ω; j50 Ω in series and j0.02 S again make 50 Ω.
    const ladder = { arms: [reactance('series', 50)], strayF: 0.02 };
    const point = realPoint(realBranches(ladder, f0, f0), fifty, fifty, 2);
    expect(point.seen.sub(fifty).abs()).toBeLessThan(1e-12);
    // Half of √(8·50·2) V is on the source's node and, of the same size, on the load's: 50 Ω of 2 W each.
    expect(point.loadW).toBeCloseTo(2, 12);
    // The arm carries what the load and its stray do: √200 V · |0.02 + j0.02| S.
    expect(point.arms[0]!.amps.abs()).toBeCloseTo(Math.sqrt(200) * 0.02 * Math.SQRT2, 12);
  });
});

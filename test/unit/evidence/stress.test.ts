import { describe, expect, it } from 'vitest';
import { stressOf } from '../../../src/evidence/stress.ts';
import { alone, between, f0, reactance } from './real-arms.ts';

const unknown = { ratedVolts: null, ratedAmps: null, ratedWatts: null };
const coil = reactance('series', 100, { q: 200 });
/** 49.5 − j100 Ω and the coil's 0.5 Ω: 50 Ω at f0. */
const load = { r: 49.5, x: -100 };
const subject = { ladder: { arms: [coil], strayF: 0 }, f0, parts: [alone(coil, 0)], states: [between(50, load)] };

describe('stressOf(subject, powerW, vswr, ratings, derating)', () => {
  it('gives peak volts, RMS amperes and heat', () => {
    // 50 W into 50 Ω: 1 A RMS; 100 Ω: 100 V RMS (and 0.5 Ω beside them: |0.5 + j100|); 0.5 Ω: 0.5 W.
    const { parts, within, vswr, powerW } = stressOf(subject, 50, null, unknown, 1);
    expect(parts).toEqual([
      {
        designator: 'P1',
        voltsPeak: expect.closeTo(Math.SQRT2 * Math.hypot(0.5, 100), 10),
        ampsRms: expect.closeTo(1, 12),
        watts: expect.closeTo(0.5, 12),
        mismatched: null,
        limitW: null,
        limitBy: null,
      },
    ]);
    expect([within, vswr, powerW]).toEqual([null, null, 50]);
  });

  it('with the load mismatched: 1 + ρ of the current where the match is lossless', () => {
    // Z + j100 + 50 = 100/(1 − Γ), so I = E·(1 − Γ)/100: at most 1.5 times for a VSWR of 3, 2.25 times the heat.
    const lossless = reactance('series', 100);
    const { parts } = stressOf(
      {
        ...subject,
        ladder: { arms: [lossless], strayF: 0 },
        parts: [alone(lossless, 0)],
        states: [between(50, { r: 50, x: -100 })],
      },
      50,
      3,
      unknown,
      1,
    );
    expect(parts[0]!.ampsRms).toBeCloseTo(1, 12);
    expect(parts[0]!.mismatched!.ampsRms).toBeCloseTo(1.5, 12);
    expect(parts[0]!.mismatched!.voltsPeak).toBeCloseTo(150 * Math.SQRT2, 10);
  });

  it('with a VSWR of 1 gives the loads as they are', () => {
    const { parts } = stressOf(subject, 50, 1, unknown, 1);
    const { voltsPeak, ampsRms, watts } = parts[0]!;
    expect(parts[0]!.mismatched!.voltsPeak).toBeCloseTo(voltsPeak, 10);
    expect(parts[0]!.mismatched!.ampsRms).toBeCloseTo(ampsRms, 12);
    expect(parts[0]!.mismatched!.watts).toBeCloseTo(watts, 12);
  });

  it('takes the worst of frequencies and states, each figure for itself', () => {
    // At 2·f0 the coil is 200 Ω and the load as before: |100 + j100| Ω in the loop and √2 times less current, but over
    // twice the reactance: √2 times more voltage.
    const lossless = reactance('series', 100);
    const { parts } = stressOf(
      {
        ladder: { arms: [lossless], strayF: 0 },
        f0,
        parts: [alone(lossless, 0)],
        states: [between(50, { r: 50, x: -100 }, [f0, 2 * f0]), between(50, { r: 5000, x: 0 })],
      },
      50,
      null,
      unknown,
      1,
    );
    expect(parts[0]!.ampsRms).toBeCloseTo(1, 12);
    expect(parts[0]!.voltsPeak).toBeCloseTo(200, 10);
  });

  it("goes by a part's own rating, by those stated for the rest, and by the mismatched load where there is one", () => {
    // 141.4 V peak at 50 W; 300 V are 4.5 times that in power. 1 A RMS; half of 3 A are 2.25 times, 1.5 A.
    const rated = { ...subject, parts: [alone(coil, 0, { ratedAmps: 3 })] };
    const policy = { ratedVolts: 300, ratedAmps: 0.001, ratedWatts: null };
    const matched = stressOf(rated, 50, null, policy, 0.5);
    expect(matched.first).toEqual({
      designator: 'P1',
      by: 'voltage',
      powerW: expect.closeTo(50 * (150 ** 2 / 2e4), 1),
    });
    const open = stressOf(rated, 50, null, { ...policy, ratedVolts: 1e4 }, 0.5);
    expect(open.first).toEqual({ designator: 'P1', by: 'current', powerW: expect.closeTo(112.5, 9) });
    expect(open.within).toBe(true);
    // A VSWR of 3: the loop is (100 − Γ)/(1 − Γ) Ω, so the current 1.5/1.005 times what it was, with Γ = −0.5.
    const mismatched = stressOf(rated, 50, 3, { ...policy, ratedVolts: 1e4 }, 0.5);
    expect(mismatched.first!.powerW).toBeCloseTo(112.5 / (1.5 / 1.005) ** 2, 9);
  });

  it('divides an arm between the two parts that stand for it', () => {
    // 100 Ω of 50 W matched: 30 and 70 Ω in series bear 1 A each and 30 and 70 V RMS.
    const arm = reactance('series', 100);
    const [first, second] = [reactance('series', 30), reactance('series', 70)];
    const { parts } = stressOf(
      {
        ladder: { arms: [arm], strayF: 0 },
        f0,
        parts: [
          alone(first, 0, { pair: 'in series', designator: 'L1A' }),
          alone(second, 0, { pair: 'in series', designator: 'L1B' }),
        ],
        states: [between(50, { r: 50, x: -100 })],
      },
      50,
      null,
      unknown,
      1,
    );
    expect(parts.map(({ designator }) => designator)).toEqual(['L1A', 'L1B']);
    expect(parts.map(({ ampsRms }) => ampsRms)).toEqual([expect.closeTo(1, 12), expect.closeTo(1, 12)]);
    expect(parts[0]!.voltsPeak).toBeCloseTo(30 * Math.SQRT2, 10);
    expect(parts[1]!.voltsPeak).toBeCloseTo(70 * Math.SQRT2, 10);
  });
});

import { describe, expect, it } from 'vitest';
import type { Arm } from '../../../src/network/arm.ts';
import { prepareLadder } from '../../../src/network/ladder.ts';
import { realArm } from '../../../src/network/real-arm.ts';
import { endsOver, sweep, type Ends } from '../../../src/network/sweep.ts';
import { logGrid } from '../../../src/network/worst-in-band.ts';
import { centreValues, worstOf } from '../../../src/parts/centre-values.ts';
import { chooseValues } from '../../../src/parts/choose-values.ts';
import { preferredValues } from '../../../src/parts/preferred-series.ts';
import { armsOf, decibels, finish, interfaces, real, within } from './parts-of.ts';
import { plainBest, plainWorst } from './plain.ts';

const strayF = 0.2e-12;
const aim = 'conjugate';

/** The three best sets about the exact values of a network, its parts within a ratio of them. */
function chosen(text: string, series: 'E12' | 'E24', ratio: number, states: readonly Ends[], f0: number) {
  const arms = armsOf(text);
  const candidates = within(arms, series, ratio);
  const problem = { armFor: (k: number, value: number) => real(arms[k]!, value), strayF, states, f0, aim } as const;
  const limits = arms.map(({ value }) => ({ low: value / ratio, high: value * ratio }));
  const exact = arms.map(({ value }) => value);
  const centre = centreValues(problem, exact, limits).values;
  const best = finish(chooseValues({ candidates, centre, strayF, states, f0, aim, keep: 3 }));
  return { candidates, best };
}

describe('chooseValues(choice) of a few parts is an exhaustive search', () => {
  const one = [[12, -20]] as const;
  const two = [
    [12, -20],
    [20, 15],
  ] as const;
  it.each([
    ['series L 35n, shunt C 68p', 'E24', 3, one, [100e6, 100e6]],
    ['shunt L 60n, series C 82p', 'E24', 2.5, two, [90e6, 110e6]],
    ['shunt C 43p, series L 53n', 'E12', 3, one, [95e6, 105e6]],
    ['shunt C 33p, series L 60n, shunt C 27p', 'E24', 1.5, one, [90e6, 110e6]],
    ['series L 60n, shunt C 30p, series L 27n', 'E12', 2, two, [90e6, 110e6]],
    ['series C 24.84p, shunt C 3.049p, series L 80.7n, shunt L 39.27n', 'E24', 1.35, one, [85e6, 118e6]],
    ['series L 84.27n, shunt L 686.3n, series C 26.04p, shunt L 39.12n', 'E12', 1.6, two, [90e6, 110e6]],
  ] as const)('%s from %s', (text, series, ratio, loads, band) => {
    const states = interfaces(loads, 100e6, band, 31);
    const { candidates, best } = chosen(text, series, ratio, states, 100e6);
    const wanted = plainBest(candidates, strayF, states, 100e6, 3);
    best.forEach(({ picks, gammaSquared }, place) => {
      expect(gammaSquared / wanted[place]!).toBeCloseTo(1, 9);
      const set = picks.map((pick, k) => candidates[k]![pick]!);
      expect(plainWorst(set, strayF, states, 100e6) / gammaSquared).toBeCloseTo(1, 9);
    });
    expect(best).toHaveLength(3);
  });
});

/**
 * Best return losses of all sets of E24 values within a ratio of 2.2 of the exact ones (16 or 17 values an arm, some
 * 20 million sets), by a program of nested loops in C over the same 101 frequencies, fed with immittances by complex.js.
 */
describe('chooseValues(choice) of six parts comes within 0.1 dB of the exhaustive best', () => {
  const fitted = { loads: [[12, -20]], f0: 100e6, band: [80e6, 125e6] } as const;
  const cascade = { loads: [[5, 0]], f0: 30e6, band: [26e6, 34e6] } as const;
  it.each([
    ['shunt C 114p, series L 132.3n, shunt C 245.6p, series L 61.4n, shunt C 529.2p, series L 28.5n', cascade, 31.099],
    [
      'shunt L 246.9n, series C 212.8p, shunt L 114.6n, series C 458.4p, shunt L 53.19n, series C 987.5p',
      cascade,
      30.752,
    ],
    [
      'shunt C 37.93p, series L 38.85n, shunt L 25.69n, series C 88.45p, shunt L 17.26n, series L 22.2n',
      fitted,
      21.852,
    ],
    [
      'shunt L 64.53n, series C 51.95p, shunt C 140.6p, series L 3.333n, shunt L 11.7n, series L 27.76n',
      fitted,
      23.583,
    ],
    [
      'series C 29.64p, shunt L 104.3n, series C 10.77p, shunt C 6.23p, series L 110.8n, shunt L 37.98n',
      fitted,
      23.031,
    ],
  ] as const)('%s', (text, { loads, f0, band }, exhaustive) => {
    const states = interfaces(loads, f0, band);
    const { candidates, best } = chosen(text, 'E24', 2.2, states, f0);
    const set = best[0]!.picks.map((pick, k) => candidates[k]![pick]!);
    expect(decibels(plainWorst(set, strayF, states, f0))).toBeGreaterThan(exhaustive - 0.1);
    expect(decibels(best[0]!.gammaSquared)).toBeLessThan(exhaustive + 0.001);
  });
});

describe('chooseValues(choice)', () => {
  const states = interfaces([[2, 0]], 30e6, [22e6, 38e6]);
  const dozen =
    'shunt C 89.4p, series L 130.7n, shunt C 152.9p, series L 76.44n, shunt C 261.4p, series L 44.7n, ' +
    'shunt C 447p, series L 26.14n, shunt C 764.4p, series L 15.29n, shunt C 1307p, series L 8.94n';

  it('finds for twelve parts a set far better than the nearest values, which give 15.9 dB', () => {
    const { candidates, best } = chosen(dozen, 'E24', 2.2, states, 30e6);
    const set = best[0]!.picks.map((pick, k) => candidates[k]![pick]!);
    expect(decibels(plainWorst(set, strayF, states, 30e6))).toBeGreaterThan(30);
  });

  it('gives the same sets each time, best first, none twice', () => {
    const [first, again] = [1, 2].map(() => chosen(dozen, 'E12', 1.6, states, 30e6).best);
    expect(again).toEqual(first);
    expect(first!.map(({ gammaSquared }) => gammaSquared)).toEqual(
      first!.map(({ gammaSquared }) => gammaSquared).sort((a, b) => a - b),
    );
    expect(new Set(first!.map(({ picks }) => picks.join())).size).toBe(3);
  });

  it('keeps an arm that has one candidate, and gives fewer sets where there are no more', () => {
    const [l, c] = armsOf('series L 35n, shunt C 68p');
    const candidates = [[real(l!, 35.3e-9)], [real(c!, 62e-12), real(c!, 68e-12)]];
    const choice = { candidates, centre: [35e-9, 67e-12], strayF, states, f0: 30e6, aim, keep: 3 } as const;
    const best = finish(chooseValues(choice));
    expect(best.map(({ picks }) => picks[0])).toEqual([0, 0]);
    expect(best.map(({ gammaSquared }) => gammaSquared)).toEqual(
      plainBest(candidates, strayF, states, 30e6, 3).map((each): unknown => expect.closeTo(each, 12)),
    );
  });

  it.each(['conjugate', 'reflectionless'] as const)('tells |Γ|² for the %s aim and a source with reactance', (goal) => {
    const f0 = 100e6;
    const ends = endsOver(
      { r: 30, x: 25, behaviour: 'series' },
      { r: 12, x: -20, behaviour: 'series' },
      f0,
      logGrid(95e6, 105e6, 31),
    );
    const arms = armsOf('shunt C 33p, series L 60n, shunt C 27p');
    const candidates = arms.map((arm) =>
      preferredValues('E12', arm.value / 2, arm.value * 2).map((value) => realArm({ ...arm, value })),
    );
    const centre = arms.map(({ value }) => value);
    const problem = { candidates, strayF: 0, states: [ends], f0, aim: goal };
    const found = finish(chooseValues({ ...problem, centre, keep: 1 }))[0]!;
    const worst = (set: readonly Omit<Arm, 'q'>[]): number => {
      const { gammaRe, gammaIm } = sweep(
        prepareLadder(set.map(({ arm, part, value }) => ({ arm, part, value }))),
        ends,
        goal,
      );
      return Math.max(...gammaRe.map((re, k) => re ** 2 + gammaIm[k]! ** 2));
    };
    const all = candidates[0]!.flatMap((a) =>
      candidates[1]!.flatMap((b) => candidates[2]!.map((c) => worst([a, b, c]))),
    );
    expect(found.gammaSquared).toBeCloseTo(Math.min(...all), 12);
    const template = { armFor: (k: number, value: number) => realArm({ ...arms[k]!, value }), ...problem };
    expect(worstOf(template, centre)).toBeCloseTo(worst(arms), 12);
  });

  it('gives one empty set for no arms: |Γ|² of 50 Ω into 2 Ω, (48/52)²', () => {
    const best = finish(chooseValues({ candidates: [], centre: [], strayF: 0, states, f0: 30e6, aim, keep: 3 }));
    expect(best).toEqual([{ picks: [], gammaSquared: expect.closeTo((48 / 52) ** 2, 12) as number }]);
  });
});

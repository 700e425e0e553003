import { describe, expect, it } from 'vitest';
import { chooseWithPairs, type PairChoice } from '../../../src/parts/choose-with-pairs.ts';
import { armsOf, decibels, finish, interfaces, within } from './parts-of.ts';
import { plainBest } from './plain.ts';

const f0 = 100e6;
const states = interfaces([[12, -20]], f0, [99e6, 101e6], 5);
const arms = armsOf('shunt C 56.8p, series L 66n');
const singles = within(arms, 'E12', 2);
// Lossless 12 Ω − j20 Ω to 50 Ω: Q = √(50/12 − 1), B = Q/50, X = 20 + 12·Q; the parts' losses move it a little.
const centre = [56.6e-12, 65.6e-9];
const choice: PairChoice = {
  ...{ candidates: singles, centre, strayF: 0, states, f0, aim: 'conjugate', keep: 3 },
  mayPair: [true, true],
  required: 10 ** -2,
};

describe('chooseWithPairs(choice)', () => {
  const best = (required: number, mayPair = choice.mayPair) => {
    const { candidates, sets } = finish(chooseWithPairs({ ...choice, required, mayPair }));
    return sets.map(({ picks, gammaSquared }) => ({
      gammaSquared,
      pairs: picks.filter((pick, k) => candidates[k]![pick]!.pair !== null).length,
    }));
  };
  const alone = plainBest(singles, 0, states, f0, 1)[0]!;

  it('makes one arm of two parts where that is enough', () => {
    const required = alone / 1.5;
    const sets = best(required);
    expect(sets.length).toBeGreaterThan(0);
    for (const { gammaSquared, pairs } of sets) {
      expect(gammaSquared).toBeLessThanOrEqual(required);
      expect(pairs).toBe(1);
    }
  });

  it('makes more of them so where one is not enough, and gives the best sets then', () => {
    const { candidates, sets } = finish(chooseWithPairs({ ...choice, required: 0 }));
    const wanted = plainBest(
      candidates.map((parts) => parts.map(({ arm }) => arm)),
      0,
      states,
      f0,
      3,
    );
    expect(sets.map(({ gammaSquared }) => gammaSquared)).toEqual(
      wanted.map((each): unknown => expect.closeTo(each, 12)),
    );
    expect(decibels(sets[0]!.gammaSquared)).toBeGreaterThan(decibels(alone) + 3);
  });

  it('leaves alone the arms that may not', () => {
    const { candidates } = finish(chooseWithPairs({ ...choice, mayPair: [true, false] }));
    expect(candidates[1]!.every(({ pair }) => pair === null)).toBe(true);
    expect(best(0, [false, false])[0]).toEqual({ gammaSquared: expect.closeTo(alone, 12) as number, pairs: 0 });
  });
});

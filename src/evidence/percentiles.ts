import { returnLossDb } from '../network/figures-of-merit.ts';
import { reflectionAt } from '../network/real-sweep.ts';
import { drawsOf, drawsWith } from './spread.ts';
import type { PreparedSubject } from './subject.ts';
import type { Percentiles } from './tolerance-figures.ts';

export const usualFractions: readonly number[] = [0.05, 0.5, 0.95];

/**
 * Return loss that fractions of the first `samples` networks of a seed's list stay below, at each frequency of each
 * state. The quantile of a fraction p is the smallest return loss drawn that at least p of all networks don't exceed
 * (the inverse of the empirical distribution function).
 *
 * @param fractions each above 0, at most 1
 */
export function percentilesOf(
  subject: PreparedSubject,
  seed: number,
  samples: number,
  fractions = usualFractions,
): Percentiles {
  const { parts, ladder, spread, distribution, states, prepared } = subject;
  const arms = ladder.arms.length;
  const draws = drawsOf(parts, arms, spread, distribution, seed, 0, samples);
  const nominal = drawsWith([], arms, [], 1);
  const reflection = new Float64Array(samples);
  const one = new Float64Array(1);
  return {
    fractions,
    states: prepared.map((state, which) => {
      const frequencyHz = [...state.frequencyHz];
      const nominalDb: number[] = [];
      const curvesDb: number[][] = fractions.map(() => []);
      frequencyHz.forEach((_, k) => {
        reflectionAt(state, k, nominal, one);
        nominalDb.push(returnLossDb(one[0]!));
        reflectionAt(state, k, draws, reflection);
        reflection.sort();
        // The largest reflection is the smallest return loss.
        fractions.forEach((fraction, at) => {
          const rank = Math.max(1, Math.ceil(fraction * samples - 1e-9));
          curvesDb[at]!.push(returnLossDb(reflection[samples - rank]!));
        });
      });
      return { state: states[which]!.name, frequencyHz, nominalDb, curvesDb };
    }),
  };
}

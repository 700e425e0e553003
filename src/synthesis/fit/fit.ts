import { resonanceOf, tracked } from './narrow-band.ts';
import type { Fitted, FitProblem, FitProgress } from './problem.ts';
import { fine, fitted, kept, leading, Search, type Trial } from './search.ts';

/** Distinct shapes that are returned. */
const returned = 3;

/**
 * Fits ladders to band and load states: lowers the worst |Γ| over every shape that the rule allows, from seeded random
 * starts and from those given, inside the element limits. Yields after each short piece of work, so that a caller can
 * show progress and stop; what it yields last holds the best so far.
 */
export function* fit(problem: FitProblem): Generator<FitProgress, readonly Fitted[]> {
  const resonance = problem.elements >= 5 ? resonanceOf(problem) : null;
  const search = new Search(problem);
  let trials = yield* search.explore(0, resonance === null ? 0.75 : 0.4);
  if (resonance !== null) trials = [...trials, ...(yield* tracked(problem, resonance, search))];
  trials = leading(trials, kept.third);
  for (const [k, trial] of trials.entries()) {
    search.improve(trial, search.dense, fine, 80);
    search.note(trial);
    yield { done: 0.75 + (0.25 * (k + 1)) / trials.length, best: search.best };
  }
  const distinct: Trial[] = [];
  for (const trial of leading(trials, trials.length)) {
    if (!distinct.some(({ shape }) => shape === trial.shape)) distinct.push(trial);
  }
  const chosen = distinct.slice(0, returned);
  for (const trial of chosen) {
    search.improve(trial, search.finest, fine.slice(-2), 80);
    search.note(trial);
  }
  yield { done: 1, best: search.best };
  return leading(chosen, returned).map((trial) => fitted(trial, search.limits));
}

import { BoxSearch } from './box-search.ts';
import { boxAbout, chooseValues, type ValueChoice } from './choose-values.ts';
import { withPairs, type PairCandidate } from './pairs.ts';
import type { PickedSet } from './value-problem.ts';

/** A choice of values where some arms may be made of two parts. */
export interface PairChoice extends ValueChoice {
  /** Arms that may; the others keep to their candidates. */
  readonly mayPair: readonly boolean[];
  /** |Γ|² that is good enough: no more pairs than it takes. */
  readonly required: number;
}

/** The best sets and what their picks point at. */
export interface PairedSets {
  readonly candidates: readonly (readonly PairCandidate[])[];
  readonly sets: readonly PickedSet[];
}

/** Sets tried with a pair in one given arm. */
const setsOfOne = 50_000;

/**
 * Sets of parts with two in place of one near the exact value: one such arm if that is enough, else as many as it takes.
 *
 * @returns sets that meet what is required with one pair, where there are such; else the best of all
 */
export function* chooseWithPairs(choice: PairChoice): Generator<void, PairedSets> {
  const { candidates: singles, centre, mayPair, required, keep } = choice;
  const candidates = singles.map((parts, k) =>
    mayPair[k]! ? withPairs(parts, centre[k]!) : parts.map((arm): PairCandidate => ({ arm, pair: null })),
  );
  const paired = { ...choice, candidates: candidates.map((parts) => parts.map(({ arm }) => arm)) };
  const picksWhere = (k: number, wanted: boolean): number[] =>
    [...candidates[k]!.keys()].filter((pick) => (candidates[k]![pick]!.pair !== null) === wanted);
  const search = new BoxSearch(paired, keep);
  for (const arm of candidates.keys()) {
    const pairs = picksWhere(arm, true);
    if (pairs.length === 0) continue;
    const lists = candidates.map((_, k) => (k === arm ? pairs : picksWhere(k, false)));
    search.search(boxAbout(paired, lists, setsOfOne));
    yield;
  }
  const one = search.best.filter(({ gammaSquared }) => gammaSquared <= required);
  if (one.length > 0) return { candidates, sets: one };
  const all = yield* chooseValues(paired);
  const seen = new Set(all.map(({ picks }) => picks.join()));
  const sets = [...all, ...search.best.filter(({ picks }) => !seen.has(picks.join()))];
  return { candidates, sets: sets.toSorted((a, b) => a.gammaSquared - b.gammaSquared).slice(0, keep) };
}

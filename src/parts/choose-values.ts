import type { RealArm } from '../network/real-arm.ts';
import { BoxSearch } from './box-search.ts';
import type { ValueProblem, PickedSet } from './value-problem.ts';
import { log } from '../quantity/elementary.ts';

/** A choice of values and how many of the best sets are wanted. */
export interface ValueChoice extends ValueProblem {
  /** Values that would be best if every value were on sale, H and F, source side first. */
  readonly centre: readonly number[];
  readonly keep: number;
}

/** Sets in the first box; more are reached by moves from the best. */
const sets = 300_000;
/** Best sets that moves start from. */
const leaders = 10;
/** Arms that move together, any or neighbours only, and by how many candidates each way at most. */
const moves = [
  { arms: 2, reach: 4, choose: combinations },
  { arms: 6, reach: 2, choose: runs },
] as const;
/** Sets that moves may try in all: so many only where a dozen parts have nowhere to settle. */
const tries = 1e7;
/** Moves before a box that has every set: they only lower the figure that it has to beat. */
const fewTries = 1e4;

/**
 * The sets of parts that together come closest to the aim over band and states, best first.
 *
 * Where all sets are few, all are searched; otherwise those of a box about the exact values, and everything that differs
 * from one of the best in any two arms or in up to six neighbouring ones. A network of many parts has long valleys, along
 * which one part grows as its neighbours shrink: moving parts one by one gets stuck on their sides.
 *
 * Yields every few milliseconds, for a caller that has other things to do.
 *
 * @returns at most `keep` sets; fewer where there are no more
 */
export function* chooseValues(choice: ValueChoice): Generator<void, readonly PickedSet[]> {
  const { candidates, centre, keep } = choice;
  const search = new BoxSearch(choice, Math.max(keep, leaders));
  const lists = boxAbout(
    choice,
    candidates.map((parts) => [...parts.keys()]),
    sets,
  );
  const whole = lists.every((list, k) => list.length === candidates[k]!.length);
  search.search(candidates.map((parts, k) => [nearest(parts, centre[k]!)]));
  yield* climb(
    candidates.map(({ length }) => length),
    search,
    whole ? fewTries : tries,
  );
  yield* inSlices(search, lists);
  if (!whole)
    yield* climb(
      candidates.map(({ length }) => length),
      search,
      tries,
    );
  return search.best.slice(0, keep);
}

/**
 * The candidates nearest to the centre by ratio, over all arms, as long as their product stays small.
 *
 * @param lists for each arm the candidates considered, one or more
 * @returns the same, fewer where there are too many
 */
export function boxAbout(
  { candidates, centre }: ValueChoice,
  lists: readonly (readonly number[])[],
  most: number,
): number[][] {
  const byDistance = lists
    .flatMap((list, arm) =>
      list.map((pick) => ({ arm, pick, distance: Math.abs(log(candidates[arm]![pick]!.value / centre[arm]!)) })),
    )
    .sort((a, b) => a.distance - b.distance);
  const box: number[][] = lists.map(() => []);
  for (const { arm, pick } of byDistance) {
    const product = box.reduce((all, { length }, k) => all * (k === arm ? length + 1 : Math.max(1, length)), 1);
    if (product <= most || box[arm]!.length === 0) box[arm]!.push(pick);
  }
  for (const list of box) list.sort((a, b) => a - b);
  return box;
}

/** A box in pieces, each with one candidate of the two arms nearest to the load that vary. */
function* inSlices(search: BoxSearch, lists: readonly (readonly number[])[]): Generator<void> {
  const outer = lists.findLastIndex(({ length }) => length > 1);
  const inner = lists.findLastIndex(({ length }, k) => k < outer && length > 1);
  if (inner === -1) {
    search.search(lists);
    return;
  }
  for (const a of lists[outer]!) {
    for (const b of lists[inner]!) {
      search.search(lists.with(outer, [a]).with(inner, [b]));
    }
    yield;
  }
}

/**
 * Moves from the best set that hasn't been moved from, small moves of all leaders before large ones, until none is left.
 *
 * @param lengths how many candidates each arm has
 */
function* climb(lengths: readonly number[], search: BoxSearch, most: number): Generator<void> {
  const done = moves.map(() => new Set<string>());
  for (let tried = 0; tried < most;) {
    const kind = moves.findIndex((_, k) => search.best.some(({ picks }) => !done[k]!.has(picks.join())));
    if (kind === -1) return;
    const from = search.best.find(({ picks }) => !done[kind]!.has(picks.join()))!.picks;
    done[kind]!.add(from.join());
    const { arms, reach, choose } = moves[kind]!;
    for (const moving of choose(lengths.length, Math.min(arms, lengths.length))) {
      const lists = from.map((pick, k) => (moving.includes(k) ? around(pick, reach, lengths[k]!) : [pick]));
      search.search(lists);
      tried += lists.reduce((product, { length }) => product * length, 1);
    }
    yield;
  }
}

/** Up to `reach` candidates either side. */
function around(pick: number, reach: number, length: number): number[] {
  const low = Math.max(0, pick - reach);
  return Array.from({ length: Math.min(length - 1, pick + reach) - low + 1 }, (_, k) => low + k);
}

/** Every k neighbours among 0 … n − 1. */
function runs(n: number, k: number): number[][] {
  return Array.from({ length: n - k + 1 }, (_, first) => Array.from({ length: k }, (__, j) => first + j));
}

/** Every k among 0 … n − 1, ascending. */
function combinations(n: number, k: number): number[][] {
  if (k === 0) return [[]];
  return Array.from({ length: n - k + 1 }, (_, j) => n - 1 - j).flatMap((last) =>
    combinations(last, k - 1).map((rest) => [...rest, last]),
  );
}

/** Which candidate is nearest by ratio; of two the smaller. */
function nearest(parts: readonly RealArm[], to: number): number {
  const distances = parts.map(({ value }) => Math.abs(log(value / to)));
  return distances.indexOf(Math.min(...distances));
}

import type { Draws } from '../network/real-sweep.ts';
import { deviate, type Distribution } from './distribution.ts';
import { philox } from './philox.ts';

/** A part whose value varies. One or two of them stand for an arm. */
export interface VariedPart {
  readonly designator: string;
  /** Index in the ladder's arms. */
  readonly armIndex: number;
  /** Half-width as a fraction of its value, 0 to below 1. */
  readonly tolerance: number;
  /** Its share in the arm: its value over the arm's where values add, the arm's over its own where inverses do. */
  readonly weight: number;
  /** Inductors in series, capacitors in parallel: the arm's value is the sum of the parts'. */
  readonly adds: boolean;
}

/** Half-width of R and of X at each end, as a fraction of R and of |Z|, 0 to below 1. */
export interface EndSpread {
  readonly source: number;
  readonly load: number;
}

/**
 * Networks `from` to `from + count` of a seed's endless list. Each depends on the seed and its own number alone, so that
 * a list cut into ranges is the same list.
 *
 * @param arms number of arms of the ladder
 * @param seed whole number from 0 to 2⁵³ − 1
 */
export function drawsOf(
  parts: readonly VariedPart[],
  arms: number,
  spread: EndSpread,
  distribution: Distribution,
  seed: number,
  from: number,
  count: number,
): Draws {
  // The ends have the first four, so that theirs are the same whatever the parts.
  const ends = spread.load === 0 && spread.source === 0 ? [] : deviations(4, 0, distribution, seed, from, count);
  const columns = deviations(parts.length, 1, distribution, seed, from, count);
  const end = (k: number, size: number): Float64Array | null =>
    size === 0 ? null : ends[k]!.map((deviation) => deviation * size);
  return {
    count,
    scale: scalesOf(parts, arms, columns, count),
    loadR: end(0, spread.load),
    loadX: end(1, spread.load),
    sourceR: end(2, spread.source),
    sourceX: end(3, spread.source),
  };
}

/**
 * Networks whose parts deviate as given; the ends don't.
 *
 * @param deviation one column a part, −1 to 1: fractions of its tolerance
 */
export const drawsWith = (
  parts: readonly VariedPart[],
  arms: number,
  deviation: readonly Float64Array[],
  count: number,
): Draws => ({
  count,
  scale: scalesOf(parts, arms, deviation, count),
  loadR: null,
  loadX: null,
  sourceR: null,
  sourceX: null,
});

/**
 * Columns of deviations, −1 to 1, four to each call of the generator.
 *
 * @param first which four of a network's deviations come first
 */
function deviations(
  width: number,
  first: number,
  distribution: Distribution,
  seed: number,
  from: number,
  count: number,
): Float64Array[] {
  const words = new Uint32Array(4 * count);
  return Array.from({ length: Math.ceil(width / 4) }, (_, four) => {
    fillWords(words, first + four, seed, from, count);
    return Array.from({ length: Math.min(4, width - 4 * four) }, (_, k) => columnOf(words, k, distribution, count));
  }).flat();
}

/** Four words of each network. */
function fillWords(words: Uint32Array, which: number, seed: number, from: number, count: number): void {
  const seedHigh = Math.floor(seed / 2 ** 32);
  for (let d = 0; d < count; d += 1) {
    const sample = from + d;
    philox(sample, Math.floor(sample / 2 ** 32), which, 0, seed, seedHigh, words, 4 * d);
  }
}

/** Deviations of the networks' `k`-th words. */
function columnOf(words: Uint32Array, k: number, distribution: Distribution, count: number): Float64Array {
  const column = new Float64Array(count);
  for (let d = 0; d < count; d += 1) column[d] = deviate((words[4 * d + k]! + 0.5) * 2 ** -32, distribution);
  return column;
}

/** Value of each arm over its nominal one: Σ w·s of its parts where values add, 1/Σ(w/s) where inverses do. */
function scalesOf(
  parts: readonly VariedPart[],
  arms: number,
  deviation: readonly Float64Array[],
  count: number,
): Float64Array[] {
  return Array.from({ length: arms }, (_, armIndex) => {
    const scale = new Float64Array(count);
    const here = parts.flatMap((part, k) => (part.armIndex === armIndex ? [{ ...part, column: deviation[k]! }] : []));
    if (here.length === 0) return scale.fill(1);
    const adds = here.length === 1 || here[0]!.adds;
    for (const { weight, tolerance, column } of here) addTo(scale, adds, weight, tolerance, column);
    return adds ? scale : scale.map((inverse) => 1 / inverse);
  });
}

function addTo(sum: Float64Array, adds: boolean, weight: number, tolerance: number, column: Float64Array): void {
  for (let d = 0; d < sum.length; d += 1) {
    const own = 1 + tolerance * column[d]!;
    sum[d]! += adds ? weight * own : weight / own;
  }
}

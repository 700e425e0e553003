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
  scale: scalesOf(
    parts,
    arms,
    deviation.map((column) => column.slice()),
    count,
  ),
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
  const low = new Uint32Array(count);
  const high = new Uint32Array(count);
  for (let d = 0; d < count; d += 1) {
    low[d] = from + d;
    high[d] = (from + d) / 2 ** 32;
  }
  const key = [seed, Math.floor(seed / 2 ** 32)] as const;
  const words = [0, 1, 2, 3].map(() => new Uint32Array(count)) as unknown as Words;
  return Array.from({ length: Math.ceil(width / 4) }, (_, four) => {
    philox(low, high, [first + four, 0], key, words);
    return words.slice(0, width - 4 * four).map((column) => columnOf(column, distribution));
  }).flat();
}

type Words = readonly [Uint32Array, Uint32Array, Uint32Array, Uint32Array];

function columnOf(words: Uint32Array, distribution: Distribution): Float64Array {
  const column = new Float64Array(words.length);
  if (distribution === 'uniform') {
    // deviate(u) is 2u − 1: written out, because most networks are drawn so.
    for (let d = 0; d < words.length; d += 1) column[d] = (words[d]! + 0.5) * 2 ** -31 - 1;
    return column;
  }
  for (let d = 0; d < words.length; d += 1) column[d] = deviate((words[d]! + 0.5) * 2 ** -32, distribution);
  return column;
}

/**
 * Value of each arm over its nominal one: Σ w·s of its parts where values add, 1/Σ(w/s) where inverses do.
 *
 * @param deviation one column a part; that of a part that stands alone is written over
 */
function scalesOf(
  parts: readonly VariedPart[],
  arms: number,
  deviation: readonly Float64Array[],
  count: number,
): Float64Array[] {
  return Array.from({ length: arms }, (_, armIndex) => {
    const here = parts.flatMap((part, k) => (part.armIndex === armIndex ? [{ ...part, column: deviation[k]! }] : []));
    const [first, second] = here;
    if (first === undefined) return new Float64Array(count).fill(1);
    if (second === undefined) return alone(first.tolerance, first.column);
    const { adds } = first;
    const scale = new Float64Array(count);
    for (const { weight, tolerance, column } of here) addTo(scale, adds, weight, tolerance, column);
    return adds ? scale : scale.map((inverse) => 1 / inverse);
  });
}

/** The part's own scale, in place of its deviations. */
function alone(tolerance: number, column: Float64Array): Float64Array {
  for (let d = 0; d < column.length; d += 1) column[d] = 1 + tolerance * column[d]!;
  return column;
}

function addTo(sum: Float64Array, adds: boolean, weight: number, tolerance: number, column: Float64Array): void {
  for (let d = 0; d < sum.length; d += 1) {
    const own = 1 + tolerance * column[d]!;
    sum[d]! += adds ? weight * own : weight / own;
  }
}

import type { RealArm } from '../network/real-arm.ts';

/** How two parts that stand for one arm are joined. */
export type Join = 'in series' | 'in parallel';

/** A real part, or two of them in place of one. */
export interface PairCandidate {
  readonly arm: RealArm;
  /** How the two are joined and which singles they are; null: one part. */
  readonly pair: {
    readonly join: Join;
    readonly of: readonly [number, number];
  } | null;
}

/** Pairs on either side of the wanted value. */
const perSide = 3;

/**
 * The single parts and, close to a wanted value, what two of them make in series or in parallel: the three pairs next
 * below it and the three next above, as far as they are closer than the nearest single part on that side. Of two pairs
 * of the same value the one with the better quality factor is taken.
 *
 * @param singles ascending by value, all of one kind and place; one alone is made to its value and not doubled
 * @param wanted  H or F
 * @returns ascending by value
 */
export function withPairs(singles: readonly RealArm[], wanted: number): PairCandidate[] {
  const single = singles.map((arm): PairCandidate => ({ arm, pair: null }));
  if (singles.length < 2) return single;
  const lower = singles.findLast(({ value }) => value <= wanted)?.value ?? 0;
  const upper = singles.find(({ value }) => value >= wanted)?.value ?? Infinity;
  const pairs = pairsBetween(singles, lower, upper);
  const below = pairs.filter(({ arm }) => arm.value <= wanted).slice(-perSide);
  const above = pairs.filter(({ arm }) => arm.value > wanted).slice(0, perSide);
  return [...single, ...below, ...above].sort((a, b) => a.arm.value - b.arm.value);
}

/** All pairs with a value strictly between two, ascending, one of each value. */
function pairsBetween(singles: readonly RealArm[], lower: number, upper: number): PairCandidate[] {
  const found: PairCandidate[] = [];
  singles.forEach((a, i) => {
    for (let j = i; j < singles.length; j += 1) {
      for (const join of ['in series', 'in parallel'] as const) {
        const value = joinedValue(join, a, singles[j]!);
        // A pair that differs from a single part in its last bits alone is that part twice over.
        if (value <= lower * (1 + same) || value >= upper * (1 - same)) continue;
        found.push({ arm: joined(join, a, singles[j]!), pair: { join, of: [i, j] } });
      }
    }
  });
  found.sort((a, b) => a.arm.value - b.arm.value || (b.arm.q ?? Infinity) - (a.arm.q ?? Infinity));
  return found.filter(({ arm }, k) => k === 0 || arm.value > found[k - 1]!.arm.value * (1 + same));
}

/** Values closer than this are equal. */
const same = 1e-6;

/** Inductances add in series, capacitances in parallel. */
const adds = (join: Join, { part }: RealArm): boolean => (join === 'in series') === (part === 'inductor');

const joinedValue = (join: Join, a: RealArm, b: RealArm): number =>
  adds(join, a) ? a.value + b.value : (a.value * b.value) / (a.value + b.value);

/**
 * Two parts as one. Each takes a share of the pair's voltage (in series) or current (in parallel), the shares adding up
 * to one; losses add by share: 1/Q = Σ share/Q. In series the inductances of leads add and the capacitances across add
 * by share²; in parallel it is the other way round. Shares are those of ideal parts: it holds well below the
 * self-resonances. The node inside a series pair gets no stray capacitance of its own.
 */
export function joined(join: Join, a: RealArm, b: RealArm): RealArm {
  const value = joinedValue(join, a, b);
  const share = ({ value: own }: RealArm): number => (adds(join, a) ? own / value : value / own);
  const lossOf = (arm: RealArm): number => (arm.q === null ? 0 : share(arm) / arm.q);
  const loss = lossOf(a) + lossOf(b);
  const sum = (of: 'parallelF' | 'seriesH', plain: boolean): number =>
    plain ? a[of] + b[of] : share(a) ** 2 * a[of] + share(b) ** 2 * b[of];
  return {
    arm: a.arm,
    part: a.part,
    value,
    q: loss === 0 ? null : 1 / loss,
    qSlope: loss === 0 ? 0 : (lossOf(a) * a.qSlope + lossOf(b) * b.qSlope) / loss,
    parallelF: sum('parallelF', join === 'in parallel'),
    seriesH: sum('seriesH', join === 'in series'),
  };
}

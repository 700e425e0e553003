import { SetTable } from './set-table.ts';
import type { ValueProblem, PickedSet } from './value-problem.ts';

/** Frequencies at which sets are sifted; what passes is judged at all of them. */
const siftedAt = 17;
/** Sets that tie but for rounding aren't lost in the sift. */
const slack = 1 + 1e-9;

/**
 * The best sets of parts among boxes: products of some candidates of each arm. Every set of a box is either judged at
 * every frequency or shown to be worse than the sets kept at one frequency of a few, so nothing good is lost.
 *
 * Voltage and current are carried from the load arm by arm and shared by all sets that agree so far; the source's
 * condition S = V + I·ZS and its partner D (D/S = Γ) are carried forward through the arms that don't vary, so that a
 * set costs one arm. Stray capacitance sits at the source's node and on the load's side of each series arm.
 */
export class BoxSearch {
  readonly #problem: ValueProblem;
  readonly #length: number;
  readonly #most: number;
  readonly #series: readonly boolean[];
  readonly #table: SetTable;
  readonly #conjugate: boolean;
  /** Sifting points, every state's frequencies in turn: index of the frequency, stray susceptance, load. */
  readonly #at: Int32Array;
  readonly #stray: Float64Array;
  /** Points in the order of trying: the one that last refused a set comes first. */
  readonly #order: Int32Array;
  /** Re and Im of V and I at each point on the load's side of each arm; at the end the load. */
  readonly #levels: readonly Float64Array[];
  /** Re and Im of α and β of S = α·V + β·I, then of D, at each point, on the source's side of the first varying arm. */
  readonly #ends: Float64Array;
  #lists: readonly (readonly number[])[] = [];
  #first = 0;
  readonly #picks: Int32Array;
  readonly #alive: Int32Array;
  /** Rows of the candidates of the first varying arm. */
  #leaves: readonly Float64Array[] = [];
  readonly #best: PickedSet[] = [];

  /** @param most how many of the best sets to keep */
  constructor(problem: ValueProblem, most: number) {
    const { candidates, states, aim, strayF } = problem;
    const n = candidates.length;
    const { frequencyHz } = states[0]!;
    const samples = Math.min(siftedAt, frequencyHz.length);
    const points = samples * states.length;
    this.#problem = problem;
    this.#length = n;
    this.#most = most;
    this.#table = new SetTable(problem);
    this.#series = this.#table.series;
    this.#conjugate = aim === 'conjugate';
    this.#at = Int32Array.from({ length: points }, (_, p) =>
      samples === 1 ? 0 : Math.round(((p % samples) * (frequencyHz.length - 1)) / (samples - 1)),
    );
    this.#stray = Float64Array.from(this.#at, (f) => 2 * Math.PI * frequencyHz[f]! * strayF);
    this.#order = Int32Array.from({ length: points }, (_, p) => p);
    this.#levels = Array.from({ length: n + 1 }, () => new Float64Array(4 * points));
    for (let p = 0; p < points; p += 1) {
      const { rl, xl } = states[Math.floor(p / samples)]!;
      this.#levels[n]!.set([rl[this.#at[p]!]!, xl[this.#at[p]!]!, 1, 0], 4 * p);
    }
    this.#ends = new Float64Array(8 * points);
    this.#picks = new Int32Array(n);
    this.#alive = new Int32Array(candidates.reduce((most_, { length }) => Math.max(most_, length), 0));
  }

  /** Best first; of equal sets the one with the smaller values nearer to the source first. */
  get best(): readonly PickedSet[] {
    return this.#best;
  }

  /** @param lists for each arm the candidates that the box has, one or more */
  search(lists: readonly (readonly number[])[]): void {
    const first = lists.findIndex(({ length }) => length > 1);
    this.#lists = lists;
    lists.forEach((list, k) => (this.#picks[k] = list[0]!));
    if (first === -1) {
      this.#judge();
      return;
    }
    this.#first = first;
    this.#leaves = lists[first]!.map((pick) => this.#table.row(first, pick));
    this.#carryEnds();
    this.#descend(this.#length - 1);
  }

  /** S and D from the source on, through the arms before the first that varies. */
  #carryEnds(): void {
    const { states } = this.#problem;
    const at = this.#at;
    const samples = at.length / states.length;
    for (let p = 0; p < at.length; p += 1) {
      const f = at[p]!;
      const { rs, xs } = states[Math.floor(p / samples)]!;
      this.#carryOne(8 * p, rs[f]!, xs[f]!, f, this.#stray[p]!);
      this.#carryOne(8 * p + 4, -rs[f]!, this.#conjugate ? xs[f]! : -xs[f]!, f, this.#stray[p]!);
    }
  }

  /** One of S and D: it starts as V + w·I and is left at `to`. */
  #carryOne(to: number, wr: number, wi: number, f: number, stray: number): void {
    // The source's node: I gains jb·V.
    let ar = 1 - stray * wi;
    let ai = stray * wr;
    let br = wr;
    let bi = wi;
    for (let k = 0; k < this.#first; k += 1) {
      const row = this.#table.row(k, this.#picks[k]!);
      const re = row[2 * f]!;
      const im = row[2 * f + 1]!;
      if (this.#series[k]!) {
        br += ar * re - ai * im;
        bi += ar * im + ai * re;
        ar -= stray * bi;
        ai += stray * br;
      } else {
        ar += br * re - bi * im;
        ai += br * im + bi * re;
      }
    }
    const ends = this.#ends;
    ends[to] = ar;
    ends[to + 1] = ai;
    ends[to + 2] = br;
    ends[to + 3] = bi;
  }

  /** Every candidate of one arm, and below it every one of the arms nearer to the source. */
  #descend(arm: number): void {
    const first = this.#first;
    if (arm === first) {
      this.#sift(null);
      return;
    }
    for (const pick of this.#lists[arm]!) {
      this.#picks[arm] = pick;
      const row = this.#table.row(arm, pick);
      // The last step before the varying arm is taken point by point: most sets are refused at the first of them.
      if (arm === first + 1) this.#sift(row);
      else {
        this.#carry(arm, row);
        this.#descend(arm - 1);
      }
    }
  }

  /** V and I over one arm towards the source, at every point. */
  #carry(arm: number, row: Float64Array): void {
    const from = this.#levels[arm + 1]!;
    const to = this.#levels[arm]!;
    const at = this.#at;
    const series = this.#series[arm]!;
    for (let p = 0, o = 0; p < at.length; p += 1, o += 4) {
      const f = 2 * at[p]!;
      const re = row[f]!;
      const im = row[f + 1]!;
      let vr = from[o]!;
      let vi = from[o + 1]!;
      let ir = from[o + 2]!;
      let ii = from[o + 3]!;
      if (series) {
        ir -= this.#stray[p]! * vi;
        ii += this.#stray[p]! * vr;
        vr += re * ir - im * ii;
        vi += re * ii + im * ir;
      } else {
        ir += re * vr - im * vi;
        ii += re * vi + im * vr;
      }
      to[o] = vr;
      to[o + 1] = vi;
      to[o + 2] = ir;
      to[o + 3] = ii;
    }
  }

  /**
   * All candidates of the first varying arm at once, point by point; those that no point refuses are judged.
   *
   * @param before the arm before it on the load's side, when there is one
   */
  #sift(before: Float64Array | null): void {
    const first = this.#first;
    const list = this.#lists[first]!;
    const leaves = this.#leaves;
    const levels = this.#levels[before === null ? first + 1 : first + 2]!;
    const series = this.#series[first]!;
    const beforeSeries = before !== null && this.#series[first + 1]!;
    const order = this.#order;
    const at = this.#at;
    const ends = this.#ends;
    const alive = this.#alive;
    const limit = this.#limit() * slack;
    let left = list.length;
    for (let k = 0; k < left; k += 1) alive[k] = k;
    for (let tried = 0; tried < order.length; tried += 1) {
      const p = order[tried]!;
      const f = 2 * at[p]!;
      const stray = this.#stray[p]!;
      const o = 4 * p;
      let vr = levels[o]!;
      let vi = levels[o + 1]!;
      let ir = levels[o + 2]!;
      let ii = levels[o + 3]!;
      if (before !== null) {
        const re = before[f]!;
        const im = before[f + 1]!;
        if (beforeSeries) {
          ir -= stray * vi;
          ii += stray * vr;
          vr += re * ir - im * ii;
          vi += re * ii + im * ir;
        } else {
          ir += re * vr - im * vi;
          ii += re * vi + im * vr;
        }
      }
      if (series) {
        ir -= stray * vi;
        ii += stray * vr;
      }
      // S = s + t·immittance, D = d + e·immittance
      const e = 8 * p;
      const sar = ends[e]!;
      const sai = ends[e + 1]!;
      const sbr = ends[e + 2]!;
      const sbi = ends[e + 3]!;
      const dar = ends[e + 4]!;
      const dai = ends[e + 5]!;
      const dbr = ends[e + 6]!;
      const dbi = ends[e + 7]!;
      const sr = sar * vr - sai * vi + sbr * ir - sbi * ii;
      const si = sar * vi + sai * vr + sbr * ii + sbi * ir;
      const dr = dar * vr - dai * vi + dbr * ir - dbi * ii;
      const di = dar * vi + dai * vr + dbr * ii + dbi * ir;
      const tr = series ? sar * ir - sai * ii : sbr * vr - sbi * vi;
      const ti = series ? sar * ii + sai * ir : sbr * vi + sbi * vr;
      const er = series ? dar * ir - dai * ii : dbr * vr - dbi * vi;
      const ei = series ? dar * ii + dai * ir : dbr * vi + dbi * vr;
      let stay = 0;
      for (let k = 0; k < left; k += 1) {
        const leaf = alive[k]!;
        const row = leaves[leaf]!;
        const re = row[f]!;
        const im = row[f + 1]!;
        const xr = sr + tr * re - ti * im;
        const xi = si + tr * im + ti * re;
        const yr = dr + er * re - ei * im;
        const yi = di + er * im + ei * re;
        if (yr * yr + yi * yi <= limit * (xr * xr + xi * xi)) {
          alive[stay] = leaf;
          stay += 1;
        }
      }
      left = stay;
      if (left === 0) {
        order.copyWithin(1, 0, tried);
        order[0] = p;
        return;
      }
    }
    const picks = this.#picks;
    for (let k = 0; k < left; k += 1) {
      picks[first] = list[alive[k]!]!;
      this.#judge();
    }
  }

  /** Above this a set is not wanted. */
  #limit(): number {
    return this.#best.length < this.#most ? Infinity : this.#best[this.#most - 1]!.gammaSquared;
  }

  /** Keeps the set at hand if it is among the best by all frequencies. */
  #judge(): void {
    const best = this.#best;
    if (best.some(({ picks }) => picks.every((pick, arm) => pick === this.#picks[arm]))) return;
    const gammaSquared = this.#table.worst(this.#picks, this.#limit());
    if (gammaSquared > this.#limit()) return;
    const set: PickedSet = { picks: Array.from(this.#picks), gammaSquared };
    const place = best.findIndex((other) => inOrder(set, other) < 0);
    best.splice(place === -1 ? best.length : place, 0, set);
    if (best.length > this.#most) best.pop();
  }
}

/** Negative when the first is better. */
function inOrder(a: PickedSet, b: PickedSet): number {
  if (a.gammaSquared !== b.gammaSquared) return a.gammaSquared - b.gammaSquared;
  const arm = a.picks.findIndex((pick, k) => pick !== b.picks[k]);
  return arm === -1 ? 0 : a.picks[arm]! - b.picks[arm]!;
}

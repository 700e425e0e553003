import type { RealArm } from '../network/real-arm.ts';
import type { Ends } from '../network/sweep.ts';
import type { Aim } from '../network/termination.ts';
import type { Span } from '../quantity/span.ts';
import { fromInside, toInside } from '../synthesis/fit/limits.ts';
import { minimise } from '../synthesis/fit/minimise.ts';
import { fillImmittance } from './immittance-of.ts';
import { cos, exp, log } from '../quantity/elementary.ts';

/** A network of real parts whose values may be any. */
export interface CentreProblem {
  /** The real part that an arm would be at a value (H or F), source side first. */
  readonly armFor: (arm: number, value: number) => RealArm;
  /** From every node to ground, F; 0: none. */
  readonly strayF: number;
  /** The same source over the same frequencies into each load state; one frequency where there is no band. */
  readonly states: readonly Ends[];
  /** Design frequency, Hz. */
  readonly f0: number;
  readonly aim: Aim;
}

/** Values (H and F, source side first) and the largest |Γ|² that they give. */
export interface Centred {
  readonly values: readonly number[];
  readonly gammaSquared: number;
}

/** Sharpness of the smooth maximum, stage by stage. */
const betas = [6, 25, 100, 400, 1600] as const;
const steps = 60;
/** Frequencies that the descent looks at; all of them judge its result. */
const most = 33;
/** Step of a value's logarithm for the slope of a part's immittance, which is smooth and known to 1e-16. */
const nudge = 1e-6;

/** Largest |Γ|² over all frequencies and states. */
export function worstOf(problem: CentreProblem, values: readonly number[]): number {
  return exp(new RealMismatch(problem, values.length).worst(values));
}

/**
 * The values about the given ones that are best with loss and strays in: exact values are for lossless parts.
 *
 * @param start  H and F, source side first
 * @param limits for each arm; one value only where low is high
 * @returns never worse than the start brought inside the limits
 */
export function centreValues(problem: CentreProblem, start: readonly number[], limits: readonly Span[]): Centred {
  const bounds = limits.map(({ low, high }) => ({
    middle: log(low * high) / 2,
    half: Math.max(log(high / low) / 2, 1e-12),
  }));
  const within = (value: number, k: number): number => Math.min(limits[k]!.high, Math.max(limits[k]!.low, value));
  const inside = start.map(within);
  const all = new RealMismatch(problem, start.length);
  const few = new RealMismatch({ ...problem, states: problem.states.map(thinned) }, start.length);
  let best = { values: inside, level: all.worst(inside) };
  const x = Float64Array.from(inside, (value, k) => toInside(log(value), bounds[k]!));
  const logs = new Float64Array(x.length);
  for (const beta of betas) {
    minimise(
      (t, slope) => {
        for (let k = 0; k < t.length; k += 1) logs[k] = fromInside(t[k]!, bounds[k]!);
        const level = few.smooth(logs, beta, slope);
        for (let k = 0; k < t.length; k += 1) slope[k]! *= bounds[k]!.half * cos(t[k]!);
        return level;
      },
      x,
      steps,
    );
    const values = Array.from(x, (t, k) => within(exp(fromInside(t, bounds[k]!)), k));
    const level = all.worst(values);
    if (level < best.level) best = { values, level };
  }
  return { values: best.values, gammaSquared: exp(best.level) };
}

function thinned(ends: Ends): Ends {
  const n = ends.frequencyHz.length;
  if (n <= most) return ends;
  const at = (samples: Float64Array): Float64Array =>
    Float64Array.from({ length: most }, (_, k) => samples[Math.round((k * (n - 1)) / (most - 1))]!);
  return {
    frequencyHz: at(ends.frequencyHz),
    rs: at(ends.rs),
    xs: at(ends.xs),
    rl: at(ends.rl),
    xl: at(ends.xl),
  };
}

/**
 * ln|Γ|² of real parts over band and states, its smooth maximum and the slopes of that: with voltage and current
 * carried back from the load and the source's condition S = α·V + β·I carried forward, a change δz of a series arm moves
 * S by α·I·δz, a change δy of a shunt arm by β·V·δy.
 */
class RealMismatch {
  readonly #problem: CentreProblem;
  /** Immittance of each arm over frequency, and its slope in the logarithm of the value. */
  readonly #rows: readonly Float64Array[];
  readonly #slopes: readonly Float64Array[];
  readonly #series: boolean[];
  readonly #levels: Float64Array;
  readonly #gradients: Float64Array;
  /** V and I at each arm: through a series arm, across a shunt arm. */
  readonly #inner: Float64Array;

  constructor(problem: CentreProblem, arms: number) {
    const n = problem.states[0]!.frequencyHz.length;
    const row = (): Float64Array => new Float64Array(2 * n);
    this.#problem = problem;
    this.#rows = Array.from({ length: arms }, row);
    this.#slopes = Array.from({ length: arms }, row);
    this.#series = new Array<boolean>(arms).fill(false);
    this.#levels = new Float64Array(n * problem.states.length);
    this.#gradients = new Float64Array(this.#levels.length * arms);
    this.#inner = new Float64Array(2 * arms);
  }

  /** Largest ln|Γ|². */
  worst(values: readonly number[]): number {
    this.#fill(Float64Array.from(values, log));
    this.#sweep();
    return this.#levels.reduce((top, level) => Math.max(top, level), -Infinity);
  }

  /** (1/β)·ln Σ |Γ|^2β, with its derivatives into `slope`. */
  smooth(logs: Float64Array, beta: number, slope: Float64Array): number {
    const m = logs.length;
    this.#fill(logs);
    this.#sweep();
    const top = this.#levels.reduce((high, level) => Math.max(high, level), -Infinity);
    let sum = 0;
    slope.fill(0);
    for (let p = 0; p < this.#levels.length; p += 1) {
      const weight = exp(beta * (this.#levels[p]! - top));
      if (weight < 1e-12) continue;
      sum += weight;
      for (let k = 0; k < m; k += 1) slope[k]! += weight * this.#gradients[p * m + k]!;
    }
    for (let k = 0; k < m; k += 1) slope[k]! /= sum;
    return top + log(sum) / beta;
  }

  #fill(logs: Float64Array): void {
    const { armFor, f0, states } = this.#problem;
    const { frequencyHz } = states[0]!;
    for (let k = 0; k < logs.length; k += 1) {
      const row = this.#rows[k]!;
      const slope = this.#slopes[k]!;
      const arm = armFor(k, exp(logs[k]!));
      this.#series[k] = arm.arm === 'series';
      fillImmittance(arm, f0, frequencyHz, row);
      fillImmittance(armFor(k, exp(logs[k]! + nudge)), f0, frequencyHz, slope);
      for (let at = 0; at < row.length; at += 1) slope[at] = (slope[at]! - row[at]!) / nudge;
    }
  }

  #sweep(): void {
    let point = 0;
    for (const ends of this.#problem.states) {
      for (let f = 0; f < ends.frequencyHz.length; f += 1) {
        this.#levels[point] = this.#one(ends, f, point * this.#rows.length);
        point += 1;
      }
    }
  }

  /** ln|Γ|² at one frequency of one state, and its slopes from `to` on. */
  #one(ends: Ends, f: number, to: number): number {
    const { strayF, aim } = this.#problem;
    const m = this.#rows.length;
    const inner = this.#inner;
    const stray = 2 * Math.PI * ends.frequencyHz[f]! * strayF;
    let vr = ends.rl[f]!;
    let vi = ends.xl[f]!;
    let ir = 1;
    let ii = 0;
    for (let k = m - 1; k >= 0; k -= 1) {
      const re = this.#rows[k]![2 * f]!;
      const im = this.#rows[k]![2 * f + 1]!;
      if (this.#series[k]!) {
        ir -= stray * vi;
        ii += stray * vr;
        inner[2 * k] = ir;
        inner[2 * k + 1] = ii;
        vr += re * ir - im * ii;
        vi += re * ii + im * ir;
      } else {
        inner[2 * k] = vr;
        inner[2 * k + 1] = vi;
        ir += re * vr - im * vi;
        ii += re * vi + im * vr;
      }
    }
    ir -= stray * vi;
    ii += stray * vr;
    const zr = ends.rs[f]!;
    const zi = ends.xs[f]!;
    const wi = aim === 'conjugate' ? zi : -zi;
    const sr = vr + ir * zr - ii * zi;
    const si = vi + ir * zi + ii * zr;
    const dr = vr - ir * zr - ii * wi;
    const di = vi + ir * wi - ii * zr;
    const s2 = sr * sr + si * si;
    // A perfect match at a sample has no logarithm; 1e-24 is −240 dB.
    const d2 = Math.max(dr * dr + di * di, 1e-24 * s2);
    this.#forward(f, stray, zr, zi, sr / s2, si / s2, to, false);
    this.#forward(f, stray, -zr, wi, dr / d2, di / d2, to, true);
    return log(d2 / s2);
  }

  /** Slopes of −ln|S|² written from `to` on, then those of ln|D|² added; each starts at the source as V + w·I. */
  #forward(
    f: number,
    stray: number,
    wr: number,
    wi: number,
    unitRe: number,
    unitIm: number,
    to: number,
    add: boolean,
  ): void {
    const inner = this.#inner;
    const sign = add ? 2 : -2;
    let ar = 1 - stray * wi;
    let ai = stray * wr;
    let br = wr;
    let bi = wi;
    for (let k = 0; k < this.#rows.length; k += 1) {
      const re = this.#rows[k]![2 * f]!;
      const im = this.#rows[k]![2 * f + 1]!;
      const slopeRe = this.#slopes[k]![2 * f]!;
      const slopeIm = this.#slopes[k]![2 * f + 1]!;
      const series = this.#series[k]!;
      // (α·I or β·V)·slope
      const cr = series ? ar : br;
      const ci = series ? ai : bi;
      const xr = inner[2 * k]! * slopeRe - inner[2 * k + 1]! * slopeIm;
      const xi = inner[2 * k]! * slopeIm + inner[2 * k + 1]! * slopeRe;
      const moved = unitRe * (cr * xr - ci * xi) + unitIm * (cr * xi + ci * xr);
      this.#gradients[to + k] = (add ? this.#gradients[to + k]! : 0) + sign * moved;
      if (series) {
        br += ar * re - ai * im;
        bi += ar * im + ai * re;
        ar -= stray * bi;
        ai += stray * br;
      } else {
        ar += br * re - bi * im;
        ai += br * im + bi * re;
      }
    }
  }
}

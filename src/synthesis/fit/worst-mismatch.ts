import type { Ends } from '../../network/sweep.ts';
import type { Aim } from '../../network/termination.ts';
import type { Shape } from './shape.ts';
import { exp, log } from '../../quantity/elementary.ts';

/**
 * The figure that a fit lowers: a smooth maximum of ln|Γ|² over band and load states,
 * (1/β)·ln Σ exp(β·ln|Γ|²), with its slope in the logarithm of every element value. The larger β, the closer to the
 * true maximum.
 *
 * Slopes are exact: with voltage and current carried back from the load, and the source's condition S = α·V + β·I
 * carried forward, a change δz of a series arm moves S by α·I·δz, a change δy of a shunt arm by β·V·δy.
 */
export class WorstMismatch {
  readonly #states: readonly Ends[];
  readonly #conjugate: boolean;
  readonly #series: Uint8Array;
  /** Reactance or susceptance grows with frequency: series L, shunt C. */
  readonly #growing: Uint8Array;
  /** On the load's side of each arm. */
  readonly #v: Float64Array;
  readonly #i: Float64Array;
  readonly #b: Float64Array;
  readonly #values: Float64Array;
  /** Slopes of ln|Γ|², one row a point. */
  readonly #rows: Float64Array;
  readonly #levels: Float64Array;

  /** @param states terminations over the fit's frequencies, one entry a load state */
  constructor(shape: Shape, states: readonly Ends[], aim: Aim) {
    const m = shape.length;
    this.#states = states;
    this.#conjugate = aim === 'conjugate';
    this.#series = Uint8Array.from(shape, ({ arm }) => (arm === 'series' ? 1 : 0));
    this.#growing = Uint8Array.from(shape, ({ arm, part }) => ((arm === 'series') === (part === 'inductor') ? 1 : 0));
    const points = states.reduce((sum, { frequencyHz }) => sum + frequencyHz.length, 0);
    this.#v = new Float64Array(2 * m);
    this.#i = new Float64Array(2 * m);
    this.#b = new Float64Array(m);
    this.#values = new Float64Array(m);
    this.#rows = new Float64Array(points * m);
    this.#levels = new Float64Array(points);
  }

  /**
   * @param logs  natural logarithms of the values in H and F, source side first
   * @param slope filled with the derivatives
   * @returns the smooth maximum of ln|Γ|²
   */
  at(logs: Float64Array, beta: number, slope: Float64Array): number {
    const m = logs.length;
    const values = this.#values;
    for (let k = 0; k < m; k += 1) values[k] = exp(logs[k]!);
    let row = 0;
    for (const ends of this.#states) {
      for (let f = 0; f < ends.frequencyHz.length; f += 1) {
        this.#levels[row] = this.#one(ends, f, values, row * m);
        row += 1;
      }
    }
    let top = -Infinity;
    for (let k = 0; k < row; k += 1) top = Math.max(top, this.#levels[k]!);
    let sum = 0;
    slope.fill(0);
    for (let k = 0; k < row; k += 1) {
      const weight = exp(beta * (this.#levels[k]! - top));
      if (weight < 1e-12) continue;
      sum += weight;
      for (let e = 0; e < m; e += 1) slope[e]! += weight * this.#rows[k * m + e]!;
    }
    for (let e = 0; e < m; e += 1) slope[e]! /= sum;
    return top + log(sum) / beta;
  }

  /** ln|Γ|² at one frequency of one state, and its slopes into `rows`. Scalars throughout: this is the hot loop. */
  #one(ends: Ends, f: number, values: Float64Array, at: number): number {
    const v = this.#v;
    const i = this.#i;
    const b = this.#b;
    const series = this.#series;
    const growing = this.#growing;
    const rows = this.#rows;
    const m = series.length;
    const omega = 2 * Math.PI * ends.frequencyHz[f]!;
    let vr = ends.rl[f]!;
    let vi = ends.xl[f]!;
    let ir = 1;
    let ii = 0;
    for (let k = m - 1; k >= 0; k -= 1) {
      const to = 2 * k;
      v[to] = vr;
      v[to + 1] = vi;
      i[to] = ir;
      i[to + 1] = ii;
      const bk = growing[k] === 1 ? omega * values[k]! : -1 / (omega * values[k]!);
      b[k] = bk;
      if (series[k] === 1) {
        vr -= bk * ii;
        vi += bk * ir;
      } else {
        ir -= bk * vi;
        ii += bk * vr;
      }
    }
    const zr = ends.rs[f]!;
    const zi = ends.xs[f]!;
    const wr = -zr;
    const wi = this.#conjugate ? zi : -zi;
    const sRe = vr + ir * zr - ii * zi;
    const sIm = vi + ir * zi + ii * zr;
    const dRe = vr + ir * wr - ii * wi;
    const dIm = vi + ir * wi + ii * wr;
    const s2 = sRe * sRe + sIm * sIm;
    // A perfect match at a sample has no logarithm; 1e-24 is −240 dB.
    const d2 = Math.max(dRe * dRe + dIm * dIm, 1e-24 * s2);
    const ofS = 2 / s2;
    const ofD = 2 / d2;
    // α and β of S and of D, from the source on.
    let saRe = 1;
    let saIm = 0;
    let sbRe = zr;
    let sbIm = zi;
    let daRe = 1;
    let daIm = 0;
    let dbRe = wr;
    let dbIm = wi;
    for (let k = 0; k < m; k += 1) {
      const bk = b[k]!;
      // jb grows with the logarithm of the value where b > 0 and shrinks where b < 0: by |b| either way.
      const size = Math.abs(bk);
      const to = 2 * k;
      if (series[k] === 1) {
        const cr = i[to]!;
        const ci = i[to + 1]!;
        const dS = sIm * (saRe * cr - saIm * ci) - sRe * (saRe * ci + saIm * cr);
        const dD = dIm * (daRe * cr - daIm * ci) - dRe * (daRe * ci + daIm * cr);
        rows[at + k] = size * (ofD * dD - ofS * dS);
        sbRe -= bk * saIm;
        sbIm += bk * saRe;
        dbRe -= bk * daIm;
        dbIm += bk * daRe;
      } else {
        const cr = v[to]!;
        const ci = v[to + 1]!;
        const dS = sIm * (sbRe * cr - sbIm * ci) - sRe * (sbRe * ci + sbIm * cr);
        const dD = dIm * (dbRe * cr - dbIm * ci) - dRe * (dbRe * ci + dbIm * cr);
        rows[at + k] = size * (ofD * dD - ofS * dS);
        saRe -= bk * sbIm;
        saIm += bk * sbRe;
        daRe -= bk * dbIm;
        daIm += bk * dbRe;
      }
    }
    return log(d2 / s2);
  }
}

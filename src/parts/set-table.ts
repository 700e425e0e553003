import { fillImmittance } from './immittance-of.ts';
import type { ValueProblem } from './value-problem.ts';

/** What every candidate does at every frequency, worked out when first needed, and how good a set of them is. */
export class SetTable {
  /** Of each arm: in series, not across. */
  readonly series: readonly boolean[];
  readonly #problem: ValueProblem;
  readonly #rows: (Float64Array | undefined)[][];
  readonly #set: Float64Array[] = [];

  constructor(problem: ValueProblem) {
    this.#problem = problem;
    this.series = problem.candidates.map(([part]) => part!.arm === 'series');
    this.#rows = problem.candidates.map((parts) => new Array<undefined>(parts.length).fill(undefined));
  }

  /** Immittance of a candidate at each frequency: real and imaginary part in turn, Ω or S. */
  row(arm: number, pick: number): Float64Array {
    const rows = this.#rows[arm]!;
    const known = rows[pick];
    if (known !== undefined) return known;
    const { candidates, states, f0 } = this.#problem;
    const { frequencyHz } = states[0]!;
    const row = new Float64Array(2 * frequencyHz.length);
    fillImmittance(candidates[arm]![pick]!, f0, frequencyHz, row);
    rows[pick] = row;
    return row;
  }

  /** Largest |Γ|² of a set over all frequencies and states, or the first found above the limit. */
  worst(picks: ArrayLike<number>, limit: number): number {
    const { states, strayF, aim } = this.#problem;
    const n = this.series.length;
    const rows = this.#set;
    for (let k = 0; k < n; k += 1) rows[k] = this.row(k, picks[k]!);
    let worst = 0;
    for (const { frequencyHz, rs, xs, rl, xl } of states) {
      for (let f = 0; f < frequencyHz.length; f += 1) {
        const stray = 2 * Math.PI * frequencyHz[f]! * strayF;
        let vr = rl[f]!;
        let vi = xl[f]!;
        let ir = 1;
        let ii = 0;
        for (let k = n - 1; k >= 0; k -= 1) {
          const re = rows[k]![2 * f]!;
          const im = rows[k]![2 * f + 1]!;
          if (this.series[k]!) {
            ir -= stray * vi;
            ii += stray * vr;
            vr += re * ir - im * ii;
            vi += re * ii + im * ir;
          } else {
            ir += re * vr - im * vi;
            ii += re * vi + im * vr;
          }
        }
        ir -= stray * vi;
        ii += stray * vr;
        const zr = rs[f]!;
        const zi = xs[f]!;
        const x = aim === 'conjugate' ? -zi : zi;
        const sr = vr + ir * zr - ii * zi;
        const si = vi + ir * zi + ii * zr;
        const dr = vr - ir * zr + ii * x;
        const di = vi - ir * x - ii * zr;
        worst = Math.max(worst, (dr * dr + di * di) / (sr * sr + si * si));
        if (worst > limit) return worst;
      }
    }
    return worst;
  }
}

import type { RealArm } from '../../network/real-arm.ts';
import type { Ends } from '../../network/sweep.ts';
import type { Aim } from '../../network/termination.ts';
import { aimedReflection, type Reflections } from './aimed-reflection.ts';
import { fillArm, type Board } from './board.ts';

/** An arm's immittance at each frequency, and the arm that it is of. */
interface Known {
  arm: RealArm | null;
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/**
 * Makes a function that gives a board's reflection, for the aim in force, at each frequency of `ends`. Boards that
 * differ in few arms are what it is for: the immittance of an arm is worked out when it isn't that of the board before.
 *
 * @param ends terminations at the frequencies, without what the board adds to the load
 * @returns    always the same arrays, overwritten by the next call
 */
export function boardSweep(ends: Ends, f0: number, aim: Aim): (board: Board) => Reflections {
  const { frequencyHz, rl, xl } = ends;
  const n = frequencyHz.length;
  const array = (): Float64Array => new Float64Array(n);
  const omega = frequencyHz.map((hz) => 2 * Math.PI * hz);
  const [vr, vi, ir, ii] = [array(), array(), array(), array()];
  const gamma = { re: array(), im: array() };
  const known: Known[] = [];

  /** A capacitance across: the current grows by jωC·V. */
  const across = (farad: number): void => {
    if (farad === 0) return;
    for (let k = 0; k < n; k += 1) {
      const b = omega[k]! * farad;
      ir[k]! -= b * vi[k]!;
      ii[k]! += b * vr[k]!;
    }
  };

  return ({ arms, straysF, load }) => {
    for (let k = 0; k < n; k += 1) {
      vr[k] = rl[k]! * load.resistance;
      vi[k] = xl[k]! + load.reactance + omega[k]! * load.seriesH;
    }
    ir.fill(1);
    ii.fill(0);
    across(load.parallelF);
    let node = straysF.length - 1;
    across(straysF[node]!);
    for (let at = arms.length - 1; at >= 0; at -= 1) {
      const arm = arms[at]!;
      const { re, im } = immittance(at, arm);
      // A series arm adds z·I to the voltage, a shunt arm y·V to the current.
      const [toRe, toIm, ofRe, ofIm] = arm.arm === 'series' ? [vr, vi, ir, ii] : [ir, ii, vr, vi];
      for (let k = 0; k < n; k += 1) {
        toRe[k]! += re[k]! * ofRe[k]! - im[k]! * ofIm[k]!;
        toIm[k]! += re[k]! * ofIm[k]! + im[k]! * ofRe[k]!;
      }
      if (arm.arm === 'series') across(straysF[(node -= 1)]!);
    }
    for (let k = 0; k < n; k += 1) {
      aimedReflection(k, vr[k]!, vi[k]!, ir[k]!, ii[k]!, ends, aim, gamma);
    }
    return gamma;
  };

  function immittance(at: number, arm: RealArm): Known {
    const there = (known[at] ??= { arm: null, re: array(), im: array() });
    if (there.arm !== arm) {
      fillArm(arm, f0, frequencyHz, there.re, there.im);
      there.arm = arm;
    }
    return there;
  }
}

/** Root mean square of the distance between reflections, at least one each. */
export function rmsDistance(a: Reflections, b: Reflections): number {
  let sum = 0;
  for (let k = 0; k < a.re.length; k += 1) sum += (a.re[k]! - b.re[k]!) ** 2 + (a.im[k]! - b.im[k]!) ** 2;
  return Math.sqrt(sum / a.re.length);
}

import { qAt, type RealArm, type RealLadder } from '../../network/real-arm.ts';
import type { Fault } from '../as-built-figures.ts';

/** A finished board: its parts, the capacitance of each node to ground, and how its load differs from the one stated. */
export interface Board {
  /** From the source to the load. */
  readonly arms: readonly RealArm[];
  /** F, one a node: the source's, and one after each series arm. The last is the load's. */
  readonly straysF: readonly number[];
  readonly load: {
    /** Factor of the resistance. */
    readonly resistance: number;
    /** Ω, added at every frequency. */
    readonly reactance: number;
    /** H, added in series. */
    readonly seriesH: number;
    /** F, added across. */
    readonly parallelF: number;
  };
}

/** The board as predicted. */
export function boardOf({ arms, strayF }: RealLadder): Board {
  const nodes = 1 + arms.filter(({ arm }) => arm === 'series').length;
  return {
    arms,
    straysF: new Array<number>(nodes).fill(strayF),
    load: { resistance: 1, reactance: 0, seriesH: 0, parallelF: 0 },
  };
}

/** The same board with one thing about it that isn't as predicted. */
export function withFault(board: Board, { kind, at, size }: Fault): Board {
  const arm = (changed: (a: RealArm) => RealArm): Board => ({
    ...board,
    arms: board.arms.map((a, k) => (k === at ? changed(a) : a)),
  });
  const load = (change: Partial<Board['load']>): Board => ({ ...board, load: { ...board.load, ...change } });
  switch (kind) {
    case 'value':
      return arm((a) => ({ ...a, value: a.value * size }));
    case 'quality':
      return arm((a) => ({ ...a, q: size }));
    case 'lead':
      return arm((a) => ({ ...a, seriesH: Math.max(0, a.seriesH + size) }));
    case 'stray':
      return { ...board, straysF: board.straysF.map((c, k) => (k === at ? Math.max(0, c + size) : c)) };
    case 'load resistance':
      return load({ resistance: size });
    case 'load reactance':
      return load({ reactance: size });
    case 'load inductance':
      return load({ seriesH: size });
    case 'load capacitance':
      return load({ parallelF: size });
  }
}

/** Least square of a divisor: a lossless resonance hit on the head is a very large or small impedance, and no infinity. */
const least = 1e-24;

/** Impedance of a series arm (Ω), admittance of a shunt arm (S), at each frequency. */
export function fillArm(arm: RealArm, f0: number, frequencyHz: Float64Array, re: Float64Array, im: Float64Array): void {
  const { part, value, parallelF, seriesH, qSlope } = arm;
  for (let k = 0; k < frequencyHz.length; k += 1) {
    const omega = 2 * Math.PI * frequencyHz[k]!;
    // A power at every frequency is what would take the time here.
    const q = qSlope === 0 ? arm.q : qAt(arm, f0, frequencyHz[k]!);
    let x = part === 'inductor' ? omega * value : -1 / (omega * value);
    let r = q === null ? 0 : Math.abs(x) / q;
    if (parallelF !== 0) {
      const b = omega * parallelF;
      // z/(1 + jb·z)
      const [dRe, dIm] = [1 - b * x, b * r];
      const size = Math.max(dRe * dRe + dIm * dIm, least);
      [r, x] = [(r * dRe + x * dIm) / size, (x * dRe - r * dIm) / size];
    }
    x += omega * seriesH;
    const size = arm.arm === 'series' ? 1 : Math.max(r * r + x * x, least);
    re[k] = r / size;
    im[k] = (arm.arm === 'series' ? x : -x) / size;
  }
}

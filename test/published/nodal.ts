import { abs, add, complex, divide, lusolve, subtract, type Complex } from 'mathjs';
import type { Arm } from '../../src/network/arm.ts';
import type { RealArm, RealLadder } from '../../src/network/real-arm.ts';

export interface Circuit {
  /** Source side first. */
  readonly arms: readonly Arm[];
  readonly source: { readonly r: number; readonly x: number };
  readonly load: { readonly r: number; readonly x: number };
  /** Open-circuit voltage of the source, V peak, of phase 0. */
  readonly emf: number;
}

export interface Solved {
  /** From the source's terminal to the load's, V peak. */
  readonly voltages: readonly Complex[];
  readonly zin: Complex;
  /** Load power over available power. */
  readonly gain: number;
  /** Of each arm, source side first: V peak across it, A peak through it, and the heat in it, W. */
  readonly arms: readonly { readonly volts: Complex; readonly amps: Complex; readonly watts: number }[];
}

interface Branch {
  readonly arm: Arm['arm'];
  readonly z: Complex;
}

/** Impedance of a part from its definition: ωL(1/Q + j) or (1/Q − j)/(ωC), Ω. */
function impedance({ part, value, q }: Arm, hz: number): Complex {
  const size = part === 'inductor' ? 2 * Math.PI * hz * value : 1 / (2 * Math.PI * hz * value);
  return complex(q === undefined ? 0 : size / q, part === 'inductor' ? size : -size);
}

/** Of a real part: the ideal one with its loss at that frequency, beside its own capacitance, after its leads. */
function realImpedance({ part, value, q, qSlope, parallelF, seriesH }: RealArm, f0: number, hz: number): Complex {
  const omega = 2 * Math.PI * hz;
  const ideal = impedance({ arm: 'series', part, value, ...(q === null ? {} : { q: q * (hz / f0) ** qSlope }) }, hz);
  const beside = add(divide(1, ideal) as Complex, complex(0, omega * parallelF));
  return add(divide(1, beside) as Complex, complex(0, omega * seriesH)) as Complex;
}

export const solveWithMathjs = ({ arms, ...ends }: Circuit, hz: number): Solved =>
  solve(
    arms.map((each) => ({ arm: each.arm, z: impedance(each, hz) })),
    0,
    ends,
  );

/** The same of real parts, with a stray capacitance from every node to ground. */
export const solveRealWithMathjs = (
  { arms, strayF }: RealLadder,
  ends: Omit<Circuit, 'arms'>,
  f0: number,
  hz: number,
): Solved =>
  solve(
    arms.map((each) => ({ arm: each.arm, z: realImpedance(each, f0, hz) })),
    2 * Math.PI * hz * strayF,
    ends,
  );

/**
 * Modified nodal equations solved by mathjs: the source's voltage and its own current are unknowns beside the node
 * voltages, so nothing is shared with the project's nodal solution but circuit theory.
 */
function solve(arms: readonly Branch[], strayB: number, { source, load, emf }: Omit<Circuit, 'arms'>): Solved {
  const last = 1 + arms.filter(({ arm }) => arm === 'series').length;
  const size = last + 2;
  const current = last + 1;
  const a = Array.from({ length: size }, () => Array.from({ length: size }, () => complex(0, 0)));
  const stamp = (row: number, column: number, y: Complex, sign: 1 | -1): void => {
    const cell = a[row]![column]!;
    a[row]![column] = complex(cell.re + sign * y.re, cell.im + sign * y.im);
  };
  /** A branch of impedance z between two nodes, or to ground. */
  const branch = (z: Complex, from: number, to: number | null): void => {
    const y = divide(1, z) as Complex;
    stamp(from, from, y, 1);
    if (to === null) return;
    stamp(to, to, y, 1);
    stamp(from, to, y, -1);
    stamp(to, from, y, -1);
  };
  // Node 0 is the ideal source; its current is the last unknown.
  stamp(0, current, complex(1, 0), -1);
  stamp(current, 0, complex(1, 0), 1);
  branch(complex(source.r, source.x), 0, 1);
  let node = 1;
  const ends = arms.map(({ arm, z }) => {
    const from = node;
    const to = arm === 'shunt' ? null : (node += 1);
    branch(z, from, to);
    return { from, to, z };
  });
  for (node = 1; node <= last; node += 1) stamp(node, node, complex(0, strayB), 1);
  branch(complex(load.r, load.x), last, null);
  const known = Array.from({ length: size }, (_, row) => complex(row === current ? emf : 0, 0));
  const x = (lusolve(a, known) as Complex[][]).map(([value]) => complex(value!));
  const voltages = x.slice(1, last + 1);
  const loadCurrent = divide(voltages.at(-1)!, complex(load.r, load.x)) as Complex;
  const loadW = (abs(loadCurrent) ** 2 * load.r) / 2;
  return {
    voltages,
    zin: divide(voltages[0]!, x[current]!) as Complex,
    gain: loadW / (emf ** 2 / (8 * source.r)),
    arms: ends.map(({ from, to, z }) => {
      const volts = to === null ? x[from]! : (subtract(x[from]!, x[to]!) as Complex);
      const amps = divide(volts, z) as Complex;
      return { volts, amps, watts: (abs(amps) ** 2 * z.re) / 2 };
    }),
  };
}

/** |a − b|/|b| of a mathjs number against one of the project's. */
export const apart = (found: { readonly re: number; readonly im: number }, wanted: Complex): number =>
  abs(subtract(complex(found.re, found.im), wanted) as Complex) / abs(wanted);

/** Γ = (Zin − Z)/(Zin + ZS), with Z the impedance aimed at. */
export function reflection(zin: Complex, source: { readonly r: number; readonly x: number }, aimX: number): Complex {
  const top = subtract(zin, complex(source.r, aimX)) as Complex;
  return divide(top, complex(zin.re + source.r, zin.im + source.x)) as Complex;
}

import { abs, complex, divide, lusolve, subtract, type Complex } from 'mathjs';
import type { Arm } from '../../src/network/arm.ts';

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
}

/** Impedance of a part from its definition: ωL(1/Q + j) or (1/Q − j)/(ωC), Ω. */
function impedance({ part, value, q }: Arm, hz: number): Complex {
  const size = part === 'inductor' ? 2 * Math.PI * hz * value : 1 / (2 * Math.PI * hz * value);
  return complex(q === undefined ? 0 : size / q, part === 'inductor' ? size : -size);
}

/**
 * Modified nodal equations solved by mathjs: the source's voltage and its own current are unknowns beside the node
 * voltages, so nothing is shared with the project's nodal solution but circuit theory.
 */
export function solveWithMathjs({ arms, source, load, emf }: Circuit, hz: number): Solved {
  const last = 1 + arms.filter(({ arm }) => arm === 'series').length;
  const size = last + 2;
  const current = last + 1;
  const a = Array.from({ length: size }, () => Array.from({ length: size }, () => complex(0, 0)));
  const add = (row: number, column: number, y: Complex, sign: 1 | -1): void => {
    const cell = a[row]![column]!;
    a[row]![column] = complex(cell.re + sign * y.re, cell.im + sign * y.im);
  };
  /** A branch of impedance z between two nodes, or to ground. */
  const branch = (z: Complex, from: number, to: number | null): void => {
    const y = divide(1, z) as Complex;
    add(from, from, y, 1);
    if (to === null) return;
    add(to, to, y, 1);
    add(from, to, y, -1);
    add(to, from, y, -1);
  };
  // Node 0 is the ideal source; its current is the last unknown.
  add(0, current, complex(1, 0), -1);
  add(current, 0, complex(1, 0), 1);
  branch(complex(source.r, source.x), 0, 1);
  let node = 1;
  for (const arm of arms) {
    const z = impedance(arm, hz);
    if (arm.arm === 'shunt') branch(z, node, null);
    else {
      branch(z, node, node + 1);
      node += 1;
    }
  }
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

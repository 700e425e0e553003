import { Complex } from 'complex.js';
import type { Arm } from '../network/arm.ts';
import { impedanceOf } from '../network/immittance.ts';
import { solveLinear } from './solve-linear.ts';

/** Voltages and powers of source, ladder and load as one circuit. Peak volts, W. */
export interface NodalSolution {
  /** Node voltages from the source's terminal to the load's, V (peak). */
  readonly nodes: readonly Complex[];
  readonly seen: Complex;
  readonly availableW: number;
  readonly loadW: number;
  /** Dissipated in the arms, W. */
  readonly lostW: number;
  /** Available but not taken: |Γ|² of the available power, with Γ from the voltage and current at the input, W. */
  readonly reflectedW: number;
  /** loadW / availableW */
  readonly gain: number;
}

/**
 * Nodal equations of the whole circuit, solved for every voltage at once: the source as a current of ES/ZS beside its
 * own admittance.
 *
 * @param arms       source side first
 * @param availableW power available from the source, W
 */
export function solveNodal(
  arms: readonly Arm[],
  source: Complex,
  load: Complex,
  frequencyHz: number,
  availableW: number,
): NodalSolution {
  const branches = arms.map((arm) => new Complex(1, 0).div(impedanceOf(arm, frequencyHz)));
  const n = 1 + arms.filter(({ arm }) => arm === 'series').length;
  const zero = new Complex(0, 0);
  const y = Array.from({ length: n }, () => new Array<Complex>(n).fill(zero));
  const stamp = (row: number, column: number, value: Complex): void => {
    y[row]![column] = y[row]![column]!.add(value);
  };
  stamp(0, 0, source.inverse());
  let node = 0;
  arms.forEach((arm, k) => {
    const branch = branches[k]!;
    stamp(node, node, branch);
    if (arm.arm === 'series') {
      stamp(node + 1, node + 1, branch);
      stamp(node, node + 1, branch.neg());
      stamp(node + 1, node, branch.neg());
      node += 1;
    }
  });
  stamp(n - 1, n - 1, load.inverse());

  const emf = new Complex(Math.sqrt(8 * source.re * availableW), 0);
  const injected = new Array<Complex>(n).fill(zero);
  injected[0] = emf.div(source);
  const nodes = solveLinear(y, injected);

  const power = (voltage: Complex, admittance: Complex): number => (voltage.abs() ** 2 * admittance.re) / 2;
  let lostW = 0;
  node = 0;
  arms.forEach((arm, k) => {
    const across = arm.arm === 'shunt' ? nodes[node]! : nodes[node]!.sub(nodes[node + 1]!);
    lostW += power(across, branches[k]!);
    if (arm.arm === 'series') node += 1;
  });
  const current = emf.sub(nodes[0]!).div(source);
  const reflected = nodes[0]!.sub(current.mul(source.conjugate()));
  // With peak values the available power is |ES|²/(8·RS), and |V − I·ZS*|²/(8·RS) of it comes back.
  const reflectedW = reflected.abs() ** 2 / (8 * source.re);
  const loadW = power(nodes[n - 1]!, load.inverse());
  return { nodes, seen: nodes[0]!.div(current), availableW, loadW, lostW, reflectedW, gain: loadW / availableW };
}

import { Complex } from 'complex.js';
import { heat, type Borne, type Branches } from './branch.ts';
import { solveLinear } from './solve-linear.ts';

/** Voltages and powers of source, ladder and load as one circuit. Peak volts, W. */
export interface NodalSolution {
  /** Node voltages from the source's terminal to the load's, V (peak). */
  readonly nodes: readonly Complex[];
  /** Of each arm: the difference of its nodes' voltages, and what current that drives through it. */
  readonly arms: readonly Borne[];
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
 * @param ladder     at the frequency in question
 * @param source     impedance at that frequency, Ω; `load` likewise
 * @param availableW power available from the source, W
 */
export function solveNodal(ladder: Branches, source: Complex, load: Complex, availableW: number): NodalSolution {
  const { arms, strayB } = ladder;
  const n = 1 + arms.filter(({ arm }) => arm === 'series').length;
  const zero = new Complex(0, 0);
  const y = Array.from({ length: n }, () => new Array<Complex>(n).fill(zero));
  const stamp = (row: number, column: number, value: Complex): void => {
    y[row]![column] = y[row]![column]!.add(value);
  };
  for (let node = 0; node < n; node += 1) stamp(node, node, new Complex(0, strayB));
  stamp(0, 0, source.inverse());
  const admittances = arms.map(({ z }) => z.inverse());
  let node = 0;
  arms.forEach(({ arm }, k) => {
    const branch = admittances[k]!;
    stamp(node, node, branch);
    if (arm === 'series') {
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

  node = 0;
  const borne = arms.map(({ arm, z }, k): Borne => {
    const volts = arm === 'shunt' ? nodes[node]! : nodes[node]!.sub(nodes[node + 1]!);
    if (arm === 'series') node += 1;
    const amps = volts.mul(admittances[k]!);
    return { volts, amps, watts: heat(amps, z) };
  });
  const current = emf.sub(nodes[0]!).div(source);
  const reflected = nodes[0]!.sub(current.mul(source.conjugate()));
  const loadW = heat(nodes[n - 1]!.div(load), load);
  return {
    nodes,
    arms: borne,
    seen: nodes[0]!.div(current),
    availableW,
    loadW,
    lostW: borne.reduce((sum, { watts }) => sum + watts, 0),
    // With peak values the available power is |ES|²/(8·RS), and |V − I·ZS*|²/(8·RS) of it comes back.
    reflectedW: reflected.abs() ** 2 / (8 * source.re),
    gain: loadW / availableW,
  };
}

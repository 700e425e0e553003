import { Complex } from 'complex.js';
import type { RealLadder } from '../network/real-arm.ts';
import type { Ends } from '../network/sweep.ts';
import { realBranches } from './branch.ts';
import { check, leastGain, relativeSpread, routeTolerance, type EvidenceCheck } from './evidence-check.ts';
import { solveNodal, type NodalSolution } from './nodal.ts';
import { realPoint, type RealPoint } from './real-point.ts';

/** Of the largest voltage or current in the ladder: a smaller one is compared on this scale. */
const leastPart = 1e-6;

/**
 * The network of real parts, solved by carrying voltage and current from the load to the source and by nodal equations.
 *
 * @param states source and load at the frequencies where the two are compared, one for each load state
 * @param f0     design frequency, Hz
 * @param powerW available from the source, > 0, W
 */
export function builtEvidence(
  ladder: RealLadder,
  states: readonly Ends[],
  f0: number,
  powerW: number,
): EvidenceCheck[] {
  const pairs = states.flatMap(({ frequencyHz, rs, xs, rl, xl }) =>
    Array.from(frequencyHz, (hz, k) => {
      const branches = realBranches(ladder, f0, hz);
      const source = new Complex(rs[k]!, xs[k]!);
      const load = new Complex(rl[k]!, xl[k]!);
      return {
        carried: realPoint(branches, source, load, powerW),
        nodal: solveNodal(branches, source, load, powerW),
      };
    }),
  );
  const most = (spread: (carried: RealPoint, nodal: NodalSolution) => number): number =>
    Math.max(...pairs.map(({ carried, nodal }) => spread(carried, nodal)));
  return [
    check(
      'impedance seen, real parts',
      most((carried, nodal) => relativeSpread([carried.seen, nodal.seen])),
      routeTolerance,
      'voltage and current carried from the load against nodal equations, relative to |Zin|',
    ),
    check(
      'transducer gain, real parts',
      most((carried, nodal) =>
        relativeSpread(
          [carried, nodal].map(({ gain }) => new Complex(gain, 0)),
          leastGain,
        ),
      ),
      routeTolerance,
      'the same two routes, relative to the gain or, of a smaller one, to a millionth',
    ),
    check(
      'power balance, real parts',
      most((carried, nodal) =>
        Math.max(
          ...[carried, nodal].map(
            ({ loadW, lostW, reflectedW }) => Math.abs(powerW - loadW - lostW - reflectedW) / powerW,
          ),
        ),
      ),
      routeTolerance,
      'available power against load + heat in every part + reflected, by both routes',
    ),
    check(
      'stress by nodal equations',
      most(({ arms }, nodal) =>
        Math.max(
          0,
          ...(['volts', 'amps'] as const).flatMap((what) => {
            const floor = leastPart * Math.max(...arms.map((arm) => arm[what].abs()));
            return arms.map((arm, k) => relativeSpread([arm[what], nodal.arms[k]![what]], floor));
          }),
        ),
      ),
      routeTolerance,
      'voltage across and current through each arm by both routes, relative to it or to a millionth of the largest',
    ),
  ];
}

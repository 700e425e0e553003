import { Complex } from 'complex.js';
import type { RealArm } from '../../../src/network/real-arm.ts';
import type { Ends } from '../../../src/network/sweep.ts';

const j = (x: number): Complex => new Complex(0, x);

/** Impedance of a part, written out once more. Ω */
function impedance({ part, value, q, qSlope, parallelF, seriesH }: RealArm, f0: number, hz: number): Complex {
  const omega = 2 * Math.PI * hz;
  const reactance = part === 'inductor' ? omega * value : 1 / (omega * value);
  const ideal = part === 'inductor' ? j(reactance) : j(-reactance);
  const lossy = q === null ? ideal : ideal.add(reactance / (q * (hz / f0) ** qSlope));
  const across =
    parallelF === 0
      ? lossy
      : lossy
          .inverse()
          .add(j(omega * parallelF))
          .inverse();
  return across.add(j(omega * seriesH));
}

/** Largest |Γ|² of real parts over frequencies and states, by input impedance, for the conjugate aim. */
export function plainWorst(arms: readonly RealArm[], strayF: number, states: readonly Ends[], f0: number): number {
  let worst = 0;
  for (const { frequencyHz, rs, xs, rl, xl } of states) {
    frequencyHz.forEach((hz, f) => {
      const stray = j(2 * Math.PI * hz * strayF);
      let z = new Complex(rl[f]!, xl[f]!);
      for (const arm of arms.toReversed()) {
        const own = impedance(arm, f0, hz);
        z = arm.arm === 'series' ? z.inverse().add(stray).inverse().add(own) : z.inverse().add(own.inverse()).inverse();
      }
      z = z.inverse().add(stray).inverse();
      const source = new Complex(rs[f]!, xs[f]!);
      const gamma = z.sub(source.conjugate()).div(z.add(source));
      worst = Math.max(worst, gamma.re ** 2 + gamma.im ** 2);
    });
  }
  return worst;
}

/** The `keep` smallest figures of all sets of candidates, one after another. */
export function plainBest(
  candidates: readonly (readonly RealArm[])[],
  strayF: number,
  states: readonly Ends[],
  f0: number,
  keep: number,
): number[] {
  const sets = candidates.reduce<RealArm[][]>(
    (all, parts) => all.flatMap((set) => parts.map((part) => [...set, part])),
    [[]],
  );
  return sets
    .map((set) => plainWorst(set, strayF, states, f0))
    .sort((a, b) => a - b)
    .slice(0, keep);
}

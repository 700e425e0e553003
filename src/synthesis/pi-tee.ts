import type { Complex } from 'complex.js';
import { partOf, type Arm } from '../network/arm.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import type { Absence, Candidate } from './candidate.ts';
import { parallelResistance, sum, susceptance } from './resistance-chain.ts';
import { sameArms, titleOf } from './title.ts';

/** Least Q for which a Pi (parallel resistances) or T (series resistances) of two sections exists; there is no largest. */
export function leastQ(kind: 'pi' | 'tee', target: Complex, load: Complex): number {
  const [a, b] = endsOf(kind, target, load);
  const excess = Math.max(a, b) / Math.min(a, b) - 1;
  return excess < 1e-13 ? 0 : Math.sqrt(excess);
}

const endsOf = (kind: 'pi' | 'tee', target: Complex, load: Complex): readonly [number, number] =>
  kind === 'pi' ? [parallelResistance(target), parallelResistance(load)] : [target.re, load.re];

/**
 * Pi or T networks of a chosen Q at the steeper end: two sections back to back through a virtual resistance, below both
 * ends' parallel resistances (Pi: Rv = Rhigh/(Q² + 1)) or above both series ones (T: Rv = Rlow·(Q² + 1)). Each section
 * is low-pass or high-pass, so there are four; the terminations' own reactance is absorbed in the outer arms
 * (C. Bowick, RF Circuit Design, Sams 1982, ch. 4).
 *
 * @param target impedance to be seen from the source, Ω
 * @param load   Ω
 * @param q      Q at the steeper end, above the least
 */
export function piTee(
  kind: 'pi' | 'tee',
  target: Complex,
  load: Complex,
  frequencyHz: number,
  q: number,
): { readonly candidates: readonly Candidate[]; readonly absent: readonly Absence[] } {
  const name = kind === 'pi' ? 'Pi' : 'T';
  const least = leastQ(kind, target, load);
  const [atSource, atLoad] = endsOf(kind, target, load);
  if (q < least * (1 - 1e-12) || q === 0) {
    const [more, less] = [Math.max(atSource, atLoad), Math.min(atSource, atLoad)];
    return {
      candidates: [],
      absent: [
        {
          form: `${name} of Q ${formatFixed(q, 3)}`,
          why: `needs Q ≥ √(Rhigh/Rlow − 1) = ${formatFixed(least, 3)} for ${formatQuantity(more, 'Ω')} and ${formatQuantity(less, 'Ω')}`,
        },
      ],
    };
  }
  const virtual = kind === 'pi' ? Math.max(atSource, atLoad) / (q * q + 1) : Math.min(atSource, atLoad) * (q * q + 1);
  const qAt = (r: number): number => Math.sqrt(Math.max(0, (kind === 'pi' ? r / virtual : virtual / r) - 1));
  const [qs, ql] = [qAt(atSource), qAt(atLoad)];
  const candidates: Candidate[] = [];
  for (const signs of [
    [1, 1],
    [1, -1],
    [-1, 1],
    [-1, -1],
  ] as const) {
    const arms = armsOf(kind, target, load, frequencyHz, { virtual, qs, ql, atSource, atLoad, signs });
    if (candidates.some((other) => sameArms(other.arms, arms))) continue;
    const way = (sign: 1 | -1): string => (sign > 0 ? 'plus' : 'minus');
    candidates.push({
      id: `${kind}-source-${way(signs[0])}-load-${way(signs[1])}`,
      title: `${name}: ${titleOf(arms).toLowerCase().replace(/\bl\b/gu, 'L').replace(/\bc\b/gu, 'C')}`,
      arms,
      sections: 2,
      sectionQ: Math.max(qs, ql),
    });
  }
  return { candidates, absent: [] };
}

function armsOf(
  kind: 'pi' | 'tee',
  target: Complex,
  load: Complex,
  frequencyHz: number,
  given: {
    readonly virtual: number;
    readonly qs: number;
    readonly ql: number;
    readonly atSource: number;
    readonly atLoad: number;
    readonly signs: readonly [1 | -1, 1 | -1];
  },
): Arm[] {
  const { virtual, qs, ql, atSource, atLoad, signs } = given;
  const [s, l] = [signs[0] * qs, signs[1] * ql];
  const arms =
    kind === 'pi'
      ? [
          partOf('shunt', sum(s / atSource, susceptance(target)), frequencyHz),
          partOf('series', sum(s * virtual, l * virtual), frequencyHz),
          partOf('shunt', sum(l / atLoad, -susceptance(load)), frequencyHz),
        ]
      : [
          partOf('series', sum(s * atSource, target.im), frequencyHz),
          partOf('shunt', sum(s / virtual, l / virtual), frequencyHz),
          partOf('series', sum(l * atLoad, -load.im), frequencyHz),
        ];
  return arms.filter((arm): arm is Arm => arm !== null);
}

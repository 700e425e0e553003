import type { Complex } from 'complex.js';
import type { Absence, Candidate, Synthesis } from './candidate.ts';
import { chainArms, chainBetween, sectionQ, whyNoChain } from './resistance-chain.ts';
import { sameArms, titleOf } from './title.ts';

/**
 * Every lossless network of at most two elements between two complex terminations at one frequency: at most four, at
 * least one, those of fewest parts first. A double root counts once; a network that two forms share is listed under the
 * first.
 *
 * @param target impedance to be seen from the source, Ω
 * @param load   Ω
 */
export function twoElement(target: Complex, load: Complex, frequencyHz: number): Synthesis {
  const candidates: Candidate[] = [];
  const absent: Absence[] = [];
  for (const shuntAt of ['load', 'source'] as const) {
    const chain = chainBetween(target, load, shuntAt);
    const q = sectionQ(chain, 1);
    if (q === null) {
      absent.push({
        form:
          shuntAt === 'load' ? 'series arm, then shunt arm at the load' : 'shunt arm at the source, then series arm',
        why: whyNoChain(chain),
      });
      continue;
    }
    for (const sign of [1, -1] as const) {
      const arms = chainArms(chain, target, load, frequencyHz, 1, q, sign);
      if (candidates.some((other) => sameArms(other.arms, arms))) continue;
      candidates.push({
        id: arms.length === 0 ? 'direct' : `shunt-${shuntAt}-${sign > 0 ? 'plus' : 'minus'}`,
        title: titleOf(arms),
        arms,
        sections: arms.length === 0 ? 0 : 1,
        sectionQ: q,
      });
    }
  }
  return { candidates: candidates.toSorted((a, b) => a.arms.length - b.arms.length), absent };
}

import type { Complex } from 'complex.js';
import type { Absence, Candidate } from './candidate.ts';
import { chainArms, chainBetween, sectionQ, whyNoChain, type ShuntAt } from './resistance-chain.ts';
import { sameArms, titleOf } from './title.ts';

/** Most sections that are offered. */
export const mostSections = 6;

export interface CascadeCandidate extends Candidate {
  readonly pass: 'low-pass' | 'high-pass';
  readonly shuntAt: ShuntAt;
}

/**
 * Two-element sections in cascade through Rk = Rlow^(1−k/n)·Rhigh^(k/n), so that every section has the same Q; low-pass
 * and high-pass, with the shunt arm at either end where the ends' series and parallel resistances allow it.
 *
 * @param target   impedance to be seen from the source, Ω
 * @param load     Ω
 * @param sections each of 1 to 6, in the order in which they are to be listed
 */
export function cascade(
  target: Complex,
  load: Complex,
  frequencyHz: number,
  sections: readonly number[],
): { readonly candidates: readonly CascadeCandidate[]; readonly absent: readonly Absence[] } {
  const candidates: CascadeCandidate[] = [];
  const absent: Absence[] = [];
  const chains = (['load', 'source'] as const).map((shuntAt) => chainBetween(target, load, shuntAt));
  for (const chain of chains) {
    if (sectionQ(chain, 1) === null) {
      absent.push({ form: `sections with the shunt arm at the ${chain.shuntAt}`, why: whyNoChain(chain) });
    }
  }
  for (const n of sections) {
    for (const chain of chains) {
      const q = sectionQ(chain, n);
      if (q === null) continue;
      for (const pass of ['low-pass', 'high-pass'] as const) {
        const arms = chainArms(chain, target, load, frequencyHz, n, q, pass === 'low-pass' ? 1 : -1);
        if (candidates.some((other) => sameArms(other.arms, arms))) continue;
        const count = `${String(n)} section${n === 1 ? '' : 's'}`;
        candidates.push({
          id: arms.length === 0 ? 'direct' : `${pass}-${String(n)}-shunt-${chain.shuntAt}`,
          title: arms.length === 0 ? titleOf([]) : `${count}, ${pass}, shunt arm at the ${chain.shuntAt}`,
          arms,
          sections: arms.length === 0 ? 0 : n,
          sectionQ: q,
          pass,
          shuntAt: chain.shuntAt,
        });
      }
    }
  }
  // Where an end leaves nothing of an outer arm, and where no part is needed at all, the simpler network stands first.
  const ordered = candidates.toSorted((a, b) => a.sections - b.sections || a.arms.length - b.arms.length);
  return { candidates: ordered, absent };
}

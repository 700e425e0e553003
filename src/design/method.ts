import type { Complex } from 'complex.js';
import type { Option } from '../dossier.ts';
import { partsOf } from '../network/circuit-model.ts';
import { isModel, isOneImpedance, type Behaviour, type Termination } from '../network/termination.ts';
import { isResistive } from '../network/termination-at.ts';
import type { DesignRecord } from '../record/design-record.ts';
import type { Absence, Candidate } from '../synthesis/candidate.ts';
import { cascade, mostSections, type CascadeCandidate } from '../synthesis/cascade.ts';
import type { equalRipple } from '../synthesis/equal-ripple.ts';
import { leastQ, piTee } from '../synthesis/pi-tee.ts';
import { resistivePair } from '../synthesis/resistive-pair.ts';
import { sameArms } from '../synthesis/title.ts';
import { twoElement } from '../synthesis/two-element.ts';

export interface FoundCandidate extends Candidate {
  readonly method: Option['method'];
  /** Of a cascade or an equal-ripple ladder. */
  readonly pass?: 'low-pass' | 'high-pass';
  readonly shuntAt?: CascadeCandidate['shuntAt'];
}

export interface Found {
  /** In the order in which they are considered. */
  readonly candidates: readonly FoundCandidate[];
  readonly absent: readonly Absence[];
}

const allSections: readonly number[] = Array.from({ length: mostSections }, (_, k) => k + 1);

/** Q taken for Pi and T where the engineer leaves it open. */
export const openQ = (least: number): number => Math.max(1.5 * least, 2);

type ClosedMethod = Exclude<Option['method'], 'fitted'>;

/** The method itself, given by the caller: it is large, and takes long. */
type EqualRipple = typeof equalRipple;

/** Closed-form networks for the first load state; of cascades and equal ripple, of every number of sections. */
export function closedForms(record: DesignRecord, target: Complex, load: Complex, ripple: EqualRipple): Found {
  if (record.method === 'fitted') return { candidates: [], absent: [] };
  if (record.method !== 'all') return closedForm(record.method, record, target, load, ripple);
  const resistive = isResistive(record.source) && isResistive(record.loads[0]!.termination);
  const methods: readonly ClosedMethod[] = [
    resistive ? 'resistive-pair' : 'two-element',
    'pi',
    'tee',
    'cascade',
    ...(record.requirement.bandHz === null ? [] : (['equal-ripple'] as const)),
  ];
  const candidates: FoundCandidate[] = [];
  const absent: Absence[] = [];
  for (const method of methods) {
    const found = closedForm(method, record, target, load, ripple);
    absent.push(...found.absent);
    for (const candidate of found.candidates) {
      // One section is a two-element network, and a Pi or T whose outer arm vanishes too: each network is listed once.
      if (!candidates.some(({ arms }) => sameArms(arms, candidate.arms))) candidates.push(candidate);
    }
  }
  return { candidates, absent };
}

function closedForm(
  method: ClosedMethod,
  record: DesignRecord,
  target: Complex,
  load: Complex,
  ripple: EqualRipple,
): Found {
  const { frequencyHz: f0, bandHz } = record.requirement;
  const named = (found: { readonly candidates: readonly Candidate[]; readonly absent: readonly Absence[] }): Found => ({
    candidates: found.candidates.map((candidate) => ({ ...candidate, method })),
    absent: found.absent,
  });
  switch (method) {
    case 'two-element':
      return named(twoElement(target, load, f0));
    case 'resistive-pair':
      return named(resistivePair(target.re, load.re, f0));
    case 'pi':
    case 'tee':
      return named(piTee(method, target, load, f0, record.q ?? openQ(leastQ(method, target, load))));
    case 'cascade':
      return named(cascade(target, load, f0, allSections));
    case 'equal-ripple': {
      const end = (z: Complex, termination: Termination) => ({ z, behaviour: behaviourOf(termination) });
      if (record.aim === 'reflectionless' && !isResistive(record.source)) {
        const why =
          "needs the conjugate aim: absorbing the source's reactance in an outer element matches it for power";
        return { candidates: [], absent: [{ form: 'equal ripple', why }] };
      }
      // Band edges are there: the schema asks for them with this method.
      return named(
        ripple(
          end(target.conjugate(), record.source),
          end(load, record.loads[0]!.termination),
          f0,
          bandHz!,
          allSections,
        ),
      );
    }
  }
}

/** How a reactance varies, as far as an outer element can absorb it: that of one part, in series or in parallel. */
function behaviourOf(termination: Termination): Behaviour {
  if (isOneImpedance(termination)) return termination.behaviour;
  if (isModel(termination)) {
    const { arrangement, l, c, c0 } = partsOf(termination);
    if (c0 === null && (l === null || c === null)) return arrangement;
  }
  return 'constant';
}

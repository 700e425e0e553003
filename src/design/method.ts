import type { Complex } from 'complex.js';
import type { DesignRecord } from '../record/design-record.ts';
import type { Absence, Candidate } from '../synthesis/candidate.ts';
import { cascade, mostSections, type CascadeCandidate } from '../synthesis/cascade.ts';
import { resistivePair } from '../synthesis/resistive-pair.ts';
import { twoElement } from '../synthesis/two-element.ts';

export interface Found {
  /** In the order in which they are considered. */
  readonly candidates: readonly Candidate[];
  readonly absent: readonly Absence[];
  /** Cascade only: the same candidates, with what a cascade says of them. */
  readonly cascades: readonly CascadeCandidate[] | null;
}

const allSections: readonly number[] = Array.from({ length: mostSections }, (_, k) => k + 1);

/** Every network that the record's method finds; of cascades, those of every number of sections. */
export function synthesise(record: DesignRecord, target: Complex, load: Complex): Found {
  const f0 = record.requirement.frequencyHz;
  switch (record.method) {
    case 'two-element':
      return { ...twoElement(target, load, f0), cascades: null };
    case 'resistive-pair':
      return { ...resistivePair(target.re, load.re, f0), cascades: null };
    case 'cascade': {
      const found = cascade(target, load, f0, allSections);
      return { ...found, cascades: found.candidates };
    }
  }
}

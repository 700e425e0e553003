import type { Complex } from 'complex.js';
import type { DesignRecord } from '../record/design-record.ts';
import type { Synthesis } from '../synthesis/candidate.ts';
import { cascade, mostSections } from '../synthesis/cascade.ts';
import { resistivePair } from '../synthesis/resistive-pair.ts';
import { twoElement } from '../synthesis/two-element.ts';

/** Every network that the record's method finds, in the order in which they are considered. */
export function synthesise(record: DesignRecord, target: Complex, load: Complex): Synthesis {
  const f0 = record.requirement.frequencyHz;
  switch (record.method) {
    case 'two-element':
      return twoElement(target, load, f0);
    case 'resistive-pair':
      return resistivePair(target.re, load.re, f0);
    case 'cascade':
      return cascade(target, load, f0, record.sections === 'auto' ? allSections : [record.sections]);
  }
}

export const allSections: readonly number[] = Array.from({ length: mostSections }, (_, k) => k + 1);

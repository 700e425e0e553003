import type { Reference } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';

/** Standards and published methods really applied to this record, each with what it was applied for. */
export function referencesOf({ method, source, load }: DesignRecord): Reference[] {
  const q = 'the single-parameter Q method (common practice)';
  const methodReference: Record<DesignRecord['method'], Reference> = {
    'two-element': {
      title: 'G. Gonzalez, Microwave Transistor Amplifiers, 2nd ed., Prentice Hall 1997, ch. 2',
      appliedFor: 'two-element networks between complex terminations',
    },
    'resistive-pair': { title: 'C. Bowick, RF Circuit Design, Sams 1982, ch. 4', appliedFor: q },
    cascade: {
      title: 'C. Bowick, RF Circuit Design, Sams 1982, ch. 4',
      appliedFor: 'sections in cascade through equal resistance ratios',
    },
  };
  const references: Reference[] = [
    methodReference[method],
    {
      title: 'D. M. Pozar, Microwave Engineering, 4th ed., Wiley 2012, ch. 4 and 12',
      appliedFor: 'S-parameters of the arms and transducer gain (second route of the evidence)',
    },
    { title: 'IEC 60617', appliedFor: 'graphical symbols of the schematic' },
    { title: 'ISO 7200', appliedFor: 'data fields of the title block' },
    { title: 'RFC 8785', appliedFor: 'canonical form of the record' },
    { title: 'FIPS 180-4', appliedFor: 'SHA-256 digest of the record' },
  ];
  if (method !== 'resistive-pair' && source.x === 0 && load.x === 0) {
    references.splice(1, 0, { title: 'C. Bowick, RF Circuit Design, Sams 1982, ch. 4', appliedFor: q });
  }
  return references;
}

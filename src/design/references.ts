import type { Reference } from '../dossier.ts';
import { isMeasured } from '../network/termination.ts';
import type { Build, DesignRecord, Method } from '../record/design-record.ts';

const gonzalez: Reference = {
  title: 'G. Gonzalez, Microwave Transistor Amplifiers, 2nd ed., Prentice Hall 1997, ch. 2',
  appliedFor: 'two-element networks between complex terminations',
};
const bowick = (appliedFor: string): Reference => ({
  title: 'C. Bowick, RF Circuit Design, Sams 1982, ch. 4',
  appliedFor,
});
const qMethod = bowick('the single-parameter Q method (common practice)');
const piTee = bowick('Pi and T networks of a chosen Q');
const cascade = bowick('sections in cascade through equal resistance ratios');
const matthaei: Reference = {
  title: 'G. L. Matthaei, Proc. IEEE 52, 1964',
  appliedFor: 'equal-ripple ladders between resistances',
};
const fitted: Reference = {
  title: 'J. Nocedal and S. J. Wright, Numerical Optimization, 2nd ed., Springer 2006, ch. 6',
  appliedFor: 'search of the fitted networks',
};

const ofMethod: Readonly<Record<Method, readonly Reference[]>> = {
  'two-element': [gonzalez],
  'resistive-pair': [qMethod],
  pi: [piTee],
  tee: [piTee],
  cascade: [cascade],
  'equal-ripple': [matthaei],
  fitted: [fitted],
  all: [gonzalez, piTee, cascade, matthaei, fitted],
};

/** Standards and methods of real parts that this policy applies. */
function ofBuild({ inductor, capacitor, seed }: Build, yieldAssessed: boolean): readonly Reference[] {
  const isSeries = (origin: string): boolean => /^E\d+$/u.test(origin);
  const kinds = [inductor, capacitor];
  return [
    ...(kinds.some(({ origin }) => isSeries(origin))
      ? [{ title: 'IEC 60063:2015', appliedFor: 'preferred values of the parts' }]
      : []),
    { title: 'JCGM 101:2008', appliedFor: `networks drawn from the tolerances (seed ${String(seed)})` },
    {
      title: 'J. K. Salmon et al., Proc. SC 2011 (Philox4x32-10)',
      appliedFor: 'the numbers that they are drawn with',
    },
    ...(yieldAssessed
      ? [{ title: 'C. J. Clopper and E. S. Pearson, Biometrika 26, 1934', appliedFor: 'interval of the yield' }]
      : []),
    ...(inductor.origin === 'wound'
      ? [
          {
            title: 'H. A. Wheeler, Proc. IRE 16, 1928; R. G. Medhurst, Wireless Engineer 24, 1947',
            appliedFor: 'coils to be wound: turns and self-capacitance',
          },
        ]
      : []),
  ];
}

/** Standards and published methods really applied to this record, each with what it was applied for. */
export function referencesOf(
  { method, source, loads, build, requirement, asBuilt }: DesignRecord,
  { ceiling, pairChecked, real }: { readonly ceiling: boolean; readonly pairChecked: boolean; readonly real: boolean },
): Reference[] {
  const measured = [source, ...loads.map(({ termination }) => termination)].filter(isMeasured);
  const files = [
    ...measured.map((termination) => termination.measured),
    ...(asBuilt === null ? [] : [asBuilt.measured]),
  ];
  const touchstone = files.some(({ name }) => /\.s\d+p\b/iu.test(name));
  return [
    ...ofMethod[method],
    ...(pairChecked && method !== 'resistive-pair' ? [qMethod] : []),
    ...(ceiling
      ? [
          {
            title: 'H. W. Bode 1945; R. M. Fano, J. Franklin Institute 249, 1950',
            appliedFor: 'the ceiling over the band',
          },
        ]
      : []),
    ...(measured.length > 0
      ? [
          {
            title: 'F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput. 5, 1984',
            appliedFor: 'interpolation between measured samples',
          },
        ]
      : []),
    ...(touchstone ? [{ title: 'Touchstone, IBIS Open Forum', appliedFor: 'measured data' }] : []),
    ...(build !== null && real ? ofBuild(build, requirement.returnLossDb !== null) : []),
    {
      title: 'D. M. Pozar, Microwave Engineering, 4th ed., Wiley 2012, ch. 4 and 12',
      appliedFor: 'S-parameters of the arms and transducer gain (third route of the evidence)',
    },
    { title: 'IEC 60617', appliedFor: 'graphical symbols of the schematic' },
    { title: 'ISO 7200', appliedFor: 'data fields of the title block' },
    { title: 'RFC 8785', appliedFor: 'canonical form of the record' },
    { title: 'FIPS 180-4', appliedFor: 'SHA-256 digest of the record' },
    { title: 'ISO 32000-1:2008', appliedFor: 'PDF: attached files, signature fields, tagged structure' },
    { title: 'ISO 16684-1', appliedFor: 'metadata of the PDF (XMP)' },
  ];
}

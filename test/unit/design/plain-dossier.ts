import type { Built, Dossier, Option } from '../../../src/dossier.ts';
import { plainRecord } from '../record/plain-record.ts';

const halfPower = { lowHz: null, highHz: null, bandwidthHz: null, peakHz: 151.25e6, peakGain: 1, words: 'none' };

/** Written by hand; its figures belong to no real network. */
export const plainOption: Option = {
  id: 'series-shunt',
  title: 'Series L, shunt C',
  arms: [
    { arm: 'series', part: 'inductor', value: 84.63e-9 },
    { arm: 'shunt', part: 'capacitor', value: 43.71e-12 },
  ],
  designators: ['L1', 'C1'],
  method: 'two-element',
  sections: 1,
  form: 'low-pass',
  states: [],
  worstState: '',
  seen: { r: 50, x: 0 },
  transducerGain: 1,
  reflection: 0,
  worstReturnLossDb: 17.253,
  worstAtHz: 152e6,
  halfPower,
  loadedQ: 1.04,
  bandwidthFromQHz: 145e6,
  bandwidthNote: '',
  harmonicDb: [],
  lossDb: 0.213,
  ceilingGapDb: 12,
  dc: { blocked: false, sourceShorted: false, loadShorted: false, words: '' },
  built: null,
  meets: true,
  checks: [{ subject: 'return loss', verdict: 'meets', reason: 'return loss 17.25 dB at worst' }],
  reasons: ['return loss 17.25 dB at worst'],
  cautions: [],
};

export const plainBuilt: Built = {
  parts: [
    {
      designator: 'L1',
      armIndex: 0,
      arm: 'series',
      part: 'inductor',
      value: 82e-9,
      from: 'E24',
      pair: null,
      tolerance: { kind: 'relative', value: 0.05 },
      q: 50,
      selfResonanceHz: null,
      ratedVolts: null,
      ratedAmps: null,
    },
  ],
  ladder: { arms: [], strayF: 0 },
  sets: [],
  set: 1,
  searchWords: '',
  worstReturnLossDb: 15.5,
  worstAtHz: 152e6,
  worstState: '',
  centring: { idealDb: 17, realDb: 16, values: [], centredDb: 16, roundingDb: 0.5 },
  lossDb: 0.31,
  efficiency: 0.93,
  yield: { value: 0.932, low: 0.914, high: 0.947, confidence: 0.95, samples: 1000, passed: 932, seed: 1 },
  percentiles: null,
  corners: null,
  sensitivity: [],
  tighten: '',
  stress: {
    powerW: 2,
    vswr: null,
    parts: [
      { designator: 'L1', voltsPeak: 22.5, ampsRms: 0.2, watts: 0.05, mismatched: null, limitW: 8, limitBy: 'current' },
    ],
    first: { designator: 'L1', by: 'current', powerW: 8 },
    within: true,
    words: 'every part is within its derated rating at 2 W',
  },
  bias: [],
  coils: [],
};

export const plainDossier: Dossier = {
  schema: 'ferrule-dossier/1',
  version: '1.2.3',
  record: plainRecord,
  digest: '0123456789abcdef'.repeat(4),
  assumptions: [],
  ceiling: {
    bestReflection: 0.01,
    perResonators: [],
    governs: 'load',
    state: '',
    q: 6.5,
    fractionalWidth: 0.01,
    estimate: false,
    needs: 1,
    verdict: 'room to spare',
    words: '',
    basis: '',
  },
  noCeiling: '',
  options: [plainOption],
  absent: [],
  minimum: '',
  sections: null,
  proposed: 'series-shunt',
  chosen: 'series-shunt',
  chosenBy: 'proposal',
  responses: [],
  evidence: {
    frequenciesHz: [151.25e6],
    routes: [],
    checks: [{ subject: 'power balance', spread: 1e-15, tolerance: 1e-9, pass: true, note: '' }],
    pass: true,
  },
  cautions: [],
  references: [],
};

/** The dossier with its one network put otherwise. */
export const withOption = (change: Partial<Option>, dossier: Dossier = plainDossier): Dossier => ({
  ...dossier,
  options: [{ ...plainOption, ...change }],
});

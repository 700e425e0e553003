import type { Built, BuiltPart } from '../../../src/dossier.ts';

const capacitor: BuiltPart = {
  designator: 'C1',
  armIndex: 0,
  arm: 'series',
  part: 'capacitor',
  value: 8.2e-12,
  from: 'E24',
  pair: null,
  tolerance: { kind: 'relative', value: 0.02 },
  q: 300,
  selfResonanceHz: null,
  ratedVolts: 100,
  ratedAmps: null,
};
const inductor: BuiltPart = {
  ...capacitor,
  designator: 'L1',
  armIndex: 1,
  arm: 'shunt',
  part: 'inductor',
  value: 46.58123e-9,
  from: 'exact',
  tolerance: { kind: 'absolute', value: 2e-9 },
  q: 48.2,
  ratedVolts: null,
};

/** A series capacitor on sale and a shunt inductor of an exact value; figures chosen to be told apart. */
export const built: Built = {
  parts: [capacitor, inductor],
  ladder: { arms: [], strayF: 0 },
  sets: [],
  set: 0,
  searchWords: '',
  worstReturnLossDb: 18.256,
  worstAtHz: 152e6,
  worstState: '',
  centring: { idealDb: 27.234, realDb: 20.36, values: [8.31e-12, 44.2e-9], centredDb: 28.78, roundingDb: 10.52 },
  lossDb: 0.757,
  efficiency: 0.84,
  yield: { value: 0.706, low: 0.6767, high: 0.7341, confidence: 0.95, samples: 1000, passed: 706, seed: 1 },
  percentiles: null,
  corners: {
    worstReturnLossDb: 10.43,
    worstAtHz: 152e6,
    worstState: 'in hand',
    words: 'C1 +2 %, L1 +5 %',
    meets: false,
  },
  sensitivity: [
    { designator: 'L1', dbPerPercent: -2.48, dbPerMinusPercent: 2.2, atToleranceDb: 10.256, yieldIfHalved: 0.936 },
    { designator: 'C1', dbPerPercent: 0.24, dbPerMinusPercent: -0.25, atToleranceDb: 16.256, yieldIfHalved: null },
  ],
  tighten: '',
  stress: {
    powerW: 2,
    vswr: 3,
    parts: [
      {
        designator: 'C1',
        voltsPeak: 34.1,
        ampsRms: 0.187,
        watts: 0.0151,
        mismatched: { voltsPeak: 61.2, ampsRms: 0.33, watts: 0.049 },
        limitW: 1.25,
        limitBy: 'voltage',
      },
      { designator: 'L1', voltsPeak: 37, ampsRms: 0.588, watts: 0.307, mismatched: null, limitW: null, limitBy: null },
    ],
    first: { designator: 'C1', by: 'voltage', powerW: 1.25 },
    within: false,
    words: '',
  },
  bias: [],
  coils: [],
};

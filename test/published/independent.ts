import type { Arm } from '../../src/network/arm.ts';
import type { Aim } from '../../src/network/termination.ts';

interface Figures {
  readonly arms: readonly Arm[];
  /** Impedance seen from the source, Ω. */
  readonly zin: { readonly r: number; readonly x: number };
  readonly transducerGain: number;
  /** The same with a Q of 80 in every part. */
  readonly transducerGainAllPartsQ80: number;
  /** Half-power edges with terminations that don't vary, Hz; null: none on that side. Conjugate aim only. */
  readonly halfPowerHz?: readonly [number | null, number | null];
}

interface Case {
  readonly source: { readonly r: number; readonly x: number };
  readonly load: { readonly r: number; readonly x: number };
  readonly frequencyHz: number;
  readonly aim: Aim;
  readonly networks: readonly Figures[];
}

/**
 * Two-element networks computed apart from this project with NumPy/SciPy nodal analysis (NumPy 1.24, SciPy 1.10;
 * numpy.linalg.solve). SI units; arms run from source to load.
 */
export const independent: readonly Case[] = [
  {
    source: { r: 50.0, x: 0.0 },
    load: { r: 9.4, x: -61.0 },
    frequencyHz: 151250000.0,
    aim: 'conjugate',
    networks: [
      {
        arms: [
          { arm: 'series', part: 'inductor', value: 1.4024178927000008e-7 },
          { arm: 'shunt', part: 'inductor', value: 1.1151916953546445e-7 },
        ],
        zin: { r: 50.00000000000001, x: 0.0 },
        transducerGain: 0.9999999999999998,
        transducerGainAllPartsQ80: 0.923390451937713,
        halfPowerHz: [102192220.7033978, 201033492.70176694],
      },
      {
        arms: [
          { arm: 'series', part: 'capacitor', value: 7.89536210015093e-12 },
          { arm: 'shunt', part: 'inductor', value: 4.657962179467625e-8 },
        ],
        zin: { r: 50.00000000000001, x: 0.0 },
        transducerGain: 0.9999999999999998,
        transducerGainAllPartsQ80: 0.8667885006160323,
        halfPowerHz: [130575739.5273162, 191327932.94368935],
      },
      {
        arms: [
          { arm: 'shunt', part: 'capacitor', value: 4.373748776171954e-11 },
          { arm: 'series', part: 'inductor', value: 8.47447285280453e-8 },
        ],
        zin: { r: 49.99999999999997, x: -1.2560739669470191e-14 },
        transducerGain: 0.9999999999999998,
        transducerGainAllPartsQ80: 0.8787036847843177,
        halfPowerHz: [114402528.90706502, 177988189.7304677],
      },
      {
        arms: [
          { arm: 'shunt', part: 'inductor', value: 2.531603355666032e-8 },
          { arm: 'series', part: 'inductor', value: 4.363149003202895e-8 },
        ],
        zin: { r: 49.99999999999997, x: -3.454203409104303e-14 },
        transducerGain: 0.9999999999999998,
        transducerGainAllPartsQ80: 0.9233346920877191,
        halfPowerHz: [112818747.85880601, 223995493.26516867],
      },
    ],
  },
  {
    source: { r: 50.0, x: 0.0 },
    load: { r: 1500.0, x: 0.0 },
    frequencyHz: 10700000.0,
    aim: 'conjugate',
    networks: [
      {
        arms: [
          { arm: 'series', part: 'inductor', value: 4.005026160840979e-6 },
          { arm: 'shunt', part: 'capacitor', value: 5.340034881121305e-11 },
        ],
        zin: { r: 49.999999999999986, x: 2.826166425630794e-14 },
        transducerGain: 0.9999999999999998,
        transducerGainAllPartsQ80: 0.877731809700041,
        halfPowerHz: [8440532.06981637, 12559355.82899749],
      },
      {
        arms: [
          { arm: 'series', part: 'capacitor', value: 5.524174014953074e-11 },
          { arm: 'shunt', part: 'inductor', value: 4.143130511214806e-6 },
        ],
        zin: { r: 50.00000000000001, x: 3.454203409104305e-14 },
        transducerGain: 1.0,
        transducerGainAllPartsQ80: 0.8777318097000407,
        halfPowerHz: [9115913.40123782, 13564310.771285534],
      },
    ],
  },
  {
    source: { r: 12.5, x: 0.0 },
    load: { r: 50.0, x: 0.0 },
    frequencyHz: 435000000.0,
    aim: 'conjugate',
    networks: [
      {
        arms: [
          { arm: 'series', part: 'inductor', value: 7.921392175600463e-9 },
          { arm: 'shunt', part: 'capacitor', value: 1.2674227480960738e-11 },
        ],
        zin: { r: 12.499999999999996, x: 3.1401849173675487e-15 },
        transducerGain: 1.0,
        transducerGainAllPartsQ80: 0.9579610863427447,
        halfPowerHz: [null, 664473476.6110054],
      },
      {
        arms: [
          { arm: 'series', part: 'capacitor', value: 1.6898969974614316e-11 },
          { arm: 'shunt', part: 'inductor', value: 1.0561856234133948e-8 },
        ],
        zin: { r: 12.499999999999996, x: -3.1401849173675487e-15 },
        transducerGain: 1.0,
        transducerGainAllPartsQ80: 0.9579610863427447,
        halfPowerHz: [284774346.60117614, null],
      },
    ],
  },
  {
    source: { r: 50.0, x: 0.0 },
    load: { r: 0.8, x: 48.0 },
    frequencyHz: 13560000.0,
    aim: 'conjugate',
    networks: [
      {
        arms: [
          { arm: 'series', part: 'inductor', value: 4.415704857311441e-6 },
          { arm: 'shunt', part: 'capacitor', value: 2.751109098365975e-10 },
        ],
        zin: { r: 50.00000000000001, x: 2.51214793389404e-13 },
        transducerGain: 0.9999999999999996,
        transducerGainAllPartsQ80: 0.4629906632351508,
        halfPowerHz: [13188440.70067147, 13914266.942054503],
      },
      {
        arms: [
          { arm: 'series', part: 'capacitor', value: 3.11975756486607e-11 },
          { arm: 'shunt', part: 'capacitor', value: 2.137987068747614e-10 },
        ],
        zin: { r: 50.00000000000004, x: -2.574951632241393e-13 },
        transducerGain: 0.9999999999999993,
        transducerGainAllPartsQ80: 0.5285147021097463,
        halfPowerHz: [13120804.908371564, 14029242.667764816],
      },
      {
        arms: [
          { arm: 'shunt', part: 'capacitor', value: 1.8408906658658606e-9 },
          { arm: 'series', part: 'capacitor', value: 2.8128795577375106e-10 },
        ],
        zin: { r: 50.000000000000114, x: -5.495323605393225e-13 },
        transducerGain: 0.9999999999999998,
        transducerGainAllPartsQ80: 0.5285709559850161,
        halfPowerHz: [13106512.909091804, 14013801.869564394],
      },
      {
        arms: [
          { arm: 'shunt', part: 'inductor', value: 7.48329538969862e-8 },
          { arm: 'series', part: 'capacitor', value: 2.162571988899775e-10 },
        ],
        zin: { r: 49.999999999999964, x: -1.7899054028995026e-13 },
        transducerGain: 1.0000000000000002,
        transducerGainAllPartsQ80: 0.46049239340583437,
        halfPowerHz: [13217549.62380473, 13938555.300714422],
      },
    ],
  },
  {
    source: { r: 17.0, x: -32.0 },
    load: { r: 210.0, x: 95.0 },
    frequencyHz: 868000000.0,
    aim: 'conjugate',
    networks: [
      {
        arms: [
          { arm: 'series', part: 'inductor', value: 1.748085198391882e-8 },
          { arm: 'shunt', part: 'capacitor', value: 3.0283019025013593e-12 },
        ],
        zin: { r: 16.999999999999993, x: 31.999999999999986 },
        transducerGain: 1.0000000000000002,
        transducerGainAllPartsQ80: 0.8878559179664447,
        halfPowerHz: [649029461.3270835, 1031715687.5894945],
      },
      {
        arms: [
          { arm: 'series', part: 'capacitor', value: 5.851144680182265e-12 },
          { arm: 'shunt', part: 'inductor', value: 1.4170648475111607e-8 },
        ],
        zin: { r: 16.999999999999993, x: 31.999999999999986 },
        transducerGain: 1.0000000000000002,
        transducerGainAllPartsQ80: 0.9389342933696142,
        halfPowerHz: [637176070.4900708, 1651353082.8606532],
      },
    ],
  },
  {
    source: { r: 17.0, x: -32.0 },
    load: { r: 210.0, x: 95.0 },
    frequencyHz: 868000000.0,
    aim: 'reflectionless',
    networks: [
      {
        arms: [
          { arm: 'series', part: 'inductor', value: 5.745925304332067e-9 },
          { arm: 'shunt', part: 'capacitor', value: 3.0283019025013593e-12 },
        ],
        zin: { r: 16.99999999999999, x: -31.999999999999986 },
        transducerGain: 0.2201066260472201,
        transducerGainAllPartsQ80: 0.21763133217118358,
      },
      {
        arms: [
          { arm: 'series', part: 'capacitor', value: 1.9232609662329698e-12 },
          { arm: 'shunt', part: 'inductor', value: 1.4170648475111607e-8 },
        ],
        zin: { r: 16.999999999999996, x: -31.999999999999986 },
        transducerGain: 0.22010662604722014,
        transducerGainAllPartsQ80: 0.21208780225386126,
      },
    ],
  },
  {
    source: { r: 75.0, x: 0.0 },
    load: { r: 75.0, x: -40.0 },
    frequencyHz: 55000000.0,
    aim: 'conjugate',
    networks: [
      {
        arms: [{ arm: 'series', part: 'inductor', value: 1.157490495213784e-7 }],
        zin: { r: 75.00000000000003, x: -7.691850745534258e-15 },
        transducerGain: 1.0000000000000007,
        transducerGainAllPartsQ80: 0.9933665191333437,
        halfPowerHz: [null, 261250000.1173317],
      },
      {
        arms: [
          { arm: 'series', part: 'capacitor', value: 7.234315595086153e-11 },
          { arm: 'shunt', part: 'inductor', value: 2.613396508724872e-7 },
        ],
        zin: { r: 75.00000000000003, x: 7.691850745534258e-15 },
        transducerGain: 1.0000000000000007,
        transducerGainAllPartsQ80: 0.98023135366608,
        halfPowerHz: [23559159.95252356, null],
      },
    ],
  },
  {
    source: { r: 22.0, x: 14.0 },
    load: { r: 22.0, x: 300.0 },
    frequencyHz: 3600000.0,
    aim: 'conjugate',
    networks: [
      {
        arms: [
          { arm: 'series', part: 'inductor', value: 1.2643976034522797e-5 },
          { arm: 'shunt', part: 'capacitor', value: 2.9315485443447707e-10 },
        ],
        zin: { r: 22.0, x: -14.000000000000009 },
        transducerGain: 1.0000000000000002,
        transducerGainAllPartsQ80: 0.6381529328771034,
        halfPowerHz: [3414642.1261091223, 3773787.9929034356],
      },
      {
        arms: [{ arm: 'series', part: 'capacitor', value: 1.4079524335801074e-10 }],
        zin: { r: 22.0, x: -13.999999999999984 },
        transducerGain: 1.0000000000000002,
        transducerGainAllPartsQ80: 0.8429098130582993,
        halfPowerHz: [3157541.88101298, 4186666.6947885295],
      },
      {
        arms: [
          { arm: 'shunt', part: 'capacitor', value: 1.8203996758876921e-9 },
          { arm: 'series', part: 'capacitor', value: 1.545793930573964e-10 },
        ],
        zin: { r: 22.000000000000007, x: -14.000000000000016 },
        transducerGain: 1.0000000000000002,
        transducerGainAllPartsQ80: 0.8415007196248184,
        halfPowerHz: [3064796.620940871, 4199293.762024686],
      },
    ],
  },
  {
    source: { r: 300.0, x: 0.0 },
    load: { r: 38.0, x: 110.0 },
    frequencyHz: 225000000.0,
    aim: 'conjugate',
    networks: [
      {
        arms: [
          { arm: 'series', part: 'inductor', value: 9.202775615906015e-8 },
          { arm: 'shunt', part: 'capacitor', value: 6.605576816512995e-12 },
        ],
        zin: { r: 300.0000000000001, x: -6.153480596427406e-14 },
        transducerGain: 1.0000000000000004,
        transducerGainAllPartsQ80: 0.9544120347295252,
        halfPowerHz: [58690344.087099805, 354120554.32728153],
      },
      {
        arms: [
          { arm: 'series', part: 'capacitor', value: 5.436963205914624e-12 },
          { arm: 'shunt', part: 'capacitor', value: 4.884246468981845e-12 },
        ],
        zin: { r: 300.0000000000001, x: 1.2306961192854813e-13 },
        transducerGain: 1.0000000000000004,
        transducerGainAllPartsQ80: 0.9646454263608856,
        halfPowerHz: [86240017.99982437, 435589798.8281054],
      },
      {
        arms: [
          { arm: 'shunt', part: 'capacitor', value: 6.1912053104270005e-12 },
          { arm: 'series', part: 'capacitor', value: 6.92112051437681e-11 },
        ],
        zin: { r: 300.0000000000001, x: 3.845925372767129e-15 },
        transducerGain: 1.0000000000000004,
        transducerGainAllPartsQ80: 0.9647666029151853,
        halfPowerHz: [62471221.14039943, 383216007.9730158],
      },
      {
        arms: [
          { arm: 'shunt', part: 'inductor', value: 8.081649680023031e-8 },
          { arm: 'series', part: 'capacitor', value: 3.371894939600392e-12 },
        ],
        zin: { r: 300.0000000000001, x: 1.2306961192854813e-13 },
        transducerGain: 1.0,
        transducerGainAllPartsQ80: 0.9052169156919895,
        halfPowerHz: [183488274.52422985, 338187207.42477816],
      },
    ],
  },
];

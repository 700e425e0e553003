import { describe, expect, it } from 'vitest';
import {
  coilRows,
  orderRows,
  sensitivityBars,
  sensitivityRows,
  setWords,
  stepRows,
  stressRows,
  summaryRows,
} from '../../../../components/build-part/rows.ts';
import { rowsText } from '../../../../components/base/rows.ts';
import { design } from '../../../../src/design.ts';
import { recordOf } from '../../record-of.ts';
import { built } from '../fixture.ts';

/** Series C, shunt L: its arms and designators. */
const option = design(recordOf({ frequency: '151.25M', source: '50', load: '9.4-j61' })).options.find(
  ({ title }) => title === 'Series C, shunt L',
)!;

describe('orderRows(built)', () => {
  it('writes a value on sale as it is ordered, an exact one to four digits', () => {
    expect(orderRows(built).rows).toEqual([
      ['C1', 'capacitor', '8.2 pF', 'E24', '±2 %', '300'],
      ['L1', 'inductor', '46.58 nH', 'exact', '±2 nH', '48.2'],
    ]);
  });

  it('says how parts are joined where two stand for one', () => {
    const [first, ...others] = built.parts;
    const rows = orderRows({ ...built, parts: [{ ...first!, pair: 'in parallel' }, ...others] });
    expect(rows.columns.at(-1)?.name).toBe('Joined');
    expect(rows.rows.map((row) => row.at(-1))).toEqual(['in parallel', 'alone']);
  });
});

describe('summaryRows(built)', () => {
  it('gives the yield with its interval, and says where the worst corner lies', () => {
    expect(summaryRows(built)).toEqual([
      ['Worst return loss', '18.26 dB at 152.0 MHz'],
      ['Yield', '70.6 % (67.7 to 73.4 %, 95 % confidence, 1000 networks, seed 1)'],
      ['Worst corner of the tolerances', '10.43 dB at 152.0 MHz, in hand, C1 +2 %, L1 +5 %: falls short'],
      ['Loss at the design frequency', '0.76 dB; efficiency 84.0 %'],
    ]);
  });

  it('says why there is no yield', () => {
    const rows = summaryRows({ ...built, yield: null, corners: null });
    expect(rows[1]).toEqual(['Yield', 'not assessed: no return loss is required']);
    expect(rows).toHaveLength(3);
  });
});

describe('stepRows(built, option)', () => {
  it('tells what loss costs, what centring wins back and what rounding costs', () => {
    const sets = [{ values: [], words: [], worstReturnLossDb: 18.256, yield: null }];
    // 20.36 − 27.234 = −6.87, 28.78 − 20.36 = +8.42, 18.256 − 28.78 = −10.52
    expect(stepRows({ ...built, sets }, option).rows).toEqual([
      ['Exact values, ideal parts', '27.23 dB', ''],
      ['Exact values, with loss and strays', '20.36 dB', '−6.87 dB'],
      ['Centred anew for these: C1 8.310 pF, L1 44.20 nH', '28.78 dB', '+8.42 dB'],
      ['Parts to order', '18.26 dB', '−10.52 dB'],
    ]);
  });

  it('takes no difference of a match beyond 100 dB', () => {
    const centring = { ...built.centring, idealDb: 200 };
    expect(stepRows({ ...built, centring }, option).rows.map((row) => row[2])).toEqual(['', '–']);
  });
});

describe('sensitivityRows(sensitivity)', () => {
  it('has a sign on what a change does', () => {
    expect(sensitivityRows(built.sensitivity).rows).toEqual([
      ['L1', '−2.48 dB', '+2.20 dB', '10.26 dB', '93.6 %'],
      ['C1', '+0.24 dB', '−0.25 dB', '16.26 dB', '–'],
    ]);
  });
});

it('sensitivityBars(sensitivity, worst) are parts of the largest cost', () => {
  // 18.256 − 10.256 = 8 and 18.256 − 16.256 = 2
  const [first, second] = sensitivityBars(built.sensitivity, 18.256);
  expect(first).toBe(1);
  expect(second).toBeCloseTo(0.25, 12);
  expect(sensitivityBars(built.sensitivity, 5)).toEqual([0, 0]);
});

describe('stressRows(stress)', () => {
  it('sets the mismatched figures beside the others, and says what is over its rating', () => {
    const rows = stressRows(built.stress!);
    expect(rows.columns.map(({ name }) => name)).toEqual([
      'Part',
      'Peak voltage',
      'RMS current',
      'Heat',
      'Peak voltage, VSWR 3.0',
      'RMS current, VSWR 3.0',
      'Heat, VSWR 3.0',
      'Reaches its rating',
    ]);
    expect(rows.rows).toEqual([
      ['C1', '34.1 V', '187 mA', '15.1 mW', '61.2 V', '330 mA', '49.0 mW', 'over it: of voltage at 1.25 W'],
      ['L1', '37.0 V', '588 mA', '307 mW', '–', '–', '–', 'no rating known'],
    ]);
  });
});

it('coilRows(coils) says what the formulas don’t give', () => {
  const coil = {
    designator: 'L1',
    inductanceH: 47e-9,
    turns: 2.64,
    diameterM: 7e-3,
    lengthM: 3.94e-3,
    wireLengthM: 58e-3,
    wireM: 1e-3,
    selfCapacitanceF: null,
    selfResonanceHz: null,
    caution: '',
  };
  expect(coilRows([coil]).rows).toEqual([
    ['L1', '47.00 nH', '2.6', '7.00 mm', '3.94 mm', '1.00 mm', '58.0 mm', 'not known', 'not known'],
  ]);
});

it('setWords(words, designators) keeps a part together', () => {
  expect(setWords(['8.2 pF + 1 pF', '47 nH'], ['C1', 'L1']).replaceAll('\u00a0', '_')).toBe(
    'C1_8.2_pF_+_1_pF, L1_47_nH',
  );
});

it('rowsText(rows) is a line for each row under the names, apart by tabs', () => {
  expect(
    rowsText({
      columns: [
        { name: 'Part', figure: false },
        { name: 'Value', figure: true },
      ],
      rows: [['C1', '1 pF']],
    }),
  ).toBe('Part\tValue\nC1\t1 pF');
});

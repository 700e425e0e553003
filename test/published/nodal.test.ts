import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import { branchesOf } from '../../src/evidence/branch.ts';
import { solveNodal } from '../../src/evidence/nodal.ts';
import type { Arm } from '../../src/network/arm.ts';
import { ladderInput } from '../../src/network/ladder-input.ts';
import { prepareLadder } from '../../src/network/ladder.ts';
import type { OneImpedance } from '../../src/network/termination.ts';
import { endsOver, sweep } from '../../src/network/sweep.ts';
import type { Fields } from '../../src/record/fields.ts';
import { recordOf } from '../unit/record-of.ts';
import { apart, reflection, solveWithMathjs } from './nodal.ts';

const cases: readonly (readonly [string, Fields])[] = [
  ['50 Ω to 9.4 − j61 Ω', { frequency: '151.25M', source: '50', load: '9.4-j61' }],
  ['17 − j32 Ω to 210 + j95 Ω', { frequency: '868M', source: '17-j32', load: '210+j95' }],
  ['the same, reflectionless', { frequency: '868M', source: '17-j32', load: '210+j95', aim: 'reflectionless' }],
  [
    '12.5 Ω to 50 Ω in three sections',
    { frequency: '434M', source: '12.5', load: '50', method: 'cascade', sections: '3' },
  ],
  [
    '8 + j3 Ω to 400 − j90 Ω in six',
    { frequency: '14.2M', source: '8+j3', load: '400-j90', method: 'cascade', sections: '6' },
  ],
];
const multiples = [0.5, 0.93, 1, 1.04, 1.3, 2, 3];
const losses = [
  ['lossless', (arm: Arm): Arm => arm],
  ['with Q = 80', (arm: Arm): Arm => ({ ...arm, q: 80 })],
  ['with Q = 25 in inductors alone', (arm: Arm): Arm => (arm.part === 'inductor' ? { ...arm, q: 25 } : arm)],
] as const;

describe.each(cases)('nodal equations solved by mathjs, to 1 part in 10⁹: %s', (_, fields) => {
  // Terminations held constant, so that both sides are given the same impedances.
  const record = recordOf({ ...fields, 'source-behaviour': 'constant', 'load-behaviour': 'constant' });
  const { aim } = record;
  const source = record.source as OneImpedance;
  const load = record.loads[0]!.termination as OneImpedance;
  const f0 = record.requirement.frequencyHz;
  const { options } = design(record);
  const frequencies = Float64Array.from(multiples, (k) => k * f0);
  const ends = endsOver(source, load, f0, frequencies);
  const zs = new Complex(source.r, source.x);
  const zl = new Complex(load.r, load.x);
  const availableW = 2;
  const emf = Math.sqrt(8 * source.r * availableW);

  it.each(losses)('sweep(), ladderInput() and solveNodal() of every network, %s', (_name, withLoss) => {
    expect(options.length).toBeGreaterThanOrEqual(2);
    for (const option of options) {
      const arms = option.arms.map(withLoss);
      const { gain, gammaRe, gammaIm } = sweep(prepareLadder(arms), ends, aim);
      frequencies.forEach((hz, k) => {
        const solved = solveWithMathjs({ arms, source, load, emf }, hz);
        const nodal = solveNodal(branchesOf(arms, hz), zs, zl, availableW);
        const gamma = reflection(solved.zin, source, aim === 'conjugate' ? -source.x : source.x);
        expect(Math.abs(gain[k]! / solved.gain - 1)).toBeLessThan(1e-9);
        expect(Math.abs(nodal.gain / solved.gain - 1)).toBeLessThan(1e-9);
        // A reflection near zero has no digits of its own: it is compared on the scale of 1.
        expect(Math.hypot(gammaRe[k]! - gamma.re, gammaIm[k]! - gamma.im)).toBeLessThan(1e-9);
        expect(apart(ladderInput(arms, zl, hz), solved.zin)).toBeLessThan(1e-9);
        expect(apart(nodal.seen, solved.zin)).toBeLessThan(1e-9);
        expect(nodal.nodes).toHaveLength(solved.voltages.length);
        nodal.nodes.forEach((volts, n) => expect(apart(volts, solved.voltages[n]!)).toBeLessThan(1e-9));
        const { loadW, lostW, reflectedW } = nodal;
        expect(Math.abs((loadW + lostW + reflectedW) / availableW - 1)).toBeLessThan(1e-9);
      });
    }
  });
});

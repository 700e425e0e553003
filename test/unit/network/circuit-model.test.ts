import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { circuitModels, partsOf, type CircuitModel } from '../../../src/network/circuit-model.ts';
import { modelImpedance } from '../../model-impedance.ts';
import { terminationAt } from '../../../src/network/termination-at.ts';

const hz = 100e6;
const omega = 2 * Math.PI * hz;
const [r, l, c, c0] = [12, 30e-9, 40e-12, 5e-12];
const zl = new Complex(0, omega * l);
const zc = new Complex(0, -1 / (omega * c));
const across = (...parts: readonly Complex[]): Complex =>
  parts.reduce((y, z) => y.add(z.inverse()), new Complex(0, 0)).inverse();
const real = new Complex(r, 0);

/** Impedances put together from those of the parts. */
const cases: readonly (readonly [CircuitModel, Complex])[] = [
  [{ model: 'rc-series', values: [r, c] }, real.add(zc)],
  [{ model: 'rl-series', values: [r, l] }, real.add(zl)],
  [{ model: 'rlc-series', values: [r, l, c] }, real.add(zl).add(zc)],
  [{ model: 'rc-parallel', values: [r, c] }, across(real, zc)],
  [{ model: 'rl-parallel', values: [r, l] }, across(real, zl)],
  [{ model: 'rlc-parallel', values: [r, l, c] }, across(real, zl, zc)],
  [{ model: 'crystal', values: [r, l, c, c0] }, across(real.add(zl).add(zc), new Complex(0, -1 / (omega * c0)))],
  // ω0·L = Q·R at 80 MHz; at 100 MHz the reactance is Q·R·(1.25 − 0.8).
  [{ model: 'antenna', values: [r, 80e6, 7] }, new Complex(r, 7 * r * (1.25 - 0.8))],
];

describe('modelImpedance(model, hz) and terminationAt(model, f0, hz)', () => {
  it.each(cases)('$model: the parts put together, to 1 part in 10¹³', (model, wanted) => {
    for (const z of [modelImpedance(model, hz), terminationAt(model, 1e6, hz)]) {
      expect(z.sub(wanted).abs() / wanted.abs()).toBeLessThan(1e-13);
    }
  });

  it('know every model', () => {
    expect(cases.map(([{ model }]) => model).toSorted()).toEqual(Object.keys(circuitModels).toSorted());
  });

  it('antenna: R alone at its resonance, Q = ω0·L/R', () => {
    const model: CircuitModel = { model: 'antenna', values: [36, 145e6, 11] };
    const { l: henry, c: farad } = partsOf(model);
    expect((2 * Math.PI * 145e6 * henry!) / 36).toBeCloseTo(11, 12);
    expect(2 * Math.PI * 145e6 * Math.sqrt(henry! * farad!)).toBeCloseTo(1, 12);
    const z = modelImpedance(model, 145e6);
    expect(z.re).toBe(36);
    expect(Math.abs(z.im)).toBeLessThan(1e-10);
  });

  it('crystal: R at the series resonance but for C0, and high at the parallel one above it', () => {
    const model: CircuitModel = { model: 'crystal', values: [30, 10e-3, 25e-15, 5e-12] };
    const series = 1 / (2 * Math.PI * Math.sqrt(10e-3 * 25e-15));
    const parallel = series * Math.sqrt(1 + 25e-15 / 5e-12);
    expect(modelImpedance(model, series).abs()).toBeCloseTo(30, 1);
    // |Z| there is X0²/R: X0 of C0 squared, over R.
    const x0 = 1 / (2 * Math.PI * parallel * 5e-12);
    expect(modelImpedance(model, parallel).abs() / (x0 ** 2 / 30)).toBeCloseTo(1, 2);
  });
});

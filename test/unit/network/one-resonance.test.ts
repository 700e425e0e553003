import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import type { CircuitModel } from '../../../src/network/circuit-model.ts';
import { modelImpedance } from '../../model-impedance.ts';
import { fitOneResonance } from '../../../src/network/one-resonance.ts';
import { logGrid } from '../../../src/network/worst-in-band.ts';

const centre = 100e6;
const omega = 2 * Math.PI * centre;
const hz = [...logGrid(90e6, 100e6 ** 2 / 90e6, 41)];
const fitTo = (model: CircuitModel) =>
  fitOneResonance(
    hz,
    hz.map((f) => modelImpedance(model, f)),
    centre,
  );

describe('fitOneResonance(hz, impedances, centre) finds a load of its own kind', () => {
  // R, and the Q at 100 MHz of the part that grows with frequency and of the one that falls.
  it.each([
    [{ model: 'rlc-series', values: [20, (6 * 20) / omega, 1 / (omega * 6 * 20)] }, 'series', 20, 6, 6],
    [{ model: 'rlc-series', values: [20, (6 * 20) / omega, 1 / (omega * 2 * 20)] }, 'series', 20, 6, 2],
    [{ model: 'rc-series', values: [14, 1 / (omega * 8 * 14)] }, 'series', 14, 0, 8],
    [{ model: 'rl-series', values: [14, (8 * 14) / omega] }, 'series', 14, 8, 0],
    [{ model: 'rlc-parallel', values: [300, 300 / (omega * 6), 4 / (omega * 300)] }, 'parallel', 300, 4, 6],
    [{ model: 'rc-parallel', values: [300, 8 / (omega * 300)] }, 'parallel', 300, 8, 0],
    [{ model: 'rl-parallel', values: [300, 300 / (omega * 8)] }, 'parallel', 300, 0, 8],
    [{ model: 'antenna', values: [36, 100e6, 12] }, 'series', 36, 12, 12],
  ] as const)('$0.model, exactly', (model, arrangement, r, growing, falling) => {
    const fit = fitTo(model);
    expect(fit.arrangement).toBe(arrangement);
    expect(fit.r).toBeCloseTo(r, 8);
    expect(fit.growingQ).toBeCloseTo(growing, 8);
    expect(fit.fallingQ).toBeCloseTo(falling, 8);
    expect(fit.misfit).toBeLessThan(1e-9);
  });

  it('in a band of a hundredth of a per cent too', () => {
    const narrow = [...logGrid(100e6 - 5e3, 100e6 + 5e3, 41)];
    const model: CircuitModel = { model: 'antenna', values: [36, 100e6, 5000] };
    const fit = fitOneResonance(
      narrow,
      narrow.map((f) => modelImpedance(model, f)),
      centre,
    );
    expect(fit.growingQ / 5000).toBeCloseTo(1, 5);
  });
});

describe('fitOneResonance(hz, impedances, centre) of what has no such model', () => {
  it('tells how far it is off: a resistance that doubles over the band', () => {
    const impedances = hz.map((_, k) => new Complex(30 + (30 * k) / 40, 0));
    const fit = fitOneResonance(hz, impedances, centre);
    // The mean is 45 Ω against 30 and 60 at the edges: |Γ| = 15/75 and 15/105.
    expect(fit.misfit).toBeGreaterThan(0.14);
    expect(fit.misfit).toBeLessThan(0.21);
  });

  it('gives no negative part: a reactance that falls as no lossless part does is taken by one part alone', () => {
    const impedances = hz.map((f) => new Complex(20, 50 - 80 * (f / centre - 1)));
    const fit = fitOneResonance(hz, impedances, centre);
    expect(fit.growingQ).toBeGreaterThanOrEqual(0);
    expect(fit.fallingQ).toBeGreaterThanOrEqual(0);
    expect(fit.misfit).toBeGreaterThan(0.01);
  });

  it('has no Q for a resistance', () => {
    const fit = fitOneResonance(
      hz,
      hz.map(() => new Complex(50, 0)),
      centre,
    );
    expect([fit.growingQ, fit.fallingQ, fit.misfit]).toEqual([0, 0, 0]);
    expect(fit.r).toBeCloseTo(50, 12);
  });
});

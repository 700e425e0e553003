import { describe, expect, it } from 'vitest';
import { realImpedance, type RealArm } from '../../../src/network/real-arm.ts';
import { fillImmittance } from '../../../src/parts/immittance-of.ts';

describe('fillImmittance(arm, f0, frequencies, into)', () => {
  const frequencyHz = Float64Array.of(30e6, 100e6, 900e6);
  it.each([
    ['series', 'inductor', 60, 0.5, 0.4e-12, 2e-9],
    ['shunt', 'inductor', 60, -0.5, 0.4e-12, 2e-9],
    ['series', 'capacitor', 300, -1, 0, 0.5e-9],
    ['shunt', 'capacitor', null, 0, 0, 0.5e-9],
  ] as const)('%s %s is what realImpedance says', (arm, part, q, qSlope, parallelF, seriesH) => {
    const real: RealArm = { arm, part, value: part === 'inductor' ? 82e-9 : 33e-12, q, qSlope, parallelF, seriesH };
    const into = new Float64Array(6);
    fillImmittance(real, 100e6, frequencyHz, into);
    frequencyHz.forEach((hz, f) => {
      const z = realImpedance(real, 100e6, hz);
      const wanted = arm === 'series' ? z : z.inverse();
      expect(Math.hypot(into[2 * f]! - wanted.re, into[2 * f + 1]! - wanted.im) / wanted.abs()).toBeLessThan(1e-12);
    });
  });

  it('stays finite at a lossless resonance', () => {
    // ω = 1 rad/s, L = 1 H with 1 F across; C = 1 F with 1 H in series, shorting
    const hz = Float64Array.of(1 / (2 * Math.PI));
    const tank: RealArm = { arm: 'series', part: 'inductor', value: 1, q: null, qSlope: 0, parallelF: 1, seriesH: 0 };
    const trap: RealArm = { arm: 'shunt', part: 'capacitor', value: 1, q: null, qSlope: 0, parallelF: 0, seriesH: 1 };
    for (const arm of [tank, trap]) {
      const into = new Float64Array(2);
      fillImmittance(arm, 1, hz, into);
      expect(into.every(Number.isFinite)).toBe(true);
    }
  });
});

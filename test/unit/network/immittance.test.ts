import { describe, expect, it } from 'vitest';
import { impedanceOf } from '../../../src/network/immittance.ts';

const hz = 1e6;
const omega = 2 * Math.PI * hz;

describe('impedanceOf(arm, frequency)', () => {
  it('is jωL of an inductor and −j/(ωC) of a capacitor, in either arm', () => {
    for (const arm of ['series', 'shunt'] as const) {
      const l = impedanceOf({ arm, part: 'inductor', value: 1e-6 }, hz);
      const c = impedanceOf({ arm, part: 'capacitor', value: 1e-9 }, hz);
      expect([l.re, c.re]).toEqual([0, 0]);
      expect(l.im).toBeCloseTo(omega * 1e-6, 12);
      expect(c.im).toBeCloseTo(-1 / (omega * 1e-9), 10);
    }
  });

  it('adds reactance/Q in series, at every frequency', () => {
    const l = { arm: 'series', part: 'inductor', value: 1e-6, q: 80 } as const;
    const c = { arm: 'shunt', part: 'capacitor', value: 1e-9, q: 200 } as const;
    for (const f of [hz, 3 * hz]) {
      expect(impedanceOf(l, f).re).toBeCloseTo((2 * Math.PI * f * 1e-6) / 80, 12);
      expect(impedanceOf(c, f).re).toBeCloseTo(1 / (2 * Math.PI * f * 1e-9) / 200, 12);
    }
  });
});

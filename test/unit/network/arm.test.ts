import { describe, expect, it } from 'vitest';
import { partOf } from '../../../src/network/arm.ts';

const omega = 2 * Math.PI * 1e6;

describe('partOf(arm, immittance, frequency)', () => {
  // X > 0: L = X/ω; X < 0: C = −1/(ωX); B > 0: C = B/ω; B < 0: L = −1/(ωB).
  it.each([
    ['series', 50, 'inductor', 50 / omega],
    ['series', -50, 'capacitor', 1 / (omega * 50)],
    ['shunt', 0.02, 'capacitor', 0.02 / omega],
    ['shunt', -0.02, 'inductor', 1 / (omega * 0.02)],
  ] as const)('makes %s %s of it a(n) %s', (arm, immittance, part, value) => {
    expect(partOf(arm, immittance, 1e6)).toEqual({ arm, part, value });
  });

  it.each(['series', 'shunt'] as const)('gives null for nothing in %s', (arm) => {
    expect(partOf(arm, 0, 1e6)).toBeNull();
    expect(partOf(arm, -0, 1e6)).toBeNull();
  });
});

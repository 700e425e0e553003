import { describe, expect, it } from 'vitest';
import { boardOf, fillArm, withFault } from '../../../../src/evidence/as-built/board.ts';
import { realImpedance } from '../../../../src/network/real-arm.ts';
import { f0, ladder, part } from './fixture.ts';

describe('fillArm(arm, f0, frequencyHz, re, im)', () => {
  const frequencyHz = Float64Array.of(90e6, 150e6, 260e6);
  it.each([
    part('series', 'inductor', 27e-9, { parallelF: 0.2e-12, seriesH: 1e-9, qSlope: 0.5 }),
    part('shunt', 'inductor', 27e-9, { parallelF: 0.2e-12 }),
    part('series', 'capacitor', 27e-12, { seriesH: 1e-9 }),
    part('shunt', 'capacitor', 27e-12, { seriesH: 1e-9, qSlope: -1 }),
    part('shunt', 'capacitor', 27e-12, { q: null }),
  ])('is what realImpedance says, or its reciprocal: %o', (arm) => {
    const [re, im] = [new Float64Array(3), new Float64Array(3)];
    fillArm(arm, f0, frequencyHz, re, im);
    for (const [k, hz] of frequencyHz.entries()) {
      const z = realImpedance(arm, f0, hz);
      const expected = arm.arm === 'series' ? z : z.inverse();
      expect(Math.hypot(re[k]! - expected.re, im[k]! - expected.im)).toBeLessThan(1e-12 * expected.abs());
    }
  });
});

describe('withFault(board, fault)', () => {
  const board = boardOf(ladder);
  it('changes the one thing', () => {
    expect(board.straysF).toEqual([0.5e-12, 0.5e-12, 0.5e-12]);
    expect(withFault(board, { kind: 'value', at: 1, size: 2 }).arms.map(({ value }) => value)).toEqual([
      20e-12, 54e-9, 43e-12, 56e-9,
    ]);
    expect(withFault(board, { kind: 'quality', at: 0, size: 7 }).arms.map(({ q }) => q)).toEqual([7, 60, 400, 60]);
    expect(withFault(board, { kind: 'stray', at: 1, size: 0.5e-12 }).straysF).toEqual([0.5e-12, 1e-12, 0.5e-12]);
    expect(withFault(board, { kind: 'load reactance', at: 0, size: 3 }).load).toEqual({ ...board.load, reactance: 3 });
  });

  it('leaves no capacitance and no inductance of leads below nothing', () => {
    expect(withFault(board, { kind: 'stray', at: 0, size: -1 }).straysF[0]).toBe(0);
    expect(withFault(board, { kind: 'lead', at: 0, size: -1 }).arms[0]!.seriesH).toBe(0);
  });
});

import { describe, expect, it } from 'vitest';
import { evidence } from '../../../src/evidence/evidence.ts';
import type { Arm } from '../../../src/network/arm.ts';
import { resistivePair } from '../../../src/synthesis/resistive-pair.ts';

const f0 = 100e6;
const source = { r: 100, x: 0, behaviour: 'series' } as const;
const load = { r: 1000, x: 0, behaviour: 'series' } as const;
const { arms } = resistivePair(100, 1000, f0).candidates[0]!;

describe('evidence(subject, frequencies, twoElement)', () => {
  it('gives the four routes and, for a resistive pair, the Q method; each with its figures at f0', () => {
    const { routes, checks, frequenciesHz, pass } = evidence([{ arms, source, load, f0 }], [f0, 95e6, 105e6], true);
    expect(routes.map(({ name }) => name)).toEqual([
      'Sweep',
      'Step by step',
      'S-parameters',
      'Nodal equations',
      'Q method',
    ]);
    for (const { seen, transducerGain } of routes.slice(0, 4)) {
      expect(seen!.r).toBeCloseTo(100, 9);
      expect(seen!.x).toBeCloseTo(0, 9);
      expect(transducerGain).toBeCloseTo(1, 12);
    }
    expect(routes[4]).toMatchObject({ seen: null, transducerGain: null });
    expect(routes[4]!.how).toMatch(/Q = .*= 3\.00000;/);
    expect(checks.map(({ subject }) => subject)).toEqual([
      'impedance seen',
      'transducer gain',
      'power balance',
      'element values by the Q method',
    ]);
    expect(checks.map(({ tolerance }) => tolerance)).toEqual([1e-9, 1e-9, 1e-9, 1e-12]);
    expect(frequenciesHz).toEqual([f0, 95e6, 105e6]);
    expect(pass).toBe(true);
  });

  it('prints element values by both methods, and passes them to 1 part in 10¹²', () => {
    const { routes, checks } = evidence([{ arms, source, load, f0 }], [f0], true);
    // 300/(2π·1e8) = 477.464829 nH, 3/1000/(2π·1e8) = 4.77464829 pF.
    expect(routes[4]!.how.match(/477\.464829 nH, 4\.77464829 pF/g)).toHaveLength(2);
    expect(checks[3]).toMatchObject({ tolerance: 1e-12, pass: true });
  });

  it('holds the Q method for resistances that are nearly the same', () => {
    const near = { ...load, r: 100.001 };
    const network = resistivePair(100, 100.001, f0).candidates[0]!.arms;
    expect(evidence([{ arms: network, source, load: near, f0 }], [f0], true).pass).toBe(true);
  });

  it('fails a network whose values are not those of the Q method', () => {
    const wrong = arms.map((arm): Arm => ({ ...arm, value: arm.value * 1.01 }));
    const { checks, pass } = evidence([{ arms: wrong, source, load, f0 }], [f0], true);
    // The routes still agree on what this other network does; it is just not the match.
    expect(checks.map(({ pass: good }) => good)).toEqual([true, true, true, false]);
    expect(checks[3]!.spread).toBeCloseTo(0.0099, 3);
    expect(pass).toBe(false);
  });

  it('leaves the Q method out for reactive terminations and for several sections', () => {
    const reactive = evidence([{ arms, source, load: { ...load, x: -1 }, f0 }], [f0], true);
    const several = evidence([{ arms: [...arms, ...arms], source, load, f0 }], [f0], false);
    for (const { routes, checks } of [reactive, several]) {
      expect(routes).toHaveLength(4);
      expect(checks).toHaveLength(3);
    }
  });

  it('agrees for a network of no part: what is seen is the load', () => {
    const { routes, pass } = evidence([{ arms: [], source, load: source, f0 }], [f0], true);
    expect(pass).toBe(true);
    for (const { seen } of routes.slice(0, 4)) expect(seen!.r).toBeCloseTo(100, 10);
  });
});

import { describe, expect, it } from 'vitest';
import { builtEvidence } from '../../../src/evidence/built-evidence.ts';
import { between, f0, reactance } from './real-arms.ts';

const arms = [reactance('shunt', -60, { q: 300, seriesH: 2 }), reactance('series', 40, { q: 50, parallelF: 0.001 })];
const states = [between(50, { r: 9, x: -20 }, [f0, 0.9 * f0, 1.1 * f0]), between(50, { r: 200, x: 90 }, [f0])];

describe('builtEvidence(ladder, states, f0, powerW)', () => {
  it('compares four things between two routes, and they agree', () => {
    const checks = builtEvidence({ arms, strayF: 0.0004 }, states, f0, 25);
    expect(checks.map(({ subject }) => subject)).toEqual([
      'impedance seen, real parts',
      'transducer gain, real parts',
      'power balance, real parts',
      'stress by nodal equations',
    ]);
    for (const { spread, tolerance, pass } of checks) {
      expect(tolerance).toBe(1e-9);
      expect(spread).toBeLessThan(1e-12);
      expect(pass).toBe(true);
    }
  });

  it('passes for a network of no part', () => {
    for (const { pass } of builtEvidence({ arms: [], strayF: 0 }, states, f0, 1)) expect(pass).toBe(true);
  });
});

import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import {
  armScattering,
  cascadeScattering,
  fromScattering,
  ladderScattering,
} from '../../../src/evidence/s-parameters.ts';
import type { Arm } from '../../../src/network/arm.ts';

const l = (x: number): number => x / (2 * Math.PI);
const c = (x: number): number => 1 / (2 * Math.PI * x);
const near = (found: Complex, re: number, im: number): void =>
  expect(found.sub(new Complex(re, im)).abs()).toBeLessThan(1e-13);
const series: Arm = { arm: 'series', part: 'inductor', value: l(50) };
const shunt: Arm = { arm: 'shunt', part: 'capacitor', value: c(50) };

describe('armScattering(arm, frequency, z0)', () => {
  it('of j50 Ω in series in 50 Ω: S11 = j/(2 + j), S21 = 2/(2 + j)', () => {
    const { s11, s12, s21, s22 } = armScattering(series, 1, 50);
    for (const s of [s11, s22]) near(s, 0.2, 0.4);
    for (const s of [s12, s21]) near(s, 0.8, -0.4);
  });

  it('of −j50 Ω across 50 Ω: S11 = −j/(2 + j), S21 = 2/(2 + j)', () => {
    const { s11, s21 } = armScattering(shunt, 1, 50);
    near(s11, -0.2, -0.4);
    near(s21, 0.8, -0.4);
  });

  it('is lossless: |S11|² + |S21|² = 1 in any reference', () => {
    for (const z0 of [1, 50, 1234]) {
      const { s11, s21 } = armScattering(series, 1, z0);
      expect(s11.abs() ** 2 + s21.abs() ** 2).toBeCloseTo(1, 14);
    }
  });
});

describe('cascadeScattering(a, b)', () => {
  it('of two series arms is the series arm of their sum', () => {
    const both = cascadeScattering(armScattering(series, 1, 50), armScattering({ ...series, value: l(25) }, 1, 50));
    const sum = armScattering({ ...series, value: l(75) }, 1, 50);
    for (const name of ['s11', 's12', 's21', 's22'] as const) near(both[name], sum[name].re, sum[name].im);
  });
});

describe('ladderScattering(arms, frequency, z0)', () => {
  it('of no arms is a through connection', () => {
    const { s11, s12, s21, s22 } = ladderScattering([], 1, 50);
    for (const s of [s11, s22]) near(s, 0, 0);
    for (const s of [s12, s21]) near(s, 1, 0);
  });

  it('keeps the order: port 1 is the source side', () => {
    // From port 1, port 2 closed by 50 Ω: j50 + (50 ∥ −j50) = 25 + j25: Γ = (−25 + j25)/(75 + j25) = −0.2 + j0.4.
    near(ladderScattering([series, shunt], 1, 50).s11, -0.2, 0.4);
    // The other way round: 50 + j50 ∥ −j50 = 50 − j50: Γ = −j50/(100 − j50) = 0.2 − j0.4.
    near(ladderScattering([shunt, series], 1, 50).s11, 0.2, -0.4);
  });
});

describe('fromScattering(s, source, load, z0)', () => {
  it('gives a direct pair its plain mismatch, in any reference', () => {
    const source = new Complex(17, -32);
    const load = new Complex(210, 95);
    // 4·17·210/((227)² + 63²)
    for (const z0 of [10, 50, 300]) {
      const { gain, seen } = fromScattering(ladderScattering([], 1, z0), source, load, z0);
      expect(gain).toBeCloseTo((4 * 17 * 210) / (227 ** 2 + 63 ** 2), 13);
      expect(seen.sub(load).abs()).toBeLessThan(1e-11);
    }
  });
});

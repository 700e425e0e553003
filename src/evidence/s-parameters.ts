import { Complex } from 'complex.js';
import type { Arm } from '../network/arm.ts';
import { impedanceOf } from '../network/immittance.ts';

/** Scattering matrix of a two-port in a common real reference resistance. */
export interface Scattering {
  readonly s11: Complex;
  readonly s12: Complex;
  readonly s21: Complex;
  readonly s22: Complex;
}

const one = new Complex(1, 0);
const zero = new Complex(0, 0);

/**
 * S-parameters of one arm in reference resistance `z0`, Ω. Series impedance z = Z/Z0: S11 = z/(z + 2), S21 = 2/(z + 2);
 * shunt admittance y = Y·Z0: S11 = −y/(y + 2), S21 = 2/(y + 2) (any textbook, e.g. D. M. Pozar, Microwave Engineering,
 * ch. 4).
 */
export function armScattering(arm: Arm, frequencyHz: number, z0: number): Scattering {
  const z = impedanceOf(arm, frequencyHz);
  const normal = arm.arm === 'series' ? z.div(z0) : new Complex(z0, 0).div(z);
  const through = normal.add(2);
  const reflected = normal.div(through);
  const s11 = arm.arm === 'series' ? reflected : reflected.neg();
  const s21 = new Complex(2, 0).div(through);
  return { s11, s12: s21, s21, s22: s11 };
}

/** Two two-ports in cascade, the first at the source side. */
export function cascadeScattering(a: Scattering, b: Scattering): Scattering {
  const loop = one.sub(a.s22.mul(b.s11));
  return {
    s11: a.s11.add(a.s12.mul(b.s11).mul(a.s21).div(loop)),
    s12: a.s12.mul(b.s12).div(loop),
    s21: a.s21.mul(b.s21).div(loop),
    s22: b.s22.add(b.s21.mul(a.s22).mul(b.s12).div(loop)),
  };
}

/** S-parameters of a whole ladder; a plain through connection when it has no arm. */
export function ladderScattering(arms: readonly Arm[], frequencyHz: number, z0: number): Scattering {
  return arms
    .map((arm) => armScattering(arm, frequencyHz, z0))
    .reduce(cascadeScattering, { s11: zero, s12: one, s21: one, s22: zero });
}

/**
 * Transducer gain and impedance seen from S-parameters:
 * GT = (1 − |ΓS|²)·|S21|²·(1 − |ΓL|²) / |(1 − S11·ΓS)(1 − S22·ΓL) − S12·S21·ΓS·ΓL|².
 * 1 − |Γ|² is taken as 4·R·Z0/|Z + Z0|², the same without cancellation.
 */
export function fromScattering(
  s: Scattering,
  source: Complex,
  load: Complex,
  z0: number,
): { readonly gain: number; readonly seen: Complex } {
  const gamma = (z: Complex): Complex => z.sub(z0).div(z.add(z0));
  const passed = (z: Complex): number => (4 * z.re * z0) / z.add(z0).abs() ** 2;
  const gammaS = gamma(source);
  const gammaL = gamma(load);
  const denominator = one
    .sub(s.s11.mul(gammaS))
    .mul(one.sub(s.s22.mul(gammaL)))
    .sub(s.s12.mul(s.s21).mul(gammaS).mul(gammaL));
  const gain = (passed(source) * passed(load) * s.s21.abs() ** 2) / denominator.abs() ** 2;
  const gammaIn = s.s11.add(
    s.s12
      .mul(gammaL)
      .mul(s.s21)
      .div(one.sub(s.s22.mul(gammaL))),
  );
  return { gain, seen: one.add(gammaIn).div(one.sub(gammaIn)).mul(z0) };
}

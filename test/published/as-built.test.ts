import { complex, abs, add, conj, divide, multiply, subtract, type Complex } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { measuredReflection } from '../../src/evidence/as-built/overlay.ts';
import { endsOver } from '../../src/network/sweep.ts';
import type { MeasuredData } from '../../src/measured/measured.ts';

const gammas: readonly (readonly [number, number])[] = [
  [0, 0],
  [0.3, -0.4],
  [-0.7, 0.1],
  [0.05, 0.98],
  [-0.99, 0],
];
const frequencyHz = gammas.map((_, k) => 100e6 + 1e6 * k);
const measuredIn = (referenceOhm: number): MeasuredData => ({
  name: 'a.s1p',
  sha256: '0'.repeat(64),
  samples: gammas.length,
  thinningError: 0,
  referenceOhm,
  frequencyHz,
  re: gammas.map(([re]) => re),
  im: gammas.map(([, im]) => im),
});
const reflectionFrom = (referenceOhm: number, r: number, x: number, aim: 'conjugate' | 'reflectionless') => {
  const source = { r, x, behaviour: 'constant' } as const;
  return measuredReflection(
    measuredIn(referenceOhm),
    endsOver(source, source, 100e6, Float64Array.from(frequencyHz)),
    aim,
  );
};

describe('measuredReflection: a change of reference (K. Kurokawa, IEEE Trans. MTT-13, 1965), worked by mathjs', () => {
  it.each([
    [75, 50, 0],
    [50, 17, -32],
    [50, 210, 95],
  ])('from %d Ω to %d + j(%d) Ω', (referenceOhm, r, x) => {
    const zs = complex(r, x);
    const [conjugate, reflectionless] = [
      reflectionFrom(referenceOhm, r, x, 'conjugate'),
      reflectionFrom(referenceOhm, r, x, 'reflectionless'),
    ];
    for (const [k, [re, im]] of gammas.entries()) {
      const g = complex(re, im);
      const z = multiply(referenceOhm, divide(add(1, g), subtract(1, g)) as Complex) as Complex;
      const power = divide(subtract(z, conj(zs)), add(z, zs)) as Complex;
      const plain = divide(subtract(z, zs), add(z, zs)) as Complex;
      expect(conjugate.re[k]).toBeCloseTo(power.re, 12);
      expect(conjugate.im[k]).toBeCloseTo(power.im, 12);
      expect(reflectionless.re[k]).toBeCloseTo(plain.re, 12);
      expect(reflectionless.im[k]).toBeCloseTo(plain.im, 12);
      // The power that passes is the same whatever is taken for a reference: 1 − |Γ|² = 4·R·RS/|Z + ZS|².
      const size = abs(add(z, zs)) as unknown as number;
      expect(1 - conjugate.re[k]! ** 2 - conjugate.im[k]! ** 2).toBeCloseTo((4 * z.re * r) / size ** 2, 12);
    }
  });

  it('between real references is Γ2 = (Γ1 + ρ)/(1 + Γ1·ρ), ρ = (R1 − R2)/(R1 + R2) (any textbook on lines)', () => {
    const rho = (75 - 50) / (75 + 50);
    const { re, im } = reflectionFrom(75, 50, 0, 'conjugate');
    for (const [k, [a, b]] of gammas.entries()) {
      const g = complex(a, b);
      const expected = divide(add(g, rho), add(1, multiply(g, rho))) as Complex;
      expect(re[k]).toBeCloseTo(expected.re, 12);
      expect(im[k]).toBeCloseTo(expected.im, 12);
    }
  });
});

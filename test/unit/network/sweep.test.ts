import { describe, expect, it } from 'vitest';
import type { Arm } from '../../../src/network/arm.ts';
import { prepareLadder } from '../../../src/network/ladder.ts';
import { endsOver, sweep } from '../../../src/network/sweep.ts';
import type { Aim, Behaviour } from '../../../src/network/termination.ts';

const hz = 1;
const l = (x: number): number => x / (2 * Math.PI);
const c = (x: number): number => 1 / (2 * Math.PI * x);
type Z = readonly [r: number, x: number, behaviour?: Behaviour];

function at(
  arms: readonly Arm[],
  [rs, xs, s = 'constant']: Z,
  [rl, xl, b = 'constant']: Z,
  aim: Aim = 'conjugate',
  f = hz,
) {
  const source = { r: rs, x: xs, behaviour: s };
  const load = { r: rl, x: xl, behaviour: b };
  const { gain, gammaRe, gammaIm } = sweep(prepareLadder(arms), endsOver(source, load, hz, Float64Array.of(f)), aim);
  return { gain: gain[0]!, re: gammaRe[0]!, im: gammaIm[0]! };
}

function expectFigures(found: ReturnType<typeof at>, gain: number, re: number, im: number): void {
  expect(found.gain).toBeCloseTo(gain, 13);
  expect(found.re).toBeCloseTo(re, 13);
  expect(found.im).toBeCloseTo(im, 13);
}

describe('sweep(ladder, ends, aim)', () => {
  it('gives a direct mismatch: 50 Ω into 25 Ω has Γ = −1/3 and GT = 8/9', () => {
    expectFigures(at([], [50, 0], [25, 0]), 8 / 9, -1 / 3, 0);
  });

  it('gives a series reactance of R: Γ = j/(2 + j), GT = 4/5', () => {
    expectFigures(at([{ arm: 'series', part: 'inductor', value: l(50) }], [50, 0], [50, 0]), 0.8, 0.2, 0.4);
    expectFigures(at([{ arm: 'series', part: 'capacitor', value: c(50) }], [50, 0], [50, 0]), 0.8, 0.2, -0.4);
  });

  it('gives a shunt reactance of R: Γ = −j/(2 + j), GT = 4/5', () => {
    expectFigures(at([{ arm: 'shunt', part: 'capacitor', value: c(50) }], [50, 0], [50, 0]), 0.8, -0.2, -0.4);
    expectFigures(at([{ arm: 'shunt', part: 'inductor', value: l(50) }], [50, 0], [50, 0]), 0.8, -0.2, 0.4);
  });

  it('takes Q as a series resistance: Q = 10 of 50 Ω in series is 5 Ω, GT = 10000/(105² + 50²)', () => {
    for (const part of ['inductor', 'capacitor'] as const) {
      const value = part === 'inductor' ? l(50) : c(50);
      expect(at([{ arm: 'series', part, value, q: 10 }], [50, 0], [50, 0]).gain).toBeCloseTo(10000 / 13525, 13);
    }
  });

  it('takes Q as a series resistance in a shunt arm too: (5 ± j50) Ω across 50 Ω', () => {
    // Y = (5 ∓ j50)/2525. With 1 A in the load V = 50, I = 1 + 50Y; V + 50·I = 100 + 2500·(5 ∓ j50)/2525.
    const sum = Math.hypot(100 + (2500 * 5) / 2525, (2500 * 50) / 2525);
    for (const part of ['inductor', 'capacitor'] as const) {
      const value = part === 'inductor' ? l(50) : c(50);
      expect(at([{ arm: 'shunt', part, value, q: 10 }], [50, 0], [50, 0]).gain).toBeCloseTo(10000 / sum ** 2, 13);
    }
  });

  it('tells the two aims apart: 30 + j40 Ω into its conjugate and into itself', () => {
    // Conjugate: all power, Γ = 0 for that aim; for the other (ZS* − ZS)/(ZS* + ZS) = −j80/60.
    expectFigures(at([], [30, 40], [30, -40], 'conjugate'), 1, 0, 0);
    expectFigures(at([], [30, 40], [30, -40], 'reflectionless'), 1, 0, -4 / 3);
    // Itself: GT = 4·30·30/|60 + j80|² = 0.36; Γ = 0, and j80/(60 + j80) for the conjugate aim.
    expectFigures(at([], [30, 40], [30, 40], 'reflectionless'), 0.36, 0, 0);
    expectFigures(at([], [30, 40], [30, 40], 'conjugate'), 0.36, 0.64, 0.48);
  });

  it('lets terminations vary: a series RC load against its series RL conjugate matches at f0 alone', () => {
    // At 2f0: 30 + j80 into 30 − j20: Zin − ZS* = j60, Zin + ZS = 60 + j60: Γ = 0.5 + 0.5j, GT = 1/2.
    expectFigures(at([], [30, 40, 'series'], [30, -40, 'series']), 1, 0, 0);
    expectFigures(at([], [30, 40, 'series'], [30, -40, 'series'], 'conjugate', 2), 0.5, 0.5, 0.5);
  });

  it('gives every frequency its own figures, in the order given', () => {
    const arms = [{ arm: 'series', part: 'inductor', value: l(50) }] as const;
    const ends = endsOver(
      { r: 50, x: 0, behaviour: 'series' },
      { r: 50, x: 0, behaviour: 'series' },
      hz,
      Float64Array.of(2, 1),
    );
    // GT = 1/(1 + (X/2R)²) with X = 100 and 50.
    const { gain } = sweep(prepareLadder(arms), ends, 'conjugate');
    expect(gain[0]).toBeCloseTo(0.5, 13);
    expect(gain[1]).toBeCloseTo(0.8, 13);
  });
});

import { describe, expect, it } from 'vitest';
import { bestReflection, bestReflectionOf } from '../../src/network/ceiling.ts';

/** Computed apart from this project with SciPy from Fano's equations: resonators, Q·w, best |Γ|. */
const apart: readonly (readonly [number, number, number])[] = [
  [1, 0.5, 0.23606797749978967],
  [2, 0.5, 0.05572809000084123],
  [3, 0.5, 0.02384915370118696],
  [4, 0.5, 0.013538573444284685],
  [Infinity, 0.5, 0.0018674427317079893],
  [1, 1, 0.4142135623730952],
  [2, 1, 0.17157287525380988],
  [3, 1, 0.11101064408361133],
  [4, 1, 0.0861543394638864],
  [Infinity, 1, 0.04321391826377225],
  [1, 2, 0.6180339887498947],
  [2, 2, 0.3819660112501052],
  [3, 2, 0.3090898522557556],
  [4, 2, 0.27578788108005825],
  [Infinity, 2, 0.20787957635076193],
];

const ours = (n: number, g: number): number => (n === Infinity ? bestReflection(g) : bestReflectionOf(g, n));

describe('ceiling computed apart from this project with SciPy (R. M. Fano, J. Franklin Institute 249, 1950)', () => {
  it.each(apart)('%s resonators, Q·w = %s: |Γ| = %s within 1e-9', (n, g, wanted) => {
    expect(Math.abs(ours(n, g) - wanted)).toBeLessThan(1e-9);
  });
});

describe('one resonator in closed form (derived by hand)', () => {
  /**
   * A resonated load of Q alone, through an ideal transformer to a resistance ρ times its own: at the edges its reactance
   * is ±g = Q·w times its resistance, and |Γ|² = ((1 − ρ)² + g²)/((1 + ρ)² + g²), at the centre |Γ| = (ρ − 1)/(ρ + 1).
   * The edges are worst for every ρ; they are best where d|Γ|²/dρ = 0, at ρ² = 1 + g², which gives
   * |Γ|² = (√(1+g²) − 1)/(√(1+g²) + 1).
   */
  const closed = (g: number): number => Math.sqrt((Math.sqrt(1 + g * g) - 1) / (Math.sqrt(1 + g * g) + 1));

  it.each([0.01, 0.1, 0.5, 1, 2, 10, 1000])('Q·w = %s: to 1 part in 10⁷', (g) => {
    expect(Math.abs(bestReflectionOf(g, 1) / closed(g) - 1)).toBeLessThan(1e-7);
    const edge = (rho: number): number => Math.sqrt(((1 - rho) ** 2 + g * g) / ((1 + rho) ** 2 + g * g));
    const best = Math.sqrt(1 + g * g);
    for (const off of [0.99, 1.01]) expect(edge(best * off)).toBeGreaterThan(bestReflectionOf(g, 1) * (1 - 1e-9));
  });
});

describe("A. R. Lopez, IEEE Antennas and Propagation Magazine 46(4), 2004 (quoted from memory): the fit of Fano's figures", () => {
  const coefficients = [
    [1, 1, 1],
    [2, 2, 1],
    [3, 2.413, 0.678],
    [4, 2.628, 0.474],
  ] as const;
  const reflections = [1 / 2, 1 / 3, 1 / 5, 1 / 10];
  const cases = coefficients.flatMap(([n, a, b]) =>
    reflections.map((gamma) => {
      const depth = Math.log(1 / gamma);
      return [n, gamma, 1 / (b * Math.sinh(depth / a) + ((1 - b) / a) * depth)] as const;
    }),
  );

  // One and two resonators are exact; he prints the others as good to a few tenths of a per cent.
  it.each(cases)('%i resonators, |Γ| = %f: Q·w = %f', (n, gamma, lopez) => {
    let [low, high] = [1e-3, 1e3];
    for (let k = 0; k < 200; k += 1) {
      const middle = Math.sqrt(low * high);
      if (bestReflectionOf(middle, n) < gamma) low = middle;
      else high = middle;
    }
    expect(Math.abs(low / lopez - 1)).toBeLessThan(n <= 2 ? 1e-9 : 5e-3);
  });
});

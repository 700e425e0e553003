import { Complex } from 'complex.js';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formOf } from '../../src/network/form.ts';
import { ladderInput } from '../../src/network/ladder-input.ts';
import { cascade } from '../../src/synthesis/cascade.ts';
import { twoElement } from '../../src/synthesis/two-element.ts';
import { aim, anyTermination, frequency, resistance } from './arbitraries.ts';
import { aimed, attainable, impedance, parallelR, seenApart, swept } from './circuit.ts';

const all = [1, 2, 3, 4, 5, 6];
const problem = fc.record({ source: anyTermination, load: anyTermination, f0: frequency, aim });
const runs = { numRuns: 200 };

describe('cascade(target, load, f0, 1 to 6 sections) of any terminations', () => {
  it('gives networks through which the source sees what was aimed at, of gain 1 for the conjugate aim', () => {
    fc.assert(
      fc.property(problem, ({ source, load, f0, aim: sought }) => {
        const target = aimed(source, sought);
        const { candidates } = cascade(target, impedance(load), f0, all);
        expect(candidates.length).toBeGreaterThanOrEqual(1);
        for (const network of candidates) {
          const tolerance = attainable(target, impedance(load), network);
          expect(seenApart(network.arms, impedance(load), target, f0)).toBeLessThanOrEqual(tolerance);
          const { gain, gammaRe, gammaIm } = swept(network.arms, source, load, f0, [f0], sought);
          expect(Math.hypot(gammaRe[0]!, gammaIm[0]!)).toBeLessThanOrEqual(tolerance);
          if (sought === 'conjugate') expect(Math.abs(gain[0]! - 1)).toBeLessThanOrEqual(tolerance);
        }
      }),
      runs,
    );
  });

  it('has every number of sections, low-pass and high-pass, for each arrangement whose inequality holds', () => {
    fc.assert(
      fc.property(problem, ({ source, load, f0, aim: sought }) => {
        const target = aimed(source, sought);
        const chains = [
          { shuntAt: 'load', low: target.re, high: parallelR(impedance(load)) },
          { shuntAt: 'source', low: load.r, high: parallelR(target) },
        ] as const;
        // Close to equality a section has no Q, and two networks can be one.
        fc.pre(chains.every(({ low, high }) => Math.abs(high / low - 1) > 1e-3));
        const { candidates, absent } = cascade(target, impedance(load), f0, all);
        // Where an end's reactance leaves nothing of an outer arm, both arrangements share a network.
        fc.pre(candidates.every(({ arms, sections }) => sections > 0 && arms.length === 2 * sections));
        const rising = chains.filter(({ low, high }) => low < high);
        const wanted = all.flatMap((n) =>
          rising.flatMap(({ shuntAt }) => [
            `low-pass-${String(n)}-shunt-${shuntAt}`,
            `high-pass-${String(n)}-shunt-${shuntAt}`,
          ]),
        );
        expect(candidates.map(({ id }) => id)).toEqual(wanted);
        expect(absent).toHaveLength(chains.length - rising.length);
        for (const { sectionQ, sections, shuntAt } of candidates) {
          const { low, high } = chains.find((chain) => chain.shuntAt === shuntAt)!;
          // Q of every section, from Q² + 1 = (Rhigh/Rlow)^(1/n).
          expect(Math.abs((sectionQ ** 2 + 1) / (high / low) ** (1 / sections) - 1)).toBeLessThan(1e-12);
        }
      }),
      runs,
    );
  });

  it('is the two-element network when it has one section', () => {
    fc.assert(
      fc.property(problem, ({ source, load, f0, aim: sought }) => {
        const target = aimed(source, sought);
        const arms = (found: readonly { readonly arms: readonly unknown[] }[]) => found.map((one) => one.arms);
        expect(arms(cascade(target, impedance(load), f0, [1]).candidates)).toEqual(
          arms(twoElement(target, impedance(load), f0).candidates),
        );
      }),
      runs,
    );
  });
});

describe('cascade() between two resistances', () => {
  it('steps through equal ratios, each section of the same Q and of the form that is said', () => {
    fc.assert(
      fc.property(resistance, resistance, frequency, (rs, rl, f0) => {
        fc.pre(Math.abs(rs / rl - 1) > 1e-3);
        const { candidates } = cascade(new Complex(rs, 0), new Complex(rl, 0), f0, all);
        expect(candidates).toHaveLength(12);
        for (const { arms, sections: n, pass } of candidates) {
          expect(arms).toHaveLength(2 * n);
          expect(formOf(arms)).toBe(pass);
          for (let k = 1; k <= n; k += 1) {
            // Looking in after k of the n sections, counted from the load: RL^(1 − k/n)·RS^(k/n), without reactance.
            const step = ladderInput(arms.slice(2 * (n - k)), new Complex(rl, 0), f0);
            const wanted = rl ** (1 - k / n) * rs ** (k / n);
            const q = Math.sqrt(Math.max(rs / rl, rl / rs));
            expect(step.sub(wanted).abs() / wanted).toBeLessThan(1e-13 * (1 + q));
          }
        }
      }),
      runs,
    );
  });
});

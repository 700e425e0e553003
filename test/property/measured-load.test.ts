import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import { measuredTermination } from '../../src/measured/measured-termination.ts';
import type { CircuitModel } from '../../src/network/circuit-model.ts';
import type { Termination } from '../../src/network/termination.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { recordOf } from '../unit/record-of.ts';
import { decades } from './random-loads.ts';
import { resonant, sampled } from './sampled.ts';

const f0 = 100e6;
const base = recordOf({ frequency: '100M', source: '50', load: '50', band: '98M..102M', 'return-loss': '10' });
const into = (load: Termination, method: DesignRecord['method']): DesignRecord => ({
  ...base,
  method,
  sections: 2,
  loads: [{ name: '', termination: load }],
});

const model: fc.Arbitrary<CircuitModel> = fc.oneof(
  fc
    .tuple(
      fc.constantFrom('rlc-series' as const, 'rlc-parallel' as const),
      decades(5, 500),
      decades(0.5, 10),
      decades(0.9, 1.1),
    )
    .map(([kind, r, q, off]) => resonant(kind, r, q, f0 * off)),
  fc
    .tuple(decades(5, 500), decades(0.9, 1.1), decades(0.5, 10))
    .map(([r, off, q]) => ({ model: 'antenna' as const, values: [r, f0 * off, q] })),
  fc.tuple(decades(5, 200), decades(5e-12, 5e-10)).map(([r, c]) => ({ model: 'rc-series' as const, values: [r, c] })),
);

describe('design(record) of measured data', () => {
  it('is that of the model from which the data were sampled, within the error of the interpolation', () => {
    // 1001 samples from 50 MHz to 150 MHz: a half-power band has 100 of them or more, a third-order curve through them
    // is within 1e-5 or so of Γ.
    const hz = Array.from({ length: 1001 }, (_, k) => 50e6 + k * 1e5 + 137);
    fc.assert(
      fc.property(
        model,
        fc.constantFrom<DesignRecord['method']>('two-element', 'pi', 'tee', 'cascade'),
        (load, method) => {
          const data = measuredTermination(sampled(load, hz), 'load.s1p');
          const [found, wanted] = [design(into(data, method)), design(into(load, method))];
          expect(found.options.map(({ id }) => id)).toEqual(wanted.options.map(({ id }) => id));
          found.options.forEach((option, k) => {
            const exact = wanted.options[k]!;
            option.arms.forEach(({ arm, part, value }, a) => {
              const other = exact.arms[a]!;
              expect([arm, part]).toEqual([other.arm, other.part]);
              expect(Math.abs(value / other.value - 1)).toBeLessThan(5e-3);
            });
            const gammas = [option, exact].map(({ worstReturnLossDb }) => 10 ** (-worstReturnLossDb! / 20));
            expect(Math.abs(gammas[0]! - gammas[1]!)).toBeLessThan(1e-3);
            expect(Math.abs(option.transducerGain - 1)).toBeLessThan(1e-6);
            for (const edge of ['lowHz', 'highHz'] as const) {
              const [a, b] = [option.halfPower[edge], exact.halfPower[edge]];
              if (a !== null && b !== null) expect(Math.abs(a / b - 1)).toBeLessThan(1e-3);
              // Beyond the data nothing is said, not even that there is no edge.
              if (a === null && b !== null) expect(b < hz[0]! * 1.001 || b > hz[1000]! * 0.999).toBe(true);
            }
          });
          expect(found.ceiling!.estimate).toBe(true);
          expect(wanted.ceiling!.estimate).toBe(false);
        },
      ),
      { numRuns: 60 },
    );
  });

  it('estimates the ceiling of a sampled one-resonance load as that of its model, within 1 %', () => {
    const hz = Array.from({ length: 201 }, (_, k) => 90e6 + k * 1e5);
    fc.assert(
      fc.property(
        decades(5, 500),
        decades(2, 30),
        fc.constantFrom('rlc-series' as const, 'rlc-parallel' as const),
        (r, q, kind) => {
          const load = resonant(kind, r, q, Math.sqrt(98e6 * 102e6));
          const data = measuredTermination(sampled(load, hz), 'load.s1p');
          const [found, wanted] = [design(into(data, 'two-element')), design(into(load, 'two-element'))];
          expect(Math.abs(found.ceiling!.q / wanted.ceiling!.q - 1)).toBeLessThan(0.01);
          expect(wanted.ceiling!.q).toBeCloseTo(q, 6);
          expect(found.ceiling!.governs).toBe('load');
        },
      ),
      { numRuns: 60 },
    );
  });
});

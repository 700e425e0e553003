import fc from 'fast-check';
import type { Arm } from '../../src/network/arm.ts';
import type { Termination } from '../../src/network/termination.ts';
import type { Span } from '../../src/quantity/span.ts';

// The same cases in every run; another seed is another run's business.
fc.configureGlobal({ seed: 20_260_131 });

/** Spread evenly over decades, both ends included. */
export const decades = (low: number, high: number): fc.Arbitrary<number> =>
  fc.double({ min: Math.log10(low), max: Math.log10(high), noNaN: true }).map((exponent) => 10 ** exponent);

/** A part of a given reactance at a frequency: H or F. */
const henry = (ohm: number, hz: number): number => ohm / (2 * Math.PI * hz);
const farad = (ohm: number, hz: number): number => 1 / (2 * Math.PI * hz * ohm);

/** Terminations around 50 Ω with one or two reactances, whose behaviour is that of real parts at every frequency. */
export const reactive = (hz: number): fc.Arbitrary<Termination> => {
  const ohms = decades(1, 2500);
  const q = decades(0.05, 100);
  return fc.oneof(
    fc
      .tuple(ohms, q, fc.constantFrom(-1, 1), fc.constantFrom('series' as const, 'parallel' as const))
      .map(([r, own, sign, behaviour]) => ({ r, x: sign * own * r, behaviour })),
    fc.tuple(ohms, q).map(([r, own]) => ({ model: 'rc-series' as const, values: [r, farad(own * r, hz)] })),
    fc.tuple(ohms, q).map(([r, own]) => ({ model: 'rl-series' as const, values: [r, henry(own * r, hz)] })),
    fc.tuple(ohms, q).map(([r, own]) => ({ model: 'rc-parallel' as const, values: [r, farad(r / own, hz)] })),
    fc.tuple(ohms, q).map(([r, own]) => ({ model: 'rl-parallel' as const, values: [r, henry(r / own, hz)] })),
    fc.tuple(ohms, q, decades(0.2, 5)).map(([r, own, off]) => ({
      model: 'rlc-series' as const,
      values: [r, henry(own * r, hz), farad(own * r * off, hz)],
    })),
    fc.tuple(ohms, q, decades(0.2, 5)).map(([r, own, off]) => ({
      model: 'rlc-parallel' as const,
      values: [r, henry(r / own, hz), farad((r / own) * off, hz)],
    })),
    fc
      .tuple(ohms, decades(0.7, 1.4), q)
      .map(([r, off, own]) => ({ model: 'antenna' as const, values: [r, hz * off, own] })),
  );
};

/** A band around a frequency, of any width from a thousandth to two octaves. */
export const bandAround = (hz: number): fc.Arbitrary<Span> =>
  fc
    .tuple(decades(1e-3, 1.4), fc.double({ min: 0, max: 1, noNaN: true }))
    .map(([width, where]) => ({ low: hz * Math.exp(-width * where), high: hz * Math.exp(width * (1 - where)) }));

/** Any ladder of up to eight arms, reactances about 50 Ω within three decades. */
export const anyLadder = (hz: number): fc.Arbitrary<readonly Arm[]> =>
  fc
    .tuple(
      fc.constantFrom(0, 1),
      fc.array(fc.tuple(fc.constantFrom('inductor' as const, 'capacitor' as const), decades(2, 2000)), {
        maxLength: 8,
      }),
    )
    .map(([first, parts]) =>
      parts.map(([part, ohm], k) => ({
        arm: (k + first) % 2 === 0 ? ('series' as const) : ('shunt' as const),
        part,
        value: part === 'inductor' ? henry(ohm, hz) : farad(ohm, hz),
      })),
    );

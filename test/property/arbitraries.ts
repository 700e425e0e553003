import fc from 'fast-check';
import type { Aim, Behaviour, OneImpedance } from '../../src/network/termination.ts';

// The same cases in every run; another seed is another run's business.
fc.configureGlobal({ seed: 20_260_131 });

/** Spread evenly over decades, both ends included. */
export const logUniform = (low: number, high: number): fc.Arbitrary<number> =>
  fc
    .double({ min: Math.log10(low), max: Math.log10(high), noNaN: true })
    .map((exponent) => Math.min(high, Math.max(low, 10 ** exponent)));

/** 1 kHz to 10 GHz. */
export const frequency = logUniform(1e3, 1e10);
export const aim = fc.constantFrom<Aim>('conjugate', 'reflectionless');
const behaviour = fc.constantFrom<Behaviour>('constant', 'series', 'parallel');

/** R from `low` to `high`, Ω; |X|/R up to `mostQ`, of either sign or none. */
export const termination = (low: number, high: number, mostQ: number): fc.Arbitrary<OneImpedance> =>
  fc
    .tuple(logUniform(low, high), fc.constantFrom(-1, 0, 1), logUniform(1e-6, mostQ), behaviour)
    .map(([r, sign, q, away]) => ({ r, x: sign === 0 ? 0 : sign * q * r, behaviour: away }));

/** 1 mΩ to 1 MΩ with reactance up to 10 000 times the resistance. */
export const anyTermination = termination(1e-3, 1e6, 1e4);

export const resistance = logUniform(1e-3, 1e6);

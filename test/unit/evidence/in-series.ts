import type { VariedPart } from '../../../src/evidence/spread.ts';
import { prepareSubject, type PreparedSubject } from '../../../src/evidence/subject.ts';
import type { RealArm } from '../../../src/network/real-arm.ts';
import { endsOver } from '../../../src/network/sweep.ts';

export const f0 = 1e6;
const omega = 2 * Math.PI * f0;
const lossless = { q: null, qSlope: 0, parallelF: 0, seriesH: 0 } as const;
export const inductor = (ohm: number): RealArm => ({
  arm: 'series',
  part: 'inductor',
  value: ohm / omega,
  ...lossless,
});
export const capacitor = (ohm: number): RealArm => ({
  arm: 'series',
  part: 'capacitor',
  value: 1 / (omega * ohm),
  ...lossless,
});
export const varied = (designator: string, armIndex: number, tolerance: number): VariedPart => {
  return { designator, armIndex, tolerance, weight: 1, adds: true };
};

/** Everything in series between 50 Ω and 50 Ω, at one frequency: |Γ|² = X²/(100² + X²) of the reactance X left over. */
export function series(arms: readonly RealArm[], parts: readonly VariedPart[]): PreparedSubject {
  const fifty = { r: 50, x: 0, behaviour: 'constant' } as const;
  const states = [{ name: 'on the bench', ends: endsOver(fifty, fifty, f0, Float64Array.of(f0)) }];
  const spread = { source: 0, load: 0 };
  const common = { states, f0, aim: 'conjugate', spread, distribution: 'uniform' } as const;
  return prepareSubject({ ladder: { arms, strayF: 0 }, parts, ...common });
}
/** Return loss, dB. */
export const db = (x: number): number => -10 * Math.log10(x ** 2 / (100 ** 2 + x ** 2));

import { Complex } from 'complex.js';
import type { Arm } from '../../src/network/arm.ts';
import { ladderInput } from '../../src/network/ladder-input.ts';
import { prepareLadder } from '../../src/network/ladder.ts';
import { endsOver, sweep } from '../../src/network/sweep.ts';
import type { Aim, OneImpedance, Termination } from '../../src/network/termination.ts';

export const impedance = ({ r, x }: OneImpedance): Complex => new Complex(r, x);

/** What the source is to see: ZS* or ZS, from the definition of the aims. */
export const aimed = ({ r, x }: OneImpedance, aim: Aim): Complex => new Complex(r, aim === 'conjugate' ? -x : x);

/** |X|/R */
export const qOf = ({ re, im }: Complex): number => Math.abs(im) / re;

/** 1/G, the parallel resistance. */
export const parallelR = ({ re, im }: Complex): number => re + (im / re) * im;

/**
 * Relative difference to allow for between what is seen and what was aimed at: 1e-9, or what double precision can give.
 * An arm's immittance is exact to a few ε; it is the difference of terms as large as (Q + QL)·G or (Q + QT)·R, whose
 * rounding moves the impedance seen by ε·(Q + QL + QT) of itself; so does the subtraction of currents (voltages) when
 * it is looked into. Each further section adds its own 1 + Q. Nothing is squared, since |dZ| = |Z|²·|dY| and
 * |Z|² = Rlow·Rhigh. 16 ε for the handful of operations along the way; 2e-12 where an arm was left out because its
 * immittance is less than 1e-12 of the two terms that make it.
 */
export function attainable(target: Complex, load: Complex, { arms, sectionQ, sections }: Network): number {
  const n = Math.max(1, sections);
  const relative = arms.length < 2 * n ? 2e-12 : 16 * Number.EPSILON;
  return Math.max(1e-9, relative * (1 + qOf(target) + qOf(load) + n * (1 + sectionQ)));
}

interface Network {
  readonly arms: readonly Arm[];
  readonly sectionQ: number;
  readonly sections: number;
}

/** The same arms with values within a part in 1e9. */
export const alike = (a: readonly Arm[], b: readonly Arm[]): boolean =>
  a.length === b.length &&
  a.every(({ arm, part, value }, k) => {
    const other = b[k]!;
    return arm === other.arm && part === other.part && Math.abs(value / other.value - 1) <= 1e-9;
  });

/** |Zin − ZT|/|ZT| at one frequency, with the load as it is there. */
export const seenApart = (arms: readonly Arm[], load: Complex, target: Complex, hz: number): number =>
  ladderInput(arms, load, hz).sub(target).abs() / target.abs();

/** Transducer gain and Γ by the sweep, at any frequencies. */
export function swept(
  arms: readonly Arm[],
  source: Termination,
  load: Termination,
  f0: number,
  hz: number[],
  aim: Aim,
) {
  return sweep(prepareLadder(arms), endsOver(source, load, f0, Float64Array.from(hz)), aim);
}

import type { Arm } from '../../network/arm.ts';
import type { Span } from '../../quantity/span.ts';
import { asin, log, sin } from '../../quantity/elementary.ts';

/** Element limits as logarithms: the variables of a fit are unbounded, the values stay inside. */
export type Limits = Record<Arm['part'], { readonly middle: number; readonly half: number }>;

export function limitsOf({ inductorH, capacitorF }: { readonly inductorH: Span; readonly capacitorF: Span }): Limits {
  const of = ({ low, high }: Span) => ({
    middle: log(low * high) / 2,
    half: Math.max(log(high / low) / 2, 1e-12),
  });
  return { inductor: of(inductorH), capacitor: of(capacitorF) };
}

/** Logarithm of a value from its unbounded variable: middle + half·sin t stays within the limits. */
export const fromInside = (t: number, { middle, half }: Limits[Arm['part']]): number => middle + half * sin(t);

/** The variable of a value's logarithm; at a limit, a little inside, where the slope is not lost. */
export function toInside(log: number, { middle, half }: Limits[Arm['part']]): number {
  return asin(Math.max(-0.999, Math.min(0.999, (log - middle) / half)));
}

import type { Fault, FaultKind } from '../as-built-figures.ts';
import type { Board } from './board.ts';

/** One kind of cause at one place, its size a function of t from `from` to 1. */
export interface Hypothesis {
  readonly kind: FaultKind;
  readonly at: number;
  readonly from: -1 | 0;
  readonly size: (t: number) => number;
}

export const faultOf = ({ kind, at, size }: Hypothesis, t: number): Fault => ({ kind, at, size: size(t) });

/** Quality factors tried. */
const leastQ = 1;
export const mostQ = 2000;

/** Impedances that set the scale of what is tried, at a frequency amid the measured ones: |ZS| and |ZL|, Ω. */
export interface Scale {
  readonly omega: number;
  readonly source: number;
  readonly load: number;
}

/**
 * Every single cause that is tried. Two-sided ones are dense about none, where most errors are; those that can't be
 * less than nothing are spread evenly by their logarithm.
 */
export function hypothesesOf({ arms, straysF }: Board, { omega, source, load }: Scale): Hypothesis[] {
  const [lowOhm, highOhm] = [Math.min(source, load), Math.max(source, load)];
  const twoSided = (most: number) => (t: number) => most * t ** 3;
  const factor = (t: number): number => 10 ** (t ** 3);
  const spread = (low: number, high: number) => (t: number) => low * (high / low) ** t;
  const farad = spread(1e-4 / (omega * highOhm), 10 / (omega * lowOhm));
  const henry = spread((1e-4 * lowOhm) / omega, (10 * highOhm) / omega);
  return [
    ...arms.flatMap((arm, at): Hypothesis[] => [
      { kind: 'value', at, from: -1, size: factor },
      { kind: 'quality', at, from: 0, size: spread(leastQ, mostQ) },
      ...(arm.arm === 'shunt'
        ? [{ kind: 'lead' as const, at, from: 0 as const, size: (t: number) => henry(t) - arm.seriesH }]
        : []),
    ]),
    // At the load's own node a stray is the same as a capacitance of the load, which is tried below.
    ...straysF.slice(0, -1).map((assumed, at): Hypothesis => ({
      kind: 'stray',
      at,
      from: 0,
      size: (t) => farad(t) - assumed,
    })),
    { kind: 'load resistance', at: 0, from: -1, size: factor },
    { kind: 'load reactance', at: 0, from: -1, size: twoSided(10 * load) },
    { kind: 'load inductance', at: 0, from: -1, size: twoSided((10 * load) / omega) },
    { kind: 'load capacitance', at: 0, from: -1, size: twoSided(10 / (omega * load)) },
  ];
}

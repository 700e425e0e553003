import type { Complex } from 'complex.js';
import type { Arm } from '../network/arm.ts';
import { partOf } from '../network/arm.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import { expm1, log1p, power } from '../quantity/elementary.ts';

/** Which end has the shunt arm, and so which end is the higher resistance. */
export type ShuntAt = 'source' | 'load';

/** Resistances between which sections step, for one arrangement of two complex ends. */
export interface Chain {
  readonly shuntAt: ShuntAt;
  /** Series resistance of the end with the series arm, Ω. */
  readonly low: number;
  /** Parallel resistance, 1/G, of the end with the shunt arm, Ω. */
  readonly high: number;
  /** high/low − 1, from the difference of the two: their quotient would leave no digit of a small one. */
  readonly excess: number;
}

/** Rounding in two resistances that differ below which they are the same: Q would be less than 3e-7. */
const equalWithin = 1e-13;
/** Part of its terms below which an arm's immittance is rounding and the arm is left out. */
const zeroWithin = 1e-12;

/**
 * @param target impedance to be seen from the source, Ω
 * @param load   Ω
 */
export function chainBetween(target: Complex, load: Complex, shuntAt: ShuntAt): Chain {
  const [lowEnd, highEnd] = shuntAt === 'load' ? [target, load] : [load, target];
  const low = lowEnd.re;
  const apart = highEnd.re - low;
  // 1/G = R + X²/R. Of equal resistances X alone decides, and is exact however small.
  const reactive = (highEnd.im / highEnd.re) * highEnd.im;
  const excess = (apart + reactive) / low;
  const same = apart !== 0 && Math.abs(excess) < equalWithin;
  return { shuntAt, low, high: highEnd.re + reactive, excess: same ? 0 : excess };
}

/** 1/G of an impedance, Ω. */
export const parallelResistance = (z: Complex): number => (z.im === 0 ? z.re : z.re + (z.im / z.re) * z.im);

/**
 * Q of each of n equal-ratio sections: sqrt((high/low)^(1/n) − 1).
 *
 * @returns null when the chain doesn't rise, so that no such network exists
 */
export function sectionQ({ excess }: Chain, sections: number): number | null {
  if (excess < 0) return null;
  return Math.sqrt(sections === 1 ? excess : expm1(log1p(excess) / sections));
}

/**
 * Arms of n sections along a chain; reactance at the ends is absorbed by (or, of the other sign, resonated in) the
 * outer arms. Section k has series reactance ±Q·Rlow and shunt susceptance ±Q/Rhigh of its own two resistances.
 *
 * For n = 1 these are the roots of the two-element equations
 * B = −BL ± sqrt(GL/RT − GL²), X = XT − Im 1/(GL + j(B + BL)), since with Q = sqrt(1/(GL·RT) − 1) the first root is
 * ±GL·Q and Im 1/(GL ± jGL·Q) is ∓Q·RT; and their duals with the shunt arm at the source.
 *
 * @param sign +1: nominally series L and shunt C (low-pass); −1: series C and shunt L (high-pass)
 * @returns arms, source side first; an arm that comes out as nothing is left out
 */
export function chainArms(
  chain: Chain,
  target: Complex,
  load: Complex,
  frequencyHz: number,
  sections: number,
  q: number,
  sign: 1 | -1,
): Arm[] {
  const ratio = power(chain.high / chain.low, 1 / sections);
  const arms: (Arm | null)[] = [];
  // From the low end to the high end.
  for (let k = 0; k < sections; k += 1) {
    const low = chain.low * power(ratio, k);
    const high = k === sections - 1 ? chain.high : low * ratio;
    const x = sign * q * low;
    const b = (sign * q) / high;
    const atLowEnd = k === 0;
    const atHighEnd = k === sections - 1;
    const endX = atLowEnd ? (chain.shuntAt === 'load' ? target.im : -load.im) : 0;
    const endB = atHighEnd ? (chain.shuntAt === 'load' ? -susceptance(load) : susceptance(target)) : 0;
    arms.push(partOf('series', sum(x, endX), frequencyHz), partOf('shunt', sum(b, endB), frequencyHz));
  }
  const present = arms.filter((arm) => arm !== null);
  return chain.shuntAt === 'load' ? present : present.reverse();
}

/** B of an impedance, S. */
export const susceptance = (z: Complex): number => -z.im / (z.re * z.re + z.im * z.im);

/** A sum that is exactly zero where only rounding is left. */
export const sum = (a: number, b: number): number =>
  Math.abs(a + b) <= zeroWithin * (Math.abs(a) + Math.abs(b)) ? 0 : a + b;

/** The condition RT <= 1/GL (or its dual RL <= 1/GT) that failed, with its numbers. */
export function whyNoChain({ shuntAt, low, high }: Chain): string {
  const numbers = `${formatQuantity(low, 'Ω')} > ${formatQuantity(high, 'Ω')} (ratio ${low / high < 1000 ? formatFixed(low / high, 3) : low / high < 1e6 ? formatFixed(low / high, 0) : (low / high).toExponential(2)})`;
  return shuntAt === 'load'
    ? `needs RT ≤ 1/GL, the resistance to be seen at most the load's parallel resistance; here ${numbers}`
    : `needs RL ≤ 1/GT, the load's resistance at most the parallel resistance to be seen; here ${numbers}`;
}

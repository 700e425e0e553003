import { log10 } from '../quantity/elementary.ts';

/** Round values of an axis and the decimals that tell them apart. */
export interface Ticks {
  readonly values: readonly number[];
  readonly decimals: number;
}

/**
 * Multiples of 1, 2 or 5 times a power of ten within [low, high].
 *
 * @param most  at most so many intervals; >= 1
 */
export function ticks(low: number, high: number, most: number): Ticks {
  const least = (high - low) / most;
  if (!(least > 0)) return { values: [low], decimals: 0 };
  const power = Math.floor(log10(least));
  const mantissa = least / 10 ** power;
  // Rounding in the division must not turn an exact 2 into 2.0000000000000004 and a step of 5.
  const [lead, raise] =
    mantissa <= 1 + 1e-9 ? [1, 0] : mantissa <= 2 + 1e-9 ? [2, 0] : mantissa <= 5 + 1e-9 ? [5, 0] : [1, 1];
  const exponent = power + raise;
  const step = lead * 10 ** exponent;
  const values: number[] = [];
  for (let k = Math.ceil(low / step - 1e-9); k * step <= high + step * 1e-9; k += 1) {
    values.push(Number((k * step).toPrecision(12)));
  }
  return { values, decimals: Math.max(0, -exponent) };
}

/** 1, 2 and 5 times every power of ten within [low, high], both > 0. */
export function decadeTicks(low: number, high: number): readonly number[] {
  const values: number[] = [];
  for (let power = Math.floor(log10(low)); power <= Math.ceil(log10(high)); power += 1) {
    for (const lead of [1, 2, 5]) {
      const value = Number(`${lead}e${power}`);
      if (value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)) values.push(value);
    }
  }
  return values;
}

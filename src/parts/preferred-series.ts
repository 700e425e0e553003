import { log10, power } from '../quantity/elementary.ts';

export type PreferredSeries = 'E3' | 'E6' | 'E12' | 'E24' | 'E48' | 'E96' | 'E192';

/** IEC 60063: E24 follows no formula, and E12, E6 and E3 are every second, fourth and eighth of it. */
const e24 = [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91];

/** E192 is 10^(i/192) to three digits, but 9.20 where that gives 9.19; E96 and E48 are every second and fourth. */
const e192 = Array.from({ length: 192 }, (_, i) => (i === 185 ? 920 : Math.round(100 * power(10, i / 192))));

/** Relative play of the ends: a limit that was computed may differ in its last bits from the one that was meant. */
const play = 1e-9;

/**
 * Values of a preferred series (IEC 60063:2015) from `low` to `high`, ascending; each is the number that its decimal
 * literal gives.
 *
 * @param low  H or F, above 0
 * @param high the same unit
 */
export function preferredValues(series: PreferredSeries, low: number, high: number): number[] {
  const perDecade = Number(series.slice(1));
  const table = perDecade > 24 ? e192 : e24;
  const digits = table === e24 ? 1 : 2;
  const mantissas = table.filter((_, i) => i % (table.length / perDecade) === 0);
  const values: number[] = [];
  for (let decade = Math.floor(log10(low)) - 1; decade <= log10(high) + 1; decade += 1) {
    for (const mantissa of mantissas) values.push(Number(`${String(mantissa)}e${String(decade - digits)}`));
  }
  return values.filter((value) => value >= low * (1 - play) && value <= high * (1 + play));
}

/**
 * Those of `values` that lie nearest to `near`: at most `below` that are no greater and at most `above` that are no
 * smaller, ascending. One that is `near` itself counts on both sides and is given once.
 *
 * @param values ascending, above 0
 */
export function neighbours(values: readonly number[], near: number, below: number, above: number): number[] {
  const firstNoSmaller = values.findIndex((value) => value >= near * (1 - play));
  const upper = firstNoSmaller < 0 ? values.length : firstNoSmaller;
  const firstGreater = values.findIndex((value) => value > near * (1 + play));
  const lower = firstGreater < 0 ? values.length : firstGreater;
  return values.slice(Math.min(upper, Math.max(0, lower - below)), Math.max(lower, upper + above));
}

import type { PrintedFigure } from '../design/printed-figures.ts';

type Value = PrintedFigure['value'];

/** One figure as it was printed and as it is computed now. */
export interface ComparedFigure {
  readonly name: string;
  readonly unit: string;
  /** undefined: it wasn't printed, or isn't any more. */
  readonly then: Value | undefined;
  readonly now: Value | undefined;
  readonly outcome: 'same' | 'within rounding' | 'differs';
}

/**
 * Where numbers differ by less they agree: another processor rounds another last digit. Relative; for ratios and
 * decibels of a ratio's size, for ohms of 1 Ω, because those may be what is left of a difference that should be nothing.
 */
export const rounding = 1e-9;
export const roundingWords = '1 in 10⁹';

/** Every figure of either, in the order of now; those that are no longer computed come last. */
export function compareFigures(
  then: readonly PrintedFigure[],
  now: readonly PrintedFigure[],
): readonly ComparedFigure[] {
  const before = keyed(then);
  const compared = [...keyed(now)].map(([key, { name, unit, value }]) => {
    const printed = before.get(key);
    before.delete(key);
    const same = printed !== undefined && printed.unit === unit;
    const outcome = same ? outcomeOf(printed.value, value, unit) : ('differs' as const);
    return { name, unit, then: printed?.value, now: value, outcome };
  });
  const gone = [...before.values()].map(({ name, unit, value }): ComparedFigure => ({
    name,
    unit,
    then: value,
    now: undefined,
    outcome: 'differs',
  }));
  return [...compared, ...gone];
}

/** By name; the second of a name is another figure than the first. */
function keyed(figures: readonly PrintedFigure[]): Map<string, PrintedFigure> {
  const out = new Map<string, PrintedFigure>();
  const counts = new Map<string, number>();
  for (const figure of figures) {
    const count = counts.get(figure.name) ?? 0;
    counts.set(figure.name, count + 1);
    out.set(`${figure.name}\n${String(count)}`, figure);
  }
  return out;
}

function outcomeOf(then: Value, now: Value, unit: string): ComparedFigure['outcome'] {
  if (then === now) return 'same';
  if (typeof then !== 'number' || typeof now !== 'number') return 'differs';
  return agree(then, now, unit) ? 'within rounding' : 'differs';
}

function agree(a: number, b: number, unit: string): boolean {
  if (unit === 'dB') return Math.abs(10 ** (-a / 20) - 10 ** (-b / 20)) <= rounding;
  const least = unit === '' || unit === 'Ω' ? 1 : 0;
  return Math.abs(a - b) <= rounding * Math.max(Math.abs(a), Math.abs(b), least);
}

import { formatQuantity } from '../quantity/format.ts';
import type { ComparedFigure } from './compare-figures.ts';

const few = 6;
const all = 17;

/** A figure as it was printed and as it is now, with as many digits as tell them apart. */
export function figureWords({ then, now, unit }: Pick<ComparedFigure, 'then' | 'now' | 'unit'>): {
  readonly then: string;
  readonly now: string;
} {
  const words = (digits: number) => ({
    then: then === undefined ? 'not printed' : valueWords(then, unit, digits),
    now: now === undefined ? 'not computed' : valueWords(now, unit, digits),
  });
  const short = words(few);
  return short.then === short.now && then !== now ? words(all) : short;
}

function valueWords(value: number | string | boolean | null, unit: string, digits: number): string {
  if (value === null) return 'none';
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') return value;
  // Decibels and plain numbers take no prefix.
  if (unit !== '' && unit !== 'dB') return formatQuantity(value, unit, digits);
  return `${String(Number(value.toPrecision(digits)))} ${unit}`.trimEnd().replaceAll('-', '−');
}

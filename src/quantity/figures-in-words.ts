import { formatFixed, formatQuantity } from './format.ts';
import type { Span } from './span.ts';
import { log10 } from './elementary.ts';

/** "118.0 MHz to 137.0 MHz"; a narrow span with as many digits as show its width. */
export function frequencySpan({ low, high }: Span): string {
  const width = high > low ? Math.ceil(-log10((high - low) / high)) : 0;
  const digits = Math.min(12, Math.max(4, width + 2));
  return `${formatQuantity(low, 'Hz', digits)} to ${formatQuantity(high, 'Hz', digits)}`;
}

/** Two decibel figures that must not look the same when they aren't: two decimals, or as many as tell them apart. */
export function decibelPair(a: number, b: number): readonly [string, string] {
  let decimals = 2;
  while (a !== b && decimals < 9 && formatFixed(a, decimals) === formatFixed(b, decimals)) decimals += 1;
  return [`${formatFixed(a, decimals)} dB`, `${formatFixed(b, decimals)} dB`];
}

/** A return loss in words: beyond 100 dB the figure is rounding. */
export const returnLossWords = (db: number): string => (db > 100 ? 'over 100 dB' : `${formatFixed(db, 2)} dB`);

import { formatFixed } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import { decadeTicks, ticks } from './ticks.ts';
import { log, log10, power } from '../quantity/elementary.ts';

const prefixes = [
  [1e9, 'GHz'],
  [1e6, 'MHz'],
  [1e3, 'kHz'],
  [1, 'Hz'],
] as const;

export interface FrequencyAxis {
  /** 0 at the low end of the span, 1 at the high end. */
  readonly at: (hertz: number) => number;
  readonly ticks: readonly { readonly hertz: number; readonly text: string }[];
  readonly unit: string;
}

/**
 * Scale of a frequency axis: linear, or logarithmic when the span exceeds three octaves.
 *
 * @param span  Hz, low > 0
 * @param most  at most so many intervals between ticks
 */
export function frequencyAxis(span: Span, most: number): FrequencyAxis {
  // The unit that writes the span's middle without leading zeros, so that 400 MHz to 1.1 GHz reads in MHz.
  const middle = Math.sqrt(span.low * span.high);
  const [size, unit] = prefixes.find(([value]) => middle >= value) ?? [1, 'Hz'];
  if (isLogarithmic(span)) {
    const ratio = log(span.high / span.low);
    const all = decadeTicks(span.low, span.high);
    const shown = all.length > most + 1 ? all.filter((hertz) => hertz.toExponential().startsWith('1e')) : all;
    return {
      at: (hertz) => log(hertz / span.low) / ratio,
      ticks: shown.map((hertz) => ({
        hertz,
        text: formatFixed(hertz / size, Math.max(0, -Math.floor(log10(hertz / size)))),
      })),
      unit,
    };
  }
  const { values, decimals } = ticks(span.low / size, span.high / size, most);
  return {
    at: (hertz) => (hertz - span.low) / (span.high - span.low || 1),
    ticks: values.map((value) => ({ hertz: value * size, text: formatFixed(value, decimals) })),
    unit,
  };
}

const isLogarithmic = ({ low, high }: Span): boolean => high > 8 * low;

/** Frequency at a place of the axis, Hz: the inverse of `at`. */
export function frequencyAt(span: Span, place: number): number {
  return isLogarithmic(span)
    ? span.low * power(span.high / span.low, place)
    : span.low + place * (span.high - span.low);
}

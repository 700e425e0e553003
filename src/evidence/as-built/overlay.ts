import { returnLossDb } from '../../network/figures-of-merit.ts';
import type { Ends } from '../../network/sweep.ts';
import { fillTermination, rangeOf } from '../../network/termination-at.ts';
import type { Aim, Termination } from '../../network/termination.ts';
import type { MeasuredData } from '../../measured/measured.ts';
import type { Span } from '../../quantity/span.ts';
import type { Overlay } from '../as-built-figures.ts';
import { aimedReflection, type Reflections } from './aimed-reflection.ts';

/** Part of a span within others; null: they have none in common. */
export function common(first: Span, ...others: readonly (Span | null)[]): Span | null {
  let { low, high } = first;
  for (const span of others) {
    if (span === null) continue;
    low = Math.max(low, span.low);
    high = Math.min(high, span.high);
  }
  return low <= high ? { low, high } : null;
}

/** Part of a span for which all terminations say something. */
export const withinReach = (span: Span, terminations: readonly Termination[]): Span | null =>
  common(span, ...terminations.map(rangeOf));

/** Measured frequencies within a span, Hz. */
export const samplesWithin = ({ frequencyHz }: MeasuredData, span: Span | null): Float64Array =>
  Float64Array.from(span === null ? [] : frequencyHz.filter((hz) => span.low <= hz && hz <= span.high));

/**
 * What was measured, as reflection for the aim against the source at hand, whatever reference the file is in.
 *
 * @param ends frequencies within the data, with the source's impedances at them
 */
export function measuredReflection(
  measured: MeasuredData,
  ends: Pick<Ends, 'frequencyHz' | 'rs' | 'xs'>,
  aim: Aim,
): Reflections {
  const n = ends.frequencyHz.length;
  const [r, x] = [new Float64Array(n), new Float64Array(n)];
  // The design frequency plays no part in measured data.
  fillTermination({ measured }, 1, ends.frequencyHz, r, x);
  const gamma = { re: new Float64Array(n), im: new Float64Array(n) };
  for (let k = 0; k < n; k += 1) aimedReflection(k, r[k]!, x[k]!, 1, 0, ends, aim, gamma);
  return gamma;
}

/** Return loss at each frequency, dB, 0 to 200. */
export const returnLosses = ({ re, im }: Reflections): number[] =>
  Array.from(re, (value, k) => returnLossDb(value * value + im[k]! * im[k]!));

/** Measured and predicted side by side, as plain data. */
export const overlayOf = (frequencyHz: Float64Array, measured: Reflections, predicted: Reflections): Overlay => ({
  frequencyHz: Array.from(frequencyHz),
  measuredRe: Array.from(measured.re),
  measuredIm: Array.from(measured.im),
  measuredDb: returnLosses(measured),
  predictedRe: Array.from(predicted.re),
  predictedIm: Array.from(predicted.im),
  predictedDb: returnLosses(predicted),
});

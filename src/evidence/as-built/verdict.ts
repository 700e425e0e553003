import type { MeasuredData } from '../../measured/measured.ts';
import type { Ends } from '../../network/sweep.ts';
import type { Aim } from '../../network/termination.ts';
import type { Span } from '../../quantity/span.ts';
import type { AsBuiltVerdict } from '../as-built-figures.ts';
import type { Reflections } from './aimed-reflection.ts';
import { common, measuredReflection, returnLosses, samplesWithin } from './overlay.ts';

/**
 * Least return loss measured over the band: at every sample in it, and at its edges where the data reach them. A band
 * that isn't covered whole can fall short, but not be met.
 *
 * @param reach   part of the band for which the terminations say anything; null: nothing
 * @param predict terminations and the prediction's reflection at some frequencies
 */
export function verdictOf(
  measured: MeasuredData,
  bandHz: Span,
  requiredDb: number | null,
  reach: Span | null,
  aim: Aim,
  predict: (frequencyHz: Float64Array) => { readonly ends: Ends; readonly gamma: Reflections },
): AsBuiltVerdict {
  const [first, last] = [measured.frequencyHz[0]!, measured.frequencyHz.at(-1)!];
  // A part in 1e12 is the rounding of the file's own unit.
  const data = {
    low: first <= bandHz.low * (1 + 1e-12) ? Math.min(first, bandHz.low) : first,
    high: last >= bandHz.high * (1 - 1e-12) ? Math.max(last, bandHz.high) : last,
  };
  const coveredHz = reach === null ? null : common(bandHz, data, reach);
  const nothing = { bandHz, requiredDb, coveredHz: null, worstReturnLossDb: null, worstAtHz: null, predictedDb: null };
  if (coveredHz === null) return { verdict: 'not assessed', ...nothing };
  const { low, high } = coveredHz;
  const frequencyHz = Float64Array.from(new Set([low, ...samplesWithin(measured, coveredHz), high])).sort();
  const { ends, gamma } = predict(frequencyHz);
  const losses = returnLosses(measuredReflection(measured, ends, aim));
  const worstReturnLossDb = Math.min(...losses);
  const whole = low === bandHz.low && high === bandHz.high;
  const short = requiredDb !== null && worstReturnLossDb < requiredDb;
  return {
    verdict: short ? 'falls short' : requiredDb !== null && whole ? 'meets' : 'not assessed',
    requiredDb,
    bandHz,
    coveredHz,
    worstReturnLossDb,
    worstAtHz: frequencyHz[losses.indexOf(worstReturnLossDb)]!,
    predictedDb: Math.min(...returnLosses(gamma)),
  };
}

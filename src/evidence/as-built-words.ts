import { decibelPair, frequencySpan, returnLossWords } from '../quantity/figures-in-words.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import type { AsBuiltFigures, AsBuiltVerdict, Explanation, OutsideSpan } from './as-built-figures.ts';

/** Spans outside the tolerance band that are told one by one, the farthest ones. */
const spansTold = 4;

/** What the finished board does and why, in sentences for page and report. */
export function asBuiltWords(figures: AsBuiltFigures): readonly string[] {
  const { name, samples, referenceOhm, measuredHz, overlay, verdict, outside } = figures;
  const compared = overlay.frequencyHz.length;
  return [
    `The finished board was measured from the source side with the load attached: ${name}, ${String(samples)} samples, ${frequencySpan(measuredHz)}, in ${formatQuantity(referenceOhm, 'Ω')}; told here against the source itself.`,
    compared === 0
      ? 'Nothing of it lies within the sweep shown, so it is compared with nothing.'
      : `${String(compared)} ${compared === 1 ? 'sample lies' : 'samples lie'} within the sweep shown.`,
    attachedWords(figures),
    ...verdictWords(verdict),
    outside === null || compared === 0 ? '' : outsideWords(outside),
    ...causeWords(figures),
    remedyWords(figures),
  ].filter((sentence) => sentence !== '');
}

/** The part to replace and what that would do; '' where nothing is to be said. */
export function remedyWords({ remedy, verdict, alike }: AsBuiltFigures): string {
  if (remedy === null) {
    return alike > 0 && verdict.verdict !== 'meets' ? 'No single part on sale brings it noticeably closer.' : '';
  }
  const { words, beforeDb, afterDb, meets } = remedy;
  const required = verdict.requiredDb === null ? '' : `the ${decibelPair(afterDb, verdict.requiredDb)[1]} required`;
  const judged = meets === null ? '' : meets ? `, which holds ${required}` : `, still below ${required}`;
  const [before, after] = decibelPair(beforeDb, afterDb);
  return `With such a cause in force, ${words} brings the worst return loss over band and load states from ${before} to ${after}${judged}.`;
}

/** How it is known which load state was attached; '' where there is only one. */
export function attachedWords({ attached: { state, by, distances } }: AsBuiltFigures): string {
  if (by === 'only one') return '';
  if (by === 'engineer') return `The load state attached was “${state}”.`;
  if (distances.length === 0) return 'Which load state was attached is not said.';
  const each = distances.map((of) => `“${of.state}” ${gamma(of.distance)}`).join(', ');
  return `Which load state was attached is not said; “${state}” is nearest and is taken (RMS distance in Γ: ${each}).`;
}

/** What was measured in the band, against what was required and predicted. */
export function verdictWords(of: AsBuiltVerdict): readonly string[] {
  const { verdict, requiredDb, bandHz, coveredHz, worstReturnLossDb, worstAtHz, predictedDb } = of;
  const place = (span: typeof bandHz): string =>
    span.low === span.high ? `at ${formatQuantity(span.low, 'Hz', 5)}` : `over ${frequencySpan(span)}`;
  if (coveredHz === null || worstReturnLossDb === null || worstAtHz === null || predictedDb === null) {
    return [`Nothing was measured ${place(bandHz)}, so the requirement is not assessed.`];
  }
  const whole = coveredHz.low <= bandHz.low && coveredHz.high >= bandHz.high;
  const [found, asked] = decibelPair(worstReturnLossDb, requiredDb ?? worstReturnLossDb);
  const shown = worstReturnLossDb > 100 ? returnLossWords(worstReturnLossDb) : found;
  const where = coveredHz.low === coveredHz.high ? '' : ` (${formatQuantity(worstAtHz, 'Hz', 5)})`;
  const judged =
    requiredDb === null
      ? ''
      : verdict === 'falls short'
        ? `, below the ${asked} required`
        : `, at least the ${asked} required`;
  const said = `Measured ${place(coveredHz)}, the return loss is ${shown} at worst${where}${judged}; ${returnLossWords(predictedDb)} was predicted.`;
  if (whole) return [said];
  const rest = verdict === 'falls short' ? '' : ', so the requirement is not assessed';
  return [said, `The data don't cover the band, ${frequencySpan(bandHz)}${rest}; nothing is extrapolated.`];
}

/** Where the board lies outside the tolerance band, the farthest places first told. */
export function outsideWords(outside: readonly OutsideSpan[]): string {
  if (outside.length === 0) return 'It lies within the tolerance band at every sample.';
  const told = outside
    .toSorted((a, b) => b.byDb - a.byDb)
    .slice(0, spansTold)
    .sort((a, b) => a.low - b.low)
    .map(
      ({ low, high, side, byDb, atHz }) =>
        `${low === high ? `at ${formatQuantity(low, 'Hz', 5)}` : `from ${frequencySpan({ low, high })}`} up to ${formatFixed(byDb, 2)} dB ${side} it${low === high ? '' : ` (${formatQuantity(atHz, 'Hz', 5)})`}`,
    )
    .join('; ');
  const more = outside.length - spansTold;
  return `It lies outside the tolerance band: ${told}${more > 0 ? `; and in ${String(more)} smaller places` : ''}.`;
}

/** How far measurement and prediction are apart, and which single causes would explain it. */
export function causeWords({ conclusion, distance, explanations, alike }: AsBuiltFigures): readonly string[] {
  if (conclusion === 'not compared' || distance === null) return [];
  const whole = gamma(distance);
  if (conclusion === 'as predicted') {
    return [`The board is as predicted: ${whole} apart in Γ (RMS), no more than a measurement leaves.`];
  }
  const [best, ...others] = explanations;
  const apart = `Measurement and prediction are ${whole} apart in Γ (RMS).`;
  if (best === undefined) return [apart, 'No single cause that was tried brings them closer.'];
  if (conclusion === 'unexplained') {
    return [apart, `No single cause explains it: the nearest, ${told(best)}, takes too little away. Look for several.`];
  }
  if (conclusion === 'alike') {
    const each = explanations.slice(0, alike).map(told).join('; ');
    return [apart, `Any one of these explains it, and this measurement can't tell them apart: ${each}.`];
  }
  const next = others[0];
  return [
    apart,
    `The single cause that explains it best: ${told(best)}.${next === undefined ? '' : ` The next: ${told(next)}.`}`,
  ];
}

const told = ({ words, residual, withinTolerance }: Explanation): string =>
  `${words}${withinTolerance === null ? '' : withinTolerance ? ', within its tolerance' : ', beyond its tolerance'}, which leaves ${gamma(residual)}`;

/** A distance in Γ. */
export const gamma = (distance: number): string => (distance < 0.0005 ? 'under 0.001' : formatFixed(distance, 3));

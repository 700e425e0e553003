import type { HalfPower, Option, Response } from '../dossier.ts';
import { attenuationDb, mismatchLossDb, returnLossDb, vswr } from '../network/figures-of-merit.ts';
import { prepareLadder } from '../network/ladder.ts';
import { endsOver, sweep } from '../network/sweep.ts';
import { logGrid } from '../network/worst-in-band.ts';
import type { Span } from '../quantity/span.ts';
import type { DesignRecord, LoadState } from '../record/design-record.ts';

const points = 201;
/** Samples put around a peak that the others are too far apart to show. */
const peakPoints = 41;
/** A half-power band narrower than this part of the span is such a peak. */
const narrow = 1 / 20;

/** The span swept when none is asked for: half an octave to either side of f0, and the band with as much again. */
export function sweepSpan({ sweepHz, requirement: { frequencyHz, bandHz } }: DesignRecord, reach: Span | null): Span {
  if (sweepHz !== null) return sweepHz;
  const low = bandHz === null ? frequencyHz : bandHz.low;
  const high = bandHz === null ? frequencyHz : bandHz.high;
  const margin = Math.max(high / low, Math.SQRT2);
  return {
    low: Math.max(low / margin, frequencyHz / 1000, reach?.low ?? 0),
    high: Math.min(high * margin, frequencyHz * 1000, reach?.high ?? Infinity),
  };
}

/**
 * The chosen network over the span shown; the design frequency and the band's edges are among the samples, which are
 * the same for every load state.
 */
export function responseOf(
  record: DesignRecord,
  { name, termination }: LoadState,
  { arms, states }: Pick<Option, 'arms' | 'states'>,
  reach: Span | null,
): Response {
  const { frequencyHz: f0, bandHz } = record.requirement;
  const span = sweepSpan(record, reach);
  const marks = [f0, bandHz?.low ?? f0, bandHz?.high ?? f0].filter((hz) => span.low <= hz && hz <= span.high);
  const peaks = states.flatMap(({ halfPower }) => aroundPeak(halfPower, span));
  const frequencyHz = Float64Array.from(new Set([...logGrid(span.low, span.high, points), ...marks, ...peaks])).sort();
  const { gain, gammaRe, gammaIm } = sweep(
    prepareLadder(arms),
    endsOver(record.source, termination, f0, frequencyHz),
    record.aim,
  );
  // Rounding can leave a perfect match a part in 1e16 above 1.
  const lossDb = Array.from(gain, (value) => attenuationDb(Math.min(1, value)));
  const squared = Array.from(gammaRe, (re, k) => re * re + gammaIm[k]! * gammaIm[k]!);
  return {
    state: name,
    spanHz: span,
    frequencyHz: Array.from(frequencyHz),
    returnLossDb: squared.map(returnLossDb),
    vswr: squared.map((value) => vswr(Math.sqrt(value))),
    // A lossless network passes all that isn't reflected, so for the conjugate aim the gain itself says it best.
    mismatchLossDb: record.aim === 'conjugate' ? lossDb : squared.map(mismatchLossDb),
    transducerGainDb: lossDb.map((db) => 0 - db),
    gammaRe: Array.from(gammaRe),
    gammaIm: Array.from(gammaIm),
  };
}

/** Frequencies over four times the half-power band, where that is narrow, Hz. */
function aroundPeak({ bandwidthHz, peakHz }: HalfPower, span: Span): readonly number[] {
  if (bandwidthHz === null || bandwidthHz >= narrow * (span.high - span.low)) return [];
  const step = (4 * bandwidthHz) / (peakPoints - 1);
  return Array.from({ length: peakPoints }, (_, k) => peakHz + (k - (peakPoints - 1) / 2) * step).filter(
    (hz) => span.low < hz && hz < span.high,
  );
}

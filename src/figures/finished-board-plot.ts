import type { AsBuiltFigures, Percentiles } from '../dossier.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { chartFrame, chartSize, type Frame, type Key, type Size } from './chart-frame.ts';
import { curve } from './curve.ts';
import { designMark } from './design-mark.ts';
import { circle, line, path, stroke } from './draw.ts';
import type { Figure, Shape } from './figure.ts';
import { bandSample, betweenWords, nominal, realCurves } from './real-curves.ts';
import { requiredKey, requiredRegion, requiredWords } from './required-region.ts';
import { returnLossAxis } from './return-loss-axis.ts';
import { smoothReturnLoss } from './smooth-return-loss.ts';

const measured = { stroke: 'ink', width: stroke.line } as const;
const dot = { fill: 'ink' } as const;
const radius = 1.7;
/** Samples closer than this are marked by one dot, pt. */
const apart = 9;

/**
 * Return loss measured on the finished board over what was predicted of it: measured solid with dots on samples,
 * predicted dashed, in the band that most networks stay in; the requirement is the hatched region.
 *
 * @param spanHz  sweep shown, Hz
 * @param real    how real parts do; null: not worked out
 */
export function finishedBoardPlot(
  { name, overlay, attached }: AsBuiltFigures,
  requirement: DesignRecord['requirement'],
  spanHz: Span,
  real: Percentiles | null,
  size: Size = chartSize,
): Figure {
  const { frequencyHz, measuredDb, predictedDb } = overlay;
  const states = real?.states.filter(({ state }) => state === attached.state) ?? [];
  const band = real === null || states.length === 0 ? null : { ...real, states };
  const best = Math.max(...measuredDb, ...predictedDb, ...states.flatMap(({ nominalDb }) => nominalDb));
  const axis = returnLossAxis(best, requirement.returnLossDb);
  const keys = [measuredKey, predictedKey(band)];
  const frame = chartFrame(size, spanHz, { low: 0, high: axis.high }, axis.title, requiredKey(requirement), keys);
  const region = requiredRegion(frame, requirement);
  const f0 = frame.x(requirement.frequencyHz);
  const mark = { left: f0 - 1, right: f0 + 1, top: frame.top, bottom: frame.bottom };
  const seen = smoothReturnLoss({
    frequencyHz,
    returnLossDb: measuredDb,
    gammaRe: overlay.measuredRe,
    gammaIm: overlay.measuredIm,
  });
  const drawn = { curves: [{ hertz: frequencyHz, values: measuredDb }], boxes: [...region.boxes, mark] };
  const shapes: Shape[] = [
    ...frame.shapes,
    ...region.shapes,
    ...designMark(frame, requirement.frequencyHz),
    ...(band === null ? predictedCurve(frame, overlay) : realCurves(frame, band, drawn)),
  ];
  const d = curve(frame, seen.hertz, seen.decibels);
  if (d !== '') shapes.push(path(d, measured));
  shapes.push(...dots(frame, frequencyHz, measuredDb));
  const description =
    `Return loss of the finished board (${name}) from ${formatQuantity(spanHz.low, 'Hz')} to ` +
    `${formatQuantity(spanHz.high, 'Hz')}: measured ${between(measuredDb)}; predicted at the same frequencies ` +
    `${between(predictedDb)}. ${requiredWords(requirement)}`;
  return { width: size.width, height: frame.height, title: 'Return loss of the finished board', description, shapes };
}

const measuredKey: Key = {
  text: 'measured on the finished board',
  tone: 'ink',
  reach: 22,
  sample: (x, y, X, Y) => [
    line(x, (y + Y) / 2, X, (y + Y) / 2, measured),
    circle((x + X) / 2, (y + Y) / 2, radius, dot),
  ],
};

const predictedKey = (band: Percentiles | null): Key => ({
  text: band === null ? 'predicted' : `predicted: nominal, and ${betweenWords(band)}`,
  tone: 'ink',
  reach: 22,
  sample: band === null ? (x, y, X, Y) => [line(x, (y + Y) / 2, X, (y + Y) / 2, nominal)] : bandSample,
});

function predictedCurve(frame: Frame, overlay: AsBuiltFigures['overlay']): readonly Shape[] {
  const { frequencyHz, predictedDb, predictedRe, predictedIm } = overlay;
  const { hertz, decibels } = smoothReturnLoss({
    frequencyHz,
    returnLossDb: predictedDb,
    gammaRe: predictedRe,
    gammaIm: predictedIm,
  });
  const d = curve(frame, hertz, decibels);
  return d === '' ? [] : [path(d, nominal)];
}

/** A dot on each sample, or on as many as stand apart. */
function dots(frame: Frame, hertz: readonly number[], decibels: readonly number[]): readonly Shape[] {
  let last = -Infinity;
  return hertz.flatMap((hz, k): Shape[] => {
    const [x, db] = [frame.x(hz), decibels[k]!];
    if (x - last < apart || db > frame.valueSpan.high) return [];
    last = x;
    return [circle(x, frame.y(db), radius, dot)];
  });
}

const between = (values: readonly number[]): string =>
  `between ${formatFixed(Math.min(...values), 2)} dB and ${formatFixed(Math.max(...values), 2)} dB`;

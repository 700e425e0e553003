import type { Response } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { formatQuantity } from '../quantity/format.ts';
import { chartFrame, chartSize, type Size } from './chart-frame.ts';
import { curve } from './curve.ts';
import { path } from './draw.ts';
import { boxOf, curveNumbers } from './curve-numbers.ts';
import type { Figure, Shape } from './figure.ts';
import { designMark } from './design-mark.ts';
import { realCurves, realKeys, realWords, type RealCurves } from './real-curves.ts';
import { requiredKey, requiredRegion, requiredWords } from './required-region.ts';
import { returnLossAxis } from './return-loss-axis.ts';
import { smoothReturnLoss } from './smooth-return-loss.ts';
import { described, stateKeys, stateStroke } from './states.ts';

/**
 * Return loss against frequency; the requirement is a hatched region that the curves must stay out of: the band, up to
 * the return loss asked for.
 *
 * @param responses one a load state, one at least, over the same frequencies; the governing one first
 * @param real      how real parts do, in the governing state: the nominal curve dashed, in the band that most stay in
 */
export function returnLossPlot(
  responses: readonly Response[],
  requirement: DesignRecord['requirement'],
  size: Size = chartSize,
  real: RealCurves = null,
): Figure {
  const { spanHz } = responses[0]!;
  const best = Math.max(...responses.flatMap(({ returnLossDb }) => returnLossDb));
  const axis = returnLossAxis(best, requirement.returnLossDb);
  const frame = chartFrame(size, spanHz, { low: 0, high: axis.high }, axis.title, requiredKey(requirement), [
    ...stateKeys(responses),
    ...realKeys(real, responses.length > 1),
  ]);
  const region = requiredRegion(frame, requirement);
  const shapes: Shape[] = [...frame.shapes, ...region.shapes, ...designMark(frame, requirement.frequencyHz)];
  const curves = responses.map(({ frequencyHz, returnLossDb }) => ({ hertz: frequencyHz, values: returnLossDb }));
  const numbers = curveNumbers(frame, curves);
  const f0 = frame.x(requirement.frequencyHz);
  const mark = { left: f0 - 1, right: f0 + 1, top: frame.top, bottom: frame.bottom };
  const boxes = [...region.boxes, mark, ...numbers.flatMap(boxOf)];
  shapes.push(...realCurves(frame, real, { curves, boxes }));
  responses.forEach((response, k) => {
    const { hertz, decibels } = smoothReturnLoss(response);
    const d = curve(frame, hertz, decibels);
    if (d !== '') shapes.push(path(d, stateStroke(k)));
  });
  shapes.push(...numbers);
  const between = described(responses, ({ returnLossDb }) => returnLossDb);
  const description =
    `Return loss from ${formatQuantity(spanHz.low, 'Hz')} to ${formatQuantity(spanHz.high, 'Hz')}: ` +
    `${between}. ${requiredWords(requirement)}${realWords(real)}`;
  return { width: size.width, height: frame.height, title: 'Return loss', description, shapes };
}

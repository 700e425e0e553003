import type { Response } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { formatFixed, formatQuantity, formatRead } from '../quantity/format.ts';
import { chartFrame, chartSize, type Key, type Size } from './chart-frame.ts';
import { curve } from './curve.ts';
import { n, path, rectangle, stroke } from './draw.ts';
import { boxOf, curveNumbers, type Box } from './curve-numbers.ts';
import type { Figure, Shape } from './figure.ts';
import { designMark } from './design-mark.ts';
import { hatch } from './hatch.ts';
import { realCurves, realKeys, realWords, type RealCurves } from './real-curves.ts';
import { smoothReturnLoss } from './smooth-return-loss.ts';
import { described, stateKeys, stateStroke } from './states.ts';

/** A match at one frequency has a return loss without end there; beyond this no one reads a difference. */
const highest = 40;
const edge = { stroke: 'limit', width: stroke.thin } as const;

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
  const needed = requirement.returnLossDb;
  const { spanHz } = responses[0]!;
  const best = Math.max(...responses.flatMap(({ returnLossDb }) => returnLossDb));
  const top = Math.max(10, (needed ?? 0) + 6, Math.min(highest, best));
  const high = Math.ceil(top / 10) * 10;
  const cut = best > high ? `; above ${formatFixed(high, 0)} dB not drawn` : '';
  const title = 'Return loss';
  const key: Key | undefined =
    needed === null
      ? undefined
      : {
          text: `required: at least ${formatRead(needed, 'dB')}`,
          tone: 'limit',
          reach: 17,
          sample: (x, y, X, Y) => [hatch(x, y, X, Y, 3.5), rectangle(x, y, X - x, Y - y, edge)],
        };
  const axisTitle = `Return loss, dB (larger is better${cut})`;
  const frame = chartFrame(size, spanHz, { low: 0, high }, axisTitle, key, [
    ...stateKeys(responses),
    ...realKeys(real, responses.length > 1),
  ]);
  const shapes: Shape[] = [...frame.shapes];
  const boxes: Box[] = [];
  let limit = 'No return loss is required.';

  if (needed !== null) {
    const band = requirement.bandHz ?? { low: requirement.frequencyHz, high: requirement.frequencyHz };
    const inside = (hertz: number): number => Math.min(frame.right, Math.max(frame.left, frame.x(hertz)));
    let [x, X] = [inside(band.low), inside(band.high)];
    if (X - x < 3) [x, X] = [(x + X) / 2 - 1.5, (x + X) / 2 + 1.5];
    const y = frame.y(needed);
    boxes.push({ left: x, right: X, top: y, bottom: frame.bottom });
    shapes.push(hatch(x, y, X, frame.bottom));
    shapes.push(path(`M${n(x)} ${n(frame.bottom)}L${n(x)} ${n(y)}L${n(X)} ${n(y)}L${n(X)} ${n(frame.bottom)}`, edge));
    limit =
      `Required: at least ${formatRead(needed, 'dB')} ` +
      (requirement.bandHz === null
        ? `at ${formatRead(band.low, 'Hz')}.`
        : `from ${formatRead(band.low, 'Hz')} to ${formatRead(band.high, 'Hz')}.`);
  }
  shapes.push(...designMark(frame, requirement.frequencyHz));
  const curves = responses.map(({ frequencyHz, returnLossDb }) => ({ hertz: frequencyHz, values: returnLossDb }));
  const numbers = curveNumbers(frame, curves);
  const f0 = frame.x(requirement.frequencyHz);
  boxes.push({ left: f0 - 1, right: f0 + 1, top: frame.top, bottom: frame.bottom }, ...numbers.flatMap(boxOf));
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
    `${between}. ${limit}${realWords(real)}`;
  return { width: size.width, height: frame.height, title, description, shapes };
}

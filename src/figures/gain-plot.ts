import type { HalfPower, Response } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import { chartFrame, chartSize, type Frame, type Key, type Size } from './chart-frame.ts';
import { curve } from './curve.ts';
import { curveNumbers } from './curve-numbers.ts';
import { designMark } from './design-mark.ts';
import { circle, line, path, stroke } from './draw.ts';
import type { Figure, Shape } from './figure.ts';
import { described, stateKeys, stateLetters, stateStroke } from './states.ts';
import { log10 } from '../quantity/elementary.ts';

/** 10 log10(1/2) */
const halfPowerDb = -3.0103;
/** Depth shown under the peak, dB. */
const depth = 40;
const dashed = { stroke: 'ink', width: stroke.thin, dash: [3, 2.5] } as const;

/**
 * Transducer gain against frequency, with the line 3.01 dB below the peak and the half-power edges on it.
 *
 * @param responses one a load state, one at least, over the same frequencies; the governing one first
 * @param halfPower of the governing state
 */
export function gainPlot(
  responses: readonly Response[],
  requirement: DesignRecord['requirement'],
  halfPower: HalfPower,
  size: Size = chartSize,
): Figure {
  const { spanHz, state } = responses[0]!;
  const least = Math.min(...responses.flatMap(({ transducerGainDb }) => transducerGainDb));
  const peakDb = halfPower.peakGain > 0 ? 10 * log10(halfPower.peakGain) : 0;
  const edgeDb = peakDb + halfPowerDb;
  const bottom = Math.max(peakDb - depth, Math.min(-6, least, edgeDb - 2));
  const low = bottom < -12 ? Math.floor(bottom / 10) * 10 : Math.floor(bottom / 2) * 2;
  const axisTitle = `Transducer gain, dB${least < low ? ` (below ${formatFixed(low, 0)} dB not drawn)` : ''}`;
  const key: Key = {
    text: `half power${responses.length > 1 ? `, ${stateLetters(state)}` : ''}: ${halfPower.words}`,
    tone: 'ink',
    reach: 17,
    sample: (x, y, X, Y) => [
      line(x, (y + Y) / 2, X, (y + Y) / 2, dashed),
      circle((x + X) / 2, (y + Y) / 2, 2.4, { fill: 'ink' }),
    ],
  };
  const frame = chartFrame(size, spanHz, { low, high: 0 }, axisTitle, key, stateKeys(responses));
  const shapes: Shape[] = [...frame.shapes, ...designMark(frame, requirement.frequencyHz)];

  shapes.push(...edges(frame, edgeDb, halfPower));
  responses.forEach(({ frequencyHz, transducerGainDb }, k) => {
    const d = curve(frame, frequencyHz, transducerGainDb);
    if (d !== '') shapes.push(path(d, stateStroke(k)));
  });
  shapes.push(
    ...curveNumbers(
      frame,
      responses.map(({ frequencyHz, transducerGainDb }) => ({ hertz: frequencyHz, values: transducerGainDb })),
    ),
  );
  const between = described(responses, ({ transducerGainDb }) => transducerGainDb);
  const description =
    `Transducer gain from ${formatQuantity(spanHz.low, 'Hz')} to ${formatQuantity(spanHz.high, 'Hz')}: ` +
    `${between}. Half-power band: ${halfPower.words}.`;
  return { width: size.width, height: frame.height, title: 'Transducer gain', description, shapes };
}

/** The half-power line, and on it each edge inside the frame; their frequencies stand in the key. */
function edges(frame: Frame, edgeDb: number, { lowHz, highHz }: HalfPower): readonly Shape[] {
  const y = frame.y(edgeDb);
  const inside = [lowHz, highHz]
    .filter((hertz) => hertz !== null)
    .map(frame.x)
    .filter((x) => x >= frame.left && x <= frame.right);
  return [line(frame.left, y, frame.right, y, dashed), ...inside.map((x) => circle(x, y, 2.4, { fill: 'ink' }))];
}

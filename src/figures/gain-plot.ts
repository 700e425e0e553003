import type { HalfPower, Response } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import { chartFrame, chartSize, type Frame, type Key, type Size } from './chart-frame.ts';
import { curve } from './curve.ts';
import { designMark } from './design-mark.ts';
import { circle, line, path, stroke } from './draw.ts';
import type { Figure, Shape } from './figure.ts';

/** 10 log10(1/2) */
const halfPowerDb = -3.0103;
/** Depth shown under the peak, dB. */
const depth = 40;
const dashed = { stroke: 'ink', width: stroke.thin, dash: [3, 2.5] } as const;
/** Transducer gain against frequency, with the line 3.01 dB below the peak and the half-power edges on it. */
export function gainPlot(
  response: Response,
  requirement: DesignRecord['requirement'],
  halfPower: HalfPower,
  size: Size = chartSize,
): Figure {
  const least = Math.min(...response.transducerGainDb);
  const peakDb = halfPower.peakGain > 0 ? 10 * Math.log10(halfPower.peakGain) : 0;
  const edgeDb = peakDb + halfPowerDb;
  const bottom = Math.max(peakDb - depth, Math.min(-6, least, edgeDb - 2));
  const low = bottom < -12 ? Math.floor(bottom / 10) * 10 : Math.floor(bottom / 2) * 2;
  const axisTitle = `Transducer gain, dB${least < low ? ` (below ${formatFixed(low, 0)} dB not drawn)` : ''}`;
  const key: Key = {
    text: `half power: ${halfPower.words}`,
    tone: 'ink',
    sample: (x, y, X, Y) => [
      line(x, (y + Y) / 2, X, (y + Y) / 2, dashed),
      circle((x + X) / 2, (y + Y) / 2, 2.4, { fill: 'ink' }),
    ],
  };
  const frame = chartFrame(size, response.spanHz, { low, high: 0 }, axisTitle, key);
  const shapes: Shape[] = [...frame.shapes, ...designMark(frame, requirement.frequencyHz)];

  shapes.push(...edges(frame, edgeDb, halfPower));
  const d = curve(frame, response.frequencyHz, response.transducerGainDb);
  if (d !== '') shapes.push(path(d, { stroke: 'accent', width: stroke.heavy }));
  const description =
    `Transducer gain from ${formatQuantity(response.spanHz.low, 'Hz')} to ${formatQuantity(response.spanHz.high, 'Hz')}: ` +
    `between ${formatFixed(least, 2)} dB and ${formatFixed(Math.max(...response.transducerGainDb), 2)} dB. ` +
    `Half-power band: ${halfPower.words}.`;
  return { ...size, title: 'Transducer gain', description, shapes };
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

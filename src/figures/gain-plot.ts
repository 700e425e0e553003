import type { HalfPower, Response } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import { chartFrame, chartSize, type Frame, type Key, lettering, type Size } from './chart-frame.ts';
import { curve } from './curve.ts';
import { designMark } from './design-mark.ts';
import { circle, label, line, path, stroke } from './draw.ts';
import type { Figure, Shape } from './figure.ts';
import { textWidth } from './text-width.ts';

/** 10 log10(1/2) */
const halfPowerDb = -3.0103;
/** Depth shown under the peak, dB. */
const depth = 40;
const dashed = { stroke: 'ink', width: stroke.thin, dash: [3, 2.5] } as const;
const key: Key = {
  text: 'half power: 3.01 dB below the peak',
  tone: 'ink',
  sample: (x, y, X, Y) => [
    line(x, (y + Y) / 2, X, (y + Y) / 2, dashed),
    circle((x + X) / 2, (y + Y) / 2, 2.4, { fill: 'ink' }),
  ],
};

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

/** The half-power line and each edge inside the frame with its frequency outside the band it bounds. */
function edges(frame: Frame, edgeDb: number, { lowHz, highHz }: HalfPower): readonly Shape[] {
  const y = frame.y(edgeDb);
  const shapes: Shape[] = [line(frame.left, y, frame.right, y, dashed)];
  const mark = (hertz: number | null, outward: -1 | 1): void => {
    if (hertz === null) return;
    const x = frame.x(hertz);
    if (x < frame.left || x > frame.right) return;
    shapes.push(circle(x, y, 2.4, { fill: 'ink' }));
    const text = formatQuantity(hertz, 'Hz');
    const room = outward < 0 ? x - frame.left : frame.right - x;
    const side = textWidth(text, lettering) + 8 < room ? outward : -outward;
    shapes.push(label(x + side * 6, y - 4, text, lettering, side < 0 ? 'end' : 'start'));
  };
  mark(lowHz, -1);
  mark(highHz, 1);
  return shapes;
}

import type { Span } from '../quantity/span.ts';
import { label, line, rectangle, stroke } from './draw.ts';
import type { Shape, Tone } from './figure.ts';
import { frequencyAxis } from './frequency-axis.ts';
import { formatFixed } from '../quantity/format.ts';
import { textWidth } from './text-width.ts';
import { ticks } from './ticks.ts';

export interface Size {
  readonly width: number;
  readonly height: number;
}

/** Size that both a page's column and a report's text width take without shrinking the lettering. */
export const chartSize: Size = { width: 480, height: 160 };

export const lettering = 8;

/** A line or a pattern and its name, kept out of the plotting area so that no curve can run through it. */
export interface Key {
  readonly text: string;
  readonly tone: Tone;
  readonly sample: (x: number, y: number, X: number, Y: number) => readonly Shape[];
}

/** The plotting area of a chart against frequency: where a value lies, and the axes to draw under the curves. */
export interface Frame {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly x: (hertz: number) => number;
  readonly y: (value: number) => number;
  readonly valueSpan: Span;
  readonly shapes: readonly Shape[];
}

/**
 * Axes with ticks at 1-2-5 steps, a faint grid, the value axis' title over the axis and the frequency axis' title below.
 *
 * @param span       Hz
 * @param values     ends of the value axis
 * @param axisTitle  with its unit
 * @param key        what else is drawn, named beside the title or, where that is too narrow, under it
 */
export function chartFrame(size: Size, span: Span, values: Span, axisTitle: string, key?: Key): Frame {
  const left = 32;
  const right = size.width - 1;
  const keyWidth = key === undefined ? 0 : 22 + textWidth(key.text, lettering);
  const beside = textWidth(axisTitle, lettering, true) + 12 + keyWidth < right;
  const top = beside ? 28 : 40;
  const bottom = size.height - 28;
  const axis = frequencyAxis(span, Math.max(2, Math.floor((right - left) / 60)));
  const x = (hertz: number): number => left + axis.at(hertz) * (right - left);
  const y = (value: number): number => bottom - ((value - values.low) / (values.high - values.low)) * (bottom - top);
  const grid = { stroke: 'faint', width: stroke.hair } as const;
  const shapes: Shape[] = [];
  const marks = ticks(values.low, values.high, Math.max(2, Math.floor((bottom - top) / 24)));
  for (const value of marks.values) {
    shapes.push(line(left, y(value), right, y(value), grid));
    shapes.push(label(left - 5, y(value) + 2.8, formatFixed(value, marks.decimals), lettering, 'end', 'muted'));
  }
  for (const tick of axis.ticks) {
    shapes.push(line(x(tick.hertz), top, x(tick.hertz), bottom, grid));
    const middle = Math.min(x(tick.hertz), right - textWidth(tick.text, lettering) / 2);
    shapes.push(label(middle, bottom + 11, tick.text, lettering, 'middle', 'muted'));
  }
  shapes.push(rectangle(left, top, right - left, bottom - top, { stroke: 'muted', width: stroke.thin }));
  shapes.push(label(0, 9, axisTitle, lettering, 'start', 'ink', true));
  if (key !== undefined) {
    const [keyX, keyY] = beside ? [right - keyWidth, 9] : [0, 22];
    shapes.push(...key.sample(keyX, keyY - 6, keyX + 17, keyY + 1));
    shapes.push(label(keyX + 22, keyY, key.text, lettering, 'start', key.tone));
  }
  shapes.push(label((left + right) / 2, size.height - 5, `Frequency, ${axis.unit}`, lettering, 'middle', 'ink', true));
  return { left, right, top, bottom, x, y, valueSpan: values, shapes };
}

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
  /** Width of the sample, pt. */
  readonly reach: number;
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
  /** Of the figure: as asked for, and higher by the rows of keys under the title. */
  readonly height: number;
  readonly shapes: readonly Shape[];
}

/** Where the plotting area of a chart of a size lies across it. */
export const plotOf = ({ width }: Size): { readonly left: number; readonly right: number } => ({
  left: 32,
  right: width - 1,
});

/**
 * Axes with ticks at 1-2-5 steps, a faint grid, the value axis' title over the axis and the frequency axis' title below.
 *
 * @param span       Hz
 * @param values     ends of the value axis
 * @param axisTitle  with its unit
 * @param key        what else is drawn, named beside the title or, where that is too narrow, under it
 * @param curves     names of the curves where there are several, in rows under both
 */
export function chartFrame(
  size: Size,
  span: Span,
  values: Span,
  axisTitle: string,
  key?: Key,
  curves: readonly Key[] = [],
): Frame {
  const { left, right } = plotOf(size);
  const keyWidth = key === undefined ? 0 : widthOf(key);
  const beside = textWidth(axisTitle, lettering, true) + 12 + keyWidth < right;
  const rows = keyRows(curves, right);
  const above = rows.length * rowHeight;
  const top = (beside ? 28 : 40) + above;
  const height = size.height + above;
  const bottom = height - 28;
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
    shapes.push(...drawKey(key, keyX, keyY));
  }
  rows.forEach((row, k) => {
    const y = (beside ? 9 : 22) + (k + 1) * rowHeight;
    let along = 0;
    for (const curve of row) {
      shapes.push(...drawKey(curve, along, y));
      along += widthOf(curve) + 14;
    }
  });
  shapes.push(label((left + right) / 2, height - 5, `Frequency, ${axis.unit}`, lettering, 'middle', 'ink', true));
  return { left, right, top, bottom, x, y, valueSpan: values, height, shapes };
}

const rowHeight = 13;

const widthOf = ({ text, reach }: Key): number => reach + 5 + textWidth(text, lettering);

const drawKey = (key: Key, x: number, y: number): readonly Shape[] => [
  ...key.sample(x, y - 6, x + key.reach, y + 1),
  label(x + key.reach + 5, y, key.text, lettering, 'start', key.tone),
];

/** Keys in as few rows as their widths allow, in their order. */
function keyRows(keys: readonly Key[], width: number): readonly (readonly Key[])[] {
  const rows: Key[][] = [];
  let used = 0;
  for (const key of keys) {
    const wide = widthOf(key) + 14;
    const row = rows.at(-1);
    if (row !== undefined && used + wide - 14 <= width) row.push(key);
    else {
      rows.push([key]);
      used = 0;
    }
    used += wide;
  }
  return rows;
}

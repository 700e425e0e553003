import { formatRead } from '../quantity/format.ts';
import { type Frame, lettering } from './chart-frame.ts';
import { label, line, stroke } from './draw.ts';
import type { Shape } from './figure.ts';
import { textWidth } from './text-width.ts';

/** The design frequency: a chain line across the frame, named over it. Nothing when the span leaves it out. */
export function designMark(frame: Frame, hertz: number): readonly Shape[] {
  const x = frame.x(hertz);
  if (x < frame.left - 0.01 || x > frame.right + 0.01) return [];
  const text = `f₀ ${formatRead(hertz, 'Hz')}`;
  const half = textWidth(text, lettering) / 2;
  const centre = Math.min(frame.right - half, Math.max(frame.left + half, x));
  return [
    line(x, frame.top, x, frame.bottom, { stroke: 'muted', width: stroke.thin, dash: [7, 2, 1.5, 2] }),
    label(centre, frame.top - 5, text, lettering, 'middle', 'muted'),
  ];
}

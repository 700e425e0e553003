import { n, path, stroke } from './draw.ts';
import type { Shape } from './figure.ts';

/** Lines at 45° that fill a rectangle and end on its sides; x < X, y < Y in pt. */
export function hatch(x: number, y: number, X: number, Y: number, pitch = 5): Shape {
  let d = '';
  // Each line is x - left = c - (bottom - y): it enters by the bottom or the left side, leaves by the right or the top.
  const width = X - x;
  const height = Y - y;
  for (let c = pitch / 2; c < width + height; c += pitch) {
    const start = c <= width ? [x + c, Y] : [X, Y - (c - width)];
    const end = c <= height ? [x, Y - c] : [x + c - height, y];
    d += `M${n(start[0] ?? 0)} ${n(start[1] ?? 0)}L${n(end[0] ?? 0)} ${n(end[1] ?? 0)}`;
  }
  return path(d, { stroke: 'limit', width: stroke.hair });
}

import type { Shape, Tone } from './figure.ts';

/** Stroke widths, pt: one scale for every figure. */
export const stroke = { hair: 0.5, thin: 0.75, line: 1.1, heavy: 1.6 } as const;

/** A coordinate, rounded so that a figure's text is short and the same on every machine. */
export const n = (value: number): string => String(Math.round(value * 100) / 100);

type Stroke = Omit<Extract<Shape, { kind: 'path' }>, 'kind' | 'd'>;

export const path = (d: string, style: Stroke): Shape => ({ kind: 'path', d, ...style });

export const line = (x1: number, y1: number, x2: number, y2: number, style: Stroke): Shape =>
  path(`M${n(x1)} ${n(y1)}L${n(x2)} ${n(y2)}`, style);

export const rectangle = (x: number, y: number, width: number, height: number, style: Stroke): Shape =>
  path(`M${n(x)} ${n(y)}L${n(x + width)} ${n(y)}L${n(x + width)} ${n(y + height)}L${n(x)} ${n(y + height)}Z`, style);

/** Two half circles: an arc can't end where it starts. */
export const circle = (x: number, y: number, radius: number, style: Stroke): Shape =>
  path(
    `M${n(x - radius)} ${n(y)}A${n(radius)} ${n(radius)} 0 0 1 ${n(x + radius)} ${n(y)}` +
      `A${n(radius)} ${n(radius)} 0 0 1 ${n(x - radius)} ${n(y)}Z`,
    style,
  );

export const label = (
  x: number,
  y: number,
  text: string,
  size: number,
  anchor: 'start' | 'middle' | 'end' = 'start',
  tone: Tone = 'ink',
  bold = false,
): Shape => ({ kind: 'text', x, y, text, size, anchor, tone, bold });

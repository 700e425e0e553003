import { circle, line, n, path, rectangle, stroke } from './draw.ts';
import type { Shape, Tone } from './figure.ts';

/**
 * Circuit symbols with the shapes of IEC 60617: inductor as half-circle windings, capacitor as two plates, impedance
 * as a rectangle, generator as a circle with a sine, earth. A part is centred on (x, y) and spans `reach` either way
 * along its axis, where the wires meet it.
 */
export interface Placed {
  readonly shapes: readonly Shape[];
  /** Half of the symbol's extent along its axis, pt. */
  readonly reach: number;
}

export type Axis = 'across' | 'down';

const ink = { stroke: 'ink', width: stroke.line } as const;

export function inductor(x: number, y: number, axis: Axis, scale = 1): Placed {
  const r = 5 * scale;
  const reach = 4 * r;
  let d = axis === 'across' ? `M${n(x - reach)} ${n(y)}` : `M${n(x)} ${n(y - reach)}`;
  for (let turn = 1; turn <= 4; turn += 1) {
    const along = -reach + turn * 2 * r;
    const [endX, endY] = axis === 'across' ? [x + along, y] : [x, y + along];
    d += `A${n(r)} ${n(r)} 0 0 1 ${n(endX)} ${n(endY)}`;
  }
  return { shapes: [path(d, ink)], reach };
}

export function capacitor(x: number, y: number, axis: Axis, scale = 1): Placed {
  const gap = 2.6 * scale;
  const plate = 9 * scale;
  const bold = { stroke: 'ink', width: stroke.heavy } as const;
  const shapes =
    axis === 'across'
      ? [line(x - gap, y - plate, x - gap, y + plate, bold), line(x + gap, y - plate, x + gap, y + plate, bold)]
      : [line(x - plate, y - gap, x + plate, y - gap, bold), line(x - plate, y + gap, x + plate, y + gap, bold)];
  return { shapes, reach: gap };
}

export function impedance(x: number, y: number, axis: Axis, scale = 1): Placed {
  const reach = 14 * scale;
  const half = 5 * scale;
  const shape =
    axis === 'across'
      ? rectangle(x - reach, y - half, 2 * reach, 2 * half, ink)
      : rectangle(x - half, y - reach, 2 * half, 2 * reach, ink);
  return { shapes: [shape], reach };
}

export function generator(x: number, y: number, scale = 1): Placed {
  const r = 11 * scale;
  const w = 6 * scale;
  const h = 6.5 * scale;
  const sine =
    `M${n(x - w)} ${n(y)}C${n(x - w * 0.64)} ${n(y - h)} ${n(x - w * 0.36)} ${n(y - h)} ${n(x)} ${n(y)}` +
    `C${n(x + w * 0.36)} ${n(y + h)} ${n(x + w * 0.64)} ${n(y + h)} ${n(x + w)} ${n(y)}`;
  return { shapes: [circle(x, y, r, ink), path(sine, ink)], reach: r };
}

/** Earth, hanging from (x, y). */
export function earth(x: number, y: number, scale = 1): Shape {
  const bars = [8, 5, 2].map((half, row) => {
    const barY = y + row * 3.2 * scale;
    return `M${n(x - half * scale)} ${n(barY)}L${n(x + half * scale)} ${n(barY)}`;
  });
  return path(bars.join(''), ink);
}

/** A junction of three wires. */
export const junction = (x: number, y: number, scale = 1): Shape =>
  circle(x, y, 2 * scale, { fill: 'ink' satisfies Tone });

export const part = (kind: 'inductor' | 'capacitor', x: number, y: number, axis: Axis, scale = 1): Placed =>
  kind === 'inductor' ? inductor(x, y, axis, scale) : capacitor(x, y, axis, scale);

import { lettering, type Frame } from './chart-frame.ts';
import { label } from './draw.ts';
import type { Shape } from './figure.ts';

export interface Curve {
  readonly hertz: readonly number[];
  readonly values: readonly number[];
}

/** A rectangle, pt. */
export interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

const numeralWidth = 5;
const numeralHeight = 6;
/** More room than this between a number and a curve says nothing more. */
const roomEnough = 8;
/** With less it could be taken for the other curve's. */
const leastRoom = 4;
const everySample = 3;

/**
 * The number of each curve beside it, where it is farthest from the others; none where there is only one curve, or
 * where a curve runs too close to others to be named on the spot (its dashes then tell it).
 *
 * @param curves over the same frequencies, Hz
 */
export function curveNumbers(frame: Frame, curves: readonly Curve[]): readonly Shape[] {
  if (curves.length < 2) return [];
  const drawn = curves.map(({ hertz, values }) => hertz.map((hz, k) => ({ x: frame.x(hz), y: frame.y(values[k]!) })));
  const placed: Box[] = [];
  return drawn.flatMap((points, k): Shape[] => {
    // Numbers spread along the curves are read more easily than a column of them.
    const wanted = frame.left + ((frame.right - frame.left) * (k + 0.5)) / curves.length;
    let best: Box | null = null;
    let most = -Infinity;
    for (const { x, y } of points.filter((_, index) => index % everySample === 0)) {
      for (const top of [y - 3 - numeralHeight, y + 3]) {
        const box = { left: x - numeralWidth / 2, right: x + numeralWidth / 2, top, bottom: top + numeralHeight };
        if (!inside(frame, box) || placed.some((other) => meet(box, other))) continue;
        const others = Math.min(...drawn.map((curve, j) => (j === k ? Infinity : clearance(curve, box))));
        if (others < leastRoom || clearance(points, box) < 1) continue;
        const score = Math.min(others, roomEnough) - (4 * Math.abs(x - wanted)) / (frame.right - frame.left);
        if (score > most) [best, most] = [box, score];
      }
    }
    if (best === null) return [];
    placed.push(best);
    return [label((best.left + best.right) / 2, best.bottom, String(k + 1), lettering, 'middle', 'ink', true)];
  });
}

/** Where a number stands that `curveNumbers` placed. */
export const boxOf = (shape: Shape): readonly Box[] =>
  shape.kind === 'text'
    ? [
        {
          left: shape.x - numeralWidth / 2,
          right: shape.x + numeralWidth / 2,
          top: shape.y - numeralHeight,
          bottom: shape.y,
        },
      ]
    : [];

export const inside = ({ left, right, top, bottom }: Frame, box: Box): boolean =>
  box.left > left + 2 && box.right < right - 2 && box.top > top + 2 && box.bottom < bottom - 2;

export const meet = (a: Box, b: Box): boolean =>
  a.left < b.right + 4 && b.left < a.right + 4 && a.top < b.bottom + 2 && b.top < a.bottom + 2;

/** Least vertical distance of a curve from a box, pt, over the box's width and a little more. */
export function clearance(points: readonly { readonly x: number; readonly y: number }[], box: Box): number {
  let least = Infinity;
  let previous: { readonly x: number; readonly y: number } | undefined;
  for (const point of points) {
    const from = previous ?? point;
    previous = point;
    if (point.x < box.left - 2) continue;
    if (from.x > box.right + 2) break;
    // A straight piece that spans the box lies between its two ends.
    const [upper, lower] = from.y < point.y ? [from.y, point.y] : [point.y, from.y];
    least = Math.min(least, Math.max(0, upper - box.bottom, box.top - lower));
  }
  return least;
}

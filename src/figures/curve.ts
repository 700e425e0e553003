import type { Frame } from './chart-frame.ts';
import { n } from './draw.ts';

/**
 * Path data of a curve through the points, cut where it leaves the value axis: the edge is met where the straight line
 * between neighbours crosses it, so that nothing is drawn outside the frame and no point is moved into it.
 *
 * @param xs  Hz
 * @param ys  on the frame's value axis; same length
 */
export function curve(frame: Frame, xs: readonly number[], ys: readonly number[]): string {
  const { low, high } = frame.valueSpan;
  let d = '';
  let drawing = false;
  for (let index = 1; index < xs.length; index += 1) {
    const [xa = 0, ya = 0, xb = 0, yb = 0] = [xs[index - 1], ys[index - 1], xs[index], ys[index]];
    const at = (value: number): number => (value - ya) / (yb - ya);
    let from = 0;
    let to = 1;
    if (ya < low) from = at(low);
    if (ya > high) from = at(high);
    if (yb < low) to = at(low);
    if (yb > high) to = at(high);
    const outside = (ya < low && yb < low) || (ya > high && yb > high);
    if (outside) {
      drawing = false;
      continue;
    }
    // Cut along the drawn line, which a logarithmic axis bends away from a line in hertz.
    const [left, right] = [frame.x(xa), frame.x(xb)];
    const point = (t: number): string => `${n(left + t * (right - left))} ${n(frame.y(ya + t * (yb - ya)))}`;
    if (!drawing) d += `M${point(from)}`;
    d += `L${point(to)}`;
    drawing = to === 1;
  }
  return d;
}

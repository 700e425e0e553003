import { asin, atan2, cos, sin, tan } from '../../quantity/elementary.ts';

const n = (value: number): string => String(Math.round(value * 100) / 100);

/**
 * Path operators for a figure's path data (M, L, C, A and Z, absolute). Arcs are those of circles that turn with the
 * sweep flag, up to a half turn: two Bézier quarters each, off by less than 0.03 % of the radius.
 *
 * @param x      left of the figure on the page, pt
 * @param y      its top, pt up from the foot of the page
 * @param scale  page pt per figure pt
 */
export function pathOperators(d: string, x: number, y: number, scale: number): string {
  const numbers = d.match(/[MLCAZ]|-?[\d.]+/gu) ?? [];
  let out = '';
  let at = 0;
  let [penX, penY] = [0, 0];
  const next = (): number => Number(numbers[at++]);
  const point = (px: number, py: number): string => `${n(x + scale * px)} ${n(y - scale * py)} `;
  while (at < numbers.length) {
    const command = numbers[at++];
    if (command === 'Z') {
      out += 'h ';
    } else if (command === 'M' || command === 'L') {
      [penX, penY] = [next(), next()];
      out += `${point(penX, penY)}${command === 'M' ? 'm ' : 'l '}`;
    } else if (command === 'C') {
      out += point(next(), next()) + point(next(), next());
      [penX, penY] = [next(), next()];
      out += `${point(penX, penY)}c `;
    } else if (command === 'A') {
      const radius = next();
      at += 3;
      const clockwise = next() === 1;
      const [endX, endY] = [next(), next()];
      for (const [ax, ay, bx, by, px, py] of arc(penX, penY, endX, endY, radius, clockwise)) {
        out += `${point(ax, ay)}${point(bx, by)}${point(px, py)}c `;
      }
      [penX, penY] = [endX, endY];
    } else {
      throw new RangeError(`pathOperators: "${String(command)}" is not a command of a figure; use M, L, C, A and Z`);
    }
  }
  return out.trimEnd();
}

type Bezier = readonly [number, number, number, number, number, number];

/** Two cubic Béziers for an arc of at most a half turn. */
function arc(x1: number, y1: number, x2: number, y2: number, radius: number, clockwise: boolean): readonly Bezier[] {
  const [halfX, halfY] = [(x2 - x1) / 2, (y2 - y1) / 2];
  const half = Math.hypot(halfX, halfY);
  // Rounding in the path data may leave a half circle's radius a hair short of its half chord.
  const r = Math.max(radius, half);
  const toCentre = Math.sqrt(Math.max(0, r * r - half * half)) / (half || 1);
  const turn = clockwise ? 1 : -1;
  const [cx, cy] = [x1 + halfX - turn * toCentre * halfY, y1 + halfY + turn * toCentre * halfX];
  const start = atan2(y1 - cy, x1 - cx);
  const sweep = turn * 2 * asin(Math.min(1, half / r));
  const step = sweep / 2;
  const k = (4 / 3) * tan(step / 4) * r;
  return [0, 1].map((part): Bezier => {
    const a = start + part * step;
    const b = a + step;
    return [
      cx + r * cos(a) - k * sin(a),
      cy + r * sin(a) + k * cos(a),
      cx + r * cos(b) + k * sin(b),
      cy + r * sin(b) - k * cos(b),
      cx + r * cos(b),
      cy + r * sin(b),
    ];
  });
}

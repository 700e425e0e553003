import type { Response } from '../dossier.ts';
import { n } from './draw.ts';

/** A reflection-coefficient plane drawn around (x, y), `radius` pt for |Γ| = `rim`. */
export interface Plane {
  readonly x: number;
  readonly y: number;
  readonly radius: number;
  readonly rim: number;
}

/** Place of a reflection coefficient, pt. */
export const placeOf = ({ x, y, radius, rim }: Plane, re: number, im: number): readonly [number, number] => [
  x + (radius * re) / rim,
  y - (radius * im) / rim,
];

/** Path data of the samples `from` to `to` within the rim, cut where the chord between two samples crosses it. */
export function planeTrace({ gammaRe, gammaIm }: Response, from: number, to: number, plane: Plane): string {
  const point = (re: number, im: number): string => placeOf(plane, re, im).map(n).join(' ');
  let d = '';
  let drawing = false;
  for (let k = from + 1; k <= to; k += 1) {
    const [re, im] = [gammaRe[k - 1]!, gammaIm[k - 1]!];
    const [dRe, dIm] = [gammaRe[k]! - re, gammaIm[k]! - im];
    const span = within(re, im, dRe, dIm, plane.rim);
    if (span === null) {
      drawing = false;
      continue;
    }
    const [enter, leave] = span;
    if (!drawing || enter > 0) d += `M${point(re + enter * dRe, im + enter * dIm)}`;
    d += `L${point(re + leave * dRe, im + leave * dIm)}`;
    drawing = leave === 1;
  }
  return d;
}

/** Part of a chord, from 0 to 1 along it, that lies within the rim. */
function within(re: number, im: number, dRe: number, dIm: number, rim: number): readonly [number, number] | null {
  // A reflection of 1 with rounding on top still belongs to the unit circle.
  const limitSquared = rim * rim * (1 + 1e-9);
  const a = dRe * dRe + dIm * dIm;
  const b = re * dRe + im * dIm;
  const c = re * re + im * im - limitSquared;
  if (a === 0) return c <= 0 ? [0, 1] : null;
  const root = b * b - a * c;
  if (root < 0) return null;
  const enter = Math.max(0, (-b - Math.sqrt(root)) / a);
  const leave = Math.min(1, (-b + Math.sqrt(root)) / a);
  return enter < leave ? [enter, leave] : null;
}

import type { Response } from '../dossier.ts';
import { formatFixed, formatRead } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import { lettering } from './chart-frame.ts';
import { circle, label, rectangle, stroke } from './draw.ts';
import type { Shape } from './figure.ts';
import { placeOf, type Plane } from './plane-trace.ts';
import { atan2, cos, sin } from '../quantity/elementary.ts';

type Symbol = 'square' | 'disc' | 'ring';

/** The design frequency or an edge of the band on a trace. */
export interface Mark {
  readonly symbol: Symbol;
  readonly hertz: number;
  readonly re: number;
  readonly im: number;
  readonly words: string;
}

/** Marks at the lower edge, the design frequency and the upper edge, of those that the sweep holds. */
export function marksOf({ frequencyHz, gammaRe, gammaIm }: Response, f0: number, band: Span | null): readonly Mark[] {
  const wanted: readonly (readonly [number, Symbol])[] = [
    ...(band === null ? [] : ([[band.low, 'square']] as const)),
    [f0, 'disc'],
    ...(band === null ? [] : ([[band.high, 'ring']] as const)),
  ];
  return wanted.flatMap(([hertz, symbol]) => {
    const k = frequencyHz.findIndex((sample) => Math.abs(sample - hertz) <= 1e-9 * hertz);
    if (k < 0) return [];
    const [re, im] = [gammaRe[k]!, gammaIm[k]!];
    const magnitude = Math.hypot(re, im);
    const angle = magnitude < 5e-4 ? '' : `∠${formatFixed((atan2(im, re) * 180) / Math.PI, 1)}°`;
    const words = `${formatRead(hertz, 'Hz')}: Γ = ${formatFixed(magnitude, 3)}${angle}`;
    return [{ symbol, hertz, re, im, words }];
  });
}

export function drawMark(symbol: Symbol, x: number, y: number): Shape {
  if (symbol === 'disc') return circle(x, y, 2.8, { fill: 'ink' });
  if (symbol === 'ring') return circle(x, y, 3.2, { stroke: 'ink', width: stroke.line });
  return rectangle(x - 2.9, y - 2.9, 5.8, 5.8, { stroke: 'ink', width: stroke.line });
}

/** Whether a plane shows a mark. */
export const shows = ({ rim }: Plane, { re, im }: Mark): boolean => Math.hypot(re, im) <= rim;

const away = 8;
const apart = 6.5;

/**
 * The number of each state beside the last of its marks, on the side where there is room; none where there is none.
 *
 * @param states marks of each state
 */
export function planeNumbers(plane: Plane, states: readonly (readonly Mark[])[]): readonly Shape[] {
  const taken = states.flatMap((marks) =>
    marks.filter((mark) => shows(plane, mark)).map(({ re, im }) => placeOf(plane, re, im)),
  );
  return states.flatMap((marks, k): Shape[] => {
    const last = marks.findLast((mark) => shows(plane, mark));
    if (last === undefined) return [];
    const [x, y] = placeOf(plane, last.re, last.im);
    for (let eighth = 0; eighth < 8; eighth += 1) {
      const angle = (eighth * Math.PI) / 4;
      const [atX, atY] = [x + away * cos(angle), y - away * sin(angle)];
      if (taken.some(([otherX, otherY]) => Math.hypot(otherX - atX, otherY - atY) < apart)) continue;
      taken.push([atX, atY]);
      return [label(atX, atY + 2.9, String(k + 1), lettering, 'middle', 'ink', true)];
    }
    return [];
  });
}

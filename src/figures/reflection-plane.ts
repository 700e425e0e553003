import type { Response } from '../dossier.ts';
import { formatFixed, formatRead } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { lettering } from './chart-frame.ts';
import { circle, label, line, n, path, rectangle, stroke } from './draw.ts';
import type { Figure, Shape } from './figure.ts';

const width = 480;
const height = 172;
const middle = 76;
const wholeRadius = 72;
const centreRadius = 56;
/** A required circle larger than this is plain enough without its enlargement. */
const largeEnough = 0.4;

const faint = { stroke: 'faint', width: stroke.hair } as const;
const limit = { stroke: 'limit', width: stroke.line, dash: [3, 2] } as const;
const thin = { stroke: 'accent', width: stroke.thin, dash: [2, 1.5] } as const;
const heavy = { stroke: 'accent', width: stroke.heavy } as const;

/**
 * The reflection coefficient over the sweep in its plane: unit circle, the circle that the required return loss allows,
 * the trace (heavy within the band) and marks at the design frequency and the band's ends. Beside it the plane's
 * centre, enlarged, where the requirement is decided. A frequency that the sweep doesn't hold has no mark: between
 * samples the figure would be a guess.
 */
export function reflectionPlane(response: Response, requirement: DesignRecord['requirement']): Figure {
  const { returnLossDb, bandHz, frequencyHz: f0 } = requirement;
  const allowed = returnLossDb === null ? null : 10 ** (-returnLossDb / 20);
  const marks = marksOf(response, f0, bandHz);
  const plane = (x: number, radius: number, rim: number): readonly Shape[] => [
    ...grid(x, radius, rim),
    ...(allowed === null ? [] : [circle(x, middle, (radius * allowed) / rim, limit)]),
    ...traces(response, bandHz, x, radius, rim),
    ...marks.flatMap(({ mark, re, im }) =>
      Math.hypot(re, im) > rim ? [] : [marker(mark, x + (radius * re) / rim, middle - (radius * im) / rim)],
    ),
    label(x, middle + wholeRadius + 15, `|Γ| ≤ ${formatRim(rim)}`, lettering, 'middle', 'muted'),
  ];
  const shapes: Shape[] = [...plane(wholeRadius + 4, wholeRadius, 1)];
  let legendX = 2 * wholeRadius + 40;
  if (allowed !== null && allowed <= largeEnough) {
    const x = legendX + centreRadius - 18;
    shapes.push(...plane(x, centreRadius, rimAbove(1.5 * allowed)));
    legendX = x + centreRadius + 16;
  }

  let row = 16;
  const note = (text: string, tone: 'ink' | 'limit' | 'accent', ...sample: readonly Shape[]): void => {
    shapes.push(...sample, label(legendX + 22, row + 2.8, text, lettering, 'start', tone));
    row += 15;
  };
  const dash = (style: typeof limit | typeof thin | typeof heavy): Shape =>
    line(legendX, row, legendX + 16, row, style);
  if (allowed !== null && returnLossDb !== null) {
    note(`required: |Γ| ≤ ${formatFixed(allowed, 3)} (${formatRead(returnLossDb, 'dB')})`, 'limit', dash(limit));
  }
  if (bandHz === null) note('over the sweep', 'accent', dash(heavy));
  else {
    note('within the band', 'accent', dash(heavy));
    note('over the sweep', 'accent', dash(thin));
  }
  for (const { mark, words } of marks) note(words, 'ink', marker(mark, legendX + 8, row));
  return {
    width,
    height,
    title: 'Reflection coefficient',
    description: `Reflection coefficient in its plane. ${marks.map(({ words }) => words).join('; ')}.`,
    shapes,
  };
}

/** Next of 0.1, 0.2, 0.5 and so on. */
function rimAbove(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  return (([1, 2, 5] as const).find((lead) => lead * power >= least) ?? 10) * power;
}

const formatRim = (rim: number): string => formatFixed(rim, Math.max(0, -Math.floor(Math.log10(rim) + 1e-9)));

function grid(x: number, radius: number, rim: number): readonly Shape[] {
  // A rim that starts with a 5 divides into five rings, any other into four.
  const rings = Math.abs(Math.log10(rim / 5) % 1) < 1e-9 ? 5 : 4;
  return [
    ...Array.from({ length: rings - 1 }, (_, k) => circle(x, middle, (radius * (k + 1)) / rings, faint)),
    line(x - radius, middle, x + radius, middle, faint),
    line(x, middle - radius, x, middle + radius, faint),
    circle(x, middle, radius, { stroke: 'muted', width: stroke.thin }),
  ];
}

type Mark = 'square' | 'disc' | 'ring';

function marksOf(
  { frequencyHz, gammaRe, gammaIm }: Response,
  f0: number,
  band: Span | null,
): readonly { readonly mark: Mark; readonly re: number; readonly im: number; readonly words: string }[] {
  const wanted: readonly (readonly [number, Mark])[] = [
    ...(band === null ? [] : ([[band.low, 'square']] as const)),
    [f0, 'disc'],
    ...(band === null ? [] : ([[band.high, 'ring']] as const)),
  ];
  return wanted.flatMap(([hertz, mark]) => {
    const k = frequencyHz.findIndex((sample) => Math.abs(sample - hertz) <= 1e-9 * hertz);
    if (k < 0) return [];
    const [re, im] = [gammaRe[k]!, gammaIm[k]!];
    const magnitude = Math.hypot(re, im);
    const angle = magnitude < 5e-4 ? '' : `∠${formatFixed((Math.atan2(im, re) * 180) / Math.PI, 1)}°`;
    return [{ mark, re, im, words: `${formatRead(hertz, 'Hz')}: Γ = ${formatFixed(magnitude, 3)}${angle}` }];
  });
}

/** The whole sweep, and over it the band. */
function traces(response: Response, band: Span | null, x: number, radius: number, rim: number): readonly Shape[] {
  const { frequencyHz } = response;
  const last = frequencyHz.length - 1;
  const whole = trace(response, 0, last, x, radius, rim);
  if (band === null) return whole === '' ? [] : [path(whole, heavy)];
  const first = frequencyHz.findIndex((hertz) => hertz >= band.low);
  const final = frequencyHz.findLastIndex((hertz) => hertz <= band.high);
  const held = first < 0 ? '' : trace(response, first, final, x, radius, rim);
  return [...(whole === '' ? [] : [path(whole, thin)]), ...(held === '' ? [] : [path(held, heavy)])];
}

/** Path data of what lies within the rim, cut where the chord between two samples crosses it. */
function trace(
  { gammaRe, gammaIm }: Response,
  from: number,
  to: number,
  x: number,
  radius: number,
  rim: number,
): string {
  const point = (re: number, im: number): string => `${n(x + (radius * re) / rim)} ${n(middle - (radius * im) / rim)}`;
  let d = '';
  let drawing = false;
  for (let k = from + 1; k <= to; k += 1) {
    const [re, im] = [gammaRe[k - 1]!, gammaIm[k - 1]!];
    const [dRe, dIm] = [gammaRe[k]! - re, gammaIm[k]! - im];
    const span = within(re, im, dRe, dIm, rim);
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

function marker(mark: Mark, x: number, y: number): Shape {
  if (mark === 'disc') return circle(x, y, 2.8, { fill: 'ink' });
  if (mark === 'ring') return circle(x, y, 3.2, { stroke: 'ink', width: stroke.line });
  return rectangle(x - 2.9, y - 2.9, 5.8, 5.8, { stroke: 'ink', width: stroke.line });
}

import type { Response } from '../dossier.ts';
import { formatFixed, formatRead } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { lettering } from './chart-frame.ts';
import { circle, label, line, path, stroke } from './draw.ts';
import type { Figure, Shape, Tone } from './figure.ts';
import { drawMark, marksOf, planeNumbers, shows } from './plane-marks.ts';
import { placeOf, planeTrace, type Plane } from './plane-trace.ts';
import { stateName, stateStroke } from './states.ts';
import { log10, power } from '../quantity/elementary.ts';

const width = 480;
const least = 172;
const middle = 76;
const wholeRadius = 72;
const centreRadius = 56;
/** A required circle larger than this is plain enough without its enlargement. */
const largeEnough = 0.4;
const leading = 15;

const faint = { stroke: 'faint', width: stroke.hair } as const;
const limit = { stroke: 'limit', width: stroke.line, dash: [3, 2] } as const;
const thin = { stroke: 'accent', width: stroke.thin, dash: [2, 1.5] } as const;
/** Of several states: the sweeps are there for their direction alone. */
const thinnest = { stroke: 'muted', width: stroke.hair, dash: [1, 1.5] } as const;

/**
 * The reflection coefficient over the sweep in its plane: unit circle, the circle that the required return loss allows,
 * the trace of each load state (heavy within the band) and marks at the design frequency and the band's ends. Beside it
 * the plane's centre, enlarged, where the requirement is decided. A frequency that the sweep doesn't hold has no mark:
 * between samples the figure would be a guess.
 *
 * @param responses one a load state, one at least; the governing one first
 */
export function reflectionPlane(responses: readonly Response[], requirement: DesignRecord['requirement']): Figure {
  const { returnLossDb, bandHz, frequencyHz: f0 } = requirement;
  const several = responses.length > 1;
  const allowed = returnLossDb === null ? null : power(10, -returnLossDb / 20);
  const states = responses.map((response) => marksOf(response, f0, bandHz));
  const draw = (plane: Plane): readonly Shape[] => [
    ...grid(plane),
    ...(allowed === null ? [] : [circle(plane.x, middle, (plane.radius * allowed) / plane.rim, limit)]),
    ...responses.flatMap((response, k) => traces(response, bandHz, k, several ? thinnest : thin, plane)),
    ...states.flatMap((marks) =>
      marks
        .filter((mark) => shows(plane, mark))
        .map(({ symbol, re, im }) => drawMark(symbol, ...placeOf(plane, re, im))),
    ),
    ...(several ? planeNumbers(plane, states) : []),
    label(plane.x, middle + wholeRadius + 15, `|Γ| ≤ ${formatRim(plane.rim)}`, lettering, 'middle', 'muted'),
  ];
  const shapes: Shape[] = [...draw({ x: wholeRadius + 4, y: middle, radius: wholeRadius, rim: 1 })];
  let legendX = 2 * wholeRadius + 40;
  if (allowed !== null && allowed <= largeEnough) {
    const x = legendX + centreRadius - 18;
    shapes.push(...draw({ x, y: middle, radius: centreRadius, rim: rimAbove(1.5 * allowed) }));
    legendX = x + centreRadius + 16;
  }

  let row = 16;
  const note = (words: string, tone: Tone, ...sample: readonly Shape[]): void => {
    shapes.push(...sample, label(legendX + 22, row + 2.8, words, lettering, 'start', tone));
    row += leading;
  };
  const dash = (style: typeof limit | typeof thin | typeof thinnest | ReturnType<typeof stateStroke>): Shape =>
    line(legendX, row, legendX + 16, row, style);
  if (allowed !== null && returnLossDb !== null) {
    note(`required: |Γ| ≤ ${formatFixed(allowed, 3)} (${formatRead(returnLossDb, 'dB')})`, 'limit', dash(limit));
  }
  if (several) {
    responses.forEach(({ state }, k) => note(stateName(state, k), 'ink', dash(stateStroke(k))));
    if (bandHz !== null) note('over the sweep', 'muted', dash(thinnest));
    // Every state has the same marks.
    for (const { symbol, hertz } of states[0]!) {
      note(formatRead(hertz, 'Hz'), 'ink', drawMark(symbol, legendX + 8, row));
    }
  } else {
    const heavy = stateStroke(0);
    note(bandHz === null ? 'over the sweep' : 'within the band', 'accent', dash(heavy));
    if (bandHz !== null) note('over the sweep', 'accent', dash(thin));
    for (const { symbol, words } of states[0]!) note(words, 'ink', drawMark(symbol, legendX + 8, row));
  }
  const inWords = states.map((marks, k) => {
    const words = marks.map((mark) => mark.words).join('; ');
    return several ? `${responses[k]!.state}: ${words}` : words;
  });
  return {
    width,
    height: Math.max(least, row),
    title: 'Reflection coefficient',
    description: `Reflection coefficient in its plane. ${inWords.join('. ')}.`,
    shapes,
  };
}

/** Next of 0.1, 0.2, 0.5 and so on. */
function rimAbove(smallest: number): number {
  const power = 10 ** Math.floor(log10(smallest));
  return (([1, 2, 5] as const).find((lead) => lead * power >= smallest) ?? 10) * power;
}

const formatRim = (rim: number): string => formatFixed(rim, Math.max(0, -Math.floor(log10(rim) + 1e-9)));

function grid({ x, radius, rim }: Plane): readonly Shape[] {
  // A rim that starts with a 5 divides into five rings, any other into four.
  const rings = Math.abs(log10(rim / 5) % 1) < 1e-9 ? 5 : 4;
  return [
    ...Array.from({ length: rings - 1 }, (_, k) => circle(x, middle, (radius * (k + 1)) / rings, faint)),
    line(x - radius, middle, x + radius, middle, faint),
    line(x, middle - radius, x, middle + radius, faint),
    circle(x, middle, radius, { stroke: 'muted', width: stroke.thin }),
  ];
}

/** A state's whole sweep, and over it the band. */
function traces(
  response: Response,
  band: Span | null,
  k: number,
  whole: typeof thin | typeof thinnest,
  plane: Plane,
): readonly Shape[] {
  const { frequencyHz } = response;
  const swept = planeTrace(response, 0, frequencyHz.length - 1, plane);
  if (band === null) return swept === '' ? [] : [path(swept, stateStroke(k))];
  const first = frequencyHz.findIndex((hertz) => hertz >= band.low);
  const final = frequencyHz.findLastIndex((hertz) => hertz <= band.high);
  const held = first < 0 ? '' : planeTrace(response, first, final, plane);
  return [...(swept === '' ? [] : [path(swept, whole)]), ...(held === '' ? [] : [path(held, stateStroke(k))])];
}

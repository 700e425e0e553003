import type { Percentiles } from '../dossier.ts';
import { formatFixed } from '../quantity/format.ts';
import { lettering, type Frame, type Key } from './chart-frame.ts';
import { curve } from './curve.ts';
import { label, line, n, path, rectangle, stroke } from './draw.ts';
import type { Shape } from './figure.ts';

/** How real parts do, over the frequencies of the curves of exact ones; `awaited`: that is still being worked out. */
export type RealCurves = Percentiles | 'awaited' | null;

const nominal = { stroke: 'accent', width: stroke.heavy, dash: [4, 2] } as const;
const shade = { fill: 'muted', fillOpacity: 0.2 } as const;
const edge = { stroke: 'muted', width: stroke.thin } as const;
/** With less between the edges of the band, pt, there is no telling which letters are of which. */
const roomForLetters = 10;

/** Names of what `realCurves` draws, beside that of the curve of exact values; as many rows before and after. */
export function realKeys(real: RealCurves, severalStates: boolean): readonly Key[] {
  if (real === null) return [];
  const exact: Key = {
    text: 'exact values',
    tone: 'ink',
    reach: 22,
    sample: (x, y, X, Y) => [line(x, (y + Y) / 2, X, (y + Y) / 2, { stroke: 'accent', width: stroke.heavy })],
  };
  const of = severalStates ? ', governing state' : '';
  const parts: Key = {
    text: real === 'awaited' ? 'real parts: being worked out' : `real parts${of}: nominal, and ${betweenWords(real)}`,
    tone: 'ink',
    reach: 22,
    sample: (x, y, X, Y) => [
      rectangle(x, y, X - x, Y - y, { ...shade, ...edge }),
      line(x, (y + Y) / 2, X, (y + Y) / 2, nominal),
    ],
  };
  return severalStates ? [parts] : [exact, parts];
}

/** The band that most networks stay in, its edges named by the part of them below, and the nominal one. */
export function realCurves(frame: Frame, real: RealCurves): readonly Shape[] {
  const state = real === null || real === 'awaited' ? undefined : real.states[0];
  if (real === null || real === 'awaited' || state === undefined) return [];
  const { frequencyHz, nominalDb, curvesDb } = state;
  const [low, high] = [curvesDb[0]!, curvesDb.at(-1)!];
  const { low: floor, high: ceiling } = frame.valueSpan;
  const at = (hertz: number, db: number): string =>
    `${n(frame.x(hertz))} ${n(frame.y(Math.min(ceiling, Math.max(floor, db))))}`;
  const there = frequencyHz.map((hertz, k) => at(hertz, low[k]!));
  const back = frequencyHz.map((hertz, k) => at(hertz, high[k]!)).reverse();
  const edges = [low, high].map((values) => curve(frame, frequencyHz, values)).filter((d) => d !== '');
  const middle = curve(frame, frequencyHz, nominalDb);
  return [
    path(`M${[...there, ...back].join('L')}Z`, shade),
    ...edges.map((d) => path(d, edge)),
    ...(middle === '' ? [] : [path(middle, nominal)]),
    ...edgeLetters(frame, frequencyHz, low, high, real.fractions),
  ];
}

/** "5 %" and "95 %" beside the edges where these are farthest apart, inside the band. */
function edgeLetters(
  frame: Frame,
  frequencyHz: readonly number[],
  low: readonly number[],
  high: readonly number[],
  fractions: readonly number[],
): readonly Shape[] {
  const places = frequencyHz.flatMap((hertz, k) => {
    const [x, lower, upper] = [frame.x(hertz), frame.y(low[k]!), frame.y(high[k]!)];
    const fits = x > frame.left + 16 && x < frame.right - 24 && upper > frame.top + 9 && lower < frame.bottom - 11;
    return fits ? [{ x, lower, upper }] : [];
  });
  const widest = places.reduce<(typeof places)[number] | null>(
    (best, place) => (best === null || place.lower - place.upper > best.lower - best.upper ? place : best),
    null,
  );
  if (widest === null || widest.lower - widest.upper < roomForLetters) return [];
  return [
    label(widest.x, widest.lower + 9, percent(fractions[0]!), lettering, 'middle', 'muted'),
    label(widest.x, widest.upper - 3, percent(fractions.at(-1)!), lettering, 'middle', 'muted'),
  ];
}

/** The same in words, for whoever doesn't see it. */
export function realWords(real: RealCurves): string {
  const state = real === null || real === 'awaited' ? undefined : real.states[0];
  if (real === null || real === 'awaited' || state === undefined) return '';
  const from = (values: readonly number[]): string => formatFixed(Math.min(...values), 2);
  const to = (values: readonly number[]): string => formatFixed(Math.max(...values), 2);
  const edges = [state.curvesDb[0]!, state.curvesDb.at(-1)!].map(
    (values, k) =>
      `${percent(real.fractions.at(-k)!)} of networks lie below a curve between ${from(values)} dB and ${to(values)} dB`,
  );
  return ` Real parts: nominal between ${from(state.nominalDb)} dB and ${to(state.nominalDb)} dB; ${edges.join('; ')}.`;
}

const percent = (fraction: number): string => `${formatFixed(fraction * 100, 0)} %`;

/** "5 % to 95 % of networks" */
const betweenWords = ({ fractions }: Percentiles): string =>
  `${percent(fractions[0]!)} to ${percent(fractions.at(-1)!)} of networks`;

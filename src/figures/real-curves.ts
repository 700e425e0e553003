import type { Percentiles } from '../dossier.ts';
import { formatFixed } from '../quantity/format.ts';
import { lettering, type Frame, type Key } from './chart-frame.ts';
import { curve } from './curve.ts';
import { clearance, inside, meet, type Box, type Curve } from './curve-numbers.ts';
import { label, line, n, path, rectangle, stroke } from './draw.ts';
import type { Shape } from './figure.ts';
import { textWidth } from './text-width.ts';

/** How real parts do, over the frequencies of the curves of exact ones; `awaited`: that is still being worked out. */
export type RealCurves = Percentiles | 'awaited' | null;

/** Of the curve of parts at their values. */
export const nominal = { stroke: 'accent', width: stroke.heavy, dash: [4, 2] } as const;
const shade = { fill: 'muted', fillOpacity: 0.2 } as const;
const edge = { stroke: 'muted', width: stroke.thin } as const;
/** Room around the letters of an edge, pt. */
const room = 2;
const height = 6;
/** From the edge, pt. */
const offsets = [3, 7, 12, 18] as const;
const every = 2;

/** What the letters of the band's edges keep away from. */
export interface Drawn {
  readonly curves: readonly Curve[];
  readonly boxes: readonly Box[];
}

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
    sample: bandSample,
  };
  return severalStates ? [parts] : [exact, parts];
}

/** The band with the nominal curve in it, for a key. */
export const bandSample: Key['sample'] = (x, y, X, Y) => [
  rectangle(x, y, X - x, Y - y, { ...shade, ...edge }),
  line(x, (y + Y) / 2, X, (y + Y) / 2, nominal),
];

/** The band that most networks stay in, its edges named by the part of them below, and the nominal one. */
export function realCurves(frame: Frame, real: RealCurves, drawn: Drawn): readonly Shape[] {
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
    ...edgeLetters(
      frame,
      [low, high, nominalDb].map((values) => ({ hertz: frequencyHz, values })),
      real.fractions,
      drawn,
    ),
  ];
}

/**
 * "5 %" under the lower edge and "95 %" over the upper one, each where the band is widest and nothing else is drawn; left
 * out where there is no such place.
 */
function edgeLetters(
  frame: Frame,
  [low, high, nominal]: readonly Curve[],
  fractions: readonly number[],
  { curves, boxes }: Drawn,
): readonly Shape[] {
  const points = [low!, high!, nominal!, ...curves].map(({ hertz, values }) =>
    hertz.map((hz, k) => ({ x: frame.x(hz), y: frame.y(values[k]!) })),
  );
  const [lower, upper] = [points[0]!, points[1]!];
  return [
    { edge: lower, text: percent(fractions[0]!), under: true },
    { edge: upper, text: percent(fractions.at(-1)!), under: false },
  ].flatMap(({ edge: along, text, under }): Shape[] => {
    const half = textWidth(text, lettering) / 2;
    const found: Box[] = [];
    let widest = 0;
    along.forEach(({ x, y }, k) => {
      const width = lower[k]!.y - upper[k]!.y;
      if (k % every > 0 || width <= widest) return;
      // Beside a steep edge the letters stand farther off.
      for (const off of offsets) {
        const top = under ? y + off : y - off - height;
        const box = { left: x - half, right: x + half, top, bottom: top + height };
        if (!inside(frame, box) || boxes.some((other) => meet(box, other))) continue;
        if (points.some((curve) => clearance(curve, box) < room)) continue;
        widest = width;
        found[0] = box;
        return;
      }
    });
    return found.map(({ left, bottom }) => label(left + half, bottom, text, lettering, 'middle', 'muted'));
  });
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
export const betweenWords = ({ fractions }: Percentiles): string =>
  `${percent(fractions[0]!)} to ${percent(fractions.at(-1)!)} of networks`;

import type { Response } from '../dossier.ts';
import { formatFixed } from '../quantity/format.ts';
import { lettering, type Key } from './chart-frame.ts';
import { line, stroke } from './draw.ts';
import { textWidth } from './text-width.ts';

/** One pattern a load state, told apart without colour; the governing state, which comes first, is solid. */
const dashes: readonly (readonly number[])[] = [
  [],
  [6, 2.5],
  [1.4, 1.8],
  [9, 2, 1.4, 2],
  [3, 2],
  [9, 2, 1.4, 2, 1.4, 2],
  [13, 3],
  [4, 1.5, 1.4, 1.5],
];

/** Stroke of the k-th state's curve; the governing one is the heaviest. */
export function stateStroke(k: number): {
  readonly stroke: 'accent' | 'ink';
  readonly width: number;
  readonly dash?: readonly number[];
} {
  const dash = dashes[k % dashes.length]!;
  return dash.length === 0 ? { stroke: 'accent', width: stroke.heavy } : { stroke: 'ink', width: 0.9, dash };
}

const longest = 120;

/** A state's name, cut to the room that a key has. */
export function stateLetters(name: string): string {
  if (textWidth(name, lettering) <= longest) return name;
  let kept = '';
  for (const letter of name) {
    if (textWidth(`${kept}${letter}…`, lettering) > longest) break;
    kept += letter;
  }
  return `${kept.trimEnd()}…`;
}

/** "1 in hand (governs)", "2 free space" */
export const stateName = (name: string, k: number): string =>
  `${String(k + 1)} ${stateLetters(name)}${k === 0 ? ' (governs)' : ''}`;

/** Keys of the curves; none where there is only one. */
export const stateKeys = (responses: readonly Response[]): readonly Key[] =>
  responses.length < 2
    ? []
    : responses.map(({ state }, k) => ({
        text: stateName(state, k),
        tone: 'ink',
        reach: 30,
        sample: (x, y, X, Y) => [line(x, (y + Y) / 2, X, (y + Y) / 2, stateStroke(k))],
      }));

/** The values of each state's curve in words, dB. */
export function described(responses: readonly Response[], valuesOf: (response: Response) => readonly number[]): string {
  const between = responses.map((response) => {
    const values = valuesOf(response);
    const words = `between ${formatFixed(Math.min(...values), 2)} dB and ${formatFixed(Math.max(...values), 2)} dB`;
    return responses.length > 1 ? `${response.state} ${words}` : words;
  });
  return between.join('; ');
}

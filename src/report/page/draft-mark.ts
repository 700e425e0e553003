import type { Figure } from '../../figures/figure.ts';
import type { Frame } from './frame.ts';
import type { Item } from './piece.ts';

/** To a point, in a straight line, or in an arc to the right of this radius. */
type Stroke = readonly ['move' | 'line', number, number] | readonly ['arc', number, number, number];

/** Letters in single strokes, 10 high, from their upper left; and how wide they are. */
const word: readonly { readonly width: number; readonly strokes: readonly Stroke[] }[] = [
  {
    width: 6.5,
    strokes: [
      ['move', 1.5, 0],
      ['arc', 1.5, 10, 5],
      ['line', 0, 10],
      ['line', 0, 0],
      ['line', 1.5, 0],
    ],
  },
  {
    width: 6.2,
    strokes: [
      ['move', 0, 10],
      ['line', 0, 0],
      ['line', 3.4, 0],
      ['arc', 3.4, 5.6, 2.8],
      ['line', 0, 5.6],
      ['move', 3, 5.6],
      ['line', 6.2, 10],
    ],
  },
  {
    width: 6.6,
    strokes: [
      ['move', 0, 10],
      ['line', 3.3, 0],
      ['line', 6.6, 10],
      ['move', 1.2, 6.4],
      ['line', 5.4, 6.4],
    ],
  },
  {
    width: 5.5,
    strokes: [
      ['move', 0, 10],
      ['line', 0, 0],
      ['line', 5.5, 0],
      ['move', 0, 4.8],
      ['line', 4.6, 4.8],
    ],
  },
  {
    width: 6.6,
    strokes: [
      ['move', 0, 0],
      ['line', 6.6, 0],
      ['move', 3.3, 0],
      ['line', 3.3, 10],
    ],
  },
];

const gap = 3;
const length = word.reduce((sum, { width }) => sum + width, gap * (word.length - 1));

/**
 * The word DRAFT across a sheet, from its lower left up. Drawn in dots, not written: it hides no text, is taken for no curve,
 * and doesn’t come along with text that is copied.
 */
export function draftMark({ width, height }: Frame): Item {
  const scale = (0.66 * Math.hypot(width, height)) / length;
  const [cos, sin] = [width, height].map((side) => (scale * side) / Math.hypot(width, height)) as [number, number];
  // The middle of the word comes to the middle of the sheet.
  const place = (x: number, y: number): string => {
    const [along, down] = [x - length / 2, y - 5];
    return [width / 2 + along * cos + down * sin, height / 2 + down * cos - along * sin]
      .map((value) => value.toFixed(2))
      .join(' ');
  };
  let start = 0;
  const d = word.flatMap((letter) => {
    const left = start;
    start += letter.width + gap;
    return letter.strokes.map(([kind, x, y, radius = 0]) => {
      const to = place(left + x, y);
      if (kind === 'arc') return `A ${(scale * radius).toFixed(2)} ${(scale * radius).toFixed(2)} 0 0 1 ${to}`;
      return `${kind === 'move' ? 'M' : 'L'} ${to}`;
    });
  });
  const figure: Figure = {
    width,
    height,
    title: 'Draft',
    description: 'The word DRAFT across the sheet',
    shapes: [{ kind: 'path', d: d.join(' '), stroke: 'faint', width: 4.5, dash: [0.9, 3.3] }],
  };
  return { kind: 'figure', x: 0, y: 0, scale: 1, figure, of: 'watermark' };
}

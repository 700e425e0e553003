import type { Paragraph } from './block.ts';
import type { Lettering } from './lettering.ts';
import type { Item } from './piece.ts';
import { styles } from './style.ts';
import { wrap } from './wrap.ts';

export interface Set {
  readonly items: readonly Item[];
  readonly height: number;
}

/** A paragraph's lines as items, its first line's top at y = 0. */
export function setParagraph(
  paragraph: Paragraph,
  x: number,
  width: number,
  letters: Lettering,
  align: 'start' | 'end' = 'start',
): Set {
  const lines = setLines(paragraph, x, width, letters, align);
  const { leading } = styles[paragraph.style ?? 'body'];
  const items = lines.flatMap((line, row) => line.map((item) => ({ ...item, y: item.y + row * leading })));
  return { items, height: lines.length * leading };
}

type TextItem = Extract<Item, { kind: 'text' }>;

/** The same, line by line, each from y = 0. */
export function setLines(
  paragraph: Paragraph,
  x: number,
  width: number,
  letters: Lettering,
  align: 'start' | 'end' = 'start',
): readonly (readonly TextItem[])[] {
  const { size, leading } = styles[paragraph.style ?? 'body'];
  // The baseline lies so that capitals stand in the middle of the line's height.
  const baseline = leading / 2 + 0.35 * size;
  return wrap(paragraph, width, letters).map((line) => {
    const left = align === 'end' ? x + width - line.width : x;
    return line.runs.map(({ x: along, ...run }) => ({ kind: 'text', x: left + along, y: baseline, size, ...run }));
  });
}

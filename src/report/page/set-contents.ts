import { bookmarkOf, type Contents } from './block.ts';
import { child, type Element } from './element.ts';
import type { Lettering } from './lettering.ts';
import type { Item, Piece } from './piece.ts';
import { space, styles } from './style.ts';
import { clip } from './wrap.ts';

const hang = 16;

/** The numbered parts, down one column and then the next, each a link with its sheet at the column's end. */
export function setContents(
  { columns, entries }: Contents,
  x: number,
  width: number,
  letters: Lettering,
  parent: Element,
): readonly Piece[] {
  const { size, leading } = styles.small;
  const rows = Math.ceil(entries.length / columns);
  const cellWidth = (width - space.wide * (columns - 1)) / columns;
  const sheetWidth = letters.width('00', size, false);
  const list = child(parent, 'TOC');
  const items = entries.flatMap(({ number, text }, index): readonly Item[] => {
    const left = x + Math.floor(index / rows) * (cellWidth + space.wide);
    const top = (index % rows) * leading;
    const bookmark = bookmarkOf(number, text);
    const of = child(child(list, 'TOCI'), 'Link');
    const write = (along: number, words: Extract<Item, { kind: 'text' }>['text'], tone: 'ink' | 'accent'): Item => ({
      kind: 'text',
      x: left + along,
      y: top + leading / 2 + 0.35 * size,
      text: words,
      size,
      bold: false,
      tone,
      of,
    });
    return [
      write(0, `${String(number)} `, 'accent'),
      write(hang, clip(text, cellWidth - hang - sheetWidth - space.near, size, false, letters), 'ink'),
      write(cellWidth - sheetWidth, ({ sheetOf }) => ` ${String(sheetOf(bookmark))}`.slice(-2), 'ink'),
      { kind: 'link', x: left, y: top, X: left + cellWidth, Y: top + leading, bookmark, of },
    ];
  });
  return [{ before: space.tight, height: rows * leading, items, keep: false }];
}

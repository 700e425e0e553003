import type { Facts } from './block.ts';
import { child, type Element } from './element.ts';
import type { Lettering } from './lettering.ts';
import { shift, within, type Item, type Piece } from './piece.ts';
import { setParagraph } from './set-paragraph.ts';
import { rules, space, styles } from './style.ts';

/** A list of names with their values as its entries. */
export function setFacts(
  { columns, entries }: Facts,
  x: number,
  width: number,
  letters: Lettering,
  parent: Element,
): readonly Piece[] {
  const list = child(parent, 'L');
  const gutter = space.wide;
  const cellWidth = (width - gutter * (columns - 1)) / columns;
  const { size, leading } = styles.body;
  const pieces: Piece[] = [];
  for (let start = 0; start < entries.length; start += columns) {
    const sets = entries.slice(start, start + columns).map(({ name, value }, column) => {
      const left = x + column * (cellWidth + gutter);
      const entry = child(list, 'LI');
      const [label, content] = [child(entry, 'Lbl'), child(entry, 'LBody')];
      const title = setParagraph({ spans: [{ text: name, tone: 'muted' }], style: 'micro' }, left, cellWidth, letters);
      const body =
        typeof value === 'string'
          ? setParagraph({ spans: [{ text: value }] }, left, cellWidth, letters)
          : {
              items: [
                {
                  kind: 'text',
                  x: left,
                  y: leading / 2 + 0.35 * size,
                  text: value,
                  size,
                  bold: false,
                  tone: 'ink',
                } as const,
              ],
              height: leading,
            };
      const top: Item = { kind: 'rule', x: left, y: 0, X: left + cellWidth, Y: 0, width: rules.hair, tone: 'muted' };
      return {
        items: [
          top,
          ...within(label, title.items).map((item) => shift(item, space.hair)),
          ...within(content, body.items).map((item) => shift(item, space.hair + title.height)),
        ],
        height: title.height + body.height,
      };
    });
    pieces.push({
      before: start === 0 ? space.near : 0,
      height: Math.max(...sets.map(({ height }) => height)) + 3 * space.hair,
      items: sets.flatMap(({ items }) => items),
      keep: start + columns < entries.length,
    });
  }
  return pieces;
}

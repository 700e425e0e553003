import type { Block, Facts, Heading, List, Picture, Text } from './block.ts';
import type { Lettering } from './lettering.ts';
import { shift, type Item, type Piece } from './piece.ts';
import { setLines, setParagraph } from './set-paragraph.ts';
import { setTable } from './set-table.ts';
import { rules, space, styles } from './style.ts';

/** Pieces of one block, between x and x + width pt. */
export function setBlock(block: Block, x: number, width: number, letters: Lettering): readonly Piece[] {
  switch (block.kind) {
    case 'heading':
      return [setHeading(block, x, width, letters)];
    case 'text':
      return setText(block, x, width, letters);
    case 'list':
      return setList(block, x, width, letters);
    case 'facts':
      return setFacts(block, x, width, letters);
    case 'table':
      return setTable(block, x, width, letters);
    case 'picture':
      return [setPicture(block, x, width, letters)];
  }
}

const hang = 26;

function setHeading({ number, text }: Heading, x: number, width: number, letters: Lettering): Piece {
  if (number === undefined) {
    const set = setParagraph({ spans: [{ text, bold: true }] }, x, width, letters);
    return { before: space.wide, height: set.height + space.hair, items: set.items, keep: true };
  }
  const style = 'heading';
  const mark = setParagraph({ spans: [{ text: String(number), bold: true, tone: 'accent' }], style }, x, hang, letters);
  const set = setParagraph({ spans: [{ text, bold: true }], style }, x + hang, width - hang, letters);
  return {
    before: space.far,
    height: set.height + space.hair,
    items: [...mark.items, ...set.items],
    keep: true,
    bookmark: `${String(number)} ${text}`,
  };
}

/** A paragraph breaks between pages like any text: at least two lines stay at the foot and two go to the head. */
function setText(
  { paragraph, bar, keep, opens }: Text,
  x: number,
  width: number,
  letters: Lettering,
): readonly Piece[] {
  const inset = bar === true ? space.near + space.hair : 0;
  const { leading } = styles[paragraph.style ?? 'body'];
  const lines = setLines(paragraph, x + inset, width - inset, letters);
  return lines.map((line, index): Piece => {
    const last = index === lines.length - 1;
    const edge: Item[] = bar === true ? [barBeside(x, leading)] : [];
    return {
      before: index > 0 ? 0 : opens === true ? space.wide : bar === true ? 0 : space.tight,
      height: leading,
      items: [...edge, ...line],
      keep: last ? keep === true : index === 0 || index === lines.length - 2,
    };
  });
}

/** Drawn line by line; the hair's overlap leaves no seam between two. */
const barBeside = (x: number, height: number): Item => ({
  kind: 'rule',
  x: x + rules.bar / 2,
  y: -0.1,
  X: x + rules.bar / 2,
  Y: height,
  width: rules.bar,
  tone: 'accent',
});

function setList({ entries }: List, x: number, width: number, letters: Lettering): readonly Piece[] {
  return entries.flatMap(({ mark, paragraph }, entry) => {
    const { leading } = styles[paragraph.style ?? 'body'];
    const style = paragraph.style ?? 'body';
    const marks = setParagraph({ spans: [{ text: mark, tone: 'muted' }], style }, x, hang, letters);
    const lines = setLines(paragraph, x + hang, width - hang, letters);
    return lines.map((line, index): Piece => ({
      before: index === 0 ? (entry === 0 ? space.tight : space.hair) : 0,
      height: leading,
      items: index === 0 ? [...marks.items, ...line] : line,
      // Neither the first entry nor the last stands on a page by itself.
      keep:
        index < lines.length - 1
          ? index === 0 || index === lines.length - 2
          : entry < entries.length - 1 && (entry === 0 || entry === entries.length - 2),
    }));
  });
}

function setFacts({ columns, entries }: Facts, x: number, width: number, letters: Lettering): readonly Piece[] {
  const gutter = space.wide;
  const cellWidth = (width - gutter * (columns - 1)) / columns;
  const { size, leading } = styles.body;
  const pieces: Piece[] = [];
  for (let start = 0; start < entries.length; start += columns) {
    const sets = entries.slice(start, start + columns).map(({ name, value }, column) => {
      const left = x + column * (cellWidth + gutter);
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
          ...title.items.map((item) => shift(item, space.hair)),
          ...body.items.map((item) => shift(item, space.hair + title.height)),
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

function setPicture({ figure, caption, scale }: Picture, x: number, width: number, letters: Lettering): Piece {
  const drawn = Math.min(scale, width / figure.width);
  const height = figure.height * drawn;
  const items: Item[] = [{ kind: 'figure', x, y: 0, scale: drawn, figure }];
  if (caption === undefined) return { before: space.near, height, items, keep: false };
  const words = setParagraph({ spans: [{ text: caption, tone: 'muted' }], style: 'small' }, x, width, letters);
  const top = height + space.tight;
  return {
    before: space.wide,
    height: top + words.height,
    items: [...items, ...words.items.map((item) => shift(item, top))],
    keep: false,
  };
}

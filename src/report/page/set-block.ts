import { bookmarkOf, type Block, type Heading, type List, type Picture, type Text } from './block.ts';
import { child, type Element } from './element.ts';
import type { Lettering } from './lettering.ts';
import { shift, within, type Item, type Piece } from './piece.ts';
import { pictured } from './set-cell.ts';
import { setContents } from './set-contents.ts';
import { setFacts } from './set-facts.ts';
import { setLines, setParagraph } from './set-paragraph.ts';
import { setTable } from './set-table.ts';
import { rules, space, styles } from './style.ts';

/** Pieces of one block, between x and x + width pt, as children of an element of the report's structure. */
export function setBlock(
  block: Block,
  x: number,
  width: number,
  letters: Lettering,
  parent: Element,
): readonly Piece[] {
  switch (block.kind) {
    case 'heading':
      return [setHeading(block, x, width, letters, parent)];
    case 'text':
      return setText(block, x, width, letters, parent);
    case 'list':
      return setList(block, x, width, letters, parent);
    case 'facts':
      return setFacts(block, x, width, letters, parent);
    case 'contents':
      return setContents(block, x, width, letters, parent);
    case 'table':
      return setTable(block, x, width, letters, parent);
    case 'picture':
      return [setPicture(block, x, width, letters, parent)];
  }
}

const hang = 26;

function setHeading({ number, text }: Heading, x: number, width: number, letters: Lettering, parent: Element): Piece {
  const heading = child(parent, number === undefined ? 'H3' : 'H2');
  if (number === undefined) {
    const set = setParagraph({ spans: [{ text, bold: true }] }, x, width, letters);
    return {
      before: space.wide,
      height: set.height + space.hair,
      items: within(heading, set.items),
      keep: true,
    };
  }
  const style = 'heading';
  const mark = setParagraph({ spans: [{ text: String(number), bold: true, tone: 'accent' }], style }, x, hang, letters);
  const set = setParagraph({ spans: [{ text, bold: true }], style }, x + hang, width - hang, letters);
  return {
    before: space.far,
    height: set.height + space.hair,
    // The space isn't seen; it keeps number and name apart for whoever hears them.
    items: within(heading, [
      ...mark.items.map((item) => ({ ...item, text: `${String(number)} ` }) as Item),
      ...set.items,
    ]),
    keep: true,
    bookmark: bookmarkOf(number, text),
  };
}

/** A paragraph breaks between pages like any text: at least two lines stay at the foot and two go to the head. */
function setText(
  { paragraph, bar, keep, opens }: Text,
  x: number,
  width: number,
  letters: Lettering,
  parent: Element,
): readonly Piece[] {
  const element = child(parent, paragraph.style === 'display' ? 'H1' : 'P');
  const inset = bar === true ? space.near + space.hair : 0;
  const { leading } = styles[paragraph.style ?? 'body'];
  const lines = setLines(paragraph, x + inset, width - inset, letters);
  return lines.map((line, index): Piece => {
    const last = index === lines.length - 1;
    const edge: Item[] = bar === true ? [barBeside(x, leading)] : [];
    return {
      before: index > 0 ? 0 : opens === true ? space.wide : bar === true ? 0 : space.tight,
      height: leading,
      items: [...edge, ...within(element, line)],
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

function setList({ entries }: List, x: number, width: number, letters: Lettering, parent: Element): readonly Piece[] {
  const list = child(parent, 'L');
  return entries.flatMap(({ mark, paragraph }, entry) => {
    const item = child(list, 'LI');
    const [label, body] = [child(item, 'Lbl'), child(item, 'LBody')];
    const { leading } = styles[paragraph.style ?? 'body'];
    const style = paragraph.style ?? 'body';
    const marks = setParagraph({ spans: [{ text: mark, tone: 'muted' }], style }, x, hang, letters);
    const lines = setLines(paragraph, x + hang, width - hang, letters);
    return lines.map((line, index): Piece => ({
      before: index === 0 ? (entry === 0 ? space.tight : space.hair) : 0,
      height: leading,
      items: [...(index === 0 ? within(label, marks.items) : []), ...within(body, line)],
      // Neither the first entry nor the last stands on a page by itself.
      keep:
        index < lines.length - 1
          ? index === 0 || index === lines.length - 2
          : entry < entries.length - 1 && (entry === 0 || entry === entries.length - 2),
    }));
  });
}

function setPicture(
  { figure, caption, scale }: Picture,
  x: number,
  width: number,
  letters: Lettering,
  parent: Element,
): Piece {
  const drawn = Math.min(scale, width / figure.width);
  const height = figure.height * drawn;
  const items: Item[] = [{ kind: 'figure', x, y: 0, scale: drawn, figure, of: pictured(figure, parent) }];
  if (caption === undefined) return { before: space.near, height, items, keep: false };
  const words = setParagraph({ spans: [{ text: caption, tone: 'muted' }], style: 'small' }, x, width, letters);
  const top = height + space.tight;
  return {
    before: space.wide,
    height: top + words.height,
    items: [...items, ...within(child(parent, 'Caption'), words.items).map((item) => shift(item, top))],
    keep: false,
  };
}

import type { Cell, Column, Row, Table } from './block.ts';
import type { Lettering } from './lettering.ts';
import { shift, type Item, type Piece } from './piece.ts';
import { setParagraph, type Set } from './set-paragraph.ts';
import { rules, space } from './style.ts';

const gutter = 12;
const pad = 2.5;

interface Place {
  readonly x: number;
  readonly width: number;
  readonly align: 'start' | 'end';
}

/**
 * A table's head and rows, each a piece that no page break divides; the head repeats on every page that the table
 * reaches, and neither the first row nor the last stands alone.
 */
export function setTable(table: Table, x: number, width: number, letters: Lettering): readonly Piece[] {
  const places = placesOf(table.columns, x, width);
  const header = setHead(table.columns, places, x, width, letters);
  const last = table.rows.length - 1;
  const pieces = table.rows.map((row, index): Piece => {
    const { items, height } = setRow(row, places, letters);
    const full = Math.max(height + 2 * pad, table.rowHeight ?? 0);
    const foot: Item = rule(
      x,
      full,
      x + width,
      index === last ? rules.line : rules.hair,
      index === last ? 'ink' : 'faint',
    );
    return {
      before: 0,
      height: full,
      items: [...items.map((item) => shift(item, pad)), ...(row.marked === true ? [bar(x, full)] : []), foot],
      keep: table.together === true || (index < last && (index === 0 || index === last - 1)),
      header,
    };
  });
  return [header, ...pieces];
}

/** In the margin, beside the row that the rest of the report is about. */
const bar = (x: number, height: number): Item => ({
  kind: 'rule',
  x: x - space.near,
  y: 0,
  X: x - space.near,
  Y: height,
  width: rules.bar,
  tone: 'accent',
});

const rule = (x: number, y: number, X: number, width: number, tone: 'ink' | 'faint'): Item => ({
  kind: 'rule',
  x,
  y,
  X,
  Y: y,
  width,
  tone,
});

function placesOf(columns: readonly Column[], x: number, width: number): readonly Place[] {
  const shares = columns.reduce((sum, { share }) => sum + share, 0);
  const free = width - gutter * (columns.length - 1);
  let left = x;
  return columns.map(({ share, align }) => {
    const place: Place = { x: left, width: (free * share) / shares, align: align ?? 'start' };
    left += place.width + gutter;
    return place;
  });
}

function setHead(
  columns: readonly Column[],
  places: readonly Place[],
  x: number,
  width: number,
  letters: Lettering,
): Piece {
  const sets = columns.map(({ title }, index) => {
    const place = places[index]!;
    const spans = [{ text: title, bold: true, tone: 'muted' as const }];
    return setParagraph({ spans, style: 'small' }, place.x, place.width, letters, place.align);
  });
  const height = Math.max(...sets.map((set) => set.height));
  // Heads of unlike length stand on one line.
  const items = sets.flatMap((set) => set.items.map((item) => shift(item, space.hair + height - set.height)));
  const full = height + 2 * space.hair;
  return {
    before: space.tight,
    height: full,
    items: [...items, rule(x, full, x + width, rules.line, 'ink')],
    keep: true,
  };
}

function setRow({ cells, below }: Row, places: readonly Place[], letters: Lettering): Set {
  const sets = cells.map((cell, index) => setCell(cell, places[index]!, letters));
  const items: Item[] = sets.flatMap((set) => [...set.items]);
  if (below === undefined) return { items, height: Math.max(0, ...sets.map(({ height }) => height)) };
  const over = (from: number, to?: number): number => Math.max(0, ...sets.slice(from, to).map(({ height }) => height));
  let y = over(below.from) + space.hair;
  const [first, last] = [places[below.from]!, places.at(-1)!];
  for (const paragraph of below.paragraphs) {
    const set = setParagraph(paragraph, first.x, last.x + last.width - first.x, letters);
    items.push(...set.items.map((item) => shift(item, y)));
    y += set.height;
  }
  return { items, height: Math.max(y, over(0, below.from)) };
}

function setCell(cell: Cell, { x, width, align }: Place, letters: Lettering): Set {
  const items: Item[] = [];
  let y = 0;
  for (const content of cell) {
    if ('kind' in content) {
      const scale = Math.min(content.scale, width / content.figure.width);
      items.push({ kind: 'figure', x, y: y + space.hair, scale, figure: content.figure });
      y += content.figure.height * scale + space.tight;
    } else {
      const set = setParagraph(content, x, width, letters, align);
      items.push(...set.items.map((item) => shift(item, y)));
      y += set.height;
    }
  }
  return { items, height: y };
}

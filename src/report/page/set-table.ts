import type { Column, Row, Table } from './block.ts';
import { child, type Element } from './element.ts';
import type { Lettering } from './lettering.ts';
import { shift, within, type Item, type Piece } from './piece.ts';
import { setCell, type Place } from './set-cell.ts';
import { setParagraph, type Set } from './set-paragraph.ts';
import { rules, space } from './style.ts';

const gutter = 12;
const pad = 2.5;

/**
 * A table's head and rows, each a piece that no page break divides; the head repeats on every page that the table
 * reaches, and neither the first row nor the last stands alone.
 */
export function setTable(
  table: Table,
  x: number,
  width: number,
  letters: Lettering,
  parent: Element,
): readonly Piece[] {
  const places = placesOf(table.columns, x, width);
  const element = child(parent, 'Table');
  const header = setHead(table.columns, places, x, width, letters, element);
  const last = table.rows.length - 1;
  const pieces = table.rows.map((row, index): Piece => {
    const { items, height } = setRow(row, places, letters, element);
    const full = height + 2 * pad;
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
  table: Element,
): Piece {
  const row = child(table, 'TR');
  const sets = columns.map(({ title }, index) => {
    const place = places[index]!;
    const spans = [{ text: title, bold: true, tone: 'muted' as const }];
    const set = setParagraph({ spans, style: 'small' }, place.x, place.width, letters, place.align);
    return { ...set, items: within(child(row, 'TH'), set.items) };
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

function setRow({ cells, below }: Row, places: readonly Place[], letters: Lettering, table: Element): Set {
  const row = child(table, 'TR');
  // What is set below the later cells is a row of its own, which the cells before them reach into.
  const sets = cells.map((cell, index) => {
    const reaches = below !== undefined && index < below.from;
    return setCell(cell, places[index]!, letters, child(row, 'TD', reaches ? { rowSpan: 2 } : {}));
  });
  const items: Item[] = sets.flatMap((set) => [...set.items]);
  if (below === undefined) return { items, height: Math.max(0, ...sets.map(({ height }) => height)) };
  const over = (from: number, to?: number): number => Math.max(0, ...sets.slice(from, to).map(({ height }) => height));
  const y = over(below.from) + space.hair;
  const [first, last] = [places[below.from]!, places.at(-1)!];
  const wide: Place = { x: first.x, width: last.x + last.width - first.x, align: 'start' };
  const columnSpan = places.length - below.from;
  const under = child(child(table, 'TR'), 'TD', columnSpan > 1 ? { columnSpan } : {});
  const set = setCell(below.paragraphs, wide, letters, under);
  items.push(...set.items.map((item) => shift(item, y)));
  return { items, height: Math.max(y + set.height, over(0, below.from)) };
}

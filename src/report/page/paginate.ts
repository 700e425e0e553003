import { asHeader, extent, shift, type Item, type Piece } from './piece.ts';

export interface Sheet {
  readonly items: Item[];
  readonly bookmarks: { readonly title: string; readonly y: number }[];
}

/**
 * Places pieces on sheets between `top` and `bottom` pt. Pieces that keep together go to the next sheet together; a
 * piece or a chain taller than a sheet is divided between its items rather than cut.
 */
export function paginate(pieces: readonly Piece[], top: number, bottom: number): readonly Sheet[] {
  const sheets: Sheet[] = [{ items: [], bookmarks: [] }];
  let y = top;
  const current = (): Sheet => sheets[sheets.length - 1]!;
  const turn = (): void => {
    sheets.push({ items: [], bookmarks: [] });
    y = top;
  };
  const put = (items: readonly Item[], height: number): void => {
    current().items.push(...items.map((item) => shift(item, y)));
    y += height;
  };
  const place = (piece: Piece): void => {
    const { header } = piece;
    if (y === top && header !== undefined) put(asHeader(header.items), header.height);
    else if (y > top) y += piece.before;
    if (piece.bookmark !== undefined) current().bookmarks.push({ title: piece.bookmark, y });
    let rest = piece;
    while (y + rest.height > bottom + 0.01) {
      const [now, later, cut] = divide(rest, bottom - y, y === top);
      put(now, cut);
      turn();
      if (header !== undefined) put(asHeader(header.items), header.height);
      rest = { ...rest, items: later, height: rest.height - cut };
    }
    put(rest.items, rest.height);
  };

  let index = 0;
  while (index < pieces.length) {
    let end = index;
    while (pieces[end]!.keep && end + 1 < pieces.length) end += 1;
    const chain = pieces.slice(index, end + 1);
    const tall = chain.reduce((sum, piece, k) => sum + (k === 0 ? 0 : piece.before) + piece.height, 0);
    const first = chain[0]!;
    const fresh = tall + (first.header?.height ?? 0) <= bottom - top;
    // A chain too tall for any sheet breaks where it must, but not on to the last lines of a sheet.
    const needed = fresh ? tall : Math.min(tall, first.height + (chain[1]?.height ?? 0), bottom - top);
    if (y > top && y + first.before + needed > bottom + 0.01) turn();
    if (fresh) chain.forEach(place);
    else for (const piece of chain) placeAlone(piece);
    index = end + 1;
  }
  return sheets;

  function placeAlone(piece: Piece): void {
    const sheet = bottom - top - (piece.header?.height ?? 0);
    if (y > top && piece.height <= sheet && y + piece.before + piece.height > bottom + 0.01) turn();
    place(piece);
  }
}

/**
 * Items that fit over a cut at or above `room`, those that don't (from y = 0), and the cut: no item is cut through.
 * Where nothing fits, all of it moves on; on a sheet that is still empty it is drawn past the foot instead.
 */
function divide(piece: Piece, room: number, empty: boolean): readonly [readonly Item[], readonly Item[], number] {
  let cut = room;
  for (let moved = true; moved;) {
    moved = false;
    for (const item of piece.items) {
      const [head, foot] = extent(item);
      if (head < cut && foot > cut) {
        cut = head;
        moved = true;
      }
    }
  }
  if (cut <= 0) return empty ? [piece.items, [], piece.height] : [[], piece.items, 0];
  const now = piece.items.filter((item) => extent(item)[1] <= cut);
  const later = piece.items.filter((item) => extent(item)[1] > cut);
  return [now, later.map((item) => shift(item, -cut)), cut];
}

/** What layout and the PDF need to know of a TrueType font. */
export interface Typeface {
  readonly file: Uint8Array;
  readonly unitsPerEm: number;
  readonly ascent: number;
  readonly descent: number;
  readonly capHeight: number;
  readonly bounds: readonly [number, number, number, number];
  /** Glyph of each character that the font draws. */
  readonly glyphs: ReadonlyMap<number, number>;
  /** Advance width of a glyph, font units. */
  readonly advance: (glyph: number) => number;
}

/**
 * Reads a TrueType font's character map and metrics (OpenType 1.9: head, hhea, hmtx, OS/2, cmap format 4). Outlines
 * stay untouched: the file is embedded as it is.
 *
 * @throws RangeError when a table is missing or there is no character map for the basic multilingual plane
 */
export function readTypeface(file: Uint8Array): Typeface {
  const view = new DataView(file.buffer, file.byteOffset, file.byteLength);
  const tables = new Map<string, number>();
  for (let k = 0; k < view.getUint16(4); k += 1) {
    const entry = 12 + 16 * k;
    tables.set(String.fromCharCode(...file.subarray(entry, entry + 4)), view.getUint32(entry + 8));
  }
  const table = (name: string): number => {
    const offset = tables.get(name);
    if (offset === undefined) throw new RangeError(`readTypeface: no "${name}" table; give a TrueType font`);
    return offset;
  };
  const [head, hhea, hmtx, os2] = [table('head'), table('hhea'), table('hmtx'), table('OS/2')];
  const metrics = view.getUint16(hhea + 34);
  return {
    file,
    unitsPerEm: view.getUint16(head + 18),
    bounds: [view.getInt16(head + 36), view.getInt16(head + 38), view.getInt16(head + 40), view.getInt16(head + 42)],
    ascent: view.getInt16(hhea + 4),
    descent: view.getInt16(hhea + 6),
    capHeight: view.getInt16(os2 + 88),
    glyphs: characterMap(view, table('cmap')),
    advance: (glyph) => view.getUint16(hmtx + 4 * Math.min(glyph, metrics - 1)),
  };
}

function characterMap(view: DataView, cmap: number): Map<number, number> {
  let start: number | undefined;
  for (let k = 0; k < view.getUint16(cmap + 2); k += 1) {
    const offset = cmap + view.getUint32(cmap + 4 + 8 * k + 4);
    if (view.getUint16(offset) === 4) start = offset;
  }
  if (start === undefined) throw new RangeError('readTypeface: no character map of format 4; give a TrueType font');
  const glyphs = new Map<number, number>();
  const doubled = view.getUint16(start + 6);
  for (let k = 0; k < doubled; k += 2) {
    const end = view.getUint16(start + 14 + k);
    const first = view.getUint16(start + 16 + doubled + k);
    const delta = view.getUint16(start + 16 + 2 * doubled + k);
    const rangeAt = start + 16 + 3 * doubled + k;
    const range = view.getUint16(rangeAt);
    for (let code = first; code <= end && code !== 0xffff; code += 1) {
      const raw = range === 0 ? code : view.getUint16(rangeAt + range + 2 * (code - first));
      const glyph = raw === 0 ? 0 : (raw + delta) & 0xffff;
      if (glyph !== 0) glyphs.set(code, glyph);
    }
  }
  return glyphs;
}

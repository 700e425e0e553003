import { PDFString, type PDFDocument, type PDFRef } from 'pdf-lib';
import type { Typeface } from '../page/typeface.ts';

/** A typeface within one document: encodes text, remembers what it drew, and is written once all is drawn. */
export interface Font {
  /** Name in the pages' resources. */
  readonly name: string;
  readonly ref: PDFRef;
  /** Glyph numbers of a text in hexadecimal, two bytes each. */
  readonly encode: (text: string) => string;
  readonly write: () => void;
}

const hex = (value: number): string => value.toString(16).padStart(4, '0');

/**
 * A composite font whose codes are the typeface's own glyph numbers (ISO 32000-1, 9.7.4), with the widths and the
 * text of the glyphs that were drawn.
 */
export function embedFont(document: PDFDocument, face: Typeface, name: string, baseFont: string): Font {
  const { context } = document;
  const ref = context.nextRef();
  const drawn = new Map<number, number>();
  const codes = new Map<string, string>();
  const scaled = (units: number): number => Math.round((units * 1000) / face.unitsPerEm);

  const encode = (text: string): string => {
    let out = '';
    for (const letter of text) {
      let code = codes.get(letter);
      if (code === undefined) {
        // A space that doesn't break is a matter of layout; on the page and in what is copied from it, it is a space.
        const point = letter === '\u00a0' ? 0x20 : (letter.codePointAt(0) ?? 0);
        const glyph = face.glyphs.get(point) ?? 0;
        drawn.set(glyph, point);
        code = hex(glyph);
        codes.set(letter, code);
      }
      out += code;
    }
    return out;
  };

  const write = (): void => {
    const file = context.register(context.flateStream(face.file, { Length1: face.file.length }));
    const descriptor = context.register(
      context.obj({
        Type: 'FontDescriptor',
        FontName: baseFont,
        // Nonsymbolic: its characters are those of ordinary text.
        Flags: 32,
        FontBBox: face.bounds.map(scaled),
        ItalicAngle: 0,
        Ascent: scaled(face.ascent),
        Descent: scaled(face.descent),
        CapHeight: scaled(face.capHeight),
        StemV: name === 'B' ? 130 : 80,
        FontFile2: file,
      }),
    );
    const glyphs = [...drawn].sort(([a], [b]) => a - b);
    const descendant = context.register(
      context.obj({
        Type: 'Font',
        Subtype: 'CIDFontType2',
        BaseFont: baseFont,
        CIDSystemInfo: { Registry: PDFString.of('Adobe'), Ordering: PDFString.of('Identity'), Supplement: 0 },
        FontDescriptor: descriptor,
        DW: scaled(face.advance(0)),
        W: glyphs.flatMap(([glyph]) => [glyph, [scaled(face.advance(glyph))]]),
        CIDToGIDMap: 'Identity',
      }),
    );
    const font = context.obj({
      Type: 'Font',
      Subtype: 'Type0',
      BaseFont: baseFont,
      Encoding: 'Identity-H',
      DescendantFonts: [descendant],
      ToUnicode: context.register(context.flateStream(toUnicode(glyphs))),
    });
    context.assign(ref, font);
  };

  return { name, ref, encode, write };
}

/** CMap that gives each glyph's character back to whoever copies or searches the text. */
function toUnicode(glyphs: readonly (readonly [number, number])[]): string {
  const groups: string[] = [];
  for (let start = 0; start < glyphs.length; start += 100) {
    const group = glyphs.slice(start, start + 100).map(([glyph, point]) => `<${hex(glyph)}> <${hex(point)}>`);
    groups.push(`${String(group.length)} beginbfchar\n${group.join('\n')}\nendbfchar`);
  }
  return [
    '/CIDInit /ProcSet findresource begin 12 dict begin begincmap',
    '/CIDSystemInfo << /Registry (Adobe) /Ordering (UCS) /Supplement 0 >> def',
    '/CMapName /Adobe-Identity-UCS def /CMapType 2 def',
    '1 begincodespacerange <0000> <ffff> endcodespacerange',
    ...groups,
    'endcmap CMapName currentdict /CMap defineresource pop end end',
  ].join('\n');
}

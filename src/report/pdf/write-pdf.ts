import { PDFDocument, PDFName } from 'pdf-lib';
import type { Attachment } from '../attachments.ts';
import type { Element } from '../page/element.ts';
import type { Lettering } from '../page/lettering.ts';
import type { Sheet } from '../page/paginate.ts';
import type { Places } from '../page/piece.ts';
import type { Typeface } from '../page/typeface.ts';
import { annotate, type Destinations } from './annotations.ts';
import { attach } from './attach.ts';
import { describe } from './describe.ts';
import type { Description } from './description.ts';
import { drawFigure, type Fonts } from './draw-figure.ts';
import { embedFont } from './font.ts';
import { Marks } from './marks.ts';
import { opacityStates } from './opacity.ts';
import { outline } from './outline.ts';
import { Pen } from './pen.ts';
import { sealed } from './seal.ts';
import { writeStructure, type Box, type Drawn } from './structure.ts';

/** What a file is made of. */
export interface Contents {
  readonly sheets: readonly Sheet[];
  /** Width and height of a sheet, pt. */
  readonly size: readonly [number, number];
  /** The root of what the sheets' items belong to. */
  readonly structure: Element;
  readonly attachments: readonly Attachment[];
  readonly description: Description;
}

/**
 * Laid-out sheets as a PDF 1.7 file, tagged, sealed, with its attachments. Nothing in it comes from a clock or from chance: the
 * same sheets give the same bytes.
 */
export async function writePdf(
  { sheets, size, structure, attachments, description }: Contents,
  faces: { readonly regular: Typeface; readonly bold: Typeface },
  letters: Lettering,
): Promise<Uint8Array> {
  const document = await PDFDocument.create({ updateMetadata: false });
  describe(document, description);
  const { context } = document;
  const fonts: Fonts = {
    regular: embedFont(document, faces.regular, 'R', 'FerruleSans-Regular'),
    bold: embedFont(document, faces.bold, 'B', 'FerruleSans-Bold'),
    letters,
  };
  const resources = context.register(
    context.obj({ Font: { R: fonts.regular.ref, B: fonts.bold.ref }, ExtGState: opacityStates(sheets) }),
  );
  const places = placesOf(sheets);
  const boxes = new Map<Element, Box>();
  const drawn = sheets.map((sheet, k): Drawn => {
    const page = document.addPage([...size]);
    const { content, elements } = drawSheet(sheet, places, size[1], fonts, boxes);
    page.node.set(PDFName.of('Resources'), resources);
    page.node.set(PDFName.of('Contents'), context.register(context.flateStream(content)));
    page.node.set(PDFName.of('StructParents'), context.obj(k));
    // Whoever goes through the page's links and fields by keyboard meets them in the order of the text.
    page.node.set(PDFName.of('Tabs'), PDFName.of('S'));
    return { page: page.ref, elements };
  });
  fonts.regular.write();
  fonts.bold.write();
  const destinations = destinationsOf(sheets, drawn, size[1]);
  outline(document, destinations);
  writeStructure(document, structure, drawn, annotate(document, sheets, size[1], destinations), boxes);
  attach(document, attachments, description.date);
  return sealed(await document.save({ objectsPerTick: Number.MAX_SAFE_INTEGER }));
}

function drawSheet(
  { items }: Sheet,
  places: Places,
  height: number,
  fonts: Fonts,
  boxes: Map<Element, Box>,
): { readonly content: string; readonly elements: readonly Element[] } {
  const pen = new Pen(height);
  const marks = new Marks(pen);
  for (const item of items) {
    if (item.kind === 'link' || item.kind === 'signature') continue;
    marks.belong(item.of);
    if (item.kind === 'rule') {
      pen.line(item.x, item.y, item.X, item.Y, item.width, item.tone);
    } else if (item.kind === 'figure') {
      const { x, y, scale, figure, of } = item;
      drawFigure(pen, figure, x, y, scale, height, fonts);
      if (typeof of === 'object') boxes.set(of, boxOf(x, y, scale * figure.width, scale * figure.height, height));
    } else {
      const font = item.bold ? fonts.bold : fonts.regular;
      const text = typeof item.text === 'string' ? item.text : item.text(places);
      pen.text(item.x, item.y, font.encode(text), font.name, item.size, item.tone);
    }
  }
  marks.close();
  return { content: pen.toString(), elements: marks.elements };
}

const boxOf = (x: number, y: number, width: number, tall: number, height: number): Box => {
  const corners = [x, height - y - tall, x + width, height - y] as const;
  return corners.map((value) => Math.round(value * 100) / 100) as unknown as Box;
};

function placesOf(sheets: readonly Sheet[]): Places {
  const sheetOf = new Map(sheets.flatMap(({ bookmarks }, k) => bookmarks.map(({ title }) => [title, k + 1] as const)));
  return { sheets: sheets.length, sheetOf: (bookmark) => sheetOf.get(bookmark) ?? 0 };
}

const destinationsOf = (sheets: readonly Sheet[], drawn: readonly Drawn[], height: number): Destinations =>
  new Map(
    sheets.flatMap(({ bookmarks }, k) =>
      bookmarks.map(
        ({ title, y }) => [title, [drawn[k]!.page, 'XYZ', null, Math.round(height - y + 6), null]] as const,
      ),
    ),
  );

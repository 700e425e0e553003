import { PDFDocument, PDFHexString, PDFName } from 'pdf-lib';
import type { Sheet } from '../page/paginate.ts';
import type { Typeface } from '../page/typeface.ts';
import type { Lettering } from '../page/lettering.ts';
import { drawFigure, type Fonts } from './draw-figure.ts';
import { embedFont } from './font.ts';
import { outline } from './outline.ts';
import { Pen } from './pen.ts';

/** What the file says of itself. */
export interface Description {
  readonly title: string;
  readonly subject: string;
  readonly author: string;
  readonly creator: string;
  /** 64 hex digits; the file's identifier is made of it. */
  readonly digest: string;
  /** Date of issue; null: none is written. */
  readonly date: Date | null;
}

/**
 * Laid-out sheets as a PDF 1.7 file. Nothing in it comes from a clock or from chance: the same sheets give the same
 * bytes.
 *
 * @param size   width and height of a sheet, pt
 */
export async function writePdf(
  sheets: readonly Sheet[],
  size: readonly [number, number],
  faces: { readonly regular: Typeface; readonly bold: Typeface },
  letters: Lettering,
  description: Description,
): Promise<Uint8Array> {
  const document = await PDFDocument.create({ updateMetadata: false });
  describe(document, description);
  const { context } = document;
  const fonts: Fonts = {
    regular: embedFont(document, faces.regular, 'R', 'FerruleSans-Regular'),
    bold: embedFont(document, faces.bold, 'B', 'FerruleSans-Bold'),
    letters,
  };
  const resources = context.register(context.obj({ Font: { R: fonts.regular.ref, B: fonts.bold.ref } }));
  for (const sheet of sheets) {
    const page = document.addPage([...size]);
    page.node.set(PDFName.of('Resources'), resources);
    const content = drawSheet(sheet, sheets.length, size[1], fonts);
    page.node.set(PDFName.of('Contents'), context.register(context.flateStream(content)));
  }
  fonts.regular.write();
  fonts.bold.write();
  outline(document, sheets, size[1]);
  return document.save();
}

function drawSheet({ items }: Sheet, count: number, height: number, fonts: Fonts): string {
  const pen = new Pen(height);
  for (const item of items) {
    if (item.kind === 'rule') {
      pen.line(item.x, item.y, item.X, item.Y, item.width, item.tone);
    } else if (item.kind === 'figure') {
      drawFigure(pen, item.figure, item.x, item.y, item.scale, height, fonts);
    } else {
      const font = item.bold ? fonts.bold : fonts.regular;
      const text = typeof item.text === 'string' ? item.text : item.text(count);
      pen.text(item.x, item.y, font.encode(text), font.name, item.size, item.tone);
    }
  }
  return pen.toString();
}

function describe(document: PDFDocument, { title, subject, author, creator, digest, date }: Description): void {
  document.setTitle(title, { showInWindowTitleBar: true });
  document.setSubject(subject);
  if (author !== '') document.setAuthor(author);
  document.setCreator(creator);
  document.setProducer(creator);
  document.setLanguage('en');
  if (date !== null) {
    document.setCreationDate(date);
    document.setModificationDate(date);
  }
  const id = PDFHexString.of(digest.slice(0, 32));
  document.context.trailerInfo.ID = document.context.obj([id, id]);
}

import { PDFHexString, PDFName, PDFString, type PDFDocument, type PDFRef } from 'pdf-lib';
import type { Sheet } from '../page/paginate.ts';
import type { Item } from '../page/piece.ts';
import type { Annotation } from './structure.ts';

/** Where each bookmark leads: a page and a height on it. */
export type Destinations = ReadonlyMap<string, readonly [PDFRef, 'XYZ', null, number, null]>;

/** Whether an annotation is printed with its page (ISO 32000-1, 12.5.3). */
const printed = 4;
/** The document holds signature fields (ISO 32000-1, 12.7.2). */
const signaturesExist = 1;

/**
 * Links and empty signature fields of the sheets. Each has its key in the structure's parent tree, in this order after
 * the pages'.
 *
 * @param height  of a page, pt
 */
export function annotate(
  document: PDFDocument,
  sheets: readonly Sheet[],
  height: number,
  destinations: Destinations,
): readonly Annotation[] {
  const { context, catalog } = document;
  const annotations: Annotation[] = [];
  const fields: PDFRef[] = [];
  sheets.forEach(({ items }, k) => {
    const { node, ref: page } = document.getPages()[k]!;
    const refs: PDFRef[] = [];
    for (const item of items) {
      if (item.kind !== 'link' && item.kind !== 'signature') continue;
      if (typeof item.of !== 'object') throw new TypeError(`annotate: a ${item.kind} is part of no element`);
      const ref = context.register(
        context.obj({
          Type: 'Annot',
          ...(item.kind === 'link' ? linkOf(item, destinations) : fieldOf(item)),
          Rect: [item.x, height - item.Y, item.X, height - item.y].map((value) => Math.round(value * 100) / 100),
          F: printed,
          P: page,
          StructParent: sheets.length + annotations.length,
        }),
      );
      refs.push(ref);
      if (item.kind === 'signature') fields.push(ref);
      annotations.push({ ref, page, of: item.of });
    }
    if (refs.length > 0) node.set(PDFName.of('Annots'), context.obj(refs));
  });
  if (fields.length > 0) {
    catalog.set(PDFName.of('AcroForm'), context.register(context.obj({ Fields: fields, SigFlags: signaturesExist })));
  }
  return annotations;
}

const linkOf = ({ bookmark }: Extract<Item, { kind: 'link' }>, destinations: Destinations) => {
  const destination = destinations.get(bookmark);
  if (destination === undefined) throw new RangeError(`annotate: no part is called "${bookmark}"`);
  return {
    Subtype: 'Link',
    Border: [0, 0, 0],
    Dest: [...destination],
    Contents: PDFHexString.fromText(`To part ${bookmark}`),
  };
};

/** A field and its one widget in one dictionary. Without a value: whoever signs adds it, and its appearance. */
const fieldOf = ({ name, label }: Extract<Item, { kind: 'signature' }>) => ({
  Subtype: 'Widget',
  FT: 'Sig',
  T: PDFString.of(name),
  TU: PDFHexString.fromText(label),
});

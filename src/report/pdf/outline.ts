import { PDFHexString, PDFName, type PDFDocument } from 'pdf-lib';
import type { Sheet } from '../page/paginate.ts';

/** The numbered parts as the file's outline, one level deep; each leads to its heading. */
export function outline(document: PDFDocument, sheets: readonly Sheet[], height: number): void {
  const { context } = document;
  const pages = document.getPages();
  const entries = sheets.flatMap(({ bookmarks }, k) =>
    bookmarks.map(({ title, y }) => ({ title, y, page: pages[k]!.ref, ref: context.nextRef() })),
  );
  const [first, last] = [entries[0], entries.at(-1)];
  if (first === undefined || last === undefined) return;
  const root = context.register(
    context.obj({ Type: 'Outlines', First: first.ref, Last: last.ref, Count: entries.length }),
  );
  entries.forEach(({ title, y, page, ref }, k) => {
    const entry = context.obj({
      Title: PDFHexString.fromText(title),
      Parent: root,
      Dest: [page, 'XYZ', null, Math.round(height - y + 6), null],
    });
    const [previous, following] = [entries[k - 1], entries[k + 1]];
    if (previous !== undefined) entry.set(PDFName.of('Prev'), previous.ref);
    if (following !== undefined) entry.set(PDFName.of('Next'), following.ref);
    context.assign(ref, entry);
  });
  document.catalog.set(PDFName.of('Outlines'), root);
}

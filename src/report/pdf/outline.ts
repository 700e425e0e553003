import { PDFHexString, PDFName, type PDFDocument } from 'pdf-lib';
import type { Destinations } from './annotations.ts';

/** The numbered parts as the file's outline, one level deep; each leads to its heading. */
export function outline(document: PDFDocument, destinations: Destinations): void {
  const { context } = document;
  const entries = [...destinations].map(([title, destination]) => ({ title, destination, ref: context.nextRef() }));
  const [first, last] = [entries[0], entries.at(-1)];
  if (first === undefined || last === undefined) return;
  const root = context.register(
    context.obj({ Type: 'Outlines', First: first.ref, Last: last.ref, Count: entries.length }),
  );
  entries.forEach(({ title, destination, ref }, k) => {
    const entry = context.obj({ Title: PDFHexString.fromText(title), Parent: root, Dest: [...destination] });
    const [previous, following] = [entries[k - 1], entries[k + 1]];
    if (previous !== undefined) entry.set(PDFName.of('Prev'), previous.ref);
    if (following !== undefined) entry.set(PDFName.of('Next'), following.ref);
    context.assign(ref, entry);
  });
  document.catalog.set(PDFName.of('Outlines'), root);
}

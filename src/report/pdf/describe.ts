import { PDFHexString, PDFName, type PDFDocument } from 'pdf-lib';
import type { Description } from './description.ts';
import { xmp } from './xmp.ts';

/** Writes the description where readers and archives look for it: information dictionary, XMP packet, catalog, trailer. */
export function describe(document: PDFDocument, description: Description): void {
  const { title, subject, author, creator, language, digest, date } = description;
  const { context, catalog } = document;
  document.setTitle(title, { showInWindowTitleBar: true });
  document.setSubject(subject);
  if (author !== '') document.setAuthor(author);
  document.setCreator(creator);
  document.setProducer(creator);
  document.setLanguage(language);
  if (date !== null) {
    document.setCreationDate(date);
    document.setModificationDate(date);
  }
  // Not compressed, so that a program that reads no PDF finds it.
  const packet = context.stream(new TextEncoder().encode(xmp(description)), { Type: 'Metadata', Subtype: 'XML' });
  catalog.set(PDFName.of('Metadata'), context.register(packet));
  const id = PDFHexString.of(digest.slice(0, 32));
  context.trailerInfo.ID = context.obj([id, id]);
}

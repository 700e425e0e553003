import { PDFHexString, PDFName, type PDFDocument } from 'pdf-lib';
import { xmp } from './xmp.ts';

/** What the file says of itself. */
export interface Description {
  readonly title: string;
  readonly subject: string;
  readonly author: string;
  readonly creator: string;
  /** Of its text, as BCP 47 has it. */
  readonly language: string;
  /** 64 hex digits; the file's identifier is made of it. */
  readonly digest: string;
  /** Date of issue; null: none is written. */
  readonly date: Date | null;
}

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

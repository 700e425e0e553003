import { md5 } from '@noble/hashes/legacy.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { PDFHexString, PDFName, PDFString, type PDFDocument } from 'pdf-lib';
import type { Attachment } from '../attachments.ts';

/**
 * Puts files into the document (ISO 32000-1, 7.11.4), each with its relation to the report (ISO 32000-2, 14.13).
 *
 * @param date  of the files; null: none is written
 */
export function attach(document: PDFDocument, files: readonly Attachment[], date: Date | null): void {
  const { context, catalog } = document;
  // A name tree is searched by halves: its names ascend.
  const ordered = files.toSorted((a, b) => (a.name < b.name ? -1 : 1));
  const named = ordered.flatMap(({ name, description, mediaType, relation, text }) => {
    const bytes = utf8ToBytes(text);
    const stream = context.flateStream(bytes, {
      Type: 'EmbeddedFile',
      Subtype: mediaType,
      Params: {
        Size: bytes.length,
        CheckSum: PDFHexString.of(bytesToHex(md5(bytes))),
        ...(date === null ? {} : { CreationDate: PDFString.fromDate(date), ModDate: PDFString.fromDate(date) }),
      },
    });
    const file = context.register(stream);
    const ref = context.register(
      context.obj({
        Type: 'Filespec',
        F: PDFString.of(name),
        UF: PDFHexString.fromText(name),
        EF: { F: file, UF: file },
        Desc: PDFHexString.fromText(description),
        AFRelationship: relation,
      }),
    );
    return [PDFString.of(name), ref] as const;
  });
  catalog.set(PDFName.of('Names'), context.obj({ EmbeddedFiles: { Names: named } }));
  catalog.set(PDFName.of('AF'), context.obj(named.filter((_, k) => k % 2 === 1)));
}

import { decodePDFRawStream, PDFRawStream, type PDFObject } from 'pdf-lib';

/** The operators of a page's content stream. */
export function contentOf(stream: PDFObject | undefined): string {
  if (!(stream instanceof PDFRawStream)) throw new Error('the page has no content stream of its own');
  return new TextDecoder('latin1').decode(decodePDFRawStream(stream).decode());
}

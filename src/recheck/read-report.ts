import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex } from '@noble/hashes/utils.js';
import { sealOf } from '../report/pdf/seal.ts';
import type { Found } from './found.ts';
import { additionsTo } from './pdf/additions.ts';
import { embeddedFiles } from './pdf/embedded-files.ts';
import { Inflater } from './pdf/inflate.ts';
import { objectsOf, type Objects } from './pdf/objects.ts';
import { isDictionary, isList, textIn, typeOf } from './pdf/value.ts';
import { readFigures } from './read-figures.ts';
import { readRecordFile } from './read-record-file.ts';
import { notAsWritten, refusal } from './refusal.ts';

/**
 * Reads a report: its seal first, then what it carries, and whether each says the same as the others.
 *
 * @param bytes of a PDF file
 * @throws InputError when it isn't a report as Ferrule wrote it, or its record can't be read
 */
export async function readReport(bytes: Uint8Array): Promise<Found> {
  const written = sealedPart(bytes);
  const inflater = new Inflater();
  const objects = await objectsOf(written, inflater);
  const files = await embeddedFiles(objects, ['record.json', 'figures.json'], inflater);
  const printed = readFigures(textOf(files['figures.json']));
  if (bytesToHex(sha256(files['record.json'])) !== printed.recordFile) {
    throw notAsWritten('the record in it is not the one that its figures were printed of');
  }
  const found = readRecordFile(textOf(files['record.json']), 'record.json, ');
  if ([printed.digest, ...statedDigests(written, objects)].some((digest) => !found.digest.startsWith(digest))) {
    throw notAsWritten(`a digest that it states is forged: its record has ${found.digest.slice(0, 16)}…`);
  }
  const added = await additionsTo(bytes, written.length, objects);
  return { ...found, report: { printed, paper: paperOf(objects), written, added } };
}

function sealedPart(bytes: Uint8Array): Uint8Array {
  const seal = sealOf(bytes);
  if (seal === null) {
    const ends = new TextDecoder('latin1').decode(bytes.subarray(-2000));
    throw /\/Encrypt\s/u.test(ends)
      ? refusal('this PDF is encrypted', 'give the report without a password')
      : refusal(
          "this PDF is no report of Ferrule's, or another program has saved it anew",
          'give the report as it was written, or its record.json',
        );
  }
  if (seal.length > bytes.length) {
    throw refusal(
      `${bytes.length} bytes of ${seal.length} are here: its end is cut off, or another program saved it anew`,
      'fetch the report anew from where it is kept',
    );
  }
  if (!seal.holds)
    throw notAsWritten('it was changed since it was written: damaged, tampered with, or saved anew by another program');
  return bytes.subarray(0, seal.length);
}

/** Digests of the record that the file states besides its figures: in the XMP packet, and the beginning of it as its ID. */
function statedDigests(written: Uint8Array, { trailer, byNumber }: Objects): readonly string[] {
  const packet =
    [...byNumber.values()].find(({ value }) => typeOf(value) === 'Metadata')?.stream ?? written.subarray(0, 0);
  const stated = /<ferrule:digest>([0-9a-f]{64})<\/ferrule:digest>/u.exec(textOf(packet))?.[1];
  const ids = trailer.get('ID');
  const id = isList(ids) ? textIn(ids[0]).toLowerCase() : '';
  if (stated === undefined || id.length !== 32) throw notAsWritten("it doesn't state the digest of its record");
  return [stated, id];
}

/** The paper that the first page was laid out for. */
function paperOf({ byNumber }: Objects): 'a4' | 'letter' {
  const page = [...byNumber.values()].find(({ value }) => typeOf(value) === 'Page')?.value;
  const box = isDictionary(page) ? page.get('MediaBox') : undefined;
  return isList(box) && Number(box[2]) > 600 ? 'letter' : 'a4';
}

const textOf = (bytes: Uint8Array): string => new TextDecoder().decode(bytes);

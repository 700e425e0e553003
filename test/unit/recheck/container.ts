import { PDFDocument } from 'pdf-lib';
import { digestOf } from '../../../src/record/canonical.ts';
import type { DesignRecord } from '../../../src/record/design-record.ts';
import { figuresFile, recordFile, type Attachment } from '../../../src/report/attachments.ts';
import { attach } from '../../../src/report/pdf/attach.ts';
import { describe } from '../../../src/report/pdf/describe.ts';
import { sealed } from '../../../src/report/pdf/seal.ts';
import { version } from '../../../src/version.ts';

/** A report of one empty page that carries these files and states this digest, sealed as a report is. */
export async function container(files: readonly Attachment[], digest: string): Promise<Uint8Array> {
  const document = await PDFDocument.create({ updateMetadata: false });
  const creator = `Ferrule ${version}`;
  describe(document, { title: '', subject: '', author: '', creator, language: 'en', digest, date: null });
  attach(document, files, null);
  return sealed(await document.save({ objectsPerTick: Number.MAX_SAFE_INTEGER }));
}

/** One that carries a record as a report does, and no figure. */
export function containerOf(record: DesignRecord, change: Partial<Attachment> = {}): Promise<Uint8Array> {
  const digest = digestOf(record);
  return container([{ ...recordFile(record), ...change }, figuresFile({ version, digest, record }, [])], digest);
}

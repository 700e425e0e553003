import { PDFDocument } from 'pdf-lib';
import { beforeAll, describe, expect, it } from 'vitest';
import { printedFigures } from '../../../src/design/printed-figures.ts';
import { mostBytes, readFile } from '../../../src/recheck/read-file.ts';
import { figuresFile, recordFile } from '../../../src/report/attachments.ts';
import { report } from '../../../src/report/report.ts';
import { dossierOf, fonts } from '../report/records.ts';
import { container, containerOf } from './container.ts';

const dossier = dossierOf('tide-gauge');
const { record, digest } = dossier;
const figures = figuresFile(dossier, printedFigures(dossier));
let bytes: Uint8Array;
beforeAll(async () => {
  bytes = await report(dossier, { paper: 'letter', fonts });
});

const text = (content: string): Uint8Array => new TextEncoder().encode(content);

describe('readFile(name, bytes)', () => {
  it('finds record, figures, digest and paper of a report', async () => {
    const found = await readFile('a.pdf', bytes);
    expect(found).toMatchObject({ record, digest, schema: 'ferrule-record/2' });
    expect(found.report).toMatchObject({ paper: 'letter', added: null });
    expect(found.report!.printed.figures).toEqual(printedFigures(dossier));
    expect((await readFile('a.pdf', await report(dossier, { paper: 'a4', fonts }))).report!.paper).toBe('a4');
  });

  it('takes a record as any editor saves it', async () => {
    const found = await readFile('a.json', text(`\uFEFF\r\n${JSON.stringify(record, null, 2)}`));
    expect(found).toEqual({ record, digest, schema: 'ferrule-record/2', report: null });
  });

  it.each([
    ['another program’s PDF', async () => (await PDFDocument.create()).save(), 'file "x": this PDF is no report'],
    [
      'one that another program saved anew',
      async () => (await PDFDocument.load(bytes)).save(),
      'saved anew by another program',
    ],
    ['an encrypted one', () => text('%PDF-1.7\ntrailer << /Encrypt 5 0 R >>'), 'this PDF is encrypted'],
    ['a report cut short', () => bytes.slice(0, -1), '74 bytes of'],
    [
      'a report with a byte changed',
      () => bytes.map((byte, k) => (k === 5000 ? byte ^ 1 : byte)),
      'it was changed since it was written',
    ],
    ['nothing', () => new Uint8Array(), 'neither a report (PDF) nor a record (JSON)'],
    ['a picture', () => text('\u0089PNG\r\n'), 'neither a report (PDF) nor a record (JSON)'],
    [
      'a PDF behind something else',
      () => Buffer.concat([text('\n'), bytes]),
      'neither a report (PDF) nor a record (JSON)',
    ],
    ['too much', () => new Uint8Array(mostBytes + 1), 'file "x": over 20 MB'],
    ['a record with a field of no meaning', () => text(JSON.stringify({ ...record, more: 1 })), 'x: more'],
    ['a report without figures', () => container([recordFile(record)], digest), 'it carries no figures.json'],
    ['figures without a record', () => container([figures], digest), 'it carries no record.json'],
    [
      'two records',
      () => container([recordFile(record), recordFile(record), figures], digest),
      "its record.json can't be told",
    ],
    ['a digest forged in its metadata', () => container([recordFile(record), figures], 'f'.repeat(64)), 'is forged'],
    [
      'a digest forged in its figures',
      () => container([recordFile(record), { ...figures, text: figures.text.replace(digest, 'f'.repeat(64)) }], digest),
      'is forged',
    ],
    [
      'a name in the sign-off put in later',
      () => containerOf(record, { text: recordFile(record).text.replace('"name":""', '"name":"X"') }),
      'not the one that its figures were printed of',
    ],
    [
      'figures of a later Ferrule',
      () =>
        container([recordFile(record), { ...figures, text: figures.text.replace('figures/1', 'figures/2') }], digest),
      'a later Ferrule wrote it',
    ],
    [
      'a figure beyond all bounds',
      () =>
        container(
          [recordFile(record), { ...figures, text: figures.text.replace(/"value":[\d.]+/u, '"value":1e400') }],
          digest,
        ),
      "its figures.json doesn't hold what a report prints",
    ],
    [
      'a figure that rewrites the terminal',
      () =>
        container(
          [recordFile(record), { ...figures, text: figures.text.replace('"name":"', '"name":"\\u001b[2J') }],
          digest,
        ),
      "its figures.json doesn't hold what a report prints",
    ],
  ])('refuses %s', async (_, file, message) => {
    const given = await file();
    const expected = message.replace('74 bytes', `${bytes.length - 1} bytes`);
    await expect(readFile('x', given)).rejects.toThrow(expected);
  });
});

import { PDFDocument, PDFName, type PDFRef } from 'pdf-lib';
import { beforeAll, describe, expect, it } from 'vitest';
import { readFile } from '../../../src/recheck/read-file.ts';
import { report } from '../../../src/report/report.ts';
import { dossierOf, fonts } from '../report/records.ts';

let bytes: Uint8Array;
let numbers: Readonly<Record<'catalog' | 'page' | 'content' | 'field' | 'form', number>>;
let texts: Readonly<Record<'catalog' | 'page' | 'field' | 'form', string>>;

beforeAll(async () => {
  bytes = await report(dossierOf('tide-gauge'), { paper: 'a4', fonts });
  const document = await PDFDocument.load(bytes, { updateMetadata: false });
  const { catalog, context } = document;
  const page = document.getPage(0);
  const form = catalog.get(PDFName.of('AcroForm')) as PDFRef;
  const [field] = [...context.enumerateIndirectObjects()].find(([, object]) => String(object).includes('/FT /Sig'))!;
  const refs = {
    catalog: context.trailerInfo.Root as PDFRef,
    page: page.ref,
    content: page.node.get(PDFName.of('Contents')) as PDFRef,
    field,
    form,
  };
  numbers = Object.fromEntries(Object.entries(refs).map(([name, ref]) => [name, ref.objectNumber])) as typeof numbers;
  texts = Object.fromEntries(
    Object.entries(refs).map(([name, ref]) => [name, String(context.lookup(ref))]),
  ) as typeof texts;
});

/** The report with objects added after it. */
const updated = (...objects: readonly (readonly [number, string])[]): Uint8Array => {
  const added = objects.map(([number, text]) => `\n${number} 0 obj\n${text}\nendobj`).join('');
  return Buffer.concat([bytes, Buffer.from(`${added}\nstartxref\n0\n%%EOF\n`, 'latin1')]);
};

const withEntry = (dictionary: string, entry: string): string => dictionary.replace(/>>$/u, `${entry}\n>>`);
const added = async (file: Uint8Array) => (await readFile('signed.pdf', file)).report!.added;
const unused = 99_999;

describe('what was added to a report', () => {
  it('is nothing where only an end of line follows', async () => {
    expect(await added(bytes)).toBeNull();
    expect(await added(Buffer.concat([bytes, Buffer.from('\r\n')]))).toBeNull();
  });

  it('may be a signature: its value, its appearance, the form that holds it', async () => {
    const signature = '<< /Type /Sig /Filter /Adobe.PPKLite /ByteRange [0 1 2 3] /Contents <00> >>';
    const file = updated(
      [numbers.field, withEntry(texts.field, `/V ${unused} 0 R /AP << /N ${unused + 1} 0 R >>`)],
      [numbers.form, texts.form.replace('/SigFlags 1', '/SigFlags 3')],
      [numbers.catalog, withEntry(texts.catalog, '/DSS << >>')],
      [numbers.page, withEntry(texts.page, '/LastModified (D:2026)')],
      [unused, signature],
      [unused + 1, '<< /Type /XObject /Length 3 >>\nstream\nq Q\nendstream'],
    );
    expect(await added(file)).toEqual({ bytes: file.length - bytes.length, signatures: 1 });
  });

  it.each([
    ['the content of a page', () => [numbers.content, '<< /Length 3 >>\nstream\nq Q\nendstream'] as const],
    [
      'which content a page has',
      () => [numbers.page, texts.page.replace(/\/Contents \d+/u, `/Contents ${unused}`)] as const,
    ],
    ['the size of a page', () => [numbers.page, withEntry(texts.page, '/CropBox [0 0 9 9]')] as const],
    [
      'which pages there are',
      () => [numbers.catalog, texts.catalog.replace(/\/Pages \d+/u, `/Pages ${unused}`)] as const,
    ],
    ['what happens when it is opened', () => [numbers.catalog, withEntry(texts.catalog, '/OpenAction 1 0 R')] as const],
    ['a page by something else', () => [numbers.page, 'null'] as const],
  ])('may not change %s', async (_, object) => {
    await expect(readFile('signed.pdf', updated(object()))).rejects.toThrow(
      'what was added to it puts other contents in the place of what was written',
    );
  });

  it('is looked through where it is packed, too', async () => {
    const { deflateSync } = await import('node:zlib');
    const packed = deflateSync(`${numbers.page} 0 null`);
    const head = `<< /Type /ObjStm /N 1 /First ${String(numbers.page).length + 3} /Filter /FlateDecode /Length ${packed.length} >>`;
    const file = Buffer.concat([
      bytes,
      Buffer.from(`\n${unused} 0 obj\n${head}\nstream\n`),
      packed,
      Buffer.from('\nendstream\nendobj\n'),
    ]);
    await expect(readFile('signed.pdf', file)).rejects.toThrow('other contents');
  });
});

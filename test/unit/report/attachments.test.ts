import { createHash } from 'node:crypto';
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { PDFArray, PDFDict, PDFDocument, PDFHexString, PDFName } from 'pdf-lib';
import { describe, expect, it } from 'vitest';
import { chosenTwoPort, sweepCsv } from '../../../src/design/exports.ts';
import { printedFigures } from '../../../src/design/printed-figures.ts';
import { design } from '../../../src/design.ts';
import type { Dossier } from '../../../src/dossier.ts';
import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import { readRecord } from '../../../src/record/read-record.ts';
import { attachments } from '../../../src/report/attachments.ts';
import { report } from '../../../src/report/report.ts';
import { dossierOf, fonts, measuredStates } from './records.ts';

const dossier = design(measuredStates);
const pdf = (of: Dossier) => report(of, { paper: 'a4', fonts });

/** The files in a PDF as another program reads them. */
async function filesIn(bytes: Uint8Array): Promise<ReadonlyMap<string, string>> {
  const task = getDocument({ data: bytes.slice(), verbosity: 0 });
  const document = await task.promise;
  const files = new Map<string, string>();
  for (const name of ((await document.getAttachments()) as ReadonlyMap<string, unknown> | null)?.keys() ?? []) {
    files.set(name, new TextDecoder().decode((await document.getAttachmentContent(name)) as unknown as Uint8Array));
  }
  await task.destroy();
  return files;
}

describe('the files inside a report', () => {
  it('give back the record, from which the same report is made', async () => {
    const bytes = await pdf(dossier);
    const files = await filesIn(bytes);
    expect(readRecord(files.get('record.json')!)).toEqual(dossier.record);
    expect(await pdf(design(readRecord(files.get('record.json')!)))).toEqual(bytes);
  });

  it('hold sweep, two-port and the figures that were printed', async () => {
    const files = await filesIn(await pdf(dossier));
    expect(files.get('sweep.csv')).toBe(sweepCsv(dossier));
    expect(files.get('network.s2p')).toBe(chosenTwoPort(dossier));
    expect(JSON.parse(files.get('figures.json')!)).toEqual({
      schema: 'ferrule-figures/1',
      version: dossier.version,
      digest: dossier.digest,
      recordFile: createHash('sha256').update(files.get('record.json')!).digest('hex'),
      figures: printedFigures(dossier),
    });
  });

  it('hold every measured file, which reads to the same samples', async () => {
    const files = await filesIn(await pdf(dossier));
    for (const { termination } of measuredStates.loads) {
      if (!('measured' in termination)) throw new Error('the states are measured');
      const { name, frequencyHz, re, im } = termination.measured;
      const again = measuredTermination(files.get(name)!, name).measured;
      expect([again.frequencyHz, again.re, again.im]).toEqual([frequencyHz, re, im]);
    }
  });

  it('are tied to the document with what they are to it, their size and their MD5 (RFC 1321)', async () => {
    const document = await PDFDocument.load(await pdf(dossier));
    const specs = document.catalog.lookup(PDFName.of('AF'), PDFArray);
    const relations: string[] = [];
    for (let k = 0; k < specs.size(); k += 1) {
      const spec = specs.lookup(k, PDFDict);
      const name = spec.lookup(PDFName.of('UF'), PDFHexString).decodeText();
      relations.push(`${name} ${String(spec.get(PDFName.of('AFRelationship')))}`);
      const stream = spec.lookup(PDFName.of('EF'), PDFDict).lookup(PDFName.of('F')) as unknown as { dict: PDFDict };
      const { text } = attachments(dossier).find((file) => file.name === name)!;
      const sum = createHash('md5').update(text).digest('hex');
      const params = stream.dict.lookup(PDFName.of('Params'), PDFDict);
      expect(params.lookup(PDFName.of('CheckSum'), PDFHexString).asString()).toBe(sum);
      expect(String(params.get(PDFName.of('Size')))).toBe(String(Buffer.byteLength(text)));
    }
    expect(relations).toEqual([
      'figures.json /Data',
      'free.s1p /Source',
      'hand.s1p /Source',
      'network.s2p /Supplement',
      'record.json /Source',
      'sweep.csv /Data',
    ]);
  });
});

describe('attachments(dossier)', () => {
  const renamed = (names: readonly string[]): readonly string[] => {
    const { measured } = measuredTermination('100M 10 -60\n200M 12 -30\n', 'table');
    const loads = names.map((name, k) => ({
      name: `state ${k}`,
      termination: { measured: { ...measured, name } },
    }));
    const record = { ...dossier.record, loads };
    return attachments({ ...dossier, record })
      .map(({ name }) => name)
      .filter((name) => name.endsWith('.s1p'));
  };

  it('names measured files so that no system stumbles and no two are alike', () => {
    expect(renamed(['a.s1p', 'A.S2P', '../../etc/pass wd', 'アンテナ.s1p', 'table', '-', 'n'.repeat(90)])).toEqual([
      'a.s1p',
      'A-2.s1p',
      'etc-pass-wd.s1p',
      'measured.s1p',
      'table.s1p',
      'measured-2.s1p',
      `${'n'.repeat(60)}.s1p`,
    ]);
  });

  it('leaves out what there is none of', () => {
    const without = dossierOf('tide-gauge');
    const names = (of: Dossier) => attachments(of).map(({ name }) => name);
    expect(names(without)).toEqual(['record.json', 'figures.json', 'sweep.csv', 'network.s2p']);
    expect(names({ ...without, responses: [], chosen: null })).toEqual(['record.json', 'figures.json']);
  });
});

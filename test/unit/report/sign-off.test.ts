import { PDFDocument, PDFName, PDFSignature } from 'pdf-lib';
import { describe, expect, it } from 'vitest';
import type { Dossier } from '../../../src/dossier.ts';
import type { DesignRecord } from '../../../src/record/design-record.ts';
import { parts } from '../../../src/report/content/parts.ts';
import { report } from '../../../src/report/report.ts';
import { contentOf } from './content-of.ts';
import { readPdf } from './read-pdf.ts';
import { dossierOf, fonts } from './records.ts';

const remark = 'The ground lead of the second prototype is 4 mm longer.';
const reason = 'The receiver tolerates 40 dB; agreed with the system engineer.';

/** Revision C of the tide gauge, with everything that change control asks for. */
const revised = (state: DesignRecord['signOff']['state'], more: Partial<DesignRecord> = {}): Dossier =>
  dossierOf('tide-gauge', ({ identity, requirement }) => ({
    identity: { ...identity, revision: 'C', change: 'Return loss raised for the new receiver' },
    requirement: { ...requirement, returnLossDb: 60 },
    history: [
      { revision: 'A', date: '2026-01-10', change: '', digest: 'a1'.repeat(32) },
      { revision: 'B', date: '2026-02-11', change: 'Band widened', digest: 'b2'.repeat(32) },
    ],
    deviations: [{ subject: 'return loss', reason }],
    signOff: {
      state,
      prepared: { name: 'A. Preparer', role: 'RF design', date: '2026-03-01', remark: '' },
      checked: { name: 'B. Checker', role: 'RF review', date: '2026-03-02', remark },
      approved: { name: '', role: 'Product integrity', date: '', remark: '' },
    },
    ...more,
  }));

const pdf = (dossier: Dossier) => report(dossier, { paper: 'a4', fonts });

describe('a report under change control', () => {
  it.each([
    ['draft', 'DRAFT', 'Draft'],
    ['for review', 'FOR REVIEW', 'For review'],
    ['issued', 'Issued', 'Issued'],
  ] as const)('says that it is %s on every sheet and in its title block', async (state, mark, name) => {
    const { pages } = await readPdf(await pdf(revised(state)));
    for (const words of pages) {
      expect(words.filter(({ y }) => y > 790).map(({ text }) => text)).toContain(mark);
    }
    const title = pages[0]!.map(({ text }) => text);
    expect(title[title.indexOf('Document status') + 1]).toBe(name);
  });

  it('marks drafts across every sheet, and nothing else', async () => {
    const marks = async (state: DesignRecord['signOff']['state']) => {
      const document = await PDFDocument.load(await pdf(revised(state)));
      return document.getPages().map((page) => contentOf(page.node.Contents()).split('/Subtype/Watermark').length - 1);
    };
    expect(new Set(await marks('draft'))).toEqual(new Set([1]));
    expect(new Set(await marks('for review'))).toEqual(new Set([0]));
    expect(new Set(await marks('issued'))).toEqual(new Set([0]));
  });

  it('tells what this revision changes, and what each before it did', async () => {
    const dossier = revised('draft');
    const { text } = await readPdf(await pdf(dossier));
    const flat = text.replace(/\s+/gu, ' ');
    expect(flat).toContain('Contents of this revision. Return loss raised for the new receiver.');
    expect(flat).toContain('A 2026-01-10 The first of this document.');
    expect(flat).toContain('B 2026-02-11 Band widened.');
    for (const digest of ['a1'.repeat(32), 'b2'.repeat(32), dossier.digest]) expect(flat).toContain(digest);
  });

  it('prints a deviation with what is missed and why that is accepted, and points to it on the first sheet', async () => {
    const { text, pages } = await readPdf(await pdf(revised('for review')));
    const flat = text.replace(/\s+/gu, ' ');
    expect(flat).toMatch(
      /Return loss Return loss with real parts [\d.]+ dB at worst [^.]+\.\d\d MHz\), below the 60\.00 dB required\./u,
    );
    expect(flat).toContain('tolerates 40 dB');
    const first = pages[0]!.map((word) => word.text).join(' ');
    expect(first).toContain(`Accepted in writing: see part ${parts.deviations}.`);
    expect(first).not.toContain('needs a written deviation');
  });

  it('says where a requirement is missed and nothing is written', async () => {
    const { text } = await readPdf(await pdf(revised('draft', { deviations: [] })));
    expect(text.replace(/\s+/gu, ' ')).toContain('Not stated. Issuing needs it in writing.');
  });

  it('prints names, dates and remarks', async () => {
    const { text } = await readPdf(await pdf(revised('issued')));
    const flat = text.replace(/\s+/gu, ' ');
    expect(flat).toContain('Checked B. Checker RF review 2026-03-02');
    expect(flat).toContain(`Remark: ${remark}`);
  });
});

describe('the signature fields of a report', () => {
  it('are three, empty, each with a name, a tooltip and room on the sheet where its duty is printed', async () => {
    const bytes = await pdf(revised('issued'));
    const document = await PDFDocument.load(bytes);
    const fields = document.getForm().getFields();
    expect(fields.map((field) => field.getName())).toEqual(['prepared', 'checked', 'approved']);
    const { pages } = await readPdf(bytes);
    const last = pages.at(-1)!;
    const labels = ['Signature, prepared by A. Preparer', 'Signature, checked by B. Checker', 'Signature, approved'];
    fields.forEach((field, k) => {
      expect(field).toBeInstanceOf(PDFSignature);
      expect(field.acroField.V()).toBeUndefined();
      const label = field.acroField.dict.lookup(PDFName.of('TU')) as unknown as { decodeText(): string };
      expect(label.decodeText()).toBe(labels[k]);
      const { x, y, width, height } = field.acroField.getWidgets()[0]!.getRectangle();
      const duty = last.find(({ text }) => text === ['Prepared', 'Checked', 'Approved'][k])!;
      expect([width > 100, height > 25]).toEqual([true, true]);
      expect(x + width).toBeLessThan(595 - 42);
      expect(y).toBeLessThan(duty.y);
      expect(y + height).toBeGreaterThan(duty.y);
      // Nothing is printed where one signs.
      const under = last.filter((word) => word.x + word.width > x && word.x < x + width);
      expect(under.filter((word) => word.y > y && word.y < y + height)).toEqual([]);
    });
  });

  it('are announced as ISO 32000-1, 12.7.2 asks: signature fields exist, nothing is signed yet', async () => {
    const document = await PDFDocument.load(await pdf(revised('draft')));
    const form = document.catalog.lookup(PDFName.of('AcroForm')) as unknown as { get(name: PDFName): unknown };
    expect(String(form.get(PDFName.of('SigFlags')))).toBe('1');
    expect(form.get(PDFName.of('NeedAppearances'))).toBeUndefined();
  });
});

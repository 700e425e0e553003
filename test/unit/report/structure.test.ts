import { PDFArray, PDFDict, PDFDocument, PDFName, PDFNumber, PDFRef } from 'pdf-lib';
import { beforeAll, describe, expect, it } from 'vitest';
import { report } from '../../../src/report/report.ts';
import { nodesOf, readStructure, type Structure } from './read-structure.ts';
import { dossierOf, fonts } from './records.ts';

const dossier = dossierOf('tide-gauge', ({ signOff }) => ({
  signOff: { ...signOff, checked: { ...signOff.checked, remark: 'Seen on the bench.' } },
}));
const bytes = await report(dossier, { paper: 'a4', fonts });
let structure: Structure;
beforeAll(async () => {
  structure = await readStructure(bytes);
});
const all = (role: string) => structure.pages.flatMap((page) => nodesOf(page, role));

describe('the structure of a report', () => {
  it('holds every text but the heads and feet of its sheets', () => {
    expect(structure.loose).toEqual([]);
    structure.artifacts.forEach((texts, k) => {
      const words = texts.join(' ');
      expect(words).toContain(`Page ${k + 1} of ${structure.pages.length}`);
      expect(words).toContain(dossier.digest);
    });
    // Two items at the foot; four at the head, and on later sheets the heads of tables that go on.
    expect(structure.artifacts[0]!.filter((text) => text.trim() !== '')).toHaveLength(6);
  });

  it('has one title, and a heading for each part, number and name apart', () => {
    expect(all('H1').map(({ text }) => text)).toEqual(['Tide-gauge telemetry: transmitter to stub whip']);
    expect(all('H2').map(({ text }) => text)).toContain('1 Requirement');
    expect(all('H2').length).toBe(all('TOCI').length);
  });

  it('keeps words apart where their weight changes', () => {
    const paragraphs = all('P').map(({ text }) => text);
    expect(paragraphs).toContain('Contents of this revision. The first of this document.');
  });

  it('says in words what every figure shows, with its numbers', () => {
    const figures = all('Figure');
    expect(figures.length).toBeGreaterThan(4);
    for (const { alt } of figures) expect(alt).toMatch(/^\w.{20,}\.$/u);
    expect(figures.find(({ alt }) => alt?.startsWith('Return loss'))?.alt).toMatch(/at least 14 dB/u);
  });

  it('lists each assumption with its mark', () => {
    const entry = all('LI').find(({ children }) => children[0]?.text === 'A1');
    expect(entry?.children.map(({ role }) => role)).toEqual(['Lbl', 'LBody']);
    expect(entry?.children[1]?.text.trim()).toBe(dossier.assumptions[0]);
  });

  it('ties each link of the contents and each signature to its place in the text', () => {
    expect(all('Link').every(({ objects }) => objects === 1)).toBe(true);
    expect(all('Form').map(({ objects }) => objects)).toEqual([1, 1, 1]);
  });
});

describe('the structure tree of a report', () => {
  const read = async () => {
    const document = await PDFDocument.load(bytes);
    const root = document.catalog.lookup(PDFName.of('StructTreeRoot'), PDFDict);
    return { document, root };
  };
  const kids = (element: PDFDict): readonly PDFDict[] => {
    const found = element.lookup(PDFName.of('K'));
    const list = found instanceof PDFArray ? found.asArray().map((each) => element.context.lookup(each)) : [found];
    return list.filter((each) => each instanceof PDFDict).filter((each) => each.has(PDFName.of('S')));
  };
  const role = (element: PDFDict): string => element.lookup(PDFName.of('S'), PDFName).decodeText();
  const span = (cell: PDFDict, name: string): number =>
    cell.lookupMaybe(PDFName.of('A'), PDFDict)?.lookupMaybe(PDFName.of(name), PDFNumber)?.asNumber() ?? 1;

  it('marks the document as tagged, its language, and the order of its fields', async () => {
    const { document } = await read();
    const { catalog } = document;
    expect(catalog.lookup(PDFName.of('MarkInfo'))?.toString()).toContain('/Marked true');
    expect(catalog.lookup(PDFName.of('ViewerPreferences'))?.toString()).toContain('/DisplayDocTitle true');
    for (const page of document.getPages()) expect(page.node.lookup(PDFName.of('Tabs'))).toBe(PDFName.of('S'));
  });

  it('has as many cells in every row of a table, those that reach into it counted', async () => {
    const { root } = await read();
    const tables: PDFDict[] = [];
    const visit = (element: PDFDict): void => {
      if (role(element) === 'Table') tables.push(element);
      kids(element).forEach(visit);
    };
    kids(root).forEach(visit);
    expect(tables.length).toBeGreaterThan(8);
    for (const table of tables) {
      const rows = kids(table);
      const widths = rows.map(() => 0);
      rows.forEach((row, k) => {
        for (const cell of kids(row)) {
          for (let down = 0; down < span(cell, 'RowSpan'); down += 1) widths[k + down]! += span(cell, 'ColSpan');
        }
      });
      expect(new Set(widths).size).toBe(1);
    }
  });

  it('leads back from every piece of marked content and every annotation', async () => {
    const { document, root } = await read();
    const nums = root.lookup(PDFName.of('ParentTree'), PDFDict).lookup(PDFName.of('Nums'), PDFArray);
    const annotations = document.getPages().flatMap((page) => page.node.Annots()?.asArray() ?? []);
    const keys = nums.asArray().filter((_, k) => k % 2 === 0);
    expect(keys.map(String)).toEqual(
      Array.from({ length: document.getPageCount() + annotations.length }, (_, k) => `${k}`),
    );
    annotations.forEach((annotation, k) => {
      const key = document.getPageCount() + k;
      const dict = document.context.lookup(annotation, PDFDict);
      expect(dict.lookup(PDFName.of('StructParent'), PDFNumber).asNumber()).toBe(key);
      expect(['Link', 'Form']).toContain(role(nums.lookup(2 * key + 1, PDFDict)));
    });
    document.getPages().forEach((_, k) => {
      for (const parent of nums.lookup(2 * k + 1, PDFArray).asArray()) expect(parent).toBeInstanceOf(PDFRef);
    });
  });
});

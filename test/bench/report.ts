import { readFileSync } from 'node:fs';
import {
  beginText,
  decodePDFRawStream,
  endText,
  lineTo,
  moveTo,
  PDFDocument,
  PDFRawStream,
  setFontAndSize,
  setTextMatrix,
  showText,
  StandardFonts,
  stroke,
  type PDFOperator,
} from 'pdf-lib';
import { design } from '../../src/design.ts';
import { readRecord } from '../../src/record/read-record.ts';
import { attachments, type Attachment } from '../../src/report/attachments.ts';
import { report } from '../../src/report/report.ts';
import type { Figure } from './figure.ts';
import { median, timeOf } from './timing.ts';

const budget = 3;
const turns = 25;

const file = (path: string): Buffer => readFileSync(new URL(`../../public/${path}`, import.meta.url));

/** Operators on one page: how often text is shown, path points set, paths painted. */
interface Count {
  readonly texts: number;
  readonly points: number;
  readonly paints: number;
}

/**
 * Time of a report, from its dossier to its bytes, against pdf-lib writing as many text and path operators on as many
 * pages, with the same font files put into the document and the same files attached; taken in turns in one run, medians.
 */
export async function benchReport(): Promise<readonly Figure[]> {
  const dossier = design(readRecord(file('demo/tide-gauge.json').toString()));
  const fonts = { regular: file('fonts/ferrule-regular.ttf'), bold: file('fonts/ferrule-bold.ttf') };
  const ours = () => report(dossier, { paper: 'a4', fonts });
  const attached = attachments(dossier);
  const counts = await countsOf(await ours());
  const times: (readonly [number, number])[] = [];
  for (let turn = 0; turn < turns; turn += 1)
    times.push([await timeOf(ours), await timeOf(() => plain(counts, fonts, attached))]);
  const settled = times.slice(5);
  const ratio = median(settled.map(([here, there]) => here / there));
  const [here, there] = [median(settled.map(([time]) => time)), median(settled.map(([, time]) => time))];
  const operators = counts.reduce((sum, { texts, points, paints }) => sum + texts + points + paints, 0);
  return [
    {
      name: `report of ${counts.length} pages, ${operators} operators`,
      measured: `${here.toFixed(1)} ms, plain ${there.toFixed(1)} ms: ${ratio.toFixed(2)}`,
      budget: `ratio < ${budget}`,
      within: ratio < budget,
    },
  ];
}

async function countsOf(bytes: Uint8Array): Promise<readonly Count[]> {
  const document = await PDFDocument.load(bytes);
  return document.getPages().map((page) => {
    const stream = page.node.Contents();
    if (!(stream instanceof PDFRawStream)) throw new Error('the page has no content stream of its own');
    const content = new TextDecoder('latin1').decode(decodePDFRawStream(stream).decode());
    const occurrences = (operators: string) =>
      content.match(new RegExp(`(?<=\\s|>)(${operators})(?=\\s|$)`, 'g')) ?? [];
    return {
      texts: occurrences('Tj').length,
      points: occurrences('m|l|c').length,
      paints: occurrences('S|f').length,
    };
  });
}

async function plain(
  counts: readonly Count[],
  fonts: Readonly<Record<string, Uint8Array>>,
  attached: readonly Attachment[],
): Promise<Uint8Array> {
  const document = await PDFDocument.create();
  for (const bytes of Object.values(fonts)) document.context.register(document.context.flateStream(bytes));
  for (const { name, text } of attached) await document.attach(new TextEncoder().encode(text), name);
  const font = await document.embedFont(StandardFonts.Helvetica);
  for (const { texts, points, paints } of counts) {
    const page = document.addPage();
    const name = page.node.newFontDictionary('F', font.ref);
    const operators: PDFOperator[] = [];
    for (let k = 0; k < texts; k += 1) {
      const words = font.encodeText(`Line ${k} of the page`);
      operators.push(
        beginText(),
        setFontAndSize(name, 9),
        setTextMatrix(1, 0, 0, 1, 40, 800 - k),
        showText(words),
        endText(),
      );
    }
    for (let k = 0; k < points; k += 1) operators.push(k % 2 === 0 ? moveTo(40.25, k) : lineTo(300.5, k));
    for (let k = 0; k < paints; k += 1) operators.push(stroke());
    page.pushOperators(...operators);
  }
  return document.save();
}

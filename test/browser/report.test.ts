import { execFile } from 'node:child_process';
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import type { Page } from 'playwright-core';
import { getDocument } from 'pdfjs-dist/legacy/build/pdf.mjs';
import { afterAll, beforeAll, expect, it } from 'vitest';
import type { Dossier } from '../../src/dossier.ts';
import { root } from '../../src/cli/project.ts';
import { formatFixed, formatImpedance, formatQuantity } from '../../src/quantity/format.ts';
import { useSite, wordsOf } from './site.ts';

const site = useSite();
let folder = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'ferrule-browser-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

async function download(page: Page, button: string): Promise<{ readonly name: string; readonly path: string }> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: button }).click(),
  ]);
  const path = join(folder, download.suggestedFilename());
  await download.saveAs(path);
  return { name: download.suggestedFilename(), path };
}

async function textOf(path: string): Promise<{ readonly pages: number; readonly text: string }> {
  const task = getDocument({ data: new Uint8Array(await readFile(path)) });
  const pdf = await task.promise;
  const pages = await Promise.all(
    Array.from({ length: pdf.numPages }, async (_, k) => {
      const { items } = await (await pdf.getPage(k + 1)).getTextContent();
      return items.map((item) => ('str' in item ? item.str : '')).join(' ');
    }),
  );
  await task.destroy();
  // The micro sign and the small letter mu look alike and mean the same here.
  return { pages: pages.length, text: pages.join(' ').replace(/\s+/gu, ' ').replaceAll('μ', 'µ') };
}

async function solve(recordPath: string): Promise<Dossier> {
  const { stdout } = await promisify(execFile)(process.execPath, [join(root, 'src/cli/solve.ts'), recordPath], {
    maxBuffer: 1e8,
  });
  return JSON.parse(stdout) as Dossier;
}

it('prints what the page shows and the command line computes, for a case typed in', async () => {
  const page = await site.visit();
  await page.getByLabel('Design frequency').fill('868.3M');
  await page.getByLabel('Band to hold').fill('863M..870M');
  await page.getByLabel('Load impedance').fill('18.6+j27');
  await page.getByLabel('Document number').fill('EX 7/2');
  await page.getByLabel('Revision').fill('C');
  await page.locator('options-part', { hasText: 'Shunt C, series C' }).waitFor();
  await page.getByRole('radio', { name: 'Shunt C, series C', exact: true }).check();
  await page.getByLabel('Why this one').fill('Both capacitors are in stock.');
  await page.locator('title-block', { hasText: 'Chosen: shunt C, series C' }).waitFor();

  const record = await download(page, 'Download the record (JSON)');
  const pdf = await download(page, 'Download the report (PDF)');
  expect(record.name).toBe('EX-7-2_C.json');
  expect(pdf.name).toBe('EX-7-2_C.pdf');
  await page.getByText('The report is written.').waitFor();
  expect(site.complaints()).toEqual([]);
  expect(site.strangers()).toEqual([]);

  const dossier = await solve(record.path);
  const { text, pages } = await textOf(pdf.path);
  const shown = await wordsOf(page);
  const chosen = dossier.options.find(({ id }) => id === dossier.chosen)!;
  expect(chosen.title).toBe('Shunt C, series C');
  expect(pages).toBeGreaterThanOrEqual(3);
  expect(text).toContain('Both capacitors are in stock.');

  // The same digest is the same record: nothing typed was lost on the way.
  expect(text).toContain(dossier.digest);
  expect(shown.replaceAll(' ', '')).toContain(dossier.digest);

  const figures = [
    ...dossier.options.flatMap(({ arms }) =>
      arms.map(({ part, value }) => formatQuantity(value, part === 'inductor' ? 'H' : 'F')),
    ),
    ...dossier.options.map(({ worstReturnLossDb }) => `${formatFixed(worstReturnLossDb!, 2)} dB`),
    ...dossier.options.flatMap(({ harmonicDb }) =>
      harmonicDb.map(({ attenuationDb }) => `${formatFixed(attenuationDb!, 1)} dB`),
    ),
    ...dossier.options.map(({ halfPower }) => halfPower.words),
    formatImpedance(chosen.seen.r, chosen.seen.x),
    formatFixed(chosen.transducerGain, 6),
  ];
  expect(figures.length).toBeGreaterThan(20);
  expect(figures.filter((figure) => !text.includes(figure))).toEqual([]);
  expect(figures.filter((figure) => !shown.includes(figure))).toEqual([]);
});

it('fetches the writer of reports only when a report is asked for', async () => {
  const page = await site.visit();
  const fetched: string[] = [];
  page.on('request', (request) => fetched.push(request.url()));
  await page.waitForTimeout(300);
  expect(fetched.filter((address) => /report|\.ttf/u.test(address))).toEqual([]);
  await page.getByLabel('Letter', { exact: true }).check();
  await download(page, 'Download the report (PDF)');
  expect(fetched.filter((address) => /report.*\.js|\.ttf/u.test(address)).length).toBe(3);
});

import { execFile } from 'node:child_process';
import { mkdtemp, readFile, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { root } from '../../src/cli/project.ts';
import { printedFigures } from '../../src/design/printed-figures.ts';
import { figuresFile, recordFile } from '../../src/report/attachments.ts';
import { container } from '../unit/recheck/container.ts';
import { dossierOf } from '../unit/report/records.ts';
import { expectUnbroken, high } from './axe.ts';
import { useSite, wordsOf } from './site.ts';

const site = useSite();
let folder = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'ferrule-recheck-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

const command = (name: string, ...args: readonly string[]) =>
  promisify(execFile)(process.execPath, [join(root, `src/cli/${name}.ts`), ...args], { maxBuffer: 1e8 });

async function saved(page: Page, button: string): Promise<string> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: button }).click(),
  ]);
  const path = join(folder, download.suggestedFilename());
  await download.saveAs(path);
  return path;
}

const give = (page: Page, path: string) => page.getByLabel('Choose a file').setInputFiles(path);

/** A report of an earlier version that printed other figures. */
async function differing(): Promise<string> {
  const dossier = dossierOf('crystal-filter');
  const other = printedFigures(dossier).map((figure) =>
    figure.name === 'networks considered' ? { ...figure, value: 99 } : figure,
  );
  const files = [recordFile(dossier.record), figuresFile({ ...dossier, version: '0.0.1' }, other)];
  const path = join(folder, 'differs.pdf');
  await writeFile(path, await container(files, dossier.digest));
  return path;
}

it('says same of a report, wherever it was written and wherever it is rechecked', async () => {
  const page = await site.visit('resistive/');
  await page.locator('evidence-part table').first().waitFor({ state: 'attached' });
  const record = await saved(page, 'Download the record (JSON)');
  const fromPage = await saved(page, 'Download the report (PDF)');
  const fromCommand = join(folder, 'command.pdf');
  await command('report', record, '--out', fromCommand);
  expect((await readFile(fromPage)).equals(await readFile(fromCommand))).toBe(true);

  for (const report of [fromPage, fromCommand]) {
    await page.goto(`${site.url()}recheck/`);
    await give(page, report);
    await page.getByText(/Same( within rounding)?: /u).waitFor({ timeout: 30_000 });
    const { stdout } = await command('recheck', report);
    expect(stdout).toMatch(/^Same( within rounding)?: /u);
    const shown = await wordsOf(page);
    for (const fact of ['Document', 'Written by', 'Digest', 'Sign-off']) {
      expect(shown).toContain(new RegExp(`^${fact}: (.*)$`, 'mu').exec(stdout)![1]);
    }
  }
  expect(site.complaints()).toEqual([]);
  expect(site.strangers()).toEqual([]);
});

it('shows what differs and folds what is the same; a file may be dropped anywhere', async () => {
  const page = await site.visit('recheck/');
  const bytes = [...(await readFile(await differing()))];
  await page.evaluate((content) => {
    const data = new DataTransfer();
    data.items.add(new File([new Uint8Array(content)], 'dropped.pdf'));
    document.querySelector('h1, footer')!.dispatchEvent(new DragEvent('drop', { dataTransfer: data, bubbles: true }));
  }, bytes);
  await page.getByText(/Differs: 1 of \d+ figures is not what was printed/u).waitFor({ timeout: 30_000 });
  await page.getByRole('row', { name: /networks considered 99/u }).waitFor();
  expect(await page.getByRole('row', { name: /network chosen/u }).isVisible()).toBe(false);
  await page.getByText(/Figures that are the same: \d+/u).click();
  expect(await page.getByRole('row', { name: /network chosen/u }).isVisible()).toBe(true);
});

it('refuses another file in a line, and takes the next', async () => {
  const page = await site.visit('recheck/');
  const path = join(folder, 'words.pdf');
  await writeFile(path, '%PDF-1.7\nnothing of ours');
  await give(page, path);
  await page.getByText(/Not rechecked\. file "words\.pdf": this PDF is no report/u).waitFor();
  await give(page, join(root, 'public/demo/crystal-filter.json'));
  await page.getByText('Computed: a record alone holds no printed figure').waitFor({ timeout: 30_000 });
  expect(site.complaints()).toEqual([]);
});

describe('axe finds nothing', () => {
  it.each(['light', 'dark'] as const)('before a file and after, %s', async (colorScheme) => {
    const page = await site.visit('recheck/', { viewport: high, colorScheme });
    await expectUnbroken(page);
    await give(page, await differing());
    await page.getByText(/Differs: 1 of/u).waitFor({ timeout: 30_000 });
    await expectUnbroken(page);
    await page.setViewportSize({ width: 390, height: 9000 });
    await expectUnbroken(page);
  });

  it('and it needs no sideways scrolling at four times the size', async () => {
    const page = await site.visit('recheck/', { viewport: { width: 320, height: 256 } });
    await give(page, await differing());
    await page.getByText(/Differs: 1 of/u).waitFor({ timeout: 30_000 });
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320);
  });
});

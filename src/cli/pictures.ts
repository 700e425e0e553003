import { execFileSync } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type * as pdfjs from 'pdfjs-dist';
import { chromium, type Browser } from 'playwright-core';
import { browserFlags, provideBrowser } from './browser.ts';
import { buildSite } from './build-site.ts';
import { root, site } from './project.ts';
import { serve } from './serve.ts';

/** Writes the pictures of README.md: a sheet and pages of a report, both as the demonstration's record gives them. */

const folder = join(root, '.readme');
const pages = [1, 3];

async function sheet(browser: Browser): Promise<void> {
  const { ok, output } = await buildSite();
  if (!ok) throw new Error(output);
  const served = await serve({ root: site, port: 0 });
  const page = await browser.newPage({ viewport: { width: 1440, height: 920 }, deviceScaleFactor: 1.25 });
  await page.goto(served.url, { waitUntil: 'networkidle' });
  await page.screenshot({ path: join(folder, 'sheet.png') });
  await served.close();
}

/** Pages of the report side by side, drawn by the PDF reader that the tests use. */
async function report(browser: Browser): Promise<void> {
  const file = join(folder, 'report.pdf');
  execFileSync(process.execPath, [join(root, 'src/cli/report.ts'), 'public/demo/tide-gauge.json', '--out', file], {
    cwd: root,
    env: { ...process.env, INIT_CWD: root },
  });
  const served = await serve({ root: join(root, 'node_modules/pdfjs-dist'), port: 0 });
  const page = await browser.newPage({ viewport: { width: 1200, height: 10 } });
  await page.goto(`${served.url}package.json`);
  const drawn = await page.evaluate(draw, { base64: readFileSync(file).toString('base64'), pages });
  writeFileSync(join(folder, 'report.png'), Buffer.from(drawn.replace(/^.*,/, ''), 'base64'));
  await served.close();
  rmSync(file);
}

/** Runs in the browser: draws pages onto one canvas, with a margin around each, and gives it as a PNG data address. */
async function draw({ base64, pages }: { base64: string; pages: readonly number[] }): Promise<string> {
  const reader = '/build/pdf.min.mjs';
  const { getDocument, GlobalWorkerOptions } = (await import(reader)) as typeof pdfjs;
  GlobalWorkerOptions.workerSrc = '/build/pdf.worker.min.mjs';
  const pdf = await getDocument({ data: Uint8Array.from(atob(base64), (letter) => letter.charCodeAt(0)) }).promise;
  const margin = 24;
  const whole = document.createElement('canvas');
  const context = whole.getContext('2d')!;
  const sheets = await Promise.all(
    pages.map(async (number) => {
      const page = await pdf.getPage(number);
      const viewport = page.getViewport({ scale: 1.25 });
      const canvas = document.createElement('canvas');
      [canvas.width, canvas.height] = [viewport.width, viewport.height];
      await page.render({ canvas, viewport }).promise;
      return canvas;
    }),
  );
  const { width, height } = sheets[0]!;
  [whole.width, whole.height] = [(width + margin) * sheets.length + margin, height + 2 * margin];
  context.fillStyle = '#dfe2e4';
  context.fillRect(0, 0, whole.width, whole.height);
  sheets.forEach((canvas, k) => context.drawImage(canvas, margin + k * (width + margin), margin));
  return whole.toDataURL('image/png');
}

mkdirSync(folder, { recursive: true });
const browser = await chromium.launch({ executablePath: await provideBrowser(), args: browserFlags });
await sheet(browser);
await report(browser);
await browser.close();

import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { measuredTermination } from '../../src/measured/measured-termination.ts';
import { formatFixed } from '../../src/quantity/format.ts';
import { expectUnbroken, high } from './axe.ts';
import { settled, useSite, wordsOf } from './site.ts';

const site = useSite();
let folder = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'ferrule-terminations-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

/** 9.4 Ω in series with 17.25 pF, as a one-port file from 140 MHz to 160 MHz. */
const sweep = [
  '! bench, no one in particular',
  '# MHz Z RI R 1',
  ...Array.from({ length: 21 }, (_, k) => {
    const mhz = 140 + k;
    return `${String(mhz)} 9.4 ${formatFixed(-1e6 / (2 * Math.PI * mhz * 17.25), 4).replace('−', '-')}`;
  }),
].join('\n');
const load = (page: Page) => page.getByLabel('Load impedance');
const band = 'frequency=151.25M&source=50&band=150.5M..152M&return-loss=14&date=2026-01-02&';

async function pick(page: Page, name: string, text: string): Promise<void> {
  const [picker] = await Promise.all([page.waitForEvent('filechooser'), page.getByText('Add measured data…').click()]);
  await picker.setFiles({ name, mimeType: 'text/plain', buffer: Buffer.from(text) });
}

const dropOn = (page: Page, name: string, text: string) =>
  page.evaluate(
    ([fileName, content]) => {
      const dataTransfer = new DataTransfer();
      dataTransfer.items.add(new File([content], fileName));
      document.body.dispatchEvent(new DragEvent('drop', { dataTransfer, bubbles: true, cancelable: true }));
    },
    [name, text] as const,
  );

async function save(page: Page, button: string): Promise<{ readonly name: string; readonly text: string }> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: button }).click(),
  ]);
  const path = join(folder, download.suggestedFilename());
  await download.saveAs(path);
  return { name: download.suggestedFilename(), text: await readFile(path, 'utf8') };
}

describe('states of the load', () => {
  it('stand one a line; the worst one governs every figure, and the reading tells of each', async () => {
    const page = await site.visit(`#${band}load=9.4-j61`, { viewport: high });
    await load(page).fill('free space = 9.4-j61\nin hand = rc-series 12 20p');
    await page.locator('options-part', { hasText: 'Worst return loss by state: free space' }).first().waitFor();
    await page.getByLabel('Read at one frequency').press('ArrowRight');
    const words = await page.locator('response-table output').innerText();
    expect(words).toMatch(/in hand: return loss .*free space: return loss/su);
    await page.getByText('The numbers').click();
    await page.getByLabel('State of the load').selectOption('free space');
    expect(await page.locator('response-numbers tbody tr').count()).toBeGreaterThan(30);
    expect(await wordsOf(page)).not.toMatch(/NaN|Infinity|undefined|\[object/);
    await expectUnbroken(page);
    expect(site.complaints()).toEqual([]);
  });
});

describe('measured data', () => {
  it('come from a file that is picked, as a state more; what is typed stays', async () => {
    const page = await site.visit(`#${band}load=9.4-j61`);
    await pick(page, 'whip.s1p', sweep);
    await page.getByText('whip.s1p: 21 samples, added as a state of the load.').waitFor();
    expect(await load(page).inputValue()).toBe('9.4-j61\nwhip.s1p = whip.s1p');
    await load(page).fill('whip.s1p');
    await page.locator('ceiling-part', { hasText: 'An estimate.' }).waitFor();
    await page.locator('network-part', { hasText: 'measured' }).waitFor();
    // Harmonics at 302.5 MHz and 453.8 MHz aren't in it.
    await page.locator('options-part', { hasText: 'outside the data' }).waitFor();

    await page.getByLabel('Band to hold').fill('130M..152M');
    await page.getByText(/^band .*it reaches outside the data/).waitFor();
  });

  it('come from a file dropped on the sheet, of the port that is chosen, and outlast a reload', async () => {
    const page = await site.visit(`#${band}load=`);
    const twoPort = sweep
      .replace('# MHz Z RI R 1', '# MHz S RI R 50')
      .split('\n')
      .map((line) => (/^\d/.test(line) ? `${line.split(' ')[0]!} 0.1 0 0.01 0 0.01 0 -0.7 -0.5` : line));
    await dropOn(page, 'filter.s2p', twoPort.join('\n'));
    await page.getByRole('button', { name: 'Port 2' }).click();
    await page.waitForFunction(() => location.hash.includes('port'));
    expect(await load(page).inputValue()).toBe('filter.s2p (port 2)');
    await page.locator('network-part', { hasText: 'measured' }).waitFor();
    await page.reload();
    await page.locator('network-part', { hasText: 'measured' }).waitFor();

    const other = await site.visit(page.url().slice(site.url().length));
    await other.getByText('load "filter.s2p (port 2)": its data are not here; open the file again').waitFor();
  });

  it('are told of with their line when they can’t be read, and pasted as a table', async () => {
    const page = await site.visit(`#${band}load=9.4-j61`, { viewport: high });
    await dropOn(page, 'bad.s1p', '# MHz S RI R 50\n100 0.1 0\n110 0.1\n');
    await page.getByText(/^bad\.s1p can’t be read\. line 3/).waitFor();
    expect(await load(page).inputValue()).toBe('9.4-j61');
    await page.getByText('Paste a table').click();
    await page.getByLabel('Frequency, R, X: one sample a line').fill('140M 9 -65\n150M 9.4 -61.5\n160M 10 -57');
    await page.getByRole('button', { name: 'Read the table' }).click();
    await page.getByText('table: 3 samples, added as a state of the load.').waitFor();
    await expectUnbroken(page);
  });

  it('are saved with the record and opened again with it', async () => {
    const page = await site.visit(`#${band}load=`);
    await pick(page, 'whip.s1p', sweep);
    await page.locator('network-part', { hasText: 'measured' }).waitFor();
    const record = await save(page, 'Download the record (JSON)');
    expect((JSON.parse(record.text) as { loads: unknown[] }).loads).toMatchObject([
      { termination: measuredTermination(sweep, 'whip.s1p') },
    ]);

    const other = await site.visit('resistive/');
    const [picker] = await Promise.all([
      other.waitForEvent('filechooser'),
      other.locator('record-part label.button').click(),
    ]);
    await picker.setFiles({ name: 'record.json', mimeType: 'application/json', buffer: Buffer.from(record.text) });
    await other.waitForURL((url) => url.pathname === '/');
    await other.locator('network-part', { hasText: 'measured' }).waitFor();
    expect(await load(other).inputValue()).toBe('whip.s1p');
  });
});

describe('the ceiling', () => {
  it.each([
    ['frequency=151.25M&source=50&load=9.4-j61&band=150.5M..152M&return-loss=14', 'Room to spare', 'room to spare'],
    // 14 Ω with Q·w = 8 · 0.1: exp(−π/0.8) is 34.11 dB
    ['frequency=100M&source=50&load=14-j112&band=95.125M..105.125M&return-loss=40', '34.1', 'out of reach'],
    ['frequency=100M&source=50&load=200&band=90M..110M&return-loss=14', 'Between two resistances', 'not assessed'],
  ])('of %s says %s', async (given, words, verdict) => {
    const page = await site.visit(`#${given}&date=2026-01-02`);
    await page.locator('ceiling-part', { hasText: words }).waitFor();
    expect(await page.locator('contents-rule li', { hasText: 'Ceiling' }).innerText()).toContain(verdict);
  });
});

describe('Pi networks', () => {
  it('take a Q and say for which they exist', async () => {
    const page = await site.visit('resistive/');
    await page.getByLabel('Method').selectOption('pi');
    await page.locator('options-part', { hasText: 'Pi: shunt C, series L, shunt C' }).first().waitFor();
    const q = page.getByLabel('Q of Pi and T, at the steeper end');
    await q.fill('12');
    await page.locator('method-fields', { hasText: 'Q 12 is asked for' }).waitFor();
    await q.fill('0.1');
    await page.getByText(/needs Q ≥/).waitFor();
    await settled(page);
    expect(site.complaints()).toEqual([]);
  });
});

describe('what is saved', () => {
  it('is the network as a two-port file and the sweep as comma-separated values', async () => {
    const page = await site.visit(`#${band}load=9.4-j61`);
    const twoPort = await save(page, 'Download the network (.s2p)');
    expect(twoPort.name).toBe('unnumbered_A.s2p');
    // Read back by another way in: port 1 of the network that ends in 50 Ω, a reflection of 1 at most.
    const { measured } = measuredTermination(twoPort.text, twoPort.name, 1);
    expect(measured.frequencyHz.length).toBeGreaterThan(200);
    expect(Math.max(...measured.re.map((re, k) => Math.hypot(re, measured.im[k]!)))).toBeLessThan(1 + 1e-9);
    const csv = await save(page, 'Download the sweep (CSV)');
    const [head = '', ...rows] = csv.text.trim().split('\r\n');
    expect(head.split(',').slice(0, 2)).toEqual(['frequency Hz', 'return loss dB']);
    expect(rows.length).toBe(measured.frequencyHz.length);
    expect(rows.every((row) => row.split(',').map(Number).every(Number.isFinite))).toBe(true);
  });
});

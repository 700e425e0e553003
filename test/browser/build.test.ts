import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { beforeAll, describe, expect, it } from 'vitest';
import { root } from '../../src/cli/project.ts';
import type { Dossier } from '../../src/dossier.ts';
import { stockTemplate } from '../../src/parts/stock-template.ts';
import { formatFixed, formatQuantity, formatRead } from '../../src/quantity/format.ts';
import { expectUnbroken, high } from './axe.ts';
import { longestTask } from './longest-task.ts';
import { useSite, wordsOf } from './site.ts';

const site = useSite();
/** Long enough for every network of a sheet on a machine that has other work too. */
const patience = { timeout: 60_000 };

const worked = (page: Page) =>
  page
    .locator('build-progress', { hasText: /^\s*All \d+ networks/ })
    .first()
    .waitFor(patience);
const build = (page: Page) => page.locator('build-part');
/** What the command line says of the same record. */
async function solve(...args: readonly string[]): Promise<Dossier> {
  const { stdout } = await promisify(execFile)(process.execPath, [join(root, 'src/cli/solve.ts'), ...args], {
    cwd: root,
    env: { ...process.env, INIT_CWD: root },
    maxBuffer: 50_000_000,
  });
  return JSON.parse(stdout) as Dossier;
}

describe('real parts', () => {
  let dossier: Dossier;
  beforeAll(async () => {
    dossier = await solve('public/demo/tide-gauge.json');
  });
  const builtOf = () => dossier.options.find(({ id }) => id === dossier.chosen)!.built!;

  it('come to the figures of the command line, network by network', async () => {
    const page = await site.visit('', { viewport: high });
    await page
      .getByText(/^[0-3] of 4 networks worked out with real parts…/)
      .first()
      .waitFor();
    await worked(page);
    const { parts, yield: made, worstReturnLossDb, sensitivity, stress } = builtOf();
    const words = await wordsOf(page, 'build-part');
    expect(words).toContain(`Worst return loss ${formatFixed(worstReturnLossDb, 2)} dB at `);
    expect(words).toContain(`Yield ${formatFixed(made!.value * 100, 1)} % (${formatFixed(made!.low * 100, 1)} to `);
    for (const { designator, value, part } of parts) {
      expect(words).toContain(`${designator} ${part} ${formatRead(value, part === 'inductor' ? 'H' : 'F')} `);
    }
    for (const { designator, dbPerPercent } of sensitivity) {
      expect(words).toContain(`${designator} ${dbPerPercent > 0 ? '+' : ''}${formatFixed(dbPerPercent, 2)} dB`);
    }
    for (const { designator, voltsPeak } of stress!.parts) {
      expect(words).toContain(`${designator} ${formatQuantity(voltsPeak, 'V', 3)}`);
    }
    const options = await wordsOf(page, 'options-part');
    for (const option of dossier.options) {
      expect(options).toContain(`Yield ${formatFixed(option.built!.yield!.value * 100, 1)} %`);
    }
    expect(await page.locator('response-part svg').first().textContent()).toContain('of networks');
    expect(await wordsOf(page)).not.toMatch(/NaN|Infinity|undefined|\[object/);
    expect(site.complaints()).toEqual([]);
    await expectUnbroken(page);
  });

  it('are of another set of values when the engineer takes it, which the address keeps', async () => {
    const page = await site.visit('', { viewport: high });
    await worked(page);
    await build(page).getByRole('group', { name: 'The best sets of values' }).getByRole('radio').nth(1).check();
    await page.waitForFunction(() => location.hash.includes('set=2'));
    const second = builtOf().sets[1]!;
    const words = `Worst return loss ${formatFixed(second.worstReturnLossDb, 2)} dB`;
    await build(page)
      .locator('dl', { hasText: words.replace('Worst return loss ', '') })
      .waitFor(patience);
    expect(await page.locator('title-block .outcome').innerText()).toMatch(/Chosen/);
  });

  it('are left out and asked for again', async () => {
    const page = await site.visit('', { viewport: high });
    await worked(page);
    await page.getByLabel('exact and ideal').check();
    await build(page)
      .getByText(/^\s*Values are exact and parts ideal/)
      .waitFor();
    expect(await page.locator('build-progress div').count()).toBe(0);
    await page.getByLabel('real: on sale, with loss and tolerance').check();
    await worked(page);
  });

  it('leave what was there in view, said to be of the entry before, until the new is there', async () => {
    const page = await site.visit('', { viewport: high });
    await worked(page);
    await build(page).getByText('Spread and yield').click();
    await page.getByLabel('Networks drawn').fill('50000');
    await build(page).getByText('Of the entry before, until this one is worked out:').waitFor();
    expect(await wordsOf(page, 'build-part')).toContain('1000 networks');
    await expectUnbroken(page);
  });

  it('are stopped, and gone on with; nothing is issued meanwhile', async () => {
    const page = await site.visit('', { viewport: high });
    await worked(page);
    await build(page).getByText('Spread and yield').click();
    await page.getByLabel('Networks drawn').fill('100000');
    await page.getByRole('button', { name: 'Stop' }).first().click();
    await page
      .getByText(/^Stopped: [0-3] of 4 networks worked out/)
      .first()
      .waitFor();
    await page.getByRole('button', { name: 'Download the report (PDF)' }).press('Enter');
    await page.locator('record-part .said', { hasText: 'until every network is worked out' }).waitFor();
    await page.getByLabel('Networks drawn').fill('200');
    await worked(page);
    expect(await wordsOf(page, 'build-part')).toContain('200 networks, seed 1');
  });

  it('never hold the page up for 50 ms', async () => {
    const page = await site.visit('sections/');
    await worked(page);
    const milliseconds = await longestTask(page, async () => {
      await page.getByLabel('Load impedance').pressSequentially('1');
      await page
        .locator('build-progress', { hasText: /^\s*\d+ of \d+ networks/ })
        .first()
        .waitFor();
      await worked(page);
    });
    expect(milliseconds).toBeLessThan(50);
  });
});

describe('a stock list', () => {
  const pick = async (page: Page, name: string, text: string) => {
    const [picker] = await Promise.all([
      page.waitForEvent('filechooser'),
      page.locator('build-fields label.button').click(),
    ]);
    await picker.setFiles({ name, mimeType: 'text/csv', buffer: Buffer.from(text) });
  };

  it('is what parts are taken from, and survives a reload', async () => {
    const page = await site.visit('', { viewport: high });
    await worked(page);
    await pick(page, 'shelf.csv', stockTemplate);
    await page.getByText('shelf.csv: 5 inductors and 5 capacitors, taken from it now.').waitFor();
    await build(page)
      .locator('td', { hasText: /^coil 47 nH, 5 %$/ })
      .first()
      .waitFor(patience);
    await page.waitForFunction(() => location.hash.includes('stock=shelf.csv'));
    await page.reload();
    await worked(page);
    expect(await wordsOf(page, 'build-part')).toContain('coil 47 nH, 5 %');
    await page.getByRole('button', { name: 'Leave it out' }).click();
    await build(page)
      .locator('td', { hasText: /^exact$/ })
      .first()
      .waitFor(patience);
  });

  it('is told from measured data when it is dropped on the sheet', async () => {
    const page = await site.visit('', { viewport: high });
    await page.locator('build-part').waitFor();
    const data = await page.evaluateHandle((text) => {
      const transfer = new DataTransfer();
      transfer.items.add(new File([text], 'shelf.csv', { type: 'text/csv' }));
      return transfer;
    }, stockTemplate);
    await page.dispatchEvent('ferrule-sheet', 'drop', { dataTransfer: data });
    await page.getByText('shelf.csv: 5 inductors and 5 capacitors, taken from it now.').waitFor();
  });

  it('that can’t be used is told line by line, and nothing changes', async () => {
    const page = await site.visit('', { viewport: high });
    await worked(page);
    const before = page.url();
    await pick(page, 'bad.csv', 'name,kind,value\na,inductor,10 pF\nb,resistor,1k\n');
    await page.getByText('bad.csv can’t be used; the sheet stays as it was.').waitFor();
    const lines = page.getByRole('list', { name: 'Problems of the stock list' }).getByRole('listitem');
    expect(await lines.allInnerTexts()).toEqual([
      expect.stringMatching(/^line 2, value "10 pF": /),
      expect.stringMatching(/^line 3, kind "resistor": /),
    ]);
    expect(page.url()).toBe(before);
    await expectUnbroken(page);
  });
});

import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { settled, useSite, wordsOf } from './site.ts';

const site = useSite();

const network = (page: Page, name: string) => page.getByRole('radio', { name, exact: true });
const outcomeOf = (page: Page) => page.locator('title-block .outcome').innerText();
/** Waits until the outcome says something. */
const outcome = (page: Page, words: RegExp) => page.locator('title-block .outcome', { hasText: words }).waitFor();

describe('a first visit', () => {
  it.each([
    ['', 'Series C, shunt L', /^1 of 4 networks meets everything asked\./],
    ['resistive/', 'Shunt C, series L', /^2 of 2 networks meet everything asked\./],
    ['sections/', '3 sections, low-pass, shunt arm at the load', /^8 of 12 networks meet everything asked\./],
  ])('of /%s opens with its demonstration computed: %s', async (path, name, words) => {
    const page = await site.visit(path);
    await outcome(page, words);
    expect(await network(page, name).isChecked()).toBe(true);
    expect(await wordsOf(page)).toContain('power balance');
    expect(new URL(page.url()).hash).toBe('');
    expect(site.complaints()).toEqual([]);
    expect(site.strangers()).toEqual([]);
  });
});

describe('typing', () => {
  it('recomputes at once and says beneath the field what was understood', async () => {
    const page = await site.visit();
    await page.getByLabel('Design frequency').fill('433.92M');
    await page.getByLabel('Band to hold').fill('430M..438M');
    await page.getByLabel('Load impedance').fill('22 - 35j');
    // X = 35 + sqrt(22·(50 - 22)) = 59.82 Ω in series at the load: 59.82/(2π·433.92e6) = 21.94 nH
    await page.locator('options-part', { hasText: '21.94 nH' }).waitFor();
    const note = await page
      .getByLabel('Load impedance')
      .evaluate((input) => input.nextElementSibling?.textContent.trim());
    expect(note).toBe('22 − j35 Ω');
    expect(await page.getByLabel('Load impedance').inputValue()).toBe('22 - 35j');
  });

  it('says the outcome aloud once typing has settled', async () => {
    const page = await site.visit();
    const voice = page.locator('ferrule-sheet > p[role=status], ferrule-sheet p.unseen[role=status]').first();
    await page.getByLabel('Load impedance').pressSequentially('5', { delay: 20 });
    expect(await voice.textContent()).toBe('');
    await page.locator('p[role=status]', { hasText: 'networks' }).first().waitFor({ state: 'attached', timeout: 5000 });
  });

  it('keeps the last result, dimmed and labelled, while an entry can’t be read', async () => {
    const page = await site.visit();
    const before = await outcomeOf(page);
    const field = page.getByLabel('Load impedance');
    await field.fill('9.4-k61');
    await page.locator('sheet-part[stale]', { hasText: 'Options' }).first().waitFor();
    expect(await page.getByText('Of the last entry that could be read.').first().isVisible()).toBe(true);
    expect(await outcomeOf(page)).toBe(before);
    expect(await field.inputValue()).toBe('9.4-k61');
    expect(await field.getAttribute('aria-invalid')).toBe('true');
    const described = await field.evaluate((input) => {
      const id = input.getAttribute('aria-describedby') ?? '';
      return (input.getRootNode() as ShadowRoot).getElementById(id)?.textContent.trim();
    });
    expect(described).toBe('load "9.4-k61": two real parts and no j; write it as 50, 9.4-j61 or 50∠-30°');

    await page.getByRole('button', { name: 'Download the report (PDF)' }).press('Enter');
    expect(await page.locator('record-part .said').innerText()).toMatch(/^Nothing is issued until every entry/);

    await field.fill('9.4-j61');
    await page.locator('sheet-part[stale]').first().waitFor({ state: 'detached' });
  });

  it('survives any text without a NaN on the page', async () => {
    const page = await site.visit();
    const field = page.getByLabel('Load impedance');
    const texts = ['NaN', '1e400', '0', '-5', '', '<img src=x onerror=alert(1)>', '1m+j1M', '1M', '50', '∠', '1e-300'];
    for (const text of texts) {
      await field.fill(text);
      await settled(page);
      // A problem repeats what was typed, in quotes.
      expect((await wordsOf(page)).replaceAll(`"${text}"`, '')).not.toMatch(/NaN|Infinity|undefined|\[object/);
      expect(await field.inputValue()).toBe(text);
    }
    expect(site.complaints()).toEqual([]);
  });
});

describe('the address', () => {
  it('reproduces the sheet, wrong texts and all', async () => {
    const page = await site.visit();
    await page.getByLabel('Source impedance').fill('50 +  j0');
    await page.getByLabel('Return loss over the band, at least').fill('fourteen & more');
    await page.getByLabel('Why this one').fill('Ω ≠ "0"\nsecond line');
    await page.getByLabel('Title').fill('');
    await page.waitForFunction(() => location.hash.includes('second+line') && /[#&]title=(&|$)/u.test(location.hash));
    const address = page.url().slice(site.url().length);

    const other = await site.visit(address);
    await other.getByLabel('Source impedance').waitFor();
    expect(await other.getByLabel('Source impedance').inputValue()).toBe('50 +  j0');
    expect(await other.getByLabel('Return loss over the band, at least').inputValue()).toBe('fourteen & more');
    expect(await other.getByLabel('Why this one').inputValue()).toBe('Ω ≠ "0"\nsecond line');
    expect(await other.getByLabel('Title').inputValue()).toBe('');
    expect(await other.getByLabel('Band to hold').inputValue()).toBe('150.5 MHz to 152 MHz');
    expect(await outcomeOf(other)).toMatch(/^Nothing is computed yet/);
  });

  it('is read again when it changes, and survives a reload', async () => {
    const page = await site.visit();
    await page.evaluate(() => (location.hash = 'frequency=10M&source=50&load=200&date=2026-01-02'));
    await outcome(page, /^2 of 2 networks meet/);
    await page.reload();
    await outcome(page, /^2 of 2 networks meet/);
    expect(await page.getByLabel('Load impedance').inputValue()).toBe('200');
  });

  it('keeps what is typed when it comes to name a place in the page', async () => {
    const page = await site.visit();
    await page.getByLabel('Load impedance').fill('20+j10');
    await page.evaluate(() => (location.hash = 'main'));
    await page.waitForFunction(() => location.hash.includes('load=20%2Bj10'));
    expect(await page.getByLabel('Load impedance').inputValue()).toBe('20+j10');
  });
});

describe('choosing a network', () => {
  it('works by keyboard alone, from the head of the page', async () => {
    const page = await site.visit();
    await outcome(page, /Proposed/);
    const focused = () =>
      page.evaluate(() => {
        let at = document.activeElement;
        while (at?.shadowRoot?.activeElement) at = at.shadowRoot.activeElement;
        return at?.id ?? '';
      });
    for (let k = 0; k < 40 && !(await focused()).startsWith('network-'); k += 1) await page.keyboard.press('Tab');
    expect(await focused()).toBe('network-shunt-load-minus');
    await page.keyboard.press('ArrowDown');
    await outcome(page, /Chosen: shunt C, series L/);
    expect(await network(page, 'Shunt C, series L').isChecked()).toBe(true);
    expect(await focused()).toBe('network-shunt-source-plus');
    await page.waitForFunction(() => location.hash.includes('choice=shunt-source-plus'));
  });

  it('drops a choice that doesn’t exist for new terminations, says so, and takes it back with them', async () => {
    const page = await site.visit('resistive/');
    await network(page, 'Shunt L, series C').check();
    await outcome(page, /Chosen/);
    await page.getByLabel('Load resistance').fill('5000');
    await page
      .getByText('The network chosen before doesn’t exist for these terminations; the nearest is shown.')
      .waitFor();
    await page.getByLabel('Load resistance').fill('50');
    await outcome(page, /Chosen: shunt L, series C/);
  });

  it('takes another number of sections', async () => {
    const page = await site.visit('sections/');
    await page.getByRole('group', { name: 'Number of sections' }).getByLabel('5', { exact: true }).check();
    await outcome(page, /5 sections/);
    expect(await page.locator('sections-table tr.chosen').innerText()).toMatch(/^5/);
  });
});

describe('the response', () => {
  it('shows a span that the reader widens, narrows and types', async () => {
    const page = await site.visit();
    const span = page.getByLabel('Span of the sweep');
    await page.getByRole('button', { name: 'Wider' }).click();
    const wide = await span.inputValue();
    // 150.5/√2 to 152·√2 MHz to begin with, each end moved outwards by √2.
    expect(wide).toBe('75.25 MHz..304 MHz');
    await page.getByRole('button', { name: 'Narrower' }).click();
    expect(await span.inputValue()).not.toBe(wide);
    await span.fill('140M..160M');
    await page.getByText('The numbers').click();
    expect(await page.locator('response-table tbody tr').first().innerText()).toMatch(/^140\.000 MHz/);
    await page.getByRole('button', { name: 'As the band' }).click();
    expect(await span.inputValue()).toBe('');
  });
});

describe('opening a file', () => {
  const drop = async (page: Page, name: string, text: string) => {
    const [picker] = await Promise.all([
      page.waitForEvent('filechooser'),
      page.locator('record-part label.button').click(),
    ]);
    await picker.setFiles({ name, mimeType: 'application/json', buffer: Buffer.from(text) });
  };

  it('takes a record of another kind to its own sheet', async () => {
    const page = await site.visit();
    const record = await (await page.request.get(`${site.url()}demo/power-stage.json`)).text();
    await drop(page, 'power-stage.json', record);
    await page.waitForURL(/\/sections\/#/);
    await outcome(page, /3 sections, low-pass/);
  });

  it('leaves the sheet as it is when the file holds no record', async () => {
    const page = await site.visit();
    await page.getByText('All 4 networks worked out with real parts').first().waitFor({ timeout: 60_000 });
    const before = await outcomeOf(page);
    await drop(page, 'notes.json', '{"schema":"ferrule-record/1"');
    await page
      .locator('record-part .said', { hasText: /^\s*notes\.json can’t be opened\. record .*not JSON; give/ })
      .waitFor();
    expect(await outcomeOf(page)).toBe(before);
  });
});

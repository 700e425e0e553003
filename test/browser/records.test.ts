import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { readRecord } from '../../src/record/read-record.ts';
import { demoText } from '../unit/record/demos.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { expectUnbroken } from './axe.ts';
import { addKeeper, begin, heard, open, openOther, openSheet, recall, saveIssued, type, typeAll } from './kept.ts';
import { useSite, wordsOf } from './site.ts';

const site = useSite();
const url = () => `${site.url()}records/`;

/** A tab with a keeper in it. */
async function sheet(): Promise<Page> {
  const page = await site.visit('records/');
  await addKeeper(page.context());
  await openSheet(page, url());
  return page;
}

async function another(page: Page): Promise<Page> {
  const other = await page.context().newPage();
  await openSheet(other, url());
  return other;
}

async function crash(page: Page): Promise<void> {
  const crashed = new Promise((done) => page.once('crash', done));
  const session = await page.context().newCDPSession(page);
  session.send('Page.crash').catch(() => undefined);
  await crashed;
  await page.close();
}

const entries = (page: Page) => page.locator('kept-entry');
const button = (page: Page, name: RegExp) => page.getByRole('button', { name });
const said = (page: Page, words: string | RegExp) =>
  page.locator('kept-records [role=status]', { hasText: words }).waitFor();

const record: DesignRecord = readRecord(demoText('tide-gauge'));
const issued = (revision: string, title = record.identity.title): DesignRecord => ({
  ...record,
  identity: { ...record.identity, revision, title },
  signOff: { ...record.signOff, state: 'issued' },
});

describe('what is typed', () => {
  it('outlasts a crash of the browser’s page, exactly as typed and though it can’t be read', async () => {
    const page = await sheet();
    await type(page, { frequency: '151.25M', load: '9.4 - k61', title: ' Ω ≠ "0"\n', number: 'TG-1' });
    const other = await page.context().newPage();
    await crash(page);
    await openSheet(other, url());
    const found = await recall(other, null);
    expect(found?.own).toBe(false);
    expect(found?.fields).toEqual({ frequency: '151.25M', load: '9.4 - k61', title: ' Ω ≠ "0"\n', number: 'TG-1' });
    await entries(other).waitFor();
    expect(await wordsOf(other)).toContain('TG-1 Ω ≠ "0"');
  });

  it('outlasts a tab closed in the middle of a word', async () => {
    const page = await sheet();
    await typeAll(page, [{ load: '9' }, { load: '9.' }, { load: '9.4' }]);
    // No hand is faster from the last letter to closing the tab.
    await new Promise((done) => setTimeout(done, 100));
    const other = await page.context().newPage();
    await page.close({ runBeforeUnload: true });
    await openSheet(other, url());
    expect((await recall(other, null))?.fields).toEqual({ load: '9.4' });
  });

  it('is the tab’s own after a reload, where its address says the same or nothing', async () => {
    const page = await sheet();
    await type(page, { load: '20+j10' });
    await openSheet(page, url());
    expect((await recall(page, { load: '20+j10' }))?.own).toBe(true);
    await openSheet(page, url());
    expect((await recall(page, null))?.own).toBe(true);
    await openSheet(page, url());
    expect(await recall(page, { load: '50' })).toMatchObject({ own: false, fields: { load: '20+j10' } });
  });

  it('is one draft however much is typed, and another after another document is begun', async () => {
    const page = await sheet();
    for (const load of ['2', '20', '20+j10']) await type(page, { load });
    await entries(page).waitFor();
    expect(await entries(page).count()).toBe(1);
    await begin(page);
    await type(page, { load: '75' });
    await entries(page).nth(1).waitFor();
    expect(await entries(page).count()).toBe(2);
  });
});

describe('one document in two tabs', () => {
  it('is never written over: what comes second is kept apart, and both tabs say so', async () => {
    const [first] = [await sheet()];
    await type(first, { number: 'TG-3', load: '10' });
    const { id } = (await recall(first, null))!;
    const second = await another(first);
    expect(await open(second, id)).toEqual({ number: 'TG-3', load: '10' });

    await type(first, { number: 'TG-3', load: '11' });
    expect((await heard(second, 'changed elsewhere')).words).toMatch(/^This document was changed in another tab\./);
    const apart = await type(second, { number: 'TG-3', load: '12' });
    expect(apart).toMatchObject({ state: 'kept apart' });
    expect(apart.words).toMatch(/Both are kept/);
    // It stays said while typing goes on.
    expect(await type(second, { number: 'TG-3', load: '123' })).toEqual(apart);

    expect(await openOther(second)).toEqual({ number: 'TG-3', load: '11' });
    const third = await another(first);
    await entries(third).nth(1).waitFor();
    expect(await entries(third).count()).toBe(2);
    expect(await wordsOf(third)).toContain('Kept apart: another tab changed the same document.');
    // Nothing of either was changed by the other.
    expect(await open(third, id)).toEqual({ number: 'TG-3', load: '11' });
  });

  it('is kept anew where it was deleted in the other', async () => {
    const first = await sheet();
    await type(first, { number: 'TG-4' });
    const list = await first.context().newPage();
    await list.goto(url());
    await button(list, /^Delete/).click();
    await said(list, 'is deleted');
    expect(await type(first, { number: 'TG-4', load: '5' })).toMatchObject({ state: 'kept apart' });
    await entries(list).waitFor();
  });
});

describe('where nothing more can be kept', () => {
  it('a full disk is told in one line, and what was typed meanwhile is kept once there is room', async () => {
    const page = await sheet();
    const session = await page.context().newCDPSession(page);
    const origin = new URL(site.url()).origin;
    await session.send('Storage.overrideQuotaForOrigin', { origin, quotaSize: 1 });
    const full = await type(page, { load: '12' });
    expect(full).toMatchObject({ state: 'not kept' });
    expect(full.words).toMatch(/^There is no room left to keep this: [^\n]+\. What you typed stays on this page/);
    expect(await saveIssued(page, issued('A'))).toMatchObject({
      would: expect.stringMatching(/^There is no room left/),
    });

    await session.send('Storage.overrideQuotaForOrigin', { origin });
    expect(await type(page, { load: '123' })).toMatchObject({ state: 'kept', words: '' });
    await openSheet(page, url());
    expect((await recall(page, null))?.fields).toEqual({ load: '123' });
  });

  it('a browser without IndexedDB works and says that it keeps nothing', async () => {
    const page = await site.visit('records/');
    await addKeeper(page.context());
    await page.context().addInitScript(() => {
      Object.defineProperty(globalThis, 'indexedDB', { value: undefined });
    });
    await openSheet(page, url());
    await said(page, /^This browser keeps nothing here, as in a private window/);
    expect(await recall(page, null)).toBeNull();
    expect(await type(page, { load: '12' })).toMatchObject({ state: 'not kept' });
    expect(site.complaints()).toEqual([]);
  });
});

describe('an issued record', () => {
  it('is frozen: its draft goes, typing starts another, and a different one of its revision is refused', async () => {
    const page = await sheet();
    await type(page, { number: record.identity.number, load: '12' });
    expect(await saveIssued(page, issued('A'))).toBeNull();
    await page.getByText('issued, frozen').waitFor();
    expect(await entries(page).count()).toBe(1);
    // The same again changes nothing.
    expect(await saveIssued(page, issued('A'))).toBeNull();
    const refused = await saveIssued(page, issued('A', 'Another title'));
    expect(refused?.why).toBe(`another record is issued and kept as ${record.identity.number} revision A`);
    await type(page, { number: record.identity.number, revision: 'B' });
    await entries(page).nth(1).waitFor();
    expect(await page.getByRole('button', { name: /^Rename/ }).count()).toBe(1);
    expect(await page.locator('.document').count()).toBe(1);
    expect(await saveIssued(page, issued('B'))).toBeNull();
    await expect.poll(() => page.getByText('issued, frozen').count()).toBe(2);
  });
});

/** Three documents of the list. */
async function filled(): Promise<Page> {
  const page = await sheet();
  await type(page, { number: 'TG-041', title: 'Tide gauge', load: 'x' });
  await begin(page);
  await type(page, { number: 'CF-7', title: 'Crystal filter', revision: 'C' });
  await begin(page);
  await saveIssued(page, issued('A', 'Signed whip'));
  await entries(page).nth(2).waitFor();
  return page;
}

describe('the list', () => {
  it('says in words that nothing is kept yet', async () => {
    const page = await site.visit('records/');
    await page.getByText('Nothing is kept yet.').waitFor();
    expect(site.complaints()).toEqual([]);
    expect(site.strangers()).toEqual([]);
  });

  it('finds by words of number, title and state', async () => {
    const page = await filled();
    const search = page.getByRole('searchbox');
    await search.fill('filter c');
    await expect.poll(() => entries(page).count()).toBe(1);
    expect(await page.locator('.document h2').innerText()).toBe('CF-7 Crystal filter');
    await search.fill('issued');
    expect(await page.locator('.document h2').innerText()).toMatch(/Signed whip$/);
    await search.fill('nothing of this');
    await page.getByText('Nothing that is kept matches this search.').waitFor();
  });

  it('opens an entry on its sheet, by its id', async () => {
    const page = await filled();
    const link = page.getByRole('link', { name: 'Open CF-7, revision C, draft' });
    expect(await link.getAttribute('href')).toMatch(/^\/#kept=[0-9a-f]{32}$/);
  });

  it('duplicates, renames, deletes and undoes by keyboard, and the focus goes along', async () => {
    const page = await filled();
    const focused = () =>
      page.evaluate(() => {
        let at = document.activeElement;
        while (at?.shadowRoot?.activeElement) at = at.shadowRoot.activeElement;
        return at?.getAttribute('aria-label') ?? at?.id ?? '';
      });
    await button(page, /^Duplicate: CF-7/).press('Enter');
    await said(page, 'CF-7, revision C, draft is duplicated.');
    expect(await focused()).toBe('Open unnumbered, revision A, draft');
    await page.getByRole('heading', { name: 'unnumbered Copy of Crystal filter' }).waitFor();

    await button(page, /^Rename: unnumbered/).press('Enter');
    await page.getByLabel('Title', { exact: true }).fill('Second filter');
    await page.keyboard.press('Tab');
    expect(await focused()).toBe('number');
    await page.keyboard.type('CF-8');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'CF-8 Second filter' }).waitFor();
    expect(await focused()).toBe('Open CF-8, revision A, draft');

    await button(page, /^Delete: CF-8/).press('Enter');
    await said(page, 'CF-8, revision A, draft is deleted.');
    expect(await entries(page).count()).toBe(3);
    expect(await focused()).toBe('Undo: CF-8, revision A, draft');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { name: 'CF-8 Second filter' }).waitFor();
    expect(await focused()).toBe('Open CF-8, revision A, draft');
    expect(await page.locator('.deleted').count()).toBe(0);

    await button(page, /^Rename: CF-8/).press('Enter');
    await page.getByLabel('Title', { exact: true }).fill('not this');
    await page.keyboard.press('Escape');
    expect(await focused()).toMatch(/^Rename: CF-8/);
    expect(site.complaints()).toEqual([]);
  });

  it('keeps every deletion undoable as long as the page is open', async () => {
    const page = await filled();
    for (let left = 2; left >= 0; left -= 1) {
      await button(page, /^Delete/)
        .first()
        .click();
      await expect.poll(() => entries(page).count()).toBe(left);
    }
    await page.getByText('Nothing is kept yet.').waitFor();
    for (let left = 3; left > 0; left -= 1) {
      expect(await button(page, /^Undo/).count()).toBe(left);
      await button(page, /^Undo/).last().click();
      await expect.poll(() => button(page, /^Undo/).count()).toBe(left - 1);
    }
    expect(await entries(page).count()).toBe(3);
  });

  it('follows what other tabs do', async () => {
    const page = await filled();
    const other = await page.context().newPage();
    await other.goto(url());
    await entries(other).nth(2).waitFor();
    await begin(page);
    await type(page, { number: 'NEW-1' });
    await other.getByRole('heading', { name: /^NEW-1/ }).waitFor();
  });
});

async function exported(page: Page, name: RegExp): Promise<{ readonly name: string; readonly text: string }> {
  const [download] = await Promise.all([page.waitForEvent('download'), button(page, name).click()]);
  return { name: download.suggestedFilename(), text: await readFile(await download.path(), 'utf8') };
}

const imported = (page: Page, name: string, text: string) =>
  page.locator('input[type=file]').setInputFiles([{ name, mimeType: 'application/json', buffer: Buffer.from(text) }]);

describe('export and import', () => {
  it('take everything elsewhere as it was, and add nothing twice', async () => {
    const page = await filled();
    const all = await exported(page, /^Export all/);
    expect(all.name).toMatch(/^ferrule-records-\d{4}-\d{2}-\d{2}\.json$/);

    const elsewhere = await site.visit('records/');
    await imported(elsewhere, 'all.json', all.text);
    await said(elsewhere, 'all.json: 3 records added.');
    expect(await entries(elsewhere).count()).toBe(3);
    await imported(elsewhere, 'all.json', all.text);
    await said(elsewhere, 'all.json: 0 records added, 3 here already.');
    const again = await exported(elsewhere, /^Export all/);
    const sorted = (text: string) => {
      const { drafts, records } = JSON.parse(text) as { drafts: { fields: { number: string } }[]; records: unknown };
      return { records, drafts: drafts.toSorted((a, b) => a.fields.number.localeCompare(b.fields.number)) };
    };
    expect(sorted(again.text)).toEqual(sorted(all.text));
  });

  it('save one as its record, under its own name, and take it back', async () => {
    const page = await filled();
    const one = await exported(page, /^Save as a file: .*issued/);
    expect(one.name).toBe(`${record.identity.number}_A.json`);
    expect(JSON.parse(one.text)).toEqual(issued('A', 'Signed whip'));
    await imported(page, 'one.json', one.text);
    await said(page, 'one.json: 0 records added, 1 here already.');
    await imported(page, 'two.json', JSON.stringify(issued('A', 'Other')));
    await said(page, 'two.json: 0 records added, 1 refused.');
    expect(await page.getByRole('list', { name: 'Refused' }).innerText()).toMatch(/another record is issued here/);
  });

  it('refuse in one line what isn’t a file of records, and change nothing', async () => {
    const page = await filled();
    const files = {
      'empty.json': '',
      'text.json': 'hello\n\n{',
      'list.json': '[1, 2, 3]',
      'later.json': '{"schema":"ferrule-records/2","records":[]}',
      'deep.json': `{"schema":"ferrule-records/1","records":${'['.repeat(1e5)}${']'.repeat(1e5)}}`,
      'wrong.json': '{"schema":"ferrule-records/1","records":[{"schema":"ferrule-record/2"},7,null]}',
      'draft.json':
        '{"schema":"ferrule-records/1","drafts":[{"sheet":"two-element","fields":{"load":7}},{"sheet":"two-element","fields":{"__proto__":"1"}},{"sheet":"toString","fields":{}},{"sheet":"two-element","fields":{},"previous":{"a":1}}]}',
    };
    for (const [name, text] of Object.entries(files)) {
      await imported(page, name, text);
      await said(page, name);
      const lines = await page.getByRole('list', { name: 'Refused' }).getByRole('listitem').allInnerTexts();
      expect(lines.length).toBeGreaterThan(0);
      for (const line of lines) {
        expect(line.startsWith(name)).toBe(true);
        expect(line).toMatch(/; /);
        expect(line).not.toMatch(/\n|undefined|NaN|\[object/);
        expect(line.length).toBeLessThan(400);
      }
    }
    expect(await entries(page).count()).toBe(3);
    expect(site.complaints()).toEqual([]);
  });

  it('migrate a record of an earlier schema', async () => {
    const page = await site.visit('records/');
    const text = await readFile(new URL('../unit/record/schema-1/tide-gauge.json', import.meta.url), 'utf8');
    await imported(page, 'old.json', text);
    await said(page, 'old.json: 1 record added.');
  });
});

describe('the page', () => {
  it('breaks no rule of axe, wide, dark and narrow, and has targets of 44 px', async () => {
    const page = await filled();
    await button(page, /^Delete: CF-7/).click();
    await button(page, /^Undo/).waitFor();
    await button(page, /^Rename: TG-041/).click();
    await imported(page, 'x.json', 'x');
    await page.getByRole('list', { name: 'Refused' }).waitFor();
    for (const [width, height] of [
      [1440, 3000],
      [390, 5000],
    ] as const) {
      await page.setViewportSize({ width, height });
      for (const colorScheme of ['light', 'dark'] as const) {
        await page.emulateMedia({ colorScheme });
        await expectUnbroken(page);
      }
      const targets = page.locator('kept-records').locator('a, button, label.button, input:not([type=file])');
      for (const target of await targets.all()) {
        const box = await target.boundingBox();
        if (box !== null) expect([box.width >= 44, box.height >= 44]).toEqual([true, true]);
      }
    }
    await page.setViewportSize({ width: 320, height: 256 });
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320);
  });

  it('works without a network after one visit', async () => {
    const page = await site.visit('', { serviceWorkers: 'allow' });
    await page.evaluate(() => navigator.serviceWorker.ready);
    await page.context().setOffline(true);
    await page.goto(url());
    await page.getByText('Nothing is kept yet.').waitFor();
    await imported(page, 'one.json', JSON.stringify(issued('A')));
    await said(page, 'one.json: 1 record added.');
  });
});

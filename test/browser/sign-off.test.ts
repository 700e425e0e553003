import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { expectUnbroken, high } from './axe.ts';
import { useSite, wordsOf } from './site.ts';

const site = useSite();
let folder = '';
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'ferrule-sign-off-'));
});
afterAll(() => rm(folder, { recursive: true, force: true }));

const sheet =
  '#frequency=151.25M&source=50&load=9.4-j61&band=150.5M..152M&return-loss=14&number=EX-7&title=Whip&date=2026-01-02';
/** More than any two parts hold over the band. */
const beyond = sheet.replace('return-loss=14', 'return-loss=40');

/** |Γ| = 0.1 in 50 Ω at every frequency: 20 dB of return loss. */
const board = [
  '# MHz S MA R 50',
  ...Array.from({ length: 51 }, (_, k) => `${String(140 + k / 2)} 0.1 ${String(3 * k)}`),
];

const signOff = (page: Page) => page.locator('sign-off');
const part = (page: Page) => page.locator('record-part');
const issue = (page: Page) => page.getByRole('button', { name: 'Issue', exact: true });
/** By keyboard: a button that isn't ready says why. */
const press = async (page: Page, name: string | RegExp) => page.getByRole('button', { name }).press('Enter');

async function sign(page: Page): Promise<void> {
  for (const k of [0, 1, 2]) {
    await signOff(page)
      .getByLabel('Name', { exact: true })
      .nth(k)
      .fill(`Person ${String(k)}`);
    await signOff(page)
      .getByLabel('Date', { exact: true })
      .nth(k)
      .fill(`2026-01-0${String(k + 3)}`);
  }
  await signOff(page).getByLabel('Remark').first().fill('As simulated.');
}

async function issued(page: Page): Promise<void> {
  await sign(page);
  await signOff(page).getByText('Nothing: it may be issued.').waitFor();
  await issue(page).press('Enter');
  await signOff(page).getByText('Revision A is issued and frozen.').waitFor();
  await page.waitForFunction(() => location.hash.includes('state=issued'));
}

async function recordOf(page: Page): Promise<DesignRecord> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Download the record (JSON)' }).click(),
  ]);
  const path = join(folder, download.suggestedFilename());
  await download.saveAs(path);
  return JSON.parse(await readFile(path, 'utf8')) as DesignRecord;
}

async function measure(page: Page, name: string, text: string): Promise<void> {
  const [picker] = await Promise.all([
    page.waitForEvent('filechooser'),
    page.locator('finished-board label.button').click(),
  ]);
  await picker.setFiles({ name, mimeType: 'text/plain', buffer: Buffer.from(text) });
}

describe('sign-off', () => {
  it('refuses to issue while something lacks, and says what', async () => {
    const page = await site.visit(beyond, { viewport: high });
    await issue(page).press('Enter');
    await signOff(page)
      .getByText(/^Not issued: 4 things lack\.$/)
      .waitFor();
    const lacks = signOff(page).getByRole('group', { name: 'What lacks before issue' });
    expect(await lacks.evaluate((list) => list.matches(':focus'))).toBe(true);
    expect(await lacks.getByRole('listitem').allInnerTexts()).toEqual([
      expect.stringMatching(/^Return loss falls short and no deviation is written: .*40/u),
      expect.stringContaining('prepared'),
      expect.stringContaining('checked'),
      expect.stringContaining('approved'),
    ]);
    expect(page.url()).not.toContain('state=issued');
    await expectUnbroken(page);
  });

  it('accepts in writing what falls short, and issues', async () => {
    const page = await site.visit(beyond, { viewport: high });
    await signOff(page).getByLabel('Accept in writing: reason').fill('Trial lot = 20 boards.');
    await signOff(page).getByLabel('for review').check();
    await page.waitForFunction(() => location.hash.includes('state=for+review'));
    await issued(page);
    await page.locator('contents-rule', { hasText: 'issued' }).waitFor();
    const { deviations, signOff: signed } = await recordOf(page);
    expect(deviations).toEqual([{ subject: 'return loss', reason: 'Trial lot = 20 boards.' }]);
    expect(signed.state).toBe('issued');
    expect(signed.prepared).toEqual({
      name: 'Person 0',
      role: '',
      date: '2026-01-03',
      remark: 'As simulated.',
    });
    expect(site.complaints()).toEqual([]);
    await expectUnbroken(page);
  });

  it('waits with the issue until every entry can be read', async () => {
    const page = await site.visit(sheet, { viewport: high });
    await sign(page);
    await page.getByLabel('Load impedance').fill('9.4-k61');
    await signOff(page).getByText('An entry can’t be read').waitFor();
    await issue(page).press('Enter');
    await signOff(page).getByText('Not issued: 1 thing lacks.').waitFor();
  });
});

describe('an issued record', () => {
  it('stays as it is: what is typed waits, and is put back', async () => {
    const page = await site.visit(sheet, { viewport: high });
    await issued(page);
    const address = page.url();
    const before = await page.locator('title-block .outcome').innerText();
    await page.getByLabel('Band to hold').fill('150M..153M');
    await page.getByText('1 changed entry waits for revision B.').waitFor();
    expect(await page.getByLabel('Band to hold').inputValue()).toBe('150M..153M');
    expect((await recordOf(page)).requirement.bandHz).toEqual({ low: 150.5e6, high: 152e6 });
    expect(await page.locator('title-block .outcome').innerText()).toBe(before);
    expect(page.url()).toBe(address);
    await expectUnbroken(page);
    await press(page, 'Leave revision A as issued');
    await page.locator('start-revision.waiting').waitFor({ state: 'detached' });
    expect(await page.getByLabel('Band to hold').inputValue()).toBe('150.5M..152M');
  });

  it('is told without colour and without sideways scrolling on a narrow dark screen', async () => {
    const page = await site.visit(`${sheet}&state=issued`, {
      viewport: { width: 320, height: 9000 },
      colorScheme: 'dark',
    });
    await measure(page, 'board-7.s1p', board.join('\n'));
    await page.getByText('The finished board waits for revision B.').waitFor();
    await press(page, 'Start revision B');
    await page.getByText('A revision needs its reason: say what it changes and why.').waitFor();
    await expectUnbroken(page);
    await page
      .locator('start-revision.waiting')
      .getByLabel(/^What revision B/u)
      .fill('As built.');
    await press(page, 'Start revision B');
    await page.locator('difference-table').getByText('board-7.s1p').waitFor();
    await expectUnbroken(page);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320);
  });

  it('is revised with a reason, by what was typed; the new revision tells what changed', async () => {
    const page = await site.visit(sheet, { viewport: high });
    await issued(page);
    const first = await recordOf(page);
    await page.getByLabel('Band to hold').fill('150M..153M');
    await press(page, 'Start revision B');
    await page.getByText('A revision needs its reason: say what it changes and why.').waitFor();
    await page.locator('start-revision.waiting').getByLabel('What revision B changes, and why').fill('A wider band.');
    await press(page, 'Start revision B');
    const changes = page.locator('difference-table');
    await changes.getByRole('row', { name: /^Band / }).waitFor();
    expect(await changes.getByRole('row', { name: /^Band / }).innerText()).toMatch(
      /Band\s+150\.5\sMHz to 152\sMHz\s+150\sMHz to 153\sMHz/u,
    );
    const next = await recordOf(page);
    expect(next.identity).toMatchObject({ revision: 'B', change: 'A wider band.' });
    expect(next.history).toMatchObject([{ revision: 'A', date: '2026-01-02', change: '' }]);
    expect(next.previous).toEqual(first);
    expect(next.signOff).toMatchObject({ state: 'draft', prepared: { name: 'Person 0', date: '', remark: '' } });
    await signOff(page).getByText('“prepared” lacks its date').waitFor();
    await expectUnbroken(page);

    await page.reload();
    await changes.getByRole('row', { name: /^Band / }).waitFor();
    expect((await recordOf(page)).history).toHaveLength(1);
    expect(site.complaints()).toEqual([]);
  });
});

describe('text for a ticket', () => {
  it('is copied as plain text and as Markdown, and so is what changed', async () => {
    const page = await site.visit(sheet, { viewport: high });
    await page.context().grantPermissions(['clipboard-read', 'clipboard-write']);
    const copied = async (button: string, where = part(page)) => {
      await where.getByRole('button', { name: button, exact: true }).click();
      await where.getByRole('button', { name: 'Copied' }).waitFor();
      const text = await page.evaluate(() => navigator.clipboard.readText());
      await where.getByRole('button', { name: button, exact: true }).waitFor();
      return text;
    };
    const plain = await copied('Copy for the ticket');
    expect(plain).toMatch(/^Whip\nEX-7, revision A, 2026-01-02, draft\n/u);
    const { digest } = { digest: (await wordsOf(page, 'record-part .digest code')).replaceAll(' ', '') };
    expect(plain).toContain(digest);
    expect(await copied('Copy as Markdown for the ticket')).toMatch(/^\*\*Whip\*\*\n/u);

    await issued(page);
    await signOff(page).getByLabel('What revision B changes, and why').fill('The load was measured anew.');
    await press(page, 'Start revision B');
    await page.getByLabel('Load impedance').fill('9.4-j60');
    await page.locator('difference-table').getByText('9.4 − j60').first().waitFor();
    expect(await copied('Copy as text')).toMatch(/\nTerminations\n.*9\.4 − j60/su);
    expect(await copied('Copy as Markdown')).toContain('| What | Before | After |');
  });
});

describe('a finished board', () => {
  it('is laid over the prediction, judged, described and left out', async () => {
    const page = await site.visit(sheet, { viewport: high });
    await measure(page, 'board-7.s1p', board.join('\n'));
    const shown = page.locator('finished-board');
    await shown.getByText('The finished board meets the requirement.').waitFor();
    // 20·log10(1/0.1) = 20 dB
    await shown
      .getByText(/^Measured over 150\.50\sMHz to 152\.00\sMHz, the return loss is 20\.00\sdB at worst/u)
      .waitFor();
    expect(await shown.locator('figure svg').textContent()).toContain('measured on the finished board');
    await page.locator('contents-rule', { hasText: /Finished board\s+meets/u }).waitFor();
    expect(await shown.getByRole('group', { name: 'Single causes' }).getByRole('row').count()).toBeGreaterThan(1);
    await shown.getByLabel('Note on the board measured').fill('On its bracket');
    await shown.getByText(/^Of the entry before/u).waitFor({ state: 'detached' });
    await expectUnbroken(page);
    expect((await recordOf(page)).asBuilt).toMatchObject({
      state: null,
      note: 'On its bracket',
      measured: { name: 'board-7.s1p', samples: 51 },
    });
    await press(page, 'Leave it out');
    await shown.getByText('Measured on the finished board…').waitFor();
    expect((await recordOf(page)).asBuilt).toBeNull();
    expect(site.complaints()).toEqual([]);
  });

  it('is said to have been measured with one of several load states', async () => {
    const states = sheet.replace('load=9.4-j61', `load=${encodeURIComponent('free = 9.4-j61\nin hand = 12-j55')}`);
    const page = await site.visit(states, { viewport: high });
    await measure(page, 'board-7.s1p', board.join('\n'));
    const shown = page.locator('finished-board');
    await shown.getByText(/is nearest and is taken/u).waitFor();
    await shown.getByLabel('Load state attached').selectOption('in hand');
    await shown.getByText('The load state attached was “in hand”.').waitFor();
    expect((await recordOf(page)).asBuilt?.state).toBe('in hand');
  });

  it('of an issued record waits for the next revision', async () => {
    const page = await site.visit(sheet, { viewport: high });
    await issued(page);
    await measure(page, 'board-7.s1p', board.join('\n'));
    await page.getByText('The finished board waits for revision B.').waitFor();
    expect((await recordOf(page)).asBuilt).toBeNull();
    await page
      .locator('start-revision.waiting')
      .getByLabel(/^What revision B/u)
      .fill('As built.');
    await press(page, 'Start revision B');
    await page.locator('finished-board').getByText('The finished board meets the requirement.').waitFor();
    expect((await recordOf(page)).asBuilt?.measured.name).toBe('board-7.s1p');
  });

  it('that can’t be read is refused in one line, and nothing changes', async () => {
    const page = await site.visit(sheet, { viewport: high });
    const said = page.locator('finished-board [role=status]');
    await measure(page, 'board.s1p', '# MHz S MA R 50\n1 2');
    await said.getByText(/^board\.s1p can’t be read\. line /u).waitFor();
    await measure(page, 'board.s2p', '# MHz S MA R 50\n1 0 0 0 0 0 0 0 0\n2 0 0 0 0 0 0 0 0');
    await said.getByText(/^board\.s2p can’t be read: it has several ports/u).waitFor();
    expect((await recordOf(page)).asBuilt).toBeNull();
    await expectUnbroken(page);
  });
});

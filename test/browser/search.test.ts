import { describe, expect, it } from 'vitest';
import { expectUnbroken, high } from './axe.ts';
import { useSite } from './site.ts';

const site = useSite();
const given = 'frequency=434M&source=50&load=14-j112&band=380M..490M&return-loss=20&date=2026-01-02&method=fitted&';

describe('a search', () => {
  it('shows how far it is, keeps the results before in view, and comes to its networks', async () => {
    const page = await site.visit(`sections/#${given.replace('fitted', 'cascade')}sections=2`, { viewport: high });
    await page.locator('title-block', { hasText: 'networks' }).waitFor();
    await page.getByLabel('Method').selectOption('fitted');
    await page.getByText(/^Searching, \d+\s%: \d elements/).waitFor();
    expect(await page.locator('network-part svg').count()).toBe(1);
    await page.locator('sheet-part[stale]', { hasText: 'Options' }).waitFor();
    await page.locator('options-part', { hasText: 'Fitted, 4 elements' }).waitFor({ timeout: 40_000 });
    expect(await page.locator('search-progress progress').count()).toBe(0);
    await page.locator('options-part', { hasText: 'Below the ceiling' }).waitFor();
    expect(site.complaints()).toEqual([]);
  });

  it('is stopped with the best so far, which the address reproduces, and goes on', async () => {
    const page = await site.visit(`#${given}elements=8`, { viewport: high });
    await page.getByText(/^Searching, .*best so far/).waitFor();
    await page.getByRole('button', { name: 'Stop, keep the best' }).click();
    await page.getByText(/^Search stopped after \d+ steps/).waitFor();
    await page.waitForFunction(() => location.hash.includes('steps='));
    const parts = await page.locator('network-part table').innerText();
    expect(parts).toMatch(/[LC]1/);
    await expectUnbroken(page);

    const other = await site.visit(page.url().slice(site.url().length));
    await other.getByText(/^Search stopped after/).waitFor({ timeout: 40_000 });
    expect(await other.locator('network-part table').innerText()).toBe(parts);

    await page.getByRole('button', { name: 'Search to the end' }).click();
    await page.waitForFunction(() => !location.hash.includes('steps='));
    await page.getByText(/^Searching/).waitFor();
  });

  it('begins anew with what is typed, and is given up for what can’t be read', async () => {
    const page = await site.visit(`#${given}elements=8`);
    await page.getByText(/^Searching/).waitFor();
    await page.getByLabel('Elements of fitted networks').selectOption('3');
    await page.locator('options-part', { hasText: 'Fitted, 3 elements' }).waitFor({ timeout: 40_000 });
    await page.getByLabel('Elements of fitted networks').selectOption('8');
    await page.getByText(/^Searching/).waitFor();
    await page.getByLabel('Load impedance').fill('?');
    await page.getByText('Of the last entry that could be read.').first().waitFor();
    expect(await page.locator('search-progress progress').count()).toBe(0);
  });

  it('is not repeated for a title or a choice', async () => {
    const page = await site.visit(`#${given}elements=4`);
    const options = page.locator('options-part input[type=radio]');
    await options.nth(1).waitFor({ timeout: 40_000 });
    const start = Date.now();
    await options.nth(1).check();
    await page.locator('title-block .outcome', { hasText: 'Chosen' }).waitFor();
    expect(Date.now() - start).toBeLessThan(1500);
  });
});

it('of every method together stands in a table', async () => {
  const page = await site.visit(`#${given.replace('fitted', 'all')}elements=2`, { viewport: high });
  const table = page.getByRole('radiogroup', { name: 'Choose a network' });
  await table.waitFor({ timeout: 40_000 });
  await table.getByText('Pi, of a chosen Q').waitFor();
  await table.getByRole('radio').last().check();
  await page.locator('title-block .outcome', { hasText: 'Chosen' }).waitFor();
  await expectUnbroken(page);
});

it('is served without a network after one visit', async () => {
  const page = await site.visit('', { serviceWorkers: 'allow' });
  await page.evaluate(async () => {
    await navigator.serviceWorker.ready;
    if (navigator.serviceWorker.controller === null) {
      await new Promise((done) => navigator.serviceWorker.addEventListener('controllerchange', done, { once: true }));
    }
  });
  await page.context().setOffline(true);
  await page.reload();
  await page.getByLabel('Method').selectOption('fitted');
  await page.getByLabel('Elements of fitted networks').selectOption('2');
  await page.locator('options-part', { hasText: 'Fitted, 2 elements' }).waitFor({ timeout: 40_000 });
});

import { expect, it } from 'vitest';
import { useSite } from './site.ts';

const site = useSite();

it('works without a network after one visit: every sheet, a reload, a report', async () => {
  const page = await site.visit('', { serviceWorkers: 'allow' });
  // Taken over and everything kept: an active worker has finished fetching.
  await page.evaluate(async () => {
    await navigator.serviceWorker.ready;
    if (navigator.serviceWorker.controller === null) {
      await new Promise((done) => navigator.serviceWorker.addEventListener('controllerchange', done, { once: true }));
    }
  });
  await page.context().setOffline(true);

  await page.reload();
  await page.locator('title-block', { hasText: 'networks' }).waitFor();
  await page.getByLabel('Load impedance').fill('20+j10');
  await page.locator('network-part', { hasText: '20 + j10 Ω' }).waitFor();
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: 'Download the report (PDF)' }).click(),
  ]);
  expect(download.suggestedFilename()).toMatch(/\.pdf$/);

  for (const path of [
    'resistive/',
    'sections/',
    'basis/',
    'sections/#sections=4&frequency=434M&source=12.5&load=50&date=2026-01-02',
  ]) {
    await page.goto(site.url() + path);
    expect(await page.locator('h1').first().innerText()).not.toBe('');
  }
  await page.locator('title-block', { hasText: '4 sections' }).waitFor();
  expect(site.complaints()).toEqual([]);
});

it('allows nothing but its own origin, by policy', async () => {
  const page = await site.visit();
  const policy = await page.locator('meta[http-equiv="Content-Security-Policy"]').getAttribute('content');
  expect(policy).toMatch(/^default-src 'self'; /);
  // Compiling WebAssembly of its own is all that it allows beyond.
  expect(policy!.replace("'wasm-unsafe-eval'", '')).not.toMatch(/unsafe|https?:|\*/);
});

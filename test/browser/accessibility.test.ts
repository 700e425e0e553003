import axe from 'axe-core';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { settled, useSite } from './site.ts';

const site = useSite();
/** High enough for the whole document: of parts out of view no contrast can be measured. */
const wide = { width: 1440, height: 9000 };
const narrow = { width: 390, height: 16_000 };

/** Rules that the page breaks, with the elements that do; all rules of WCAG 2.2 AA and of good practice, or one. */
async function broken(page: Page, rule?: string): Promise<readonly string[]> {
  await settled(page);
  await page.evaluate(axe.source);
  return page.evaluate(async (only) => {
    const run = (globalThis as unknown as { axe: typeof axe }).axe.run;
    const { violations } = await run(document, only === undefined ? {} : { runOnly: [only] });
    return violations.flatMap(({ id, nodes }) => nodes.map(({ target }) => `${id}: ${JSON.stringify(target)}`));
  }, rule);
}

/** Wide, in the dark, and narrow, one after the other on the same page. */
async function expectUnbroken(page: Page): Promise<void> {
  expect(await broken(page)).toEqual([]);
  await page.emulateMedia({ colorScheme: 'dark' });
  expect(await broken(page, 'color-contrast')).toEqual([]);
  await page.emulateMedia({ colorScheme: 'light' });
  await page.setViewportSize(narrow);
  const folded = page.getByRole('button', { name: /Given/, expanded: false });
  if (await folded.isVisible()) await folded.click();
  expect(await broken(page)).toEqual([]);
}

const unfold = (page: Page) =>
  page.evaluate(() => {
    const open = (root: ParentNode): void => {
      for (const element of root.querySelectorAll('*')) {
        if (element instanceof HTMLDetailsElement) element.open = true;
        if (element.shadowRoot) open(element.shadowRoot);
      }
    };
    open(document);
  });

const ready = (page: Page, path: string) =>
  page
    .locator(path === 'basis/' ? '#B17' : 'evidence-part table')
    .first()
    .waitFor({ state: 'attached' });

describe('axe finds nothing, wide, dark and narrow,', () => {
  it.each(['', 'resistive/', 'sections/', 'basis/'])('on /%s with everything unfolded', async (path) => {
    const page = await site.visit(path, { viewport: wide });
    await ready(page, path);
    await unfold(page);
    await expectUnbroken(page);
  });

  it('where nothing in the address can be read', async () => {
    const wrong = 'frequency=0&source=x&load=50&band=2..1&sections=9&aim=up&keep-dc=here&date=soon';
    const page = await site.visit(`sections/#${wrong}`, { viewport: wide });
    await page.getByText('Nothing is computed yet').waitFor();
    await expectUnbroken(page);
  });

  it('while an earlier result is shown', async () => {
    const page = await site.visit('', { viewport: wide });
    await page.getByLabel('Load impedance').fill('?');
    await page.locator('sheet-part[stale]').nth(2).waitFor();
    await expectUnbroken(page);
  });
});

it.each(['', 'sections/', 'basis/'])('/%s needs no sideways scrolling at four times the size', async (path) => {
  const page = await site.visit(path, { viewport: { width: 320, height: 256 } });
  await ready(page, path);
  expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320);
});

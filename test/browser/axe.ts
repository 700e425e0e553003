import axe from 'axe-core';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { settled } from './site.ts';

/** High enough for the whole document: of parts out of view no contrast can be measured. */
export const high = { width: 1440, height: 9000 };

/** Every rule of WCAG 2.2 AA and of good practice holds on the page as it stands. */
export async function expectUnbroken(page: Page): Promise<void> {
  await settled(page);
  await page.evaluate(axe.source);
  const broken = await page.evaluate(async () => {
    const { violations } = await (globalThis as unknown as { axe: typeof axe }).axe.run(document);
    return violations.flatMap(({ id, nodes }) => nodes.map(({ target }) => `${id}: ${JSON.stringify(target)}`));
  });
  expect(broken).toEqual([]);
}

import { chromium, type Browser, type Page } from 'playwright-core';
import { browserFlags, findBrowser } from '../../src/cli/browser.ts';
import { buildSite } from '../../src/cli/build-site.ts';
import { site } from '../../src/cli/project.ts';
import { serve } from '../../src/cli/serve.ts';

/**
 * A fresh page of a headless browser, with the built site served to it; null when there is no browser.
 * Service workers are kept out: what they fetch for later isn't part of a first load.
 */
export async function withPage<T>(use: (page: Page, url: string, browser: Browser) => Promise<T>): Promise<T | null> {
  const executablePath = findBrowser();
  if (executablePath === null) return null;
  const { ok, output } = await buildSite();
  if (!ok) throw new Error(`the site could not be built:\n${output}`);
  const served = await serve({ root: site, port: 0 });
  const browser = await chromium.launch({ executablePath, args: browserFlags });
  try {
    const context = await browser.newContext({ serviceWorkers: 'block', viewport: { width: 1440, height: 900 } });
    return await use(await context.newPage(), served.url, browser);
  } finally {
    await browser.close();
    await served.close();
  }
}

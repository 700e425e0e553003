import { chromium, type Browser, type BrowserContext, type BrowserContextOptions, type Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll } from 'vitest';
import { browserFlags, findBrowser } from '../../src/cli/browser.ts';
import { site } from '../../src/cli/project.ts';
import { serve, type Served } from '../../src/cli/serve.ts';

export interface Site {
  /** Address of the built site, with a slash at the end. */
  readonly url: () => string;
  /** A fresh visitor's page at a path of the site; closed after the test. */
  readonly visit: (path?: string, options?: BrowserContextOptions) => Promise<Page>;
  /** Addresses outside the site that any page of the test asked for. */
  readonly strangers: () => readonly string[];
  /** What pages wrote to the console as errors, and what they threw. */
  readonly complaints: () => readonly string[];
}

/** The built site and a browser, for one file of tests. */
export function useSite(): Site {
  let served: Served;
  let browser: Browser;
  const contexts: BrowserContext[] = [];
  const strangers: string[] = [];
  const complaints: string[] = [];

  beforeAll(async () => {
    const executablePath = findBrowser();
    if (executablePath === null) throw new Error('no browser; install Chromium or name one in CHROME_PATH');
    served = await serve({ root: site, port: 0 });
    browser = await chromium.launch({ executablePath, args: browserFlags });
  });
  afterEach(async () => {
    await Promise.all(contexts.splice(0).map((context) => context.close()));
    strangers.length = 0;
    complaints.length = 0;
  });
  afterAll(async () => {
    await browser.close();
    await served.close();
  });

  return {
    url: () => served.url,
    strangers: () => strangers,
    complaints: () => complaints,
    visit: async (path = '', options = {}) => {
      const context = await browser.newContext({ ...usual, ...options });
      contexts.push(context);
      context.on('request', (request) => {
        const address = request.url();
        if (!address.startsWith(served.url) && !/^(data|blob):/u.test(address)) strangers.push(address);
      });
      // Nothing here takes longer, on a slow machine either; a wrong selector shouldn't cost more.
      context.setDefaultTimeout(10_000);
      const page = await context.newPage();
      page.on('pageerror', (error) => complaints.push(error.message));
      page.on('console', (message) => {
        if (message.type() === 'error') complaints.push(message.text());
      });
      await page.goto(served.url + path);
      return page;
    },
  };
}

/** What keeps the site for use without a network stays out: it fetches everything at every first visit. */
const usual: BrowserContextOptions = { viewport: { width: 1440, height: 900 }, serviceWorkers: 'block' };

/** Every word in the page's main part or another, those in the elements' own trees too, with single spaces. */
export async function wordsOf(page: Page, part = 'main'): Promise<string> {
  const words = await page.locator(part).evaluate((main) => {
    const collect = (node: Node): string => {
      if (node instanceof Text) return node.data;
      const own = node instanceof Element ? [...(node.shadowRoot?.childNodes ?? [])] : [];
      return [...own, ...node.childNodes].map(collect).join(' ');
    };
    return collect(main);
  });
  return words.replace(/[ \n\u00a0]+/gu, ' ');
}

/** Waits for what follows a keystroke: the parts after the options come one frame later. */
export const settled = (page: Page): Promise<void> =>
  page.evaluate(
    () =>
      new Promise<void>((done) =>
        requestAnimationFrame(() => setTimeout(() => requestAnimationFrame(() => setTimeout(done)))),
      ),
  );

import { brotliCompressSync } from 'node:zlib';
import type { Figure } from './figure.ts';
import { withPage } from './with-page.ts';

const budgetKb = { scripts: 60, all: 130 };

interface Sent {
  /** Before the first result was painted. */
  readonly atFirst: boolean;
  readonly isScript: boolean;
  readonly writesPdf: boolean;
  /** As a host that compresses would send it, B; what is compressed already stays as it is. */
  readonly size: number;
}

/**
 * What the first visit to `/` fetches up to its first result, and until it asks for nothing more, each file as brotli
 * sends it. The first result is there when the outcome and every option stand on the screen; what is fetched afterwards
 * is for the parts below and for real parts.
 */
export async function benchLoad(): Promise<readonly Figure[]> {
  const sent = await withPage(async (page, url) => {
    const answers: Promise<Omit<Sent, 'atFirst'> & { readonly address: string }>[] = [];
    await page.addInitScript(noteFirstResult);
    page.on('response', (response) => {
      answers.push(
        response.body().then((body) => ({
          address: response.url(),
          isScript: (response.headers()['content-type'] ?? '').startsWith('text/javascript'),
          writesPdf: body.includes('%PDF-'),
          size: Math.min(body.length, brotliCompressSync(body).length),
        })),
      );
    });
    await page.goto(url, { waitUntil: 'networkidle' });
    await page.locator('options-part input[type=radio]').first().waitFor();
    const early = await page.evaluate(() => (globalThis as unknown as Noted).fetchedAtFirst);
    const all = await Promise.all(answers);
    return all.map((each): Sent => ({ ...each, atFirst: early.includes(each.address) || each.address === url }));
  });
  const name = 'cold load of /';
  if (sent === null) return [{ name, measured: 'no browser', budget: `${budgetKb.all} kB`, within: null }];
  const kilobytes = (which: readonly Sent[]): number => which.reduce((sum, { size }) => sum + size, 0) / 1000;
  const against = (what: string, all: readonly Sent[], budget: number): Figure => {
    const first = kilobytes(all.filter(({ atFirst }) => atFirst));
    return {
      name: `${name} to first result, ${what}`,
      measured: `${first.toFixed(1)} kB (${kilobytes(all).toFixed(1)} kB in the end)`,
      budget: `≤ ${budget} kB`,
      within: first <= budget,
    };
  };
  const early = sent.filter(({ writesPdf }) => writesPdf).length;
  const scripts = sent.filter(({ isScript }) => isScript);
  return [
    against('scripts', scripts, budgetKb.scripts),
    against('all', sent, budgetKb.all),
    { name: `${name}, PDF writer`, measured: `${early} files`, budget: 'none', within: early === 0 },
  ];
}

interface Noted {
  fetchedAtFirst: readonly string[];
}

/** Runs in the page, before its own scripts: what had been asked for when the first result came to be painted. */
function noteFirstResult(): void {
  const look = (): void => {
    const sheet = document.querySelector('ferrule-sheet')?.shadowRoot;
    const option = sheet?.querySelector('options-part')?.shadowRoot?.querySelector('input[type=radio]');
    if (!option) requestAnimationFrame(look);
    else {
      const asked = performance.getEntriesByType('resource').map(({ name }) => name);
      (globalThis as unknown as Noted).fetchedAtFirst = asked;
    }
  };
  requestAnimationFrame(look);
}

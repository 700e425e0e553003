import { brotliCompressSync } from 'node:zlib';
import type { Figure } from './figure.ts';
import { withPage } from './with-page.ts';

const budgetKb = { scripts: 60, all: 130 };

interface Sent {
  readonly isScript: boolean;
  readonly writesPdf: boolean;
  /** As a host that compresses would send it, B; what is compressed already stays as it is. */
  readonly size: number;
}

/**
 * What the first visit to `/` fetches up to its first result and until it asks for nothing more, each file as brotli
 * sends it.
 */
export async function benchLoad(): Promise<readonly Figure[]> {
  const sent = await withPage(async (page, url) => {
    const answers: Promise<Sent>[] = [];
    page.on('response', (response) => {
      answers.push(
        response.body().then((body) => ({
          isScript: (response.headers()['content-type'] ?? '').startsWith('text/javascript'),
          writesPdf: body.includes('%PDF-'),
          size: Math.min(body.length, brotliCompressSync(body).length),
        })),
      );
    });
    await page.goto(url, { waitUntil: 'networkidle' });
    await page.locator('options-part input[type=radio]').first().waitFor();
    return Promise.all(answers);
  });
  const name = 'cold load of /';
  if (sent === null) return [{ name, measured: 'no browser', budget: `${budgetKb.all} kB`, within: null }];
  const kilobytes = (which: readonly Sent[]): number => which.reduce((sum, { size }) => sum + size, 0) / 1000;
  const against = (what: string, which: readonly Sent[], budget: number): Figure => ({
    name: `${name}, ${what}`,
    measured: `${kilobytes(which).toFixed(1)} kB in ${which.length} files`,
    budget: `≤ ${budget} kB`,
    within: kilobytes(which) <= budget,
  });
  const early = sent.filter(({ writesPdf }) => writesPdf).length;
  return [
    against(
      'scripts, compressed',
      sent.filter(({ isScript }) => isScript),
      budgetKb.scripts,
    ),
    against('all, compressed', sent, budgetKb.all),
    { name: `${name}, PDF writer`, measured: `${early} files`, budget: 'none', within: early === 0 },
  ];
}

import { Worker } from 'node:worker_threads';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { hostileFiles } from './files.ts';
import type { Refusal } from './refuse.ts';

/** Problems told of one file: where more are wrong, they are counted. */
const mostLines = 31;

/** One thread for all of them; it dies where a file makes it take more than 200 MB. */
let worker: Worker;
beforeAll(() => {
  worker = new Worker(new URL('refuse.ts', import.meta.url), { resourceLimits: { maxOldGenerationSizeMb: 200 } });
});
afterAll(() => worker.terminate());

const refusalOf = (index: number): Promise<Refusal> =>
  new Promise((resolve, reject) => {
    worker.once('error', reject);
    worker.once('message', (refusal: Refusal) => {
      worker.off('error', reject);
      resolve(refusal);
    });
    worker.postMessage(index);
  });

describe('a hostile file is refused, a line a problem, in a second and 200 MB', () => {
  it.each(hostileFiles.map(({ what, name }, index) => [name, what, index] as const))('%s: %s', async (_, __, index) => {
    const { lines, thrown, milliseconds, polluted } = await refusalOf(index);
    expect([thrown, polluted]).toEqual(['', false]);
    expect(lines).not.toBeNull();
    expect(lines!.length).toBeGreaterThan(0);
    expect(lines!.length).toBeLessThanOrEqual(mostLines);
    for (const line of lines!) {
      expect(line).toMatch(/^[^\p{Cc}\p{Cs}\p{Zl}\p{Zp}]+$/u);
      expect(line).toMatch(/^.+: .+; .+$/u);
      expect(line.length).toBeLessThanOrEqual(450);
    }
    expect(milliseconds).toBeLessThan(1000);
  });
});

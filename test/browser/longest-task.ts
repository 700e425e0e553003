import type { Page } from 'playwright-core';

/** Of a trace in Chromium's format; times in µs. */
interface TraceEvent {
  readonly name: string;
  readonly ph: string;
  readonly pid: number;
  readonly tid: number;
  /** What the thread itself spent; the rest it waited for a processor. */
  readonly tdur?: number;
  readonly args: { readonly name?: string };
}

/**
 * The longest task of the page's main thread while something is done, ms. It is the thread's own time: other work of
 * the machine doesn't count.
 */
export async function longestTask(page: Page, work: () => Promise<void>): Promise<number> {
  const browser = page.context().browser()!;
  await browser.startTracing(page, { categories: ['devtools.timeline', 'disabled-by-default-devtools.timeline'] });
  await work();
  const { traceEvents } = JSON.parse((await browser.stopTracing()).toString()) as { traceEvents: TraceEvent[] };
  const main = traceEvents.find(({ name, args }) => name === 'thread_name' && args.name === 'CrRendererMain');
  const tasks = traceEvents.filter(
    ({ name, ph, pid, tid }) => name === 'RunTask' && ph === 'X' && pid === main?.pid && tid === main.tid,
  );
  return Math.max(0, ...tasks.map(({ tdur = 0 }) => tdur)) / 1000;
}

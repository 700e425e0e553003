import type { Browser, Page } from 'playwright-core';
import type { Figure } from './figure.ts';
import { median } from './timing.ts';
import { withPage } from './with-page.ts';

const budgetMs = 16;
const slowDown = 4;
const keystrokes = 20;

const sheets = [
  { path: '', name: 'complex terminations' },
  { path: 'resistive/', name: 'resistive pair' },
  { path: 'sections/', name: 'several sections' },
];

/** Main-thread time from a key pressed in a field to the frame that shows every option anew, at a quarter of the speed. */
export async function benchKeystroke(): Promise<readonly Figure[]> {
  const times = await withPage(async (page, url, browser) => {
    const session = await page.context().newCDPSession(page);
    const perSheet: number[][] = [];
    for (const { path } of sheets) {
      await session.send('Emulation.setCPUThrottlingRate', { rate: 1 });
      await page.goto(url + path, { waitUntil: 'networkidle' });
      await session.send('Emulation.setCPUThrottlingRate', { rate: slowDown });
      perSheet.push(await timesOfKeystrokes(page, browser));
    }
    return perSheet;
  });
  return sheets.map(({ name }, k) => {
    const title = `keystroke to options, ${name}`;
    const budget = `< ${budgetMs} ms`;
    if (times === null) return { name: title, measured: 'no browser', budget, within: null };
    const time = median(times[k]!);
    return {
      name: title,
      measured: `${time.toFixed(1)} ms at ${slowDown}x slow-down`,
      budget,
      within: time < budgetMs,
    };
  });
}

/** Types a digit at the end of the load and takes it away again, over and over; both are loads that can be computed. */
async function timesOfKeystrokes(page: Page, browser: Browser): Promise<number[]> {
  const field = page.getByLabel(/^Load (impedance|resistance)/).first();
  await field.focus();
  await page.keyboard.press('End');
  const type = async (count: number) => {
    for (let k = 0; k < count; k += 1) {
      await page.keyboard.press(k % 2 === 0 ? '5' : 'Backspace');
      await page.waitForTimeout(300);
    }
  };
  await type(10);
  await browser.startTracing(page, { categories: ['devtools.timeline', 'disabled-by-default-devtools.timeline'] });
  await type(keystrokes);
  const { traceEvents } = JSON.parse((await browser.stopTracing()).toString()) as { traceEvents: TraceEvent[] };
  return timesInTrace(traceEvents);
}

/** Of a trace in Chromium's format; times in µs. */
interface TraceEvent {
  readonly name: string;
  readonly ph: string;
  readonly pid: number;
  readonly tid: number;
  readonly ts: number;
  readonly dur?: number;
  /** Of `dur`, what the thread itself spent; the rest it waited for a processor. */
  readonly tdur?: number;
  readonly args: { readonly name?: string; readonly data?: { readonly type?: string } };
}

/** For each input event the time of its task and of those up to the next paint, ms. */
function timesInTrace(events: readonly TraceEvent[]): number[] {
  const main = events.find(({ name, args }) => name === 'thread_name' && args.name === 'CrRendererMain');
  const onMain = events
    .filter(({ pid, tid, ph }) => ph === 'X' && pid === main?.pid && tid === main.tid)
    .sort((a, b) => a.ts - b.ts);
  const tasks = onMain.filter(({ name }) => name === 'RunTask');
  const inputs = onMain.filter(({ name, args }) => name === 'EventDispatch' && args.data?.type === 'input');
  return inputs.map((input) => {
    const paint = onMain.find(({ name, ts }) => name === 'Paint' && ts > input.ts);
    const until = paint?.ts ?? Infinity;
    return (
      tasks.filter(({ ts, dur = 0 }) => ts + dur > input.ts && ts <= until).reduce((sum, { dur = 0 }) => sum + dur, 0) /
      1000
    );
  });
}

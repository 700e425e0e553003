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

/**
 * Main-thread time from a key pressed in a field to the frame that shows every option anew, on a processor of a quarter of
 * the speed. It is the thread's own time, times four: a slow-down emulated by the browser would stretch what other programs
 * take meanwhile too.
 */
export async function benchKeystroke(): Promise<readonly Figure[]> {
  const times = await withPage(async (page, url, browser) => {
    const perSheet: Keystroke[][] = [];
    for (const { path } of sheets) {
      await page.goto(url + path, { waitUntil: 'networkidle' });
      perSheet.push(await timesOfKeystrokes(page, browser));
    }
    return perSheet;
  });
  return sheets.map(({ name }, k) => {
    const title = `keystroke to options, ${name}`;
    const budget = `< ${budgetMs} ms`;
    if (times === null) return { name: title, measured: 'no browser', budget, within: null };
    const all = slowDown * median(times[k]!.map((time) => time.all));
    const script = slowDown * median(times[k]!.map((time) => time.script));
    return {
      name: title,
      measured: `${all.toFixed(1)} ms, ${script.toFixed(1)} of it script`,
      budget,
      within: all < budgetMs,
    };
  });
}

/** Time of the main thread, ms. */
interface Keystroke {
  /** Handling the input: computing, and bringing the page's elements up to date. */
  readonly script: number;
  /** With layout and paint. */
  readonly all: number;
}

/** Types a digit at the end of the load and takes it away again, over and over; both are loads that can be computed. */
async function timesOfKeystrokes(page: Page, browser: Browser): Promise<Keystroke[]> {
  const field = page.getByLabel(/^Load (impedance|resistance)/).first();
  await field.focus();
  await page.keyboard.press('End');
  const type = async (count: number) => {
    for (let k = 0; k < count; k += 1) {
      await page.keyboard.press(k % 2 === 0 ? '5' : 'Backspace');
      await page.waitForTimeout(200);
    }
  };
  // As warm as a sheet in use.
  await type(40);
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
  /** Of `dur`, what the thread itself spent; the rest of it the thread waited for a processor. */
  readonly tdur?: number;
  readonly args: { readonly name?: string; readonly data?: { readonly type?: string } };
}

/** For each input event its own time, and that of its task and those up to the next paint. */
function timesInTrace(events: readonly TraceEvent[]): Keystroke[] {
  const main = events.find(({ name, args }) => name === 'thread_name' && args.name === 'CrRendererMain');
  const onMain = events
    .filter(({ pid, tid, ph }) => ph === 'X' && pid === main?.pid && tid === main.tid)
    .sort((a, b) => a.ts - b.ts);
  const tasks = onMain.filter(({ name }) => name === 'RunTask');
  const inputs = onMain.filter(({ name, args }) => name === 'EventDispatch' && args.data?.type === 'input');
  return inputs.map((input) => {
    const until = onMain.find(({ name, ts }) => name === 'Paint' && ts > input.ts)?.ts ?? Infinity;
    const its = tasks.filter(({ ts, dur = 0 }) => ts + dur > input.ts && ts <= until);
    return { script: (input.tdur ?? 0) / 1000, all: its.reduce((sum, { tdur = 0 }) => sum + tdur, 0) / 1000 };
  });
}

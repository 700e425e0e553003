import { designSteps } from '../design.ts';
import type { Dossier } from '../dossier.ts';
import { InputError } from '../quantity/problem.ts';
import { readFile } from '../recheck/read-file.ts';
import { recheck } from '../recheck/recheck.ts';
import type { DesignRecord } from '../record/design-record.ts';
import type { FromRecheck, ToRecheck } from './recheck-messages.ts';

/** One file rechecked off the main thread, with progress. Whoever wants no more of it ends the worker. */

/** Least time between two words of progress, ms. */
const pause = 100;

const say = (message: FromRecheck): void => {
  postMessage(message);
};

function computed(record: DesignRecord): Dossier {
  const steps = designSteps(record, { stopped: false });
  let said = 0;
  for (;;) {
    const step = steps.next();
    if (step.done === true) return step.value;
    if (performance.now() - said < pause) continue;
    said = performance.now();
    if (step.value.kind === 'fit') say({ kind: 'progress', doing: 'search', done: step.value.step.done });
    if (step.value.kind === 'option') say({ kind: 'progress', doing: 'parts', done: step.value.done / step.value.of });
  }
}

async function fontAt(address: string): Promise<Uint8Array> {
  const answer = await fetch(address);
  if (answer.ok) return new Uint8Array(await answer.arrayBuffer());
  throw new InputError({
    field: 'typeface',
    read: '',
    why: `it can't be fetched (${answer.status})`,
    would: 'connect once and try again',
  });
}

async function work({ name, bytes, fonts }: ToRecheck): Promise<void> {
  try {
    const found = await readFile(name, bytes);
    const dossier = computed(found.record);
    say({ kind: 'progress', doing: 'report', done: 0 });
    const [regular, bold] = await Promise.all([fontAt(fonts.regular), fontAt(fonts.bold)]);
    say({ kind: 'done', recheck: await recheck(found, dossier, { regular, bold }) });
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    say({ kind: 'refused', problems: error.problems });
  }
}

addEventListener('message', ({ data }: MessageEvent<ToRecheck>) => void work(data));

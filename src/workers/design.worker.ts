import { dossierSteps } from '../design/pipeline.ts';
import { reviewMethods } from '../design.ts';
import type { FitControl } from '../design/fitted.ts';
import { groundsOf } from '../design/grounds.ts';
import { realSteps } from '../design/real-parts.ts';
import { builtEvidence } from '../evidence/built-evidence.ts';
import { InputError } from '../quantity/problem.ts';
import { equalRipple } from '../synthesis/equal-ripple.ts';
import type { FromWorker, ToWorker } from './messages.ts';
import { rememberedSearch } from './remembered-search.ts';

/**
 * The pipeline off the main thread: one record at a time, with progress. A stop keeps the best so far; a new record
 * takes the place of the one at work.
 */

/** How long it works before it looks for messages, ms: a stop is felt as immediate. */
const slice = 40;

let current: { readonly id: number; readonly control: FitControl } | null = null;

const say = (message: FromWorker): void => {
  postMessage(message);
};

/** Lets waiting messages in. */
const breathe = (): Promise<void> =>
  new Promise((done) => {
    setTimeout(done, 0);
  });

async function work({ id, record }: Extract<ToWorker, { kind: 'design' }>): Promise<void> {
  const control: FitControl = { stopped: false };
  current = { id, control };
  const steps = dossierSteps(record, {
    equalRipple,
    grounds: groundsOf,
    search: rememberedSearch(record, control),
    real: { steps: realSteps, evidence: builtEvidence, control },
    review: reviewMethods(control),
  });
  try {
    let since = performance.now();
    for (;;) {
      const step = steps.next();
      if (step.done === true) {
        say({ kind: 'done', id, dossier: step.value });
        return;
      }
      const found = step.value;
      if (found.kind === 'dossier') say({ kind: 'exact', id, dossier: found.dossier });
      if (found.kind === 'option') say({ ...found, id });
      if (performance.now() - since < slice) continue;
      if (found.kind === 'fit') say({ kind: 'progress', id, step: found.step });
      await breathe();
      if (current.id !== id) return;
      since = performance.now();
    }
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    say({ kind: 'refused', id, problems: error.problems });
  }
}

addEventListener('message', ({ data }: MessageEvent<ToWorker>) => {
  if (data.kind === 'design') void work(data);
  else if (current?.id === data.id) current.control.stopped = true;
});

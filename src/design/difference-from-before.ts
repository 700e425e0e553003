import type { Change, Dossier } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { recordDifference } from '../record/difference.ts';
import { dossierDifference } from './dossier-difference.ts';
import type { DesignStep } from './real-parts.ts';

/** What a dossier has otherwise than the revision before it, which is worked out anew; null where there is none. */
export function* differenceFromBefore(
  dossier: Dossier,
  steps: (before: DesignRecord) => Generator<DesignStep, Dossier>,
): Generator<DesignStep, readonly Change[] | null> {
  const { record } = dossier;
  if (record.previous === null) return null;
  const before = record.previous;
  // That the earlier one is now in the history, and carried along, is what a revision is.
  const same = { ...before, history: record.history, previous: record.previous };
  const work = steps(before);
  for (;;) {
    const step = work.next();
    if (step.done === true) {
      return [...recordDifference(same, record), ...dossierDifference(step.value, dossier)];
    }
    // What is found on the way is of the earlier revision: nothing to show.
    yield { kind: 'work' };
  }
}

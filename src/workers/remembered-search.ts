import type { Search } from '../design/pipeline.ts';
import { fittedNetworks, type FitControl } from '../design/fitted.ts';
import type { FoundCandidate } from '../design/method.ts';
import type { DesignRecord } from '../record/design-record.ts';

/** Searches kept: enough to go back and forth between a few entries. */
const most = 8;
const known = new Map<string, readonly FoundCandidate[]>();

/** All that the search of fitted networks depends on, as one text. */
function keyOf({ source, loads, aim, method, q, fit, requirement }: DesignRecord, steps: number | null): string {
  const { frequencyHz, bandHz, blockDc, keepDc, inductorH, capacitorF } = requirement;
  const sought = [frequencyHz, bandHz, blockDc, keepDc, inductorH, capacitorF];
  return JSON.stringify([source, loads, aim, method, q, { ...fit, steps }, sought]);
}

/**
 * The search of a record, or what the same search found before: a title, a choice or a requirement typed anew doesn't
 * touch it. A stopped one is kept as that of so many steps.
 */
export const rememberedSearch = (record: DesignRecord, control: FitControl): Search =>
  function* (starts) {
    const before = known.get(keyOf(record, record.fit.steps));
    if (before !== undefined) return before;
    const search = fittedNetworks(record, starts, control);
    let steps = 0;
    for (;;) {
      const step = search.next();
      if (step.done === true) {
        known.set(keyOf(record, control.stopped ? steps : record.fit.steps), step.value);
        const [oldest] = known.keys();
        if (known.size > most && oldest !== undefined) known.delete(oldest);
        return step.value;
      }
      steps = step.value.steps;
      yield step.value;
    }
  };

import { returnLossDb } from '../network/figures-of-merit.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { fit } from '../synthesis/fit/fit.ts';
import type { Fitted } from '../synthesis/fit/problem.ts';
import { titleOf } from '../synthesis/title.ts';
import type { FoundCandidate } from './method.ts';
import { exp } from '../quantity/elementary.ts';

/** What a caller may show while networks are fitted. */
export interface FitStep {
  /** 0 to 1, of all sizes. */
  readonly done: number;
  /** Pieces of work so far; a record that holds this number as `fit.steps` stops at the same place. */
  readonly steps: number;
  readonly elements: number;
  /** Best worst return loss of the size at work, dB; null before there is one. */
  readonly bestDb: number | null;
}

/** Whether the engineer has stopped the search; read between pieces of work. */
export interface FitControl {
  stopped: boolean;
}

const everySize = [2, 3, 4, 5, 6, 7, 8] as const;
/** Shapes, and so work, double with every element. */
const share = (elements: number): number => 2 ** elements;

/**
 * Fitted networks of the record's sizes, best first within a size. A stop, or the record's `fit.steps`, keeps the best of
 * each size so far.
 *
 * @param starts closed-form networks to start from
 */
export function* fittedNetworks(
  record: DesignRecord,
  starts: readonly FoundCandidate[],
  control: FitControl,
): Generator<FitStep, readonly FoundCandidate[]> {
  const { fit: asked, requirement } = record;
  const { bandHz } = requirement;
  if (bandHz === null) return [];
  const sizes: readonly number[] = asked.elements === 'auto' ? everySize : [asked.elements];
  const whole = sizes.reduce((sum, size) => sum + share(size), 0);
  const found: FoundCandidate[] = [];
  let before = 0;
  let steps = 0;
  for (const elements of sizes) {
    const search = fit({
      source: record.source,
      loads: record.loads.map(({ termination }) => termination),
      f0: requirement.frequencyHz,
      bandHz,
      aim: record.aim,
      elements,
      rule: {
        form: asked.form,
        shuntInductor: asked.shuntInductor,
        blockDc: requirement.blockDc,
        keepDc: requirement.keepDc,
      },
      inductorH: requirement.inductorH,
      capacitorF: requirement.capacitorF,
      seed: asked.seed,
      starts: [...starts, ...found].map(({ arms }) => arms),
    });
    let best: Fitted | null = null;
    let results: readonly Fitted[] = [];
    for (;;) {
      const step = search.next();
      if (step.done === true) {
        results = step.value;
        break;
      }
      best = step.value.best;
      steps += 1;
      const bestDb = best === null ? null : returnLossDb(exp(best.level));
      yield { done: (before + step.value.done * share(elements)) / whole, steps, elements, bestDb };
      if (control.stopped || steps === asked.steps) {
        results = best === null ? [] : [best];
        break;
      }
    }
    // Of one size asked for alone three shapes are of interest; of every size, the best.
    const wanted = asked.elements === 'auto' ? 1 : results.length;
    results.slice(0, wanted).forEach(({ arms }, k) => {
      found.push({
        id: `fitted-${String(elements)}-${String(k + 1)}`,
        title: `Fitted, ${String(elements)} elements: ${lowerFirst(titleOf(arms))}`,
        arms,
        sections: 0,
        sectionQ: 0,
        method: 'fitted',
      });
    });
    if (control.stopped || steps === asked.steps) break;
    before += share(elements);
  }
  return found;
}

const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);

import type { Dossier, Option } from '../dossier.ts';
import type { Span } from '../quantity/span.ts';
import type { Build, DesignRecord } from '../record/design-record.ts';
import { builtSteps, type Shown } from './built.ts';
import { realStates } from './real-worst.ts';
import { choose } from './choose.ts';
import type { FitControl, FitStep } from './fitted.ts';
import { withBuilt } from './judge-built.ts';
import { responseOf } from './response.ts';
import { statesOf } from './states-of.ts';

/** What a caller may show on the way: how far a search is, and each network as it is worked out with real parts. */
export type DesignStep =
  | { readonly kind: 'fit'; readonly step: FitStep }
  | { readonly kind: 'dossier'; readonly dossier: Dossier }
  | { readonly kind: 'option'; readonly option: Option; readonly done: number; readonly of: number }
  | { readonly kind: 'work' };

/**
 * Every option with real parts, the one that the sheet shows first; of the chosen one, its spread over frequency too. A
 * stop leaves the others as they are.
 */
export function* realSteps(
  record: DesignRecord,
  build: Build,
  exact: Dossier,
  reach: Span | null,
  control: FitControl,
): Generator<DesignStep, readonly Option[]> {
  const byId = new Map(exact.options.map((option) => [option.id, option]));
  const first = ({ id }: Option): number => (id === exact.chosen ? 0 : 1);
  const states = realStates(record);
  const shownOf = (option: Option): Shown => {
    const governing = statesOf(record, option);
    const { frequencyHz } = responseOf(record, governing[0]!, option, reach);
    return { states: governing, frequencyHz: Float64Array.from(frequencyHz) };
  };
  const order = exact.options.toSorted((a, b) => first(a) - first(b));
  for (const [k, option] of order.entries()) {
    if (control.stopped) break;
    const judged = withBuilt(
      record,
      option,
      yield* working(builtSteps(record, build, option, states, option.id === exact.chosen ? shownOf(option) : null)),
    );
    byId.set(option.id, judged);
    yield { kind: 'option', option: judged, done: k + 1, of: order.length };
  }
  const options = exact.options.map(({ id }) => byId.get(id)!);
  const { chosen } = choose(record, options);
  // As a rule it was the first; where real parts gave it away to another, that one's spread is still to come.
  if (chosen?.built?.percentiles !== null || control.stopped) return options;
  const built = yield* working(builtSteps(record, build, chosen, states, shownOf(chosen)));
  return options.map((option) => (option.id === chosen.id ? { ...option, built } : option));
}

function* working<T>(steps: Generator<void, T>): Generator<DesignStep, T> {
  for (;;) {
    const step = steps.next();
    if (step.done === true) return step.value;
    yield { kind: 'work' };
  }
}

import type { Change, Dossier, Option } from '../dossier.ts';
import type { asBuiltOf } from './as-built.ts';
import { ceilingOf } from './ceiling.ts';
import type { Grounds } from './grounds.ts';
import type { FitControl, FitStep } from './fitted.ts';
import { choose, heldDb } from './choose.ts';
import { closedForms, type FoundCandidate } from './method.ts';
import { minimumWords } from './minimum.ts';
import { assess, assessor } from './option.ts';
import { checkReach, reachOf } from './reach.ts';
import type { DesignStep, realSteps } from './real-parts.ts';
import { responseOf } from './response.ts';
import { statesOf } from './states-of.ts';
import { sectionTable } from './section-table.ts';
import type { builtEvidence } from '../evidence/built-evidence.ts';
import { terminationAt } from '../network/termination-at.ts';
import { digestOf } from '../record/canonical.ts';
import type { Build, DesignRecord } from '../record/design-record.ts';
import type { equalRipple } from '../synthesis/equal-ripple.ts';
import { leastQ } from '../synthesis/pi-tee.ts';
import { targetOf } from '../synthesis/target.ts';
import { version } from '../version.ts';

/**
 * The same for a record that doesn't take long, as exact values have it; whoever calls only this needs none of the
 * methods that do.
 *
 * @param grounds null: assumptions, evidence, cautions and references are still to come
 * @throws RangeError for one that does
 */
export function designAtOnce(record: DesignRecord, grounds: Grounds | null): Dossier {
  if (takesLong(record)) throw new RangeError(`designAtOnce: ${record.method} takes long; use designSteps`);
  return finish(dossierSteps(record, { ...none, grounds }));
}

/** Runs the pipeline to its end. */
export function finish(steps: Generator<DesignStep, Dossier>): Dossier {
  for (;;) {
    const step = steps.next();
    if (step.done === true) return step.value;
  }
}

const isSearched = ({ method }: DesignRecord): boolean => method === 'fitted' || method === 'all';

/** Whether exact values take more than a keystroke allows, up to seconds: such a record belongs in a worker. */
export const takesLong = (record: DesignRecord): boolean => isSearched(record) || record.method === 'equal-ripple';

/** Whether there is more to it than `designAtOnce` gives: real parts, a finished board, a revision before. */
export const hasMore = ({ build, asBuilt, previous }: DesignRecord): boolean =>
  build !== null || asBuilt !== null || previous !== null;

/** Finds fitted networks, from closed forms to start with. */
export type Search = (starts: readonly FoundCandidate[]) => Generator<FitStep, readonly FoundCandidate[]>;

/** The methods that take long. */
export interface LongMethods {
  readonly equalRipple: typeof equalRipple;
  readonly search: Search;
  /** What a dossier rests on; null: still to come. */
  readonly grounds: Grounds | null;
  /** Real parts; null: exact values alone. */
  readonly real: RealMethods | null;
  /** What a later revision is held against; null: nothing. */
  readonly review: ReviewMethods | null;
}

export interface ReviewMethods {
  readonly asBuilt: typeof asBuiltOf;
  readonly difference: (dossier: Dossier) => Generator<DesignStep, readonly Change[] | null>;
}

export interface RealMethods {
  readonly steps: typeof realSteps;
  readonly evidence: typeof builtEvidence;
  readonly control: FitControl;
}

const noGrounds: ReturnType<Grounds> = { assumptions: [], evidence: null, cautions: [], references: [] };

const none: LongMethods = {
  grounds: null,
  equalRipple: () => ({ candidates: [], absent: [] }),
  *search() {
    return [];
  },
  real: null,
  review: null,
};

/** The pipeline with a search of the caller's: one that remembers, where only what doesn't touch it has changed. */
export function* dossierSteps(record: DesignRecord, methods: LongMethods): Generator<DesignStep, Dossier> {
  const f0 = record.requirement.frequencyHz;
  const reach = reachOf(record);
  checkReach(record, reach);
  const load = terminationAt(record.loads[0]!.termination, f0, f0);
  const target = targetOf(terminationAt(record.source, f0, f0), record.aim);
  const { candidates, absent } = closedForms(record, target, load, methods.equalRipple);
  const fitted = isSearched(record) ? yield* fitSteps(methods.search(candidates)) : [];
  const { ceiling, noCeiling } = ceilingOf(record);
  const judge = assessor(record, reach, ceiling);
  const found = [...candidates, ...fitted];
  const assessed = found.map((candidate) => assess(judge, candidate));
  const kinds = (['pi', 'tee'] as const).filter((kind) => record.method === kind || record.method === 'all');
  const least = kinds.map((kind) => ({
    kind: kind === 'pi' ? ('Pi' as const) : ('T' as const),
    q: leastQ(kind, target, load),
  }));
  const isLast = record.build === null || methods.real === null;
  const whole = (options: readonly Option[], last: boolean): Dossier => {
    const { proposed, chosen, chosenBy } = choose(record, options);
    const states = chosen === undefined ? [] : statesOf(record, chosen);
    const { assumptions, evidence, cautions, references } =
      methods.grounds === null
        ? noGrounds
        : methods.grounds({ record, chosen, states, ceiling, least, real: methods.real });
    return {
      schema: 'ferrule-dossier/1',
      version,
      record,
      digest: digestOf(record),
      assumptions,
      ceiling,
      noCeiling,
      options,
      absent: absent.map(({ form, why }) => ({ form, why })),
      minimum: minimumWords(record, options),
      sections:
        record.method === 'cascade' || record.method === 'equal-ripple' ? sectionTable(record, found, assessed) : null,
      proposed: proposed?.id ?? null,
      chosen: chosen?.id ?? null,
      chosenBy,
      responses: chosen === undefined ? [] : states.map((state) => responseOf(record, state, chosen, reach)),
      evidence,
      asBuilt: last && methods.review !== null ? methods.review.asBuilt(record, chosen, reach) : null,
      difference: null,
      cautions,
      references,
    };
  };
  const exact = whole(listed(record, assessed), isLast);
  const { build } = record;
  const worked = build === null || methods.real === null ? exact : yield* withRealParts(build, methods.real);
  if (record.previous === null || methods.review === null) return worked;
  return { ...worked, difference: yield* methods.review.difference(worked) };

  function* withRealParts(policy: Build, real: RealMethods): Generator<DesignStep, Dossier> {
    yield { kind: 'dossier', dossier: exact };
    return whole(yield* real.steps(record, policy, exact, reach, real.control), true);
  }
}

function* fitSteps(search: ReturnType<Search>): Generator<DesignStep, readonly FoundCandidate[]> {
  for (;;) {
    const step = search.next();
    if (step.done === true) return step.value;
    yield { kind: 'fit', step: step.value };
  }
}

/** The networks that the list shows, in its order: of all methods together, those of fewest parts come first. */
function listed({ method, sections }: DesignRecord, assessed: readonly Option[]): readonly Option[] {
  const asked = assessed.filter(
    (option) =>
      sections === 'auto' ||
      option.sections === sections ||
      option.sections === 0 ||
      (option.method !== 'cascade' && option.method !== 'equal-ripple'),
  );
  if (method !== 'all') return asked;
  const byReturnLoss = (a: Option, b: Option): number => heldDb(b) - heldDb(a);
  return asked.toSorted((a, b) => a.arms.length - b.arms.length || byReturnLoss(a, b));
}

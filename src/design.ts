import type { Change, Dossier, Evidence, Option } from './dossier.ts';
import { asBuiltOf } from './design/as-built.ts';
import { assumptionsOf } from './design/assumptions.ts';
import { cautionsOf } from './design/cautions.ts';
import { ceilingOf } from './design/ceiling.ts';
import { differenceFromBefore } from './design/difference-from-before.ts';
import { fittedNetworks, type FitControl, type FitStep } from './design/fitted.ts';
import { choose, heldDb } from './design/choose.ts';
import { closedForms, type FoundCandidate } from './design/method.ts';
import { minimumWords } from './design/minimum.ts';
import { assess, assessor } from './design/option.ts';
import { checkReach, reachOf } from './design/reach.ts';
import { referencesOf } from './design/references.ts';
import { realSteps, type DesignStep } from './design/real-parts.ts';
import { responseOf } from './design/response.ts';
import { statesOf } from './design/states-of.ts';
import { sectionTable } from './design/section-table.ts';
import { evidence } from './evidence/evidence.ts';
import { builtEvidence } from './evidence/built-evidence.ts';
import { endsOver } from './network/sweep.ts';
import { terminationAt } from './network/termination-at.ts';
import { digestOf } from './record/canonical.ts';
import type { Build, DesignRecord, LoadState } from './record/design-record.ts';
import { equalRipple } from './synthesis/equal-ripple.ts';
import { leastQ } from './synthesis/pi-tee.ts';
import { targetOf } from './synthesis/target.ts';
import { version } from './version.ts';

/**
 * The one pipeline, used by page, worker and command line alike: a checked record in, everything computed from it out.
 *
 * @throws InputError when a termination's data don't reach, or the record's selection names a network that isn't there
 */
export function design(record: DesignRecord): Dossier {
  return finish(designSteps(record, { stopped: false }));
}

/**
 * The same for a record that doesn't take long, as exact values have it; whoever calls only this needs none of the
 * methods that do.
 *
 * @throws RangeError for one that does
 */
export function designAtOnce(record: DesignRecord): Dossier {
  if (takesLong(record)) throw new RangeError(`designAtOnce: ${record.method} takes long; use designSteps`);
  return finish(dossierSteps(record, none));
}

function finish(steps: Generator<DesignStep, Dossier>): Dossier {
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

export type { DesignStep } from './design/real-parts.ts';

/** The pipeline in pieces, for a caller that shows progress or stops it: what it has then is kept. */
export function designSteps(record: DesignRecord, control: FitControl): Generator<DesignStep, Dossier> {
  return dossierSteps(record, {
    equalRipple,
    search: (starts) => fittedNetworks(record, starts, control),
    real: { steps: realSteps, evidence: builtEvidence, control },
    review: reviewMethods(control),
  });
}

/** Finds fitted networks, from closed forms to start with. */
export type Search = (starts: readonly FoundCandidate[]) => Generator<FitStep, readonly FoundCandidate[]>;

/** The methods that take long. */
export interface LongMethods {
  readonly equalRipple: typeof equalRipple;
  readonly search: Search;
  /** Real parts; null: exact values alone. */
  readonly real: RealMethods | null;
  /** What a later revision is held against; null: nothing. */
  readonly review: ReviewMethods | null;
}

export const reviewMethods = (control: FitControl): ReviewMethods => ({
  asBuilt: asBuiltOf,
  difference: (dossier) => differenceFromBefore(dossier, (before) => designSteps(before, control)),
});

export interface ReviewMethods {
  readonly asBuilt: typeof asBuiltOf;
  readonly difference: (dossier: Dossier) => Generator<DesignStep, readonly Change[] | null>;
}

export interface RealMethods {
  readonly steps: typeof realSteps;
  readonly evidence: typeof builtEvidence;
  readonly control: FitControl;
}

const none: LongMethods = {
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
    const checked = chosen === undefined ? null : evidenceOf(record, chosen, states, methods.real);
    return {
      schema: 'ferrule-dossier/1',
      version,
      record,
      digest: digestOf(record),
      assumptions: assumptionsOf(record, least),
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
      evidence: checked,
      asBuilt: last && methods.review !== null ? methods.review.asBuilt(record, chosen, reach) : null,
      difference: null,
      cautions: cautionsOf(record, chosen),
      references: referencesOf(record, {
        ceiling: ceiling !== null,
        pairChecked: checked?.routes.some(({ name }) => name === 'Q method') ?? false,
        real: (chosen?.built ?? null) !== null,
      }),
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

function evidenceOf(
  { source, requirement }: DesignRecord,
  { arms, sections, method, built }: Option,
  states: readonly LoadState[],
  real: RealMethods | null,
): Evidence {
  const { frequencyHz: f0, bandHz, powerW } = requirement;
  const frequencies = [...new Set(bandHz === null ? [f0] : [f0, bandHz.low, bandHz.high])];
  const exact = evidence(
    states.map(({ termination }) => ({ arms, source, load: termination, f0 })),
    frequencies,
    sections <= 1 && method !== 'fitted' && method !== 'equal-ripple',
  );
  if (built === null || real === null) return exact;
  const grid = Float64Array.from(frequencies);
  const ends = states.map(({ termination }) => endsOver(source, termination, f0, grid));
  const checks = [...exact.checks, ...real.evidence(built.ladder, ends, f0, powerW ?? 1)];
  return { ...exact, checks, pass: checks.every(({ pass }) => pass) };
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

import type { Dossier, Option } from './dossier.ts';
import { assumptionsOf } from './design/assumptions.ts';
import { cautionsOf } from './design/cautions.ts';
import { ceilingOf } from './design/ceiling.ts';
import { fittedNetworks, type FitControl, type FitStep } from './design/fitted.ts';
import { closedForms, type FoundCandidate } from './design/method.ts';
import { minimumWords } from './design/minimum.ts';
import { assess, assessor } from './design/option.ts';
import { checkReach, reachOf } from './design/reach.ts';
import { referencesOf } from './design/references.ts';
import { responseOf } from './design/response.ts';
import { sectionTable } from './design/section-table.ts';
import { evidence } from './evidence/evidence.ts';
import { terminationAt } from './network/termination-at.ts';
import { InputError } from './quantity/problem.ts';
import { digestOf } from './record/canonical.ts';
import type { DesignRecord } from './record/design-record.ts';
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
 * The same for a record that doesn't take long; whoever calls only this needs none of the methods that do.
 *
 * @throws RangeError for one that does
 */
export function designAtOnce(record: DesignRecord): Dossier {
  if (takesLong(record)) throw new RangeError(`designAtOnce: ${record.method} takes long; use designSteps`);
  return finish(dossierSteps(record, none));
}

function finish(steps: Generator<FitStep, Dossier>): Dossier {
  for (;;) {
    const step = steps.next();
    if (step.done === true) return step.value;
  }
}

const isSearched = ({ method }: DesignRecord): boolean => method === 'fitted' || method === 'all';

/** Whether a record takes more than a keystroke allows, up to seconds: such a one belongs in a worker. */
export const takesLong = (record: DesignRecord): boolean => isSearched(record) || record.method === 'equal-ripple';

/** The pipeline in pieces, for a caller that shows progress or stops a search: what it has then is kept. */
export function designSteps(record: DesignRecord, control: FitControl): Generator<FitStep, Dossier> {
  return dossierSteps(record, { equalRipple, search: (starts) => fittedNetworks(record, starts, control) });
}

/** Finds fitted networks, from closed forms to start with. */
export type Search = (starts: readonly FoundCandidate[]) => Generator<FitStep, readonly FoundCandidate[]>;

/** The methods that take long. */
interface LongMethods {
  readonly equalRipple: typeof equalRipple;
  readonly search: Search;
}

const none: LongMethods = {
  equalRipple: () => ({ candidates: [], absent: [] }),
  *search() {
    return [];
  },
};

/** The pipeline with a search of the caller's: one that remembers, where only what doesn't touch it has changed. */
export function* dossierSteps(record: DesignRecord, methods: LongMethods): Generator<FitStep, Dossier> {
  const f0 = record.requirement.frequencyHz;
  const reach = reachOf(record);
  checkReach(record, reach);
  const load = terminationAt(record.loads[0]!.termination, f0, f0);
  const target = targetOf(terminationAt(record.source, f0, f0), record.aim);
  const { candidates, absent } = closedForms(record, target, load, methods.equalRipple);
  const fitted = isSearched(record) ? yield* methods.search(candidates) : [];
  const { ceiling, noCeiling } = ceilingOf(record);
  const judge = assessor(record, reach, ceiling);
  const found = [...candidates, ...fitted];
  const assessed = found.map((candidate) => assess(judge, candidate));
  const options = listed(record, assessed);
  const proposed = options.find(({ meets }) => meets);
  const picked = pickedBy(record, options);
  const chosen = picked ?? proposed ?? nearest(options);
  const band = record.requirement.bandHz;
  const states =
    chosen === undefined
      ? []
      : record.loads.toSorted((a, b) => Number(b.name === chosen.worstState) - Number(a.name === chosen.worstState));
  const checked =
    chosen === undefined
      ? null
      : evidence(
          states.map(({ termination }) => ({ arms: chosen.arms, source: record.source, load: termination, f0 })),
          [...new Set(band === null ? [f0] : [f0, band.low, band.high])],
          chosen.sections <= 1 && chosen.method !== 'fitted' && chosen.method !== 'equal-ripple',
        );
  const kinds = (['pi', 'tee'] as const).filter((kind) => record.method === kind || record.method === 'all');
  const least = kinds.map((kind) => ({
    kind: kind === 'pi' ? ('Pi' as const) : ('T' as const),
    q: leastQ(kind, target, load),
  }));
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
    chosenBy: picked !== undefined ? 'engineer' : proposed !== undefined ? 'proposal' : 'nearest',
    responses: chosen === undefined ? [] : states.map((state) => responseOf(record, state, chosen, reach)),
    evidence: checked,
    cautions: cautionsOf(record, chosen),
    references: referencesOf(record, {
      ceiling: ceiling !== null,
      pairChecked: checked?.routes.some(({ name }) => name === 'Q method') ?? false,
    }),
  };
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
  const byReturnLoss = (a: Option, b: Option): number => (b.worstReturnLossDb ?? 0) - (a.worstReturnLossDb ?? 0);
  return asked.toSorted((a, b) => a.arms.length - b.arms.length || byReturnLoss(a, b));
}

function pickedBy({ selection }: DesignRecord, options: readonly Option[]): Option | undefined {
  if (selection.option === null) return undefined;
  const picked = options.find(({ id }) => id === selection.option);
  if (picked !== undefined) return picked;
  const some = options.slice(0, 6).map(({ id }) => id);
  throw new InputError({
    field: 'choice',
    read: selection.option,
    why: 'no such network for these terminations',
    would:
      some.length === 0
        ? 'leave the choice open'
        : `choose one of ${some.join(', ')}${options.length > 6 ? ', …' : ''}`,
  });
}

/** The option with the fewest shortfalls; of those, the one with the best worst return loss. */
function nearest(options: readonly Option[]): Option | undefined {
  const shortfalls = ({ checks }: Option): number => checks.filter(({ verdict }) => verdict === 'falls short').length;
  return options.toSorted(
    (a, b) => shortfalls(a) - shortfalls(b) || (b.worstReturnLossDb ?? 0) - (a.worstReturnLossDb ?? 0),
  )[0];
}

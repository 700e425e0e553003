import { synthesise } from './design/method.ts';
import { assess } from './design/option.ts';
import { assumptionsOf } from './design/assumptions.ts';
import { bandSweeper } from './design/band-figures.ts';
import { cautionsOf } from './design/cautions.ts';
import { referencesOf } from './design/references.ts';
import { responseOf } from './design/response.ts';
import { sectionTable } from './design/section-table.ts';
import type { Dossier, Option } from './dossier.ts';
import { evidence } from './evidence/evidence.ts';
import { terminationAt } from './network/termination-at.ts';
import { InputError } from './quantity/problem.ts';
import { digestOf } from './record/canonical.ts';
import type { DesignRecord } from './record/design-record.ts';
import { targetOf } from './synthesis/target.ts';
import { version } from './version.ts';

/**
 * The one pipeline, used by page, worker and command line alike: a checked record in, everything computed from it out.
 *
 * @throws InputError when the record's selection names a network that doesn't exist for its terminations
 */
export function design(record: DesignRecord): Dossier {
  const f0 = record.requirement.frequencyHz;
  const load = terminationAt(record.load, f0, f0);
  const target = targetOf(terminationAt(record.source, f0, f0), record.aim);
  const { candidates, absent, cascades } = synthesise(record, target, load);
  const figuresOf = bandSweeper(record);
  const assessed = candidates.map((candidate) => assess(record, load, candidate, figuresOf));
  const { sections } = record;
  const options =
    cascades === null || sections === 'auto'
      ? assessed
      : assessed.filter((option) => option.sections === sections || option.sections === 0);
  const proposed = options.find(({ meets }) => meets);
  const picked = pickedBy(record, options);
  const chosen = picked ?? proposed ?? nearest(options);
  const band = record.requirement.bandHz;
  const subject = { source: record.source, load: record.load, f0 };
  return {
    schema: 'ferrule-dossier/1',
    version,
    record,
    digest: digestOf(record),
    assumptions: assumptionsOf(record),
    options,
    absent: absent.map(({ form, why }) => ({ form, why })),
    sections: cascades === null ? null : sectionTable(record, cascades, assessed),
    proposed: proposed?.id ?? null,
    chosen: chosen?.id ?? null,
    chosenBy: picked !== undefined ? 'engineer' : proposed !== undefined ? 'proposal' : 'nearest',
    response: chosen === undefined ? null : responseOf(record, chosen.arms),
    evidence:
      chosen === undefined
        ? null
        : evidence(
            { ...subject, arms: chosen.arms },
            [...new Set(band === null ? [f0] : [f0, band.low, band.high])],
            chosen.sections <= 1,
          ),
    cautions: cautionsOf(record, chosen),
    references: referencesOf(record),
  };
}

function pickedBy({ selection }: DesignRecord, options: readonly Option[]): Option | undefined {
  if (selection.option === null) return undefined;
  const picked = options.find(({ id }) => id === selection.option);
  if (picked !== undefined) return picked;
  throw new InputError({
    field: 'choice',
    read: selection.option,
    why: 'no such network for these terminations',
    would: `choose one of ${options.map(({ id }) => id).join(', ')}`,
  });
}

/** The option with the fewest shortfalls; of those, the one with the best worst return loss. */
function nearest(options: readonly Option[]): Option | undefined {
  const shortfalls = ({ checks }: Option): number => checks.filter(({ verdict }) => verdict === 'falls short').length;
  return options.toSorted(
    (a, b) => shortfalls(a) - shortfalls(b) || (b.worstReturnLossDb ?? 0) - (a.worstReturnLossDb ?? 0),
  )[0];
}

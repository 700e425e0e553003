import type { Dossier, Option } from '../dossier.ts';
import { InputError } from '../quantity/problem.ts';
import type { DesignRecord } from '../record/design-record.ts';

export interface Choice {
  readonly proposed: Option | undefined;
  readonly chosen: Option | undefined;
  readonly chosenBy: Dossier['chosenBy'];
}

/**
 * The network that meets everything first, and the one that the rest of a dossier is about.
 *
 * @throws InputError when the record names one that isn't there
 */
export function choose(record: DesignRecord, options: readonly Option[]): Choice {
  const proposed = options.find(({ meets }) => meets);
  const picked = pickedBy(record, options);
  return {
    proposed,
    chosen: picked ?? proposed ?? nearest(options),
    chosenBy: picked !== undefined ? 'engineer' : proposed !== undefined ? 'proposal' : 'nearest',
  };
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
  return options.toSorted((a, b) => shortfalls(a) - shortfalls(b) || heldDb(b) - heldDb(a))[0];
}

/** What an option holds over the band, with real parts where it has such, dB. */
export const heldDb = ({ built, worstReturnLossDb }: Option): number =>
  built?.worstReturnLossDb ?? worstReturnLossDb ?? 0;

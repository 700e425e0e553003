import { design } from '../../src/design.ts';
import type { Dossier } from '../../src/dossier.ts';
import { formatProblem, InputError, type Problem } from '../../src/quantity/problem.ts';
import { readDraft } from '../../src/record/draft.ts';
import type { FieldName, Fields } from '../../src/record/fields.ts';
import type { FieldState } from '../base/field-state.ts';

/** All that the sheet shows: the texts as typed, and the dossier of the last ones that could be read. */
export interface Settled extends FieldState {
  readonly dossier: Dossier | null;
  /** The texts typed now can't be read: the dossier is of earlier ones. */
  readonly stale: boolean;
  /** Why the network chosen isn't the one shown; '' when it is. */
  readonly notice: string;
}

/**
 * From typed texts to a dossier, keeping the previous one while they can't be read.
 *
 * A chosen network that doesn't exist for these terminations stays chosen in the texts: it is back as soon as they allow
 * it again, which spares whoever is in the middle of typing a number.
 */
export function settle(fields: Fields, before: Settled | null): Settled {
  const { record, problems, understood } = readDraft(fields);
  const kept = { fields, understood, dossier: before?.dossier ?? null, stale: true, notice: '' };
  if (record === null) return { ...kept, problems: lines(problems) };
  const fresh = { fields, understood, problems: {}, stale: false };
  try {
    return { ...fresh, dossier: design(record), notice: '' };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const lost = error.problems.some(({ field }) => field === 'choice');
    if (!lost) return { ...kept, problems: lines(error.problems) };
  }
  const dossier = design({ ...record, selection: { ...record.selection, option: null } });
  const shown = dossier.chosenBy === 'proposal' ? 'the proposal' : 'the nearest';
  return {
    ...fresh,
    dossier,
    notice: `The network chosen before doesn’t exist for these terminations; ${shown} is shown.`,
  };
}

const lines = (problems: readonly Problem[]): Partial<Record<FieldName, string>> =>
  Object.fromEntries(problems.map((problem) => [problem.field, formatProblem(problem)]));

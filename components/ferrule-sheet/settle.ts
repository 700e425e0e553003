import { designAtOnce, takesLong } from '../../src/design.ts';
import type { Dossier } from '../../src/dossier.ts';
import { formatProblem, InputError, type Problem } from '../../src/quantity/problem.ts';
import { readDraft } from '../../src/record/draft.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import type { FieldName, Fields } from '../../src/record/fields.ts';
import type { Attachments } from '../../src/record/read-termination.ts';
import type { FieldState } from '../base/field-state.ts';

/** All that the sheet shows: the texts as typed, and the dossier of the last ones that could be read. */
export interface Settled extends FieldState {
  readonly dossier: Dossier | null;
  /** The dossier is of earlier texts: those typed now can't be read, or are being computed. */
  readonly stale: boolean;
  /** Record that takes long: its dossier comes from the worker. */
  readonly pending: DesignRecord | null;
  /** Why the network chosen isn't the one shown; '' when it is. */
  readonly notice: string;
}

/**
 * From typed texts to a dossier, keeping the previous one while they can't be read or take long.
 *
 * A chosen network that doesn't exist for these terminations stays chosen in the texts: it is back as soon as they allow
 * it again, which spares whoever is in the middle of typing a number.
 */
export function settle(fields: Fields, before: Settled | null, attachments: Attachments = new Map()): Settled {
  const { record, problems, understood } = readDraft(fields, attachments);
  const kept = { fields, understood, dossier: before?.dossier ?? null, stale: true, pending: null, notice: '' };
  if (record === null) return { ...kept, problems: lines(problems) };
  if (takesLong(record)) return { ...kept, problems: {}, pending: record };
  const fresh = { fields, understood, problems: {}, stale: false, pending: null };
  try {
    return { ...fresh, dossier: designAtOnce(record), notice: '' };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    if (!lostChoice(error.problems)) return { ...kept, problems: lines(error.problems) };
  }
  const dossier = designAtOnce(withoutChoice(record));
  return { ...fresh, dossier, notice: lostNotice(dossier) };
}

/** What the worker came to. */
export const finished = (before: Settled, dossier: Dossier, notice: string): Settled => ({
  ...before,
  dossier,
  stale: false,
  pending: null,
  notice,
});

export const refused = (before: Settled, problems: readonly Problem[]): Settled => ({
  ...before,
  problems: lines(problems),
  pending: null,
});

/** The network chosen before doesn't exist any more. */
export const lostChoice = (problems: readonly Problem[]): boolean => problems.some(({ field }) => field === 'choice');

export const withoutChoice = (record: DesignRecord): DesignRecord => ({
  ...record,
  selection: { ...record.selection, option: null },
});

export function lostNotice({ chosenBy }: Dossier): string {
  const shown = chosenBy === 'proposal' ? 'the proposal' : 'the nearest';
  return `The network chosen before doesn’t exist for these terminations; ${shown} is shown.`;
}

const lines = (problems: readonly Problem[]): Partial<Record<FieldName, string>> =>
  Object.fromEntries(problems.map((problem) => [problem.field, formatProblem(problem)]));

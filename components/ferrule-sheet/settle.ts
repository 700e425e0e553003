import { designAtOnce, hasMore, takesLong } from '../../src/design/pipeline.ts';
import type { Grounds } from '../../src/design/grounds.ts';
import type { Dossier, Option } from '../../src/dossier.ts';
import { formatProblem, InputError, type Problem } from '../../src/quantity/problem.ts';
import { readDraft } from '../../src/record/draft.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import type { FieldName, Fields } from '../../src/record/fields.ts';
import { nothingKept, type Kept } from '../../src/record/kept.ts';
import type { Attachments } from '../../src/record/read-termination.ts';
import type { FieldState } from '../base/field-state.ts';

/** How far the networks of a dossier are worked out with real parts; `none`: they aren't asked for. */
export type RealParts = 'none' | 'at work' | 'stopped' | 'whole';

/** How assumptions, evidence, cautions and references are worked out; null until that is fetched. */
let grounds: Grounds | null = null;

/** From now on dossiers have grounds; one that has none yet gets them. */
export function ground(before: Settled, how: Grounds): Settled {
  grounds = how;
  const { dossier } = before;
  if (dossier === null || dossier.evidence !== null || takesLong(dossier.record)) return before;
  const { assumptions, evidence, cautions, references } = designAtOnce(dossier.record, how);
  return { ...before, dossier: { ...dossier, assumptions, evidence, cautions, references } };
}

/** All that the sheet shows: the texts as typed, and the dossier of the last ones that could be read. */
export interface Settled extends FieldState {
  readonly dossier: Dossier | null;
  /** The dossier is of earlier texts: those typed now can't be read, or are being computed. */
  readonly stale: boolean;
  /** Record that takes long: its dossier comes from the worker. */
  readonly pending: DesignRecord | null;
  /** Record of the dossier shown, while more of it is still to be worked out: its whole dossier comes from the worker. */
  readonly building: DesignRecord | null;
  readonly realParts: RealParts;
  /** Why the network chosen isn't the one shown; '' when it is. */
  readonly notice: string;
}

/**
 * From typed texts to a dossier, keeping the previous one while they can't be read or take long.
 *
 * A chosen network that doesn't exist for these terminations stays chosen in the texts: it is back as soon as they allow
 * it again, which spares whoever is in the middle of typing a number.
 */
export function settle(
  fields: Fields,
  before: Settled | null,
  attachments: Attachments = new Map(),
  kept: Kept = nothingKept,
): Settled {
  const { record, problems, understood } = readDraft(fields, attachments, kept);
  const old: Settled = {
    fields,
    understood,
    problems: {},
    dossier: before?.dossier ?? null,
    stale: true,
    pending: null,
    building: null,
    realParts: before === null ? 'none' : left(before),
    notice: '',
  };
  if (record === null) return { ...old, problems: lines(problems) };
  if (takesLong(record)) return { ...old, pending: record };
  try {
    return { ...old, ...fresh(record), notice: '' };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    if (!lostChoice(error.problems)) return { ...old, problems: lines(error.problems) };
  }
  const shown = fresh(withoutChoice(record));
  return { ...old, ...shown, notice: lostNotice(shown.dossier) };
}

/** Other texts over the same figures, as those typed on a frozen record: what can be read of them is told. */
export function retyped(before: Settled, fields: Fields, attachments: Attachments, kept: Kept): Settled {
  const { problems, understood } = readDraft(fields, attachments, kept);
  return { ...before, fields, understood, problems: lines(problems) };
}

/** A record's dossier at once; real parts, the finished board and what changed are still to come where there are such. */
function fresh(record: DesignRecord) {
  const building = hasMore(record) ? record : null;
  const realParts = record.build === null ? ('none' as const) : ('at work' as const);
  return { dossier: designAtOnce(record, grounds), stale: false, building, realParts };
}

/** What the worker came to with exact values, while it goes on to real parts. */
export const exact = (before: Settled, dossier: Dossier, notice: string): Settled => ({
  ...before,
  ...sameRecord(before, dossier),
  building: dossier.record.build === null ? null : dossier.record,
  realParts: dossier.record.build === null ? 'none' : 'at work',
  notice,
});

/** What the worker came to. */
export function finished(before: Settled, dossier: Dossier, notice: string): Settled {
  const whole = dossier.options.every(({ built }) => built !== null);
  const shown = sameRecord(before, dossier);
  return {
    ...before,
    ...shown,
    building: dossier.record.build === null || whole ? null : shown.dossier.record,
    realParts: dossier.record.build === null ? 'none' : whole ? 'whole' : 'stopped',
    notice,
  };
}

/** A record comes back from the worker as a copy; what was found sound in it is known of the original alone. */
function sameRecord({ pending, building }: Settled, dossier: Dossier) {
  const asked = building ?? pending;
  const same = asked !== null && asked.selection.option === dossier.record.selection.option;
  return { dossier: same ? { ...dossier, record: asked } : dossier, stale: false, pending: null };
}

/** One network more is worked out with real parts. */
export function withOption(before: Settled, option: Option): Settled {
  const { dossier, building } = before;
  if (dossier === null || building === null) return before;
  const options = dossier.options.map((each) => (each.id === option.id ? option : each));
  return { ...before, dossier: { ...dossier, options } };
}

/** The work on real parts is stopped, with what there is of it. */
export const stopped = (before: Settled): Settled => ({ ...before, realParts: left(before) });

export const goingOn = (before: Settled): Settled => ({ ...before, realParts: 'at work' });

const left = ({ realParts }: Settled): RealParts => (realParts === 'at work' ? 'stopped' : realParts);

export const refused = (before: Settled, problems: readonly Problem[]): Settled => ({
  ...before,
  problems: lines(problems),
  pending: null,
  building: null,
  realParts: left(before),
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

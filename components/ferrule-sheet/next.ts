import { InputError, type Problem } from '../../src/quantity/problem.ts';
import type { Draft } from '../../src/record/draft.ts';
import { fieldNames, fieldsOf, pathOf, type Fields } from '../../src/record/fields.ts';
import { keptOf, type Kept } from '../../src/record/kept.ts';
import { nextRevision } from '../../src/record/next-revision.ts';
import { revise } from '../../src/record/revise.ts';
import { changedFields, type Waiting } from './frozen.ts';

/** The next revision as texts and what goes with them, or why there is none. */
export type Started = { readonly fields: Fields; readonly kept: Kept } | { readonly problem: Problem };

/**
 * The draft of the next revision: as it was issued, with what was typed and measured since.
 *
 * @param draft the issued record as read
 * @param typed texts as they stand now
 * @param change what the revision changes, and why
 * @param date  ISO 8601 calendar date, where none is typed
 */
export function startNext(
  { record, problems }: Draft,
  { issued, board }: Waiting,
  typed: Fields,
  change: string,
  date: string,
): Started {
  if (record === null) return { problem: problems[0]! };
  const since = Object.fromEntries(changedFields(issued, typed).map((name) => [name, typed[name] ?? '']));
  const revision = since.revision ?? nextRevision(record.identity.revision);
  try {
    const next = revise(record, { revision, change, date: since.date ?? date });
    const texts = fieldsOf(next);
    const begun = Object.fromEntries(documentFields.map((name) => [name, texts[name]]));
    const kept = keptOf(next);
    return {
      // What the revision doesn't begin anew stays as it was typed.
      fields: { ...issued, ...begun, ...since, change },
      kept: board === undefined ? kept : { ...kept, asBuilt: board },
    };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return { problem: error.problems[0]! };
  }
}

const documentFields = fieldNames.filter((name) => /^(?:identity|signOff)\./u.test(pathOf[name]));

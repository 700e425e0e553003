import type { DesignRecord } from '../../src/record/design-record.ts';
import { readDraft } from '../../src/record/draft.ts';
import type { Fields } from '../../src/record/fields.ts';

/** A record from the texts of its fields; a problem in them is the test's own mistake. */
export function recordOf(fields: Fields): DesignRecord {
  const { record, problems } = readDraft({ date: '2026-01-31', ...fields });
  if (record === null) throw new Error(problems.map(({ field, why }) => `${field}: ${why}`).join('; '));
  return record;
}

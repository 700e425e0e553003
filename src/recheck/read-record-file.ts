import { InputError } from '../quantity/problem.ts';
import { sha256Of } from '../record/canonical.ts';
import { readRecord } from '../record/read-record.ts';
import type { Found } from './found.ts';

/**
 * Reads a record from its JSON text, and takes its digest as it was written: of an earlier schema, that of the earlier
 * form.
 *
 * @param where before the names of its fields in what is refused
 * @throws InputError when it isn't a record
 */
export function readRecordFile(text: string, where = ''): Found {
  const record = reading(where, () => readRecord(text));
  const { signOff: _, previous: __, ...stated } = JSON.parse(text.replace(/^\uFEFF/u, '')) as Record<string, unknown>;
  return { record, schema: String(stated['schema']), digest: sha256Of(stated), report: null };
}

function reading<T>(where: string, read: () => T): T {
  try {
    return read();
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    throw new InputError(...error.problems.map((problem) => ({ ...problem, field: `${where}${problem.field}` })));
  }
}

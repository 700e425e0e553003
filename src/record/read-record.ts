import { InputError } from '../quantity/problem.ts';
import { checkRecord } from './check-record.ts';
import type { DesignRecord } from './design-record.ts';
import { migrate, neededVersion } from './migrate.ts';
import { repeatedName } from './repeated-name.ts';

/** Largest record read, in characters: a hundred times what its fields can hold without being an attack. */
const longest = 8_000_000;

/**
 * Reads a design record from its JSON text.
 *
 * @throws InputError: too long, not JSON, a field given twice, or not a record
 */
export function readRecord(text: string): DesignRecord {
  if (text.length > longest) {
    throw new InputError({
      field: 'record',
      read: '',
      why: `${(text.length / 1e6).toFixed(1)} million characters are more than a record can have`,
      would: 'give a design record of at most 8 million',
    });
  }
  let value: unknown;
  try {
    value = JSON.parse(text.replace(/^\uFEFF/u, ''));
  } catch {
    throw new InputError({
      field: 'record',
      read: text,
      why: 'not JSON',
      would: 'give a design record as Ferrule saved it',
    });
  }
  const twice = repeatedName(text);
  if (twice !== null) {
    throw new InputError({
      field: twice,
      read: '',
      why: 'this field is given twice',
      would: 'keep the one that is meant',
    });
  }
  const later = neededVersion(value);
  if (later !== null) throw new InputError(later);
  return checkRecord(migrate(value));
}

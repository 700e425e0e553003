import { basename } from 'node:path';
import { measuredTermination } from '../measured/measured-termination.ts';
import { InputError } from '../quantity/problem.ts';
import { checkRecord } from '../record/check-record.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { readTextFile } from './read-arguments.ts';

/** Options that tell of a finished board: what the analyser measured on it, and the load state attached. */
export const boardOptions = ['as-built', 'attached'] as const;

/** The record with the board measured; as it is where none was. */
export function withBoard(
  record: DesignRecord,
  options: Partial<Record<(typeof boardOptions)[number], string>>,
): DesignRecord {
  const { 'as-built': file, attached } = options;
  if (file === undefined) {
    if (attached === undefined) return record;
    throw new InputError({
      field: '--attached',
      read: attached,
      why: 'no board was measured',
      would: 'give its file too, as in --as-built board.s1p',
    });
  }
  const { measured } = boardOf(file);
  return checkRecord({ ...record, asBuilt: { measured, state: attached ?? null, note: '' } });
}

function boardOf(file: string): ReturnType<typeof measuredTermination> {
  try {
    return measuredTermination(readTextFile(file), basename(file), 1);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    throw new InputError(...error.problems.map((found) => ({ ...found, field: `--as-built ${file}, ${found.field}` })));
  }
}

import { InputError } from '../quantity/problem.ts';

/** Why a file isn't rechecked, and what would be; who knows the file's name adds it. */
export const refusal = (why: string, would: string): InputError =>
  new InputError({ field: 'file', read: '', why, would });

/** Of a PDF whose bytes aren't arranged as a report's are. */
export const notAsWritten = (why: string): InputError =>
  refusal(why, 'give the report as Ferrule wrote it, or its record.json');

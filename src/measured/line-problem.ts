import { InputError } from '../quantity/problem.ts';

/** What can't be used in a file, told with the line that it stands in (counted from 1). */
export function lineProblem(line: number, why: string, would: string, read = ''): InputError {
  return new InputError({ field: line > 0 ? `line ${String(line)}` : 'file', read, why, would });
}

import { writeFileSync } from 'node:fs';
import { InputError } from '../quantity/problem.ts';
import { fromHere } from './read-arguments.ts';

/**
 * Writes a file that the command line names.
 *
 * @throws InputError when it can't be written
 */
export function writeFile(option: string, file: string, content: string | Uint8Array): void {
  try {
    writeFileSync(fromHere(file), content);
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code ?? 'unknown';
    const reasons: Partial<Record<string, string>> = { ENOENT: 'there is no such folder', EISDIR: 'this is a folder' };
    throw new InputError({
      field: option,
      read: file,
      why: reasons[code] ?? `it can't be written (${code})`,
      would: 'give a file in a folder that can be written to',
    });
  }
}

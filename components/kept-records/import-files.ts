import { InputError } from '../../src/quantity/problem.ts';
import { inOneLine } from '../record-store/collection.ts';
import type { Shelf } from '../record-store/shelf.ts';
import { importedWords } from './words.ts';

/** A larger file isn't one of kept records, bytes. */
const mostRead = 100_000_000;

const tooLarge = { field: 'file', read: '', why: 'it is larger than 100 MB', would: 'give a file of kept records' };

/**
 * Takes what files hold, one after the other; one that can't be used keeps no other out.
 *
 * @returns what it came to in a sentence each, and what can't be used in a line each
 */
export async function importFiles(shelf: Shelf, files: readonly File[]) {
  const [said, refused]: [string[], string[]] = [[], []];
  for (const file of files) {
    try {
      if (file.size > mostRead) throw new InputError(tooLarge);
      const imported = await shelf.take(await file.text());
      said.push(importedWords(file.name, imported));
      refused.push(...imported.refused.map((line) => `${file.name}, ${line}`));
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      said.push(`Refused: ${file.name}.`);
      refused.push(`${file.name} can’t be imported. ${inOneLine(error.problems)}`);
    }
  }
  return { said: said.join(' '), refused };
}

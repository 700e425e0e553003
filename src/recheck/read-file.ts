import { InputError } from '../quantity/problem.ts';
import type { Found } from './found.ts';
import { readRecordFile } from './read-record-file.ts';
import { readReport } from './read-report.ts';
import { refusal } from './refusal.ts';

/** Largest file that is read, bytes: a report has less than 400 kB, and its signatures some more. */
export const mostBytes = 20_000_000;

/**
 * Reads a report (PDF) or a record (JSON), told apart by how they begin.
 *
 * @param name of the file, for what is said of it
 * @throws InputError in a line when it is neither, or not as it was written
 */
export async function readFile(name: string, bytes: Uint8Array): Promise<Found> {
  try {
    if (bytes.length > mostBytes) throw tooLarge();
    if (startsWith(bytes, '%PDF-')) return await readReport(bytes);
    const text = new TextDecoder().decode(bytes);
    if (!/^\uFEFF?\s*\{/u.test(text)) {
      throw refusal("neither a report (PDF) nor a record (JSON) of Ferrule's", 'give one of these');
    }
    return readRecordFile(text);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    throw new InputError(
      ...error.problems.map((problem) =>
        problem.field === 'file' ? { ...problem, read: name } : { ...problem, field: `${name}: ${problem.field}` },
      ),
    );
  }
}

export const tooLarge = (): InputError =>
  refusal(`over ${mostBytes / 1e6} MB, which no report has`, "give a report or a record of Ferrule's");

const startsWith = (bytes: Uint8Array, text: string): boolean =>
  Array.from(text).every((sign, k) => bytes[k] === sign.charCodeAt(0));

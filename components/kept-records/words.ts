import type { Entry } from '../record-store/entry.ts';
import { stateOf, textOf } from '../record-store/documents.ts';
import type { Imported } from '../record-store/shelf.ts';
import { count } from '../base/words.ts';

export const revisionWords = (entry: Entry): string => {
  const revision = textOf(entry, 'revision');
  return revision === '' ? 'No revision' : `Revision ${revision}`;
};

export const numberWords = (number: string): string => (number === '' ? 'No number' : number);

export const titleWords = (title: string): string => (title === '' ? 'No title' : title);

/** "TG-041, revision A, draft": names one entry among all. */
export const nameOf = (entry: Entry): string =>
  `${numberWords(textOf(entry, 'number'))}, ${lowerFirst(revisionWords(entry))}, ${stateOf(entry)}`;

const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);

const time = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short' });

export const keptWords = ({ savedAt }: Entry): string => `kept ${time.format(savedAt)}`;

/** What an import came to. */
export function importedWords(name: string, { added, skipped, refused }: Imported): string {
  const parts = [
    `${count(added, 'record')} added`,
    ...(skipped === 0 ? [] : [`${skipped} here already`]),
    ...(refused.length === 0 ? [] : [`${refused.length} refused`]),
  ];
  return `${name}: ${parts.join(', ')}.`;
}

/** Name of the file in which everything is taken elsewhere. */
export const collectionName = (now: number): string =>
  `ferrule-records-${new Date(now).toISOString().slice(0, 10)}.json`;

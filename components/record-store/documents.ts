import { defaults, type Fields } from '../../src/record/fields.ts';
import { nothingKept } from '../../src/record/kept.ts';
import { newDraft, opened, type Body, type Carried, type Entry } from './entry.ts';

/** Entries of one document number: drafts first, then the issued revisions, the newest of each first. */
export interface KeptDocument {
  /** Tells documents apart; not for people. */
  readonly key: string;
  readonly number: string;
  /** Of the first entry. */
  readonly title: string;
  readonly entries: readonly Entry[];
}

export const textOf = ({ fields }: Entry, name: keyof Fields): string => (fields[name] ?? defaults[name]).trim();

/** Drafts say what they were typed as; only what is kept frozen is issued. */
export const stateOf = (entry: Entry): 'draft' | 'for review' | 'issued' => {
  if (entry.kind === 'issued') return 'issued';
  return textOf(entry, 'state') === 'for review' ? 'for review' : 'draft';
};

/** Without a number of its own a draft is a document by itself. */
const numbered = (number: string): boolean => number !== '' && number !== defaults.number;

/** The document last worked on first. */
export function documentsOf(entries: readonly Entry[]): readonly KeptDocument[] {
  const groups = Map.groupBy(entries, (entry) => {
    const number = textOf(entry, 'number');
    return numbered(number) ? `number ${number}` : `id ${entry.id}`;
  });
  return [...groups]
    .map(([key, group]) => {
      const sorted = group.toSorted(byAge);
      return { key, number: textOf(sorted[0]!, 'number'), title: textOf(sorted[0]!, 'title'), entries: sorted };
    })
    .toSorted((a, b) => newest(b) - newest(a) || a.key.localeCompare(b.key));
}

const newest = ({ entries }: KeptDocument): number => Math.max(...entries.map(({ savedAt }) => savedAt));

const revisions = new Intl.Collator('en', { numeric: true });

function byAge(a: Entry, b: Entry): number {
  if (a.kind !== b.kind) return a.kind === 'draft' ? -1 : 1;
  if (a.kind === 'draft') return b.savedAt - a.savedAt;
  return (
    textOf(b, 'date').localeCompare(textOf(a, 'date')) ||
    revisions.compare(textOf(b, 'revision'), textOf(a, 'revision'))
  );
}

const searched = ['number', 'title', 'revision', 'date', 'ticket', 'owner', 'change'] as const;

/** Whether each word of the search stands somewhere in what identifies the entry; capitals and accents don't count. */
export function matches(entry: Entry, search: string): boolean {
  const text = plain([...searched.map((name) => textOf(entry, name)), stateOf(entry)].join('\n'));
  return plain(search)
    .split(/\s+/u)
    .every((word) => text.includes(word));
}

const plain = (text: string): string => text.normalize('NFKD').replace(/\p{M}/gu, '').toLowerCase();

/** Why two entries may be taken for each other, in a few words; '' where nothing is to be said. */
export function noteOf(entry: Entry, others: readonly Entry[]): string {
  if (entry.kind === 'issued') return '';
  const revision = textOf(entry, 'revision');
  const twin = others.find(({ id, kind, fields: { revision: other = '' } }) => {
    return id !== entry.id && kind === 'issued' && other.trim() === revision;
  });
  if (twin !== undefined) return `Revision ${revision} is issued already.`;
  return entry.apart ? 'Kept apart: another tab changed the same document.' : '';
}

/** Most letters of a title; the record's schema takes no more. */
const longestTitle = 120;

/** A new document that begins with the same design: nobody has signed it, and no history is its own. */
export function duplicateOf(entry: Entry, body: Body, savedAt: number): { readonly entry: Entry; readonly body: Body } {
  const { kept, attachments }: Carried = opened(entry, body);
  const fields: Fields = {
    ...entry.fields,
    title: `Copy of ${textOf(entry, 'title')}`.slice(0, longestTitle).toWellFormed(),
    ...unsigned,
  };
  return {
    entry: newDraft(entry.sheet, fields, savedAt),
    body: { record: null, kept: { ...nothingKept, stock: kept.stock }, attachments },
  };
}

const unsigned: Fields = {
  number: defaults.number,
  revision: defaults.revision,
  change: '',
  ticket: '',
  state: 'draft',
  'prepared-date': '',
  'prepared-remark': '',
  'checked-date': '',
  'checked-remark': '',
  'approved-date': '',
  'approved-remark': '',
};

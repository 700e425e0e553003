/**
 * What is kept in the browser. Two kinds: a draft, exactly as typed whether it reads as a record or not, written over by
 * the sheet that it was opened in; and an issued record, which is frozen. Times are milliseconds since 1970.
 */
import { isMeasured } from '../../src/network/termination.ts';
import type { DesignRecord, Method } from '../../src/record/design-record.ts';
import { fieldsOf, type Fields } from '../../src/record/fields.ts';
import { keptOf, nothingKept, type Kept } from '../../src/record/kept.ts';
import { attachmentsOf, type Attachments } from '../../src/record/read-termination.ts';

/** First methods of the sheets, by which these are known. */
export const sheets = ['two-element', 'resistive-pair', 'cascade'] as const satisfies readonly Method[];

/** What is shown of it in a list; small, however much it carries. */
export interface Entry {
  readonly id: string;
  readonly kind: 'draft' | 'issued';
  /** How often it was written: who writes says which one was read, so that nothing is written over unseen. */
  readonly version: number;
  readonly savedAt: number;
  /** First method of the sheet that it belongs to. */
  readonly sheet: Method;
  readonly fields: Fields;
  /** It was typed while another tab changed the same document. */
  readonly apart: boolean;
  /** SHA-256 of an issued record, its sign-off included; '' for a draft. */
  readonly seal: string;
}

/** What fields can't hold. */
export interface Carried {
  readonly kept: Kept;
  readonly attachments: Attachments;
}

export interface DraftBody extends Carried {
  readonly record: null;
}

/** An issued record is kept whole: it is what was signed. */
export type Body = DraftBody | { readonly record: DesignRecord };

export const nothingCarried: Carried = { kept: nothingKept, attachments: new Map() };

/** All that a sheet needs to show what is kept. */
export interface Opened extends Carried {
  readonly entry: Entry;
  readonly fields: Fields;
}

export function opened(entry: Entry, body: Body): Opened {
  if (body.record === null) return { entry, fields: entry.fields, kept: body.kept, attachments: body.attachments };
  return { entry, fields: entry.fields, ...carriedBy(body.record) };
}

export const carriedBy = (record: DesignRecord): Carried => ({
  kept: keptOf(record),
  attachments: attachmentsOf([record.source, ...record.loads.map(({ termination }) => termination)].filter(isMeasured)),
});

/** A new entry's name: 128 bits drawn at random, which needs no secure context as a UUID of the browser's would. */
export const newId = (): string =>
  Array.from(crypto.getRandomValues(new Uint8Array(16)), (byte) => byte.toString(16).padStart(2, '0')).join('');

export const newDraft = (sheet: Method, fields: Fields, savedAt: number): Entry => ({
  id: newId(),
  kind: 'draft',
  version: 0,
  savedAt,
  sheet,
  fields,
  apart: false,
  seal: '',
});

export const issuedEntry = (sheet: Method, record: DesignRecord, seal: string, savedAt: number): Entry => ({
  ...newDraft(sheet, fieldsOf(record), savedAt),
  kind: 'issued',
  version: 1,
  seal,
});

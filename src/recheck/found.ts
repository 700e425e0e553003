import type { DesignRecord } from '../record/design-record.ts';
import type { Additions } from './pdf/additions.ts';
import type { PrintedFigures } from './read-figures.ts';

/** A record read from a file, and what the file says of it. */
export interface Found {
  readonly record: DesignRecord;
  /** Of the schema in which it was written, "ferrule-record/1". */
  readonly schema: string;
  /** SHA-256 over its RFC 8785 form as it was written, sign-off and the revision before left out. */
  readonly digest: string;
  /** null: the file is the record alone. */
  readonly report: FoundReport | null;
}

/** What a report holds besides its record; its digests are true. */
export interface FoundReport {
  readonly printed: PrintedFigures;
  readonly paper: 'a4' | 'letter';
  /** The file as it was written, without what was added since. */
  readonly written: Uint8Array;
  readonly added: Additions | null;
}

import type { DesignRecord, Method } from '../../src/record/design-record.ts';
import { sha256Of } from '../../src/record/canonical.ts';
import { readDraft } from '../../src/record/draft.ts';
import { fieldsOf } from '../../src/record/fields.ts';
import { collectionText, readCollection, sealOf, type TypedDraft } from './collection.ts';
import { duplicateOf } from './documents.ts';
import { carriedBy, issuedEntry, newDraft, opened, type Body, type Entry } from './entry.ts';
import type { RecordStore } from './record-store.ts';
import type { Tabs } from './tabs.ts';

/** What was deleted, whole. */
export interface Removed {
  readonly entry: Entry;
  readonly body: Body;
}

/** What became of an import, in numbers and in lines. */
export interface Imported {
  readonly added: number;
  /** They are here already. */
  readonly skipped: number;
  readonly refused: readonly string[];
}

/** What can be done with records that are kept, beside typing in one. */
export class Shelf {
  readonly #store: RecordStore;
  readonly #tabs: Tabs;
  readonly #sheetOf: (method: Method) => Method;
  readonly #now: () => number;

  /** @param sheetOf the sheet, by its first method, that serves a method */
  constructor(store: RecordStore, tabs: Tabs, sheetOf: (method: Method) => Method, now: () => number = Date.now) {
    this.#store = store;
    this.#tabs = tabs;
    this.#sheetOf = sheetOf;
    this.#now = now;
  }

  list(): Promise<readonly Entry[]> {
    return this.#store.list();
  }

  /** @returns the copy; null where there is nothing to copy any more */
  async duplicate(id: string): Promise<Entry | null> {
    const found = await this.#store.read(id);
    if (found === null) return null;
    const { entry, body } = duplicateOf(found.entry, found.body, this.#now());
    await this.#add(entry, body);
    return entry;
  }

  /** @returns false where it was changed or deleted in another tab since it was listed; then nothing is changed */
  async rename(entry: Entry, title: string, number: string): Promise<boolean> {
    const renamed = { ...entry, fields: { ...entry.fields, title, number }, savedAt: this.#now() };
    const written = await this.#store.writeDraft(renamed, undefined);
    if (written.outcome !== 'written') return false;
    this.#tabs.tell({ id: entry.id, version: written.version });
    return true;
  }

  /** @returns what puts it back; null where another tab deleted it already */
  async remove(id: string): Promise<Removed | null> {
    const found = await this.#store.read(id);
    if (found === null) return null;
    await this.#store.remove(id);
    this.#tabs.tell({ id, version: 0 });
    return found;
  }

  async restore({ entry, body }: Removed): Promise<void> {
    await this.#store.restore(entry, body);
    this.#tabs.tell({ id: entry.id, version: entry.version });
  }

  /** One entry as a file: its record where it reads as one, else the draft as typed; null where it isn't there any more. */
  async one(id: string): Promise<{ readonly text: string; readonly record: DesignRecord | null } | null> {
    const found = await this.#store.read(id);
    if (found === null) return null;
    const record = recordOf(found);
    if (record !== null) return { text: `${JSON.stringify(record, null, 2)}\n`, record };
    return { text: collectionText({ records: [], drafts: [typedOf(found)] }), record };
  }

  /** Everything that is kept, as the text of a file. */
  async all(): Promise<string> {
    const found = await this.#everything();
    return collectionText({
      records: found.flatMap(({ body }) => (body.record === null ? [] : [body.record])),
      drafts: found.filter(({ body }) => body.record === null).map(typedOf),
    });
  }

  /**
   * Adds what a file holds. What is here already is left alone, and nothing is written over.
   *
   * @throws InputError where the file holds no records
   */
  async take(text: string): Promise<Imported> {
    const { records, drafts, refused } = readCollection(text);
    const found = await this.#everything();
    const known = new Set(found.flatMap((each) => sealsOf(each)));
    const lines = [...refused];
    let [added, skipped] = [0, 0];
    const add = async (entry: Entry, body: Body, seal: string) => {
      if (known.has(seal)) skipped += 1;
      else if (body.record === null) await this.#add(entry, body).then(() => (added += 1));
      else if ((await this.#store.addIssued(entry, body, null)).outcome === 'other') lines.push(other(body.record));
      else added += 1;
      known.add(seal);
    };
    for (const record of records) {
      const seal = sha256Of(record);
      const sheet = this.#sheetOf(record.method);
      const issued = record.signOff.state === 'issued';
      if (issued) await add(issuedEntry(sheet, record, seal, this.#now()), { record }, seal);
      else await add(newDraft(sheet, fieldsOf(record), this.#now()), { record: null, ...carriedBy(record) }, seal);
    }
    for (const draft of drafts) {
      const { sheet, fields, kept, attachments } = draft;
      await add(newDraft(sheet, fields, this.#now()), { record: null, kept, attachments }, sealOf(draft));
    }
    this.#tabs.tell({ id: '', version: 0 });
    return { added, skipped, refused: lines };
  }

  async #add(entry: Entry, body: Body): Promise<void> {
    await this.#store.writeDraft(entry, body);
    this.#tabs.tell({ id: entry.id, version: 1 });
  }

  async #everything(): Promise<readonly Removed[]> {
    const entries = await this.#store.list();
    const found = await Promise.all(entries.map(({ id }) => this.#store.read(id)));
    return found.filter((each) => each !== null);
  }
}

const typedOf = ({ entry, body }: Removed): TypedDraft => {
  const { fields, kept, attachments } = opened(entry, body);
  return { sheet: entry.sheet, fields, kept, attachments };
};

function recordOf(found: Removed): DesignRecord | null {
  if (found.body.record !== null) return found.body.record;
  const { fields, attachments, kept } = typedOf(found);
  return readDraft(fields, attachments, kept).record;
}

/** By which of its forms an entry is known: as it was typed, and as the record that it reads as. */
function sealsOf(found: Removed): readonly string[] {
  if (found.body.record !== null) return [found.entry.seal];
  const record = recordOf(found);
  return [sealOf(typedOf(found)), ...(record === null ? [] : [sha256Of(record)])];
}

const other = ({ identity: { number, revision } }: DesignRecord): string =>
  `${number}, revision ${revision}: another record is issued here under this number and revision; keep the file, or delete the other first`;

import { sha256Of } from '../../src/record/canonical.ts';
import type { DesignRecord, Method } from '../../src/record/design-record.ts';
import { defaults, fieldNames, type Fields } from '../../src/record/fields.ts';
import type { Kept } from '../../src/record/kept.ts';
import type { Attachments } from '../../src/record/read-termination.ts';
import type { Problem } from '../../src/quantity/problem.ts';
import { issuedEntry, newDraft, newId, opened, type Carried, type Entry, type Opened } from './entry.ts';
import { changedElsewhere, goneElsewhere, keptApart, keptNow, notKept, nothingTyped, type Keeping } from './keeping.ts';
import type { Written } from './record-store.ts';
import { browser, type Surroundings } from './surroundings.ts';
import type { Change, Tabs } from './tabs.ts';
import { stillHere, whyNotKept } from './trouble.ts';

interface Waiting extends Carried {
  readonly fields: Fields;
  readonly document: number;
}

/** What a sheet finds when it opens. */
export interface Recalled extends Opened {
  /** This tab's own, as its address has it: to be shown at once. Otherwise it is to be offered. */
  readonly own: boolean;
}

/**
 * Keeps what is typed in one sheet of one tab. A document opened in two tabs is never written over: the tab that comes
 * second keeps what was typed in it apart, and both say so.
 *
 * A sheet calls `recall` or `open` once at its start, `keep` at every change, `begin` before it shows another document.
 */
export class DraftKeeper {
  readonly #sheet: Method;
  readonly #tell: (keeping: Keeping) => void;
  readonly #around: Surroundings;
  readonly #tabs: Tabs;
  /** What the texts shown are kept as, as it was last read or written; null: nothing yet. */
  #entry: Entry | null = null;
  /** What the store has of it beside its texts. */
  #carried: Carried | null = null;
  /** What is typed and not kept yet. */
  #waiting: Waiting | null = null;
  /** Counts the documents shown, so that what was typed in one is never taken for another's. */
  #document = 0;
  /** Id of what another tab made of the document; null: no tab did. */
  #other: string | null = null;
  /** How it stands with what is kept of this document. */
  #standing: Keeping = keptNow;
  #timer: ReturnType<typeof setTimeout> | undefined;
  /** A write is under way; what is typed meanwhile is written after it, all at once. */
  #busy = false;
  #writing: Promise<void> = Promise.resolve();

  /** @param tell how it stands with keeping, whenever that changes */
  constructor(sheet: Method, tell: (keeping: Keeping) => void, around: Surroundings = browser(sheet)) {
    this.#sheet = sheet;
    this.#tell = tell;
    this.#around = around;
    this.#tabs = around.join((change) => this.#hear(change));
  }

  /** Ends it; what waits is written. */
  close(): void {
    void this.saveNow().finally(() => {
      this.#tabs.close();
      this.#around.store.close();
    });
  }

  /**
   * What this tab had open before a reload or a crash; else, where the address holds no sheet, the draft of this sheet
   * that was typed last, in whatever tab.
   *
   * @param address texts of the address; null: it holds none
   */
  async recall(address: Fields | null): Promise<Recalled | null> {
    try {
      const id = this.#around.session.read();
      const before = id === null ? null : await this.#around.store.read(id);
      if (before !== null) {
        // Whoever is quicker than the store has begun another document.
        const own = this.#untouched() && (address === null || sameTexts(address, before.entry.fields));
        const found = opened(before.entry, before.body);
        return { ...(own ? this.#hold(found) : found), own };
      }
      const last = address === null ? await this.#last() : null;
      return last === null ? null : { ...last, own: false };
    } catch (error) {
      this.#tell(notKept(whyNotKept(error)));
      return null;
    }
  }

  /** Opens an entry by its id, to go on with it; null where it isn't kept here any more. */
  async open(id: string): Promise<Opened | null> {
    await this.saveNow();
    try {
      const found = await this.#around.store.read(id);
      // What was typed meanwhile belongs to the document before.
      await this.saveNow();
      return found === null ? null : this.#hold(opened(found.entry, found.body));
    } catch (error) {
      this.#tell(notKept(whyNotKept(error)));
      return null;
    }
  }

  /** What another tab made of the document, to go on with it; what was typed here is kept apart. null: no tab did. */
  async openOther(): Promise<Opened | null> {
    await this.saveNow();
    return this.#other === null ? null : this.open(this.#other);
  }

  /** Another document is shown from now on: what is typed next is kept as a new draft. */
  begin(): void {
    void this.saveNow();
    this.#document += 1;
    this.#writing = this.#writing.then(() => this.#forget());
  }

  /**
   * Keeps what is typed, exactly as typed, once the keystroke is answered: a pause would be what a crash loses. Call it at
   * every change, with the same `kept` and `attachments` where these didn't change: then the texts alone are written.
   */
  keep(fields: Fields, kept: Kept, attachments: Attachments): void {
    this.#waiting = { fields, kept, attachments, document: this.#document };
    clearTimeout(this.#timer);
    if (!this.#busy) this.#timer = setTimeout(() => void this.saveNow());
  }

  /** Writes what waits. Never rejects: what went wrong is told. */
  saveNow(): Promise<void> {
    clearTimeout(this.#timer);
    const waiting = this.#waiting;
    this.#waiting = null;
    if (waiting !== null) this.#writing = this.#writing.then(() => this.#write(waiting));
    return this.#writing;
  }

  /**
   * Keeps an issued record as a frozen revision; the draft that it was issued from goes with it.
   *
   * @returns why not, where another record stands under its number and revision, or nothing can be kept; null: it is kept
   */
  async saveIssued(record: DesignRecord): Promise<Problem | null> {
    await this.saveNow();
    const { store, now, session } = this.#around;
    const draft = this.#entry?.kind === 'draft' ? this.#entry.id : null;
    try {
      const entry = issuedEntry(this.#sheet, record, sha256Of(record), now());
      const issued = await store.addIssued(entry, { record }, draft);
      if (issued.outcome === 'other') return alreadyIssued(record);
      this.#show(issued.entry, null);
      session.write(issued.entry.id);
      if (draft !== null) this.#tabs.tell({ id: draft, version: 0 });
      this.#tabs.tell({ id: issued.entry.id, version: 1 });
      this.#tell(keptNow);
      return null;
    } catch (error) {
      return { field: 'record', read: '', why: 'it isn’t kept', would: whyNotKept(error) };
    }
  }

  async #last(): Promise<Opened | null> {
    const drafts = (await this.#around.store.list()).filter(
      ({ kind, sheet }) => kind === 'draft' && sheet === this.#sheet,
    );
    const latest = drafts.toSorted((a, b) => b.savedAt - a.savedAt)[0];
    const found = latest === undefined ? null : await this.#around.store.read(latest.id);
    return found === null ? null : opened(found.entry, found.body);
  }

  #hold(found: Opened): Opened {
    this.#show(found.entry, found);
    this.#around.session.write(found.entry.id);
    this.#tell(found.entry.kind === 'draft' ? keptNow : nothingTyped);
    return found;
  }

  /** Another document from here on. What waits of the one before could not be kept, and was told so. */
  #show(entry: Entry, carried: Carried | null): void {
    this.#document += 1;
    this.#waiting = null;
    this.#entry = entry;
    this.#carried = carried;
    this.#other = null;
    this.#standing = keptNow;
  }

  #untouched(): boolean {
    return this.#entry === null && this.#waiting === null;
  }

  #forget(): void {
    this.#entry = null;
    this.#carried = null;
    this.#other = null;
    this.#standing = keptNow;
    this.#around.session.write(null);
    this.#tell(nothingTyped);
  }

  async #write(waiting: Waiting): Promise<void> {
    this.#busy = true;
    try {
      this.#tell(await this.#put(waiting));
      this.#busy = false;
      if (this.#waiting !== null) void this.saveNow();
    } catch (error) {
      this.#busy = false;
      // The next keystroke tries again, with all of it.
      if (waiting.document === this.#document) this.#waiting ??= waiting;
      this.#tell(notKept(`${whyNotKept(error)} ${stillHere}`));
    }
  }

  async #put({ fields, kept, attachments }: Waiting): Promise<Keeping> {
    const before = this.#entry;
    // An issued record is shown with texts of its own; only what differs from them was typed.
    if (before?.kind === 'issued' && sameTexts(before.fields, fields)) return nothingTyped;
    const draft = before?.kind === 'draft' ? before : newDraft(this.#sheet, fields, 0);
    const next = { ...draft, fields, savedAt: this.#around.now() };
    const same = before?.kind === 'draft' && this.#carried?.kept === kept && this.#carried.attachments === attachments;
    const body = { record: null, kept, attachments };
    const written = await this.#around.store.writeDraft(next, same ? undefined : body);
    if (written.outcome === 'written') return this.#wrote(next, body, written);
    const apart = { ...next, id: newId(), version: 0, apart: true };
    const again = await this.#around.store.writeDraft(apart, body);
    if (again.outcome !== 'written') throw new Error(`a new draft wasn't written: ${again.outcome}`);
    this.#standing = written.outcome === 'gone' ? goneElsewhere : keptApart;
    this.#other = written.outcome === 'gone' ? null : next.id;
    return this.#wrote(apart, body, again);
  }

  #wrote(entry: Entry, carried: Carried, { version }: Written & { outcome: 'written' }): Keeping {
    this.#entry = { ...entry, version };
    this.#carried = carried;
    this.#around.session.write(entry.id);
    this.#tabs.tell({ id: entry.id, version });
    return this.#standing;
  }

  #hear({ id, version }: Change): void {
    if (id !== this.#entry?.id) return;
    // One that comes late tells of what was read since; a deletion may be undone.
    const elsewhere = version === 0 || version > this.#entry.version;
    this.#other = elsewhere ? id : null;
    this.#tell(elsewhere ? changedElsewhere : this.#standing);
  }
}

const sameTexts = (a: Fields, b: Fields): boolean =>
  fieldNames.every((name) => (a[name] ?? defaults[name]) === (b[name] ?? defaults[name]));

const alreadyIssued = ({ identity: { number, revision } }: DesignRecord): Problem => ({
  field: 'revision',
  read: revision,
  why: `another record is issued and kept as ${number} revision ${revision}`,
  would: 'give the next revision, or another document number',
});

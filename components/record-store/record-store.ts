import { openDB, type DBSchema, type IDBPDatabase } from 'idb';
import type { Body, Entry } from './entry.ts';

/** Entries and what they carry lie apart: a list reads the first alone, a keystroke writes it alone. */
interface Kept extends DBSchema {
  entries: { key: string; value: Entry };
  bodies: { key: string; value: Body };
}

/** What became of a draft that was to be written. */
export type Written =
  | { readonly outcome: 'written'; readonly version: number }
  /** Another tab wrote it since it was read; nothing was changed. */
  | { readonly outcome: 'changed' }
  /** It was deleted since, or issued; nothing was changed. */
  | { readonly outcome: 'gone' };

/** What became of an issued record: `other` stands already where it would have been put. */
export type Issued = { readonly outcome: 'issued' | 'same' | 'other'; readonly entry: Entry };

/** Records kept by this browser for this site. Every method rejects where the browser keeps nothing, or has no room. */
export interface RecordStore {
  list(): Promise<readonly Entry[]>;
  /** null where it isn't there any more */
  read(id: string): Promise<{ readonly entry: Entry; readonly body: Body } | null>;
  /**
   * @param entry its `version` is the one that was read; 0: a new one
   * @param body  undefined: as it is kept already
   */
  writeDraft(entry: Entry, body: Body | undefined): Promise<Written>;
  /** @param draft id of the draft that it was issued from, which it stands for now; null: none */
  addIssued(entry: Entry, body: Body, draft: string | null): Promise<Issued>;
  /** Puts back what was deleted, as it was. */
  restore(entry: Entry, body: Body): Promise<void>;
  remove(id: string): Promise<void>;
  close(): void;
}

/** The store of this site. Opened at its first use, and again after the browser closed it. */
export function openRecordStore(name = 'ferrule'): RecordStore {
  let opening: Promise<IDBPDatabase<Kept>> | null = null;
  const forget = () => (opening = null);
  const database = (): Promise<IDBPDatabase<Kept>> => {
    if (typeof indexedDB === 'undefined') throw new DOMException('no IndexedDB', 'InvalidStateError');
    opening ??= openDB<Kept>(name, 1, {
      upgrade(fresh) {
        fresh.createObjectStore('entries', { keyPath: 'id' });
        fresh.createObjectStore('bodies');
      },
      // A later version of the site waits in another tab.
      blocking(_, __, event) {
        (event.target as IDBDatabase).close();
        forget();
      },
      terminated: forget,
    }).catch((error: unknown) => {
      forget();
      throw error;
    });
    return opening;
  };
  /** One transaction over both: all of it is kept, or nothing. */
  const writing = async () => {
    const transaction = (await database()).transaction(['entries', 'bodies'], 'readwrite');
    // Its failure is told by the request that caused it, or at the end.
    transaction.done.catch(() => undefined);
    return {
      entries: transaction.objectStore('entries'),
      bodies: transaction.objectStore('bodies'),
      done: transaction.done,
    };
  };

  return {
    list: async () => (await database()).getAll('entries'),

    read: async (id) => {
      const transaction = (await database()).transaction(['entries', 'bodies']);
      const [entry, body] = await Promise.all([
        transaction.objectStore('entries').get(id),
        transaction.objectStore('bodies').get(id),
      ]);
      return entry === undefined || body === undefined ? null : { entry, body };
    },

    writeDraft: async (entry, body) => {
      const { entries, bodies, done } = await writing();
      const before = await entries.get(entry.id);
      if (entry.version > 0 && before?.kind !== 'draft') return { outcome: 'gone' };
      if ((before?.version ?? 0) !== entry.version) return { outcome: 'changed' };
      const version = entry.version + 1;
      await whole(done, [...(body ? [bodies.put(body, entry.id)] : []), entries.put({ ...entry, version })]);
      return { outcome: 'written', version };
    },

    addIssued: async (entry, body, draft) => {
      const { entries, bodies, done } = await writing();
      const before = (await entries.getAll()).find((each) => each.kind === 'issued' && sameRevision(each, entry));
      if (before !== undefined && before.seal !== entry.seal) return { outcome: 'other', entry: before };
      const added = before === undefined ? [bodies.put(body, entry.id), entries.put(entry)] : [];
      const dropped = draft === null ? [] : [entries.delete(draft), bodies.delete(draft)];
      await whole(done, [...added, ...dropped]);
      return { outcome: before === undefined ? 'issued' : 'same', entry: before ?? entry };
    },

    restore: async (entry, body) => {
      const { entries, bodies, done } = await writing();
      await whole(done, [bodies.put(body, entry.id), entries.put(entry)]);
    },

    remove: async (id) => {
      const { entries, bodies, done } = await writing();
      await whole(done, [entries.delete(id), bodies.delete(id)]);
    },

    close: () => {
      opening?.then((open) => open.close()).catch(() => undefined);
      forget();
    },
  };
}

/** A transaction's end. Where it fails, its own error tells why; those of its requests may only tell that it did. */
async function whole(done: Promise<void>, requests: readonly Promise<unknown>[]): Promise<void> {
  const [, failed] = await Promise.allSettled([done, Promise.all(requests)]);
  await done;
  if (failed.status === 'rejected') throw failed.reason;
}

const trimmed = (text: string | undefined): string => (text ?? '').trim();

/** Of one document and one revision of it. */
export const sameRevision = ({ fields: a }: Entry, { fields: b }: Entry): boolean =>
  trimmed(a.number) === trimmed(b.number) && trimmed(a.revision) === trimmed(b.revision);

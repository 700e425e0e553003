import type { Body, Entry } from '../../../../components/record-store/entry.ts';
import type { RecordStore } from '../../../../components/record-store/record-store.ts';

/** A store that forgets, and says no when it is told to. Issued records are the browser tests' business. */
export function memoryStore(): RecordStore & { readonly entries: Map<string, Entry>; full: boolean } {
  const entries = new Map<string, Entry>();
  const bodies = new Map<string, Body>();
  const store = {
    entries,
    full: false,
    list: () => Promise.resolve([...entries.values()]),
    read: (id: string) => {
      const [entry, body] = [entries.get(id), bodies.get(id)];
      return Promise.resolve(entry === undefined || body === undefined ? null : { entry, body });
    },
    writeDraft: (entry: Entry, body: Body | undefined) => {
      if (store.full) return Promise.reject(new DOMException('full', 'QuotaExceededError'));
      if ((entries.get(entry.id)?.version ?? 0) !== entry.version)
        return Promise.resolve({ outcome: 'changed' as const });
      const version = entry.version + 1;
      entries.set(entry.id, { ...entry, version });
      if (body !== undefined) bodies.set(entry.id, body);
      return Promise.resolve({ outcome: 'written' as const, version });
    },
    addIssued: () => Promise.reject(new Error('not here')),
    restore: (entry: Entry, body: Body) => {
      entries.set(entry.id, entry);
      bodies.set(entry.id, body);
      return Promise.resolve();
    },
    remove: (id: string) => {
      entries.delete(id);
      bodies.delete(id);
      return Promise.resolve();
    },
    close: () => undefined,
  };
  return store;
}

import { describe, expect, it } from 'vitest';
import { DraftKeeper } from '../../../../components/record-store/draft-keeper.ts';
import type { Keeping } from '../../../../components/record-store/keeping.ts';
import type { Change } from '../../../../components/record-store/tabs.ts';
import type { Fields } from '../../../../src/record/fields.ts';
import { nothingKept } from '../../../../src/record/kept.ts';
import { memoryStore } from './memory-store.ts';

const attachments = new Map();

/** A keeper of which every surrounding is the test's own. */
function keeping(store = memoryStore()) {
  const said: Keeping[] = [];
  const told: Change[] = [];
  let open: string | null = null;
  let hear: (change: Change) => void = () => undefined;
  const keeper = new DraftKeeper('two-element', (each) => said.push(each), {
    store,
    session: { read: () => open, write: (id) => (open = id) },
    join: (listener) => {
      hear = listener;
      return { tell: (change) => told.push(change), close: () => undefined };
    },
    now: () => 1000 + told.length,
  });
  return {
    keeper,
    store,
    said,
    told,
    hear: (change: Change) => hear(change),
    open: () => open,
    type: (fields: Fields) => keeper.keep(fields, nothingKept, attachments),
    texts: () => [...store.entries.values()].map(({ fields }) => fields.load),
  };
}

describe('DraftKeeper.keep(fields, kept, attachments)', () => {
  it('writes one draft again and again, counts, and tells other tabs', async () => {
    const { keeper, type, texts, told, said } = keeping();
    type({ load: '1' });
    await keeper.saveNow();
    type({ load: '12' });
    await keeper.saveNow();
    expect(texts()).toEqual(['12']);
    expect(told.map(({ version }) => version)).toEqual([1, 2]);
    expect(said.map(({ state }) => state)).toEqual(['kept', 'kept']);
  });

  it('keeps the last of many letters, by itself', async () => {
    const { type, texts, said } = keeping();
    for (const load of ['1', '12', '123']) type({ load });
    await expect.poll(() => said.length).toBe(1);
    expect(texts()).toEqual(['123']);
  });

  it('tries again with all that is typed after there was no room', async () => {
    const { keeper, store, type, texts, said } = keeping();
    store.full = true;
    type({ load: '1' });
    await keeper.saveNow();
    expect(said.at(-1)).toMatchObject({ state: 'not kept' });
    store.full = false;
    await keeper.saveNow();
    expect(texts()).toEqual(['1']);
    expect(said.at(-1)).toMatchObject({ state: 'kept' });
  });
});

describe('DraftKeeper.begin()', () => {
  it('never takes what is typed next for the document before, not even at once', async () => {
    const { keeper, type, texts } = keeping();
    type({ load: 'first' });
    keeper.begin();
    type({ load: 'second' });
    await keeper.saveNow();
    expect(texts()).toEqual(['first', 'second']);
  });

  it('does not put into the next document what there was no room for', async () => {
    const { keeper, store, type, texts } = keeping();
    store.full = true;
    type({ load: 'first' });
    await keeper.saveNow();
    keeper.begin();
    await keeper.saveNow();
    store.full = false;
    type({ load: 'second' });
    await keeper.saveNow();
    expect(texts()).toEqual(['second']);
  });
});

describe('DraftKeeper with another tab', () => {
  it('says that the document was changed, and unsays it where that was undone', async () => {
    const { keeper, type, hear, open, said } = keeping();
    type({ load: '1' });
    await keeper.saveNow();
    const id = open()!;
    hear({ id: 'another', version: 9 });
    expect(said.at(-1)!.state).toBe('kept');
    hear({ id, version: 0 });
    expect(said.at(-1)!.state).toBe('changed elsewhere');
    hear({ id, version: 1 });
    expect(said.at(-1)!.state).toBe('kept');
  });

  it('keeps apart what was typed in the tab that comes second, and opens the other’s on demand', async () => {
    const store = memoryStore();
    const [a, b] = [keeping(store), keeping(store)];
    a.type({ load: '1' });
    await a.keeper.saveNow();
    await b.keeper.open(a.open()!);
    a.type({ load: '2' });
    await a.keeper.saveNow();
    b.type({ load: '3' });
    await b.keeper.saveNow();
    expect(b.texts()).toEqual(['2', '3']);
    expect(b.said.at(-1)!.state).toBe('kept apart');
    expect((await b.keeper.openOther())?.fields).toEqual({ load: '2' });
    b.type({ load: '4' });
    await b.keeper.saveNow();
    expect(b.texts()).toEqual(['4', '3']);
  });
});

describe('DraftKeeper.recall(address)', () => {
  it('is quicker than no hand: what is typed before it answers is a document of its own', async () => {
    const store = memoryStore();
    const before = keeping(store);
    before.type({ load: '1' });
    await before.keeper.saveNow();
    const after = keeping(store);
    const recalled = after.keeper.recall(null);
    after.type({ load: '2' });
    expect(await recalled).toMatchObject({ own: false, fields: { load: '1' } });
    await after.keeper.saveNow();
    expect(after.texts()).toEqual(['1', '2']);
  });

  it('offers the last draft of its own sheet alone', async () => {
    const store = memoryStore();
    const before = keeping(store);
    before.type({ load: '1' });
    await before.keeper.saveNow();
    const elsewhere = new DraftKeeper('cascade', () => undefined, {
      store,
      session: { read: () => null, write: () => undefined },
      join: () => ({ tell: () => undefined, close: () => undefined }),
      now: () => 0,
    });
    expect(await elsewhere.recall(null)).toBeNull();
    expect(await keeping(store).keeper.recall({ load: '50' })).toBeNull();
    expect(await keeping(store).keeper.recall(null)).toMatchObject({ own: false });
  });
});

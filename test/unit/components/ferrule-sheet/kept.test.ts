import { describe, expect, it } from 'vitest';
import { keptFor, noneKept, withStock } from '../../../../components/ferrule-sheet/kept.ts';

const list = { name: 'shelf.csv', sha256: '0'.repeat(64), parts: [] };
const history = [{ revision: 'A', date: '2026-01-02', change: '', digest: '0'.repeat(64) }];
const kept = withStock({ ...noneKept, history, document: 'TGT-1' }, list);

describe('keptFor(kept, fields)', () => {
  it('keeps a document’s history with that document', () => {
    expect(keptFor(kept, { number: 'TGT-1' })).toBe(kept);
  });

  it('takes stock lists along to another, and nothing else', () => {
    const other = keptFor(kept, { number: 'TGT-2' });
    expect(other.history).toEqual([]);
    expect(other.stock.get('shelf.csv')).toBe(list);
  });
});

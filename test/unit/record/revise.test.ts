import { describe, expect, it } from 'vitest';
import { digestOf } from '../../../src/record/canonical.ts';
import type { DesignRecord } from '../../../src/record/design-record.ts';
import { readRecord } from '../../../src/record/read-record.ts';
import { frozen, revise } from '../../../src/record/revise.ts';
import { plainRecord } from './plain-record.ts';

const issued: DesignRecord = {
  ...plainRecord,
  identity: { ...plainRecord.identity, revision: 'A', date: '2026-01-31' },
  signOff: {
    state: 'issued',
    prepared: { name: 'P', role: 'RF design', date: '2026-01-29', remark: 'first' },
    checked: { name: 'C', role: 'RF review', date: '2026-01-30', remark: '' },
    approved: { name: 'A', role: 'Product', date: '2026-01-31', remark: '' },
  },
};
const next = { revision: 'B', change: 'Band widened for the new whip', date: '2026-03-02' };

describe('revise(record, next)', () => {
  const revised = revise(issued, next);

  it('starts a draft with the new revision, its date and its reason', () => {
    expect(revised.identity).toEqual({ ...issued.identity, ...next });
    expect(frozen(revised)).toBe(false);
  });

  it('writes the issued revision into the history, with its digest', () => {
    expect(revised.history).toEqual([{ revision: 'A', date: '2026-01-31', change: '', digest: digestOf(issued) }]);
  });

  it('keeps the issued record whole, but for the one before it', () => {
    expect(revised.previous).toEqual(issued);
    const third = revise({ ...revised, signOff: issued.signOff }, { ...next, revision: 'C' });
    expect(third.previous).toEqual({ ...revised, signOff: issued.signOff, previous: null });
    expect(third.history.map(({ revision, change }) => [revision, change])).toEqual([
      ['A', ''],
      ['B', next.change],
    ]);
    // The digest of the revision before is the one in the history, whatever came before that.
    expect(digestOf(third.previous!)).toBe(third.history.at(-1)!.digest);
    expect(readRecord(JSON.stringify(third))).toEqual(third);
    const forged = { ...third, previous: { ...third.previous!, method: 'pi' as const } };
    expect(() => readRecord(JSON.stringify(forged))).toThrow('the revision before is not the one');
  });

  it('keeps who signs and clears that they signed', () => {
    expect(revised.signOff).toEqual({
      state: 'draft',
      prepared: { name: 'P', role: 'RF design', date: '', remark: '' },
      checked: { name: 'C', role: 'RF review', date: '', remark: '' },
      approved: { name: 'A', role: 'Product', date: '', remark: '' },
    });
  });

  it('leaves the measurement of the earlier boards with the earlier revision', () => {
    const data = {
      name: 'board.s1p',
      sha256: 'a'.repeat(64),
      samples: 1,
      thinningError: 0,
      referenceOhm: 50,
      frequencyHz: [1e6],
      re: [0],
      im: [0],
    };
    const measured = { ...issued, asBuilt: { measured: data, state: null, note: 'board 3' } };
    expect(revise(measured, next).asBuilt).toBeNull();
    expect(revise(measured, next).previous?.asBuilt).toEqual(measured.asBuilt);
  });

  it('refuses what is not issued, a revision that exists, and a change without its reason', () => {
    expect(() => revise(revised, { ...next, revision: 'C' })).toThrow(
      'state "draft": only an issued record is revised',
    );
    expect(() => revise(issued, { ...next, revision: 'A ' })).toThrow(
      'this revision exists already; give the next one',
    );
    expect(() => revise(issued, { ...next, change: ' \n' })).toThrow('change: a revision needs its reason');
  });
});

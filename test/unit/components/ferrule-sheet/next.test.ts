import { describe, expect, it } from 'vitest';
import { isFrozen, waitingFor } from '../../../../components/ferrule-sheet/frozen.ts';
import { startNext } from '../../../../components/ferrule-sheet/next.ts';
import { settle } from '../../../../components/ferrule-sheet/settle.ts';
import { today } from '../../../../components/ferrule-sheet/today.ts';
import { digestOf } from '../../../../src/record/canonical.ts';
import { readDraft } from '../../../../src/record/draft.ts';
import { defaults } from '../../../../src/record/fields.ts';

const issued = {
  ...defaults,
  frequency: '10M',
  source: '1k5',
  load: '50',
  number: 'EX-1',
  date: '2026-01-02',
  state: 'issued',
  'prepared-name': 'P',
  'prepared-date': '2026-01-02',
  'prepared-remark': 'as simulated',
};
const draft = readDraft(issued);

describe('startNext(draft, waiting, typed, change, date)', () => {
  it('starts a draft of the next revision with what was typed since', () => {
    const next = startNext(draft, { issued }, { ...issued, load: '75' }, 'another load', '2027-03-04');
    if ('problem' in next) throw new Error(next.problem.why);
    expect(next.fields).toEqual({
      ...issued,
      load: '75',
      revision: 'B',
      date: '2027-03-04',
      change: 'another load',
      state: 'draft',
      'prepared-date': '',
      'prepared-remark': '',
    });
    expect(next.kept.history).toEqual([
      { revision: 'A', date: '2026-01-02', change: '', digest: digestOf(draft.record!) },
    ]);
    expect(next.kept.previous).toEqual(draft.record);
    expect(readDraft(next.fields, new Map(), next.kept).problems).toEqual([]);
  });

  it('takes the revision and the date that were typed', () => {
    const next = startNext(draft, { issued }, { ...issued, revision: '2', date: '2027-05-06' }, 'why', '2027-03-04');
    expect(next).toMatchObject({ fields: { revision: '2', date: '2027-05-06' } });
  });

  it('carries the board measured since, and no other', () => {
    const board = { measured: draft.record!, state: null, note: '' } as never;
    expect(startNext(draft, { issued, board }, issued, 'as built', '2027-03-04')).toMatchObject({
      kept: { asBuilt: board },
    });
    expect(startNext(draft, { issued }, issued, 'why', '2027-03-04')).toMatchObject({ kept: { asBuilt: null } });
  });

  it('tells why there is no next revision', () => {
    expect(startNext(draft, { issued }, issued, ' ', '2027-03-04')).toMatchObject({ problem: { field: 'change' } });
    const open = readDraft({ ...issued, state: 'draft' });
    expect(startNext(open, { issued }, issued, 'why', '2027-03-04')).toMatchObject({ problem: { field: 'state' } });
  });
});

describe('isFrozen(settled)', () => {
  it('holds for an issued record that can be read', () => {
    expect(isFrozen(settle(issued, null))).toBe(true);
    expect(isFrozen(settle({ ...issued, state: 'for review' }, null))).toBe(false);
    expect(isFrozen(settle({ ...issued, load: '?' }, null))).toBe(false);
  });
});

describe('waitingFor(waiting, typed)', () => {
  it('is nothing once everything stands as it was issued', () => {
    expect(waitingFor({ issued }, { ...issued, load: '75' })).toEqual({ issued });
    expect(waitingFor({ issued }, { ...issued })).toBeNull();
    expect(waitingFor({ issued, board: null }, issued)).toEqual({ issued, board: null });
  });
});

describe('today(now)', () => {
  it('is the calendar date where the reader is', () => {
    expect(today(new Date(2026, 0, 2, 23, 59))).toBe('2026-01-02');
  });
});

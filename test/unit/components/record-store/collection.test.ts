import { describe, expect, it } from 'vitest';
import {
  collectionText,
  readCollection,
  sealOf,
  type TypedDraft,
} from '../../../../components/record-store/collection.ts';
import { InputError } from '../../../../src/quantity/problem.ts';
import { revise } from '../../../../src/record/revise.ts';
import { plainRecord } from '../../record/plain-record.ts';

const signed = { ...plainRecord, signOff: { ...plainRecord.signOff, state: 'issued' as const } };
const next = revise(signed, { revision: 'B', change: 'Another whip', date: '2026-03-01' });
const measured = {
  measured: {
    name: 'whip.s1p',
    sha256: 'a'.repeat(64),
    samples: 2,
    thinningError: 0,
    referenceOhm: 50,
    frequencyHz: [150e6, 152e6],
    re: [0.1, 0.2],
    im: [0, -0.1],
  },
};
const list = {
  name: 'parts.csv',
  sha256: 'b'.repeat(64),
  parts: [
    {
      name: 'P1',
      kind: 'inductor' as const,
      value: 1e-8,
      tolerance: null,
      q: null,
      qAtHz: null,
      selfResonanceHz: null,
      eslH: null,
      ratedVolts: null,
      ratedAmps: null,
    },
  ],
};
const typed: TypedDraft = {
  sheet: 'cascade',
  fields: { load: '9.4 - k61', title: ' two\nlines ', sections: '3' },
  kept: {
    stock: new Map([[list.name, list]]),
    history: next.history,
    previous: next.previous,
    asBuilt: { measured: measured.measured, state: 'in hand', note: 'board 3' },
  },
  attachments: new Map([['whip.s1p', measured]]),
};

describe('readCollection(collectionText(collection))', () => {
  it('is the same: records, and drafts with all they carry, exactly as typed', () => {
    expect(readCollection(collectionText({ records: [signed, next], drafts: [typed] }))).toEqual({
      records: [signed, next],
      drafts: [typed],
      refused: [],
    });
  });

  it('takes the good ones of a file and tells of the others by place, number and revision', () => {
    const text = JSON.stringify({
      schema: 'ferrule-records/1',
      records: [{ ...signed, aim: 'up' }, signed],
      drafts: [
        { sheet: 'cascade', fields: { number: 'X-1', revision: 'Q', load: 5 } },
        { sheet: 'cascade', fields: { nonsense: '5' } },
        { sheet: 'cascade', fields: {}, asBuilt: { measured: 1 } },
        { sheet: 'cascade', fields: {}, stock: [{ name: 'x' }] },
      ],
    });
    const { records, drafts, refused } = readCollection(text);
    expect(records).toEqual([signed]);
    expect(drafts).toEqual([]);
    expect(refused).toHaveLength(5);
    expect(refused[0]).toBe(
      'record 1 (EX-014, revision A): aim "up": the aim is unknown; give conjugate or reflectionless',
    );
    expect(refused[1]).toBe(
      'draft 1 (X-1, revision Q): load: not a text that a field can hold; give the draft as it was saved',
    );
    expect(refused[2]).toMatch(/^draft 2: nonsense "5": this field is unknown;/);
    expect(refused[3]).toMatch(/^draft 3: asBuilt\.measured/);
    expect(refused[4]).toMatch(/^draft 4: build\.stock/);
  });

  it('reads a file of one record', () => expect(readCollection(JSON.stringify(signed)).records).toEqual([signed]));
});

it.each([
  '',
  'x',
  'null',
  '[]',
  '{}',
  '{"schema":7}',
  '{"schema":"ferrule-records/1","records":{}}',
  '{"schema":"a","schema":"b"}',
])('readCollection(%j) refuses it in one line', (text) => {
  expect(() => readCollection(text)).toThrow(InputError);
  expect(() => readCollection(text)).toThrow(
    /^file[^\n]*; give a file of schema ferrule-records\/1 or a design record$/,
  );
});

describe('sealOf(draft)', () => {
  it('tells typed texts apart letter for letter, but not a default from nothing', () => {
    expect(sealOf({ ...typed, fields: { ...typed.fields, aim: 'conjugate' } })).toBe(sealOf(typed));
    expect(sealOf({ ...typed, fields: { ...typed.fields, load: '9.4 -k61' } })).not.toBe(sealOf(typed));
  });
});

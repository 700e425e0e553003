import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { checkRecord } from '../../../src/record/check-record.ts';
import { migrate, neededVersion } from '../../../src/record/migrate.ts';

/** A record as it was saved when the schema was ferrule-record/1. */
const saved = (name: string): Record<string, unknown> =>
  JSON.parse(readFileSync(new URL(`schema-1/${name}.json`, import.meta.url), 'utf8'));

const names = ['tide-gauge', 'crystal-filter', 'power-stage'];

describe('migrate(value)', () => {
  it.each(names)('makes a record of schema 1 one of schema 2: %s', (name) => {
    const before = saved(name);
    const record = checkRecord(migrate(before));
    expect(record).toEqual({
      ...before,
      schema: 'ferrule-record/2',
      identity: { ...(before.identity as object), change: '' },
      build: null,
      selection: { option: null, reason: '', set: 1 },
      deviations: [],
      history: [],
      previous: null,
      asBuilt: null,
      signOff: {
        state: 'draft',
        prepared: { name: '', role: 'RF design', date: '', remark: '' },
        checked: { name: '', role: 'RF review', date: '', remark: '' },
        approved: { name: '', role: 'Product integrity', date: '', remark: '' },
      },
    });
  });

  it('leaves what it was given as it was', () => {
    const before = saved('tide-gauge');
    migrate(before);
    expect(before).toEqual(saved('tide-gauge'));
  });

  it('loses no field that schema 1 had not: the schema is to judge it', () => {
    const odd = { ...saved('tide-gauge'), build: 'what?', colour: 'green' };
    expect(migrate(odd)).toMatchObject({ build: 'what?', colour: 'green' });
  });

  it('adds no signature that is missing', () => {
    const { signOff, ...rest } = saved('tide-gauge') as { signOff: Record<string, unknown> };
    const { checked: _, ...others } = signOff;
    expect(() => checkRecord(migrate({ ...rest, signOff: others }))).toThrow(/signOff\.checked: this field is missing/);
  });

  it.each([
    null,
    7,
    'ferrule-record/1',
    [],
    {},
    { schema: 'ferrule-record/2', identity: {} },
    { schema: 'ferrule-record/3' },
  ])('leaves %j as it is', (value) => {
    expect(migrate(value)).toBe(value);
  });

  it.each([{ identity: null }, { identity: 'x', selection: 3, signOff: [] }, { signOff: { prepared: null } }])(
    'leaves the broken fields of %j to the schema',
    (fields) => {
      expect(migrate({ schema: 'ferrule-record/1', ...fields })).toMatchObject(fields);
    },
  );
});

describe('neededVersion(value)', () => {
  it('says which schema a later record needs', () => {
    expect(neededVersion({ schema: 'ferrule-record/3' })).toEqual({
      field: 'schema',
      read: 'ferrule-record/3',
      why: 'a later Ferrule wrote this record; this one reads up to ferrule-record/2',
      would: 'open it with a Ferrule that reads ferrule-record/3',
    });
  });

  it.each([
    null,
    'ferrule-record/3',
    {},
    { schema: 3 },
    { schema: 'ferrule-record/1' },
    { schema: 'ferrule-record/2' },
    { schema: 'ferrule-record/03' },
    { schema: 'ferrule-record/3.1' },
    { schema: 'another/3' },
  ])('has nothing to say of %j', (value) => {
    expect(neededVersion(value)).toBeNull();
  });
});

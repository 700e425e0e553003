import { describe, expect, it } from 'vitest';
import { formatProblem, InputError } from '../../../src/quantity/problem.ts';
import { digestOf } from '../../../src/record/canonical.ts';
import { checkRecord } from '../../../src/record/check-record.ts';
import { recordOf } from '../record-of.ts';

const record = recordOf({ frequency: '151.25M', source: '50', load: '9.4-j61' });

function linesOf(value: unknown): string[] {
  try {
    checkRecord(value);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return error.problems.map(formatProblem);
  }
  return [];
}

describe('checkRecord(value)', () => {
  it('tells of another document only that it is one', () => {
    expect(linesOf([])).toEqual(['record "a list": not an object; give the fields that the schema names']);
    expect(linesOf({})).toEqual(['schema: this field is missing; give it']);
    expect(linesOf({ schema: 'ferrule-dossier/1' })).toEqual([
      'schema "ferrule-dossier/1": this schema is unknown; give "ferrule-record/2"',
    ]);
  });

  it('does not follow revisions into each other', () => {
    const history = [{ revision: 'A', date: '2026-01-31', change: '', digest: digestOf(record) }];
    expect(linesOf({ ...record, history, previous: record })).toEqual([]);
    expect(linesOf({ ...record, previous: record })).toEqual([
      expect.stringMatching(/^previous ".*": the revision before is not the one that the history ends with; /u),
    ]);
    expect(linesOf({ ...record, previous: { ...record, previous: record } })).toEqual([
      'previous.previous: the revision before has one before it; keep only the last',
    ]);
  });

  it('tells thirty fields, and how many more there are', () => {
    const state = { name: 'a', termination: { r: -1, x: 0, behaviour: 'series' } };
    const lines = linesOf({ ...record, loads: new Array(40).fill(state) });
    expect(lines).toHaveLength(31);
    expect(lines[29]).toMatch(/^loads\.29\.termination\.r "-1": /u);
    expect(lines[30]).toBe('record: 10 more problems; mend these first');
  });
});

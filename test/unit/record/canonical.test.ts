import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { canonical, digestOf } from '../../../src/record/canonical.ts';
import type { DesignRecord } from '../../../src/record/design-record.ts';
import { recordOf } from '../record-of.ts';

const record = recordOf({ frequency: '151.25M', source: '50', load: '9.4-j61', title: 'Ω µ ° — “quoted”' });

/** RFC 8785 for what a record can hold: names sorted by code unit, numbers and strings as ECMAScript writes them. */
function byHand(value: unknown): string {
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  if (Array.isArray(value)) return `[${value.map(byHand).join(',')}]`;
  const names = Object.keys(value).sort();
  return `{${names.map((name) => `${JSON.stringify(name)}:${byHand((value as Record<string, unknown>)[name])}`).join(',')}}`;
}

describe('canonical(record)', () => {
  it('sorts names and leaves no space', () => {
    expect(canonical({ b: 1, a: { d: null, c: true } })).toBe('{"a":{"c":true,"d":null},"b":1}');
    expect(canonical(record)).toBe(byHand(record));
  });
});

describe('digestOf(record)', () => {
  it("is SHA-256 of the canonical form without its sign-off, by Node's own hash", () => {
    const signed = Object.fromEntries(
      Object.entries(record).filter(([name]) => name !== 'signOff' && name !== 'previous'),
    );
    expect(digestOf(record)).toBe(createHash('sha256').update(byHand(signed), 'utf8').digest('hex'));
  });

  it('stays the same when the sign-off changes, and not when a reason does', () => {
    const signature = { name: 'A. Reviewer', role: 'RF review', date: '2026-02-01', remark: '' };
    const signed: DesignRecord = {
      ...record,
      signOff: { state: 'for review', prepared: signature, checked: signature, approved: signature },
    };
    const reasoned: DesignRecord = { ...record, selection: { option: null, reason: 'cheaper', set: 1 } };
    expect(digestOf(signed)).toBe(digestOf(record));
    expect(digestOf(reasoned)).not.toBe(digestOf(record));
  });
});

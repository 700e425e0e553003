import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { digestOf } from '../../src/record/canonical.ts';
import type { DesignRecord } from '../../src/record/design-record.ts';
import { readDraft } from '../../src/record/draft.ts';
import { fieldsOf } from '../../src/record/fields.ts';
import { keptOf } from '../../src/record/kept.ts';
import { readRecord } from '../../src/record/read-record.ts';
import { anyRecord } from './records.ts';

const runs = { numRuns: 200 };

describe('a design record of any admissible values', () => {
  it('reads back from its JSON as itself', () => {
    fc.assert(
      fc.property(anyRecord(), (record) => {
        expect(readRecord(JSON.stringify(record))).toEqual(record);
      }),
      runs,
    );
  });

  it('reads back from the texts of its fields as itself, to the last digit', () => {
    fc.assert(
      fc.property(anyRecord(1e4), (record) => {
        const { record: again, problems } = readDraft(fieldsOf(record), new Map(), keptOf(record));
        expect(problems).toEqual([]);
        expect(again).toEqual(record);
      }),
      runs,
    );
  });

  it('keeps a digest that every field but the sign-off changes', () => {
    fc.assert(
      fc.property(anyRecord(), (record) => {
        const digest = digestOf(record);
        expect(digest).toMatch(/^[0-9a-f]{64}$/);
        const changed = variants(record);
        for (const { path, record: other } of changed) {
          expect([path, digestOf(other) === digest]).toEqual([
            path,
            path.startsWith('signOff.') || path.startsWith('previous'),
          ]);
        }
        expect(changed.length).toBeGreaterThan(30);
      }),
      { numRuns: 20 },
    );
  });

  it('keeps its digest when its fields are written in another order', () => {
    fc.assert(
      fc.property(anyRecord(), (record) => {
        expect(digestOf(reordered(record))).toBe(digestOf(record));
      }),
      runs,
    );
  });
});

/** The record once for each of its values, with that one altered and all others as they were. */
function variants(record: DesignRecord): { path: string; record: DesignRecord }[] {
  const leaves = (value: unknown, path: readonly string[]): (readonly string[])[] =>
    typeof value === 'object' && value !== null
      ? Object.entries(value).flatMap(([name, inner]) => leaves(inner, [...path, name]))
      : [path];
  const alter = (value: unknown, [name, ...rest]: readonly string[]): unknown => {
    if (Array.isArray(value))
      return (value as unknown[]).map((inner, k) => (String(k) === name ? alter(inner, rest) : inner));
    if (name !== undefined) {
      const object = value as Record<string, unknown>;
      return { ...object, [name]: alter(object[name], rest) };
    }
    if (typeof value === 'number') return value === 0 ? 1 : value * (1 + 2 * Number.EPSILON);
    if (typeof value === 'boolean') return !value;
    return value === null ? 1 : `${value as string}x`;
  };
  return leaves(record, []).map((path) => ({ path: path.join('.'), record: alter(record, path) as DesignRecord }));
}

function reordered<T>(value: T): T {
  if (typeof value !== 'object' || value === null) return value;
  if (Array.isArray(value)) return value.map(reordered) as T;
  const entries = Object.entries(value).map(([name, inner]): [string, unknown] => [name, reordered(inner)]);
  return Object.fromEntries(entries.reverse()) as T;
}

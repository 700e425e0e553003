import * as v from 'valibot';
import { InputError, type Problem } from '../quantity/problem.ts';
import type { DesignRecord } from './design-record.ts';
import { recordSchema } from './schema.ts';

/**
 * A value as a design record.
 *
 * @throws InputError with one problem per field that can't be used
 */
export function checkRecord(value: unknown): DesignRecord {
  const result = v.safeParse(recordSchema, value);
  if (result.success) return result.output;
  const problems = result.issues.map(problemOf);
  // One problem a field: a second check on the same value says nothing new.
  throw new InputError(...problems.filter(({ field }, k) => problems.findIndex((p) => p.field === field) === k));
}

function problemOf(issue: v.BaseIssue<unknown>): Problem {
  const field = v.getDotPath(issue) ?? 'record';
  // A rule between fields is told of one of them: what stands in that one is what was read.
  const place = issue.path?.at(-1);
  const read = shown(place === undefined ? issue.input : place.value);
  if (issue.expected === 'never') {
    return { field, read, why: 'this field is unknown', would: 'leave it out or check its spelling' };
  }
  if (issue.received === 'undefined') return { field, read: '', why: 'this field is missing', would: 'give it' };
  if (issue.expected === 'Object')
    return { field, read, why: 'not an object', would: 'give the fields that the schema names' };
  const [why = issue.message, would = 'see the schema of the record'] = issue.message.split('; ');
  return { field, read, why, would };
}

function shown(value: unknown): string {
  if (typeof value === 'string') return value;
  if (value === undefined) return '';
  // JSON's 1e400 is read as infinity, which is nothing to show.
  if (typeof value === 'number') return Number.isFinite(value) ? String(value) : '';
  if (typeof value === 'object' && value !== null) {
    if ('low' in value && 'high' in value && Object.keys(value).length === 2) {
      return `${shown(value.low)}..${shown(value.high)}`;
    }
    return Array.isArray(value) ? 'a list' : '';
  }
  return JSON.stringify(value);
}

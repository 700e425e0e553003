import * as v from 'valibot';
import { InputError, type Problem } from '../quantity/problem.ts';
import { digestOf } from './canonical.ts';
import type { DesignRecord } from './design-record.ts';
import { recordSchema } from './schema.ts';

/** Most fields told at once; a file made to do harm could have as many wrong ones as it has values. */
const mostProblems = 30;

/** The revision before is the one that the history ends with: its digest says so. */
function checkHistory({ previous, history }: DesignRecord): void {
  if (previous === null) return;
  const digest = digestOf(previous);
  if (history.at(-1)?.digest === digest) return;
  throw new InputError({
    field: 'previous',
    read: `${previous.identity.revision}, digest ${digest.slice(0, 16)}…`,
    why: 'the revision before is not the one that the history ends with',
    would: 'take the record as it was saved',
  });
}

/** At or below the design frequency an inductor that resonates by itself is none. */
function checkResonance({ build, requirement }: DesignRecord): void {
  const resonance = build?.selfResonanceHz ?? null;
  if (resonance === null || resonance > requirement.frequencyHz) return;
  throw new InputError({
    field: 'build.selfResonanceHz',
    read: `${String(resonance)} Hz`,
    why: 'at or below the design frequency: there it is no inductor',
    would: 'give a higher one, as 900M, or leave it out',
  });
}

/**
 * A value as a design record.
 *
 * @throws InputError with one problem per field that can't be used, 30 at most and then how many more there are; of another document, that it is one
 */
export function checkRecord(value: unknown): DesignRecord {
  const misplaced = misplacedIn(value);
  if (misplaced !== null) throw new InputError(misplaced);
  const result = v.safeParse(recordSchema, value, { abortPipeEarly: true });
  if (result.success) {
    checkHistory(result.output);
    checkResonance(result.output);
    return result.output;
  }
  const issues = result.issues.length > mostProblems ? result.issues : issuesOf(value);
  // One problem a field: a second check on the same value says nothing new.
  const problems = new Map<string, Problem>();
  let more = 0;
  for (const issue of issues) {
    if (problems.size === mostProblems) more += 1;
    else {
      const problem = problemOf(issue);
      // What is no record of this schema needn't be told field by field.
      if (problem.field === 'schema') throw new InputError(problem);
      if (!problems.has(problem.field)) problems.set(problem.field, problem);
    }
  }
  const rest = { field: 'record', read: '', why: `${String(more)} more problems`, would: 'mend these first' };
  throw new InputError(...problems.values(), ...(more === 0 ? [] : [rest]));
}

/**
 * Those of rules between fields among them. The schema compares each with all before it once for every such rule, so
 * that they are asked for only where they are few.
 */
const issuesOf = (value: unknown): readonly v.BaseIssue<unknown>[] => v.safeParse(recordSchema, value).issues ?? [];

/** What is told before the schema is asked: it takes a list for an object, and goes down as deep as revisions do. */
function misplacedIn(value: unknown): Problem | null {
  if (Array.isArray(value)) {
    return { field: 'record', read: 'a list', why: 'not an object', would: 'give the fields that the schema names' };
  }
  const earlier = inside(inside(value, 'previous'), 'previous');
  if (earlier === null || earlier === undefined) return null;
  return {
    field: 'previous.previous',
    read: '',
    why: 'the revision before has one before it',
    would: 'keep only the last',
  };
}

const inside = (value: unknown, name: string): unknown =>
  typeof value === 'object' && value !== null && Object.hasOwn(value, name) ? Reflect.get(value, name) : undefined;

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

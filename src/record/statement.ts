import { formatRead } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import type { Unit } from '../quantity/unit.ts';
import { canonical } from './canonical.ts';
import type { Change, ChangeGroup } from './change.ts';

/** One thing that a record says, ready to be compared with what another says of the same. */
export interface Statement {
  readonly what: string;
  /** Plain data: two statements are different when these are. */
  readonly value: unknown;
  readonly words: string;
  /** To the last digit and letter, for two whose words look the same. */
  readonly exact: () => string;
}

/** Stands where there is nothing. */
export const none = 'none';

export const text = (what: string, value: string): Statement => ({
  what,
  value,
  words: value.trim() === '' ? none : value,
  exact: () => JSON.stringify(value),
});

/** One of a few; `words` where the record's own aren't an engineer's. */
export const choice = (what: string, value: string | number | boolean, words = String(value)): Statement => ({
  what,
  value,
  words,
  exact: () => JSON.stringify(value),
});

export const yesNo = (what: string, value: boolean): Statement => choice(what, value, value ? 'yes' : 'no');

/** @param absent what null means */
export const quantity = (what: string, value: number | null, unit: Unit, absent = none): Statement => ({
  what,
  value,
  words: value === null ? absent : formatRead(value, unit),
  exact: () => (value === null ? absent : `${minus(String(value))} ${unit}`),
});

export const plainNumber = (what: string, value: number | null, absent = none): Statement => ({
  what,
  value,
  words: value === null ? absent : minus(String(Number(value.toPrecision(12)))),
  exact: () => (value === null ? absent : minus(String(value))),
});

/** A fraction, as per cent. */
export const percent = (what: string, value: number | null, absent = none): Statement => ({
  what,
  value,
  words: value === null ? absent : `${minus(String(Number((100 * value).toPrecision(12))))} %`,
  exact: () => (value === null ? absent : `${String(value)} of the whole`),
});

export const span = (what: string, value: Span | null, unit: Unit, absent = none): Statement => ({
  what,
  value,
  words: value === null ? absent : `${formatRead(value.low, unit)} to ${formatRead(value.high, unit)}`,
  exact: () => (value === null ? absent : `${String(value.low)} to ${String(value.high)} ${unit}`),
});

export const minus = (number: string): string => number.replaceAll('-', '−');

/** Whether two values are the same to the last bit. */
export function same(a: unknown, b: unknown): boolean {
  if (typeof a !== 'object' || typeof b !== 'object' || a === null || b === null) return a === b;
  return a === b || canonical(a) === canonical(b);
}

/** What is otherwise between two statements about the same; null where nothing is. */
export function changeOf(group: ChangeGroup, before: Statement, after: Statement): Change | null {
  if (same(before.value, after.value)) return null;
  const alike = oneLine(before.words) === oneLine(after.words);
  const [a, b] = alike ? [before.exact(), after.exact()] : [before.words, after.words];
  return { group, what: after.what, before: a, after: b };
}

const oneLine = (words: string): string => words.replace(/\s+/gu, ' ').trim();

import * as v from 'valibot';
import { mostStockParts } from '../parts/stock.ts';

/** Pieces of the record's schema. Messages are the two later parts of a problem: why it won't do; what would. */

/** Limits of what is computed, wide of any lumped circuit; inside them no figure leaves double precision. */
export const limits = {
  frequencyHz: { low: 1, high: 1e12 },
  resistanceOhm: { low: 1e-6, high: 1e9 },
  reactanceOhm: 1e9,
  inductorH: { low: 1e-15, high: 1e6 },
  capacitorF: { low: 1e-18, high: 1e3 },
  powerW: 1e5,
  returnLossDb: 100,
  nameLetters: 120,
  stateLetters: 40,
  states: 8,
  samples: 2001,
  reasonLetters: 4000,
  remarkLetters: 1000,
  draws: 1_000_000,
  stockParts: mostStockParts,
  deviations: 20,
  revisions: 200,
} as const;

export const number = (what: string): v.NumberSchema<string> =>
  v.number(`${what} is not a number; give a plain number in SI units`);

export const between = (what: string, low: number, high: number, words: string) =>
  v.pipe(
    number(what),
    v.minValue(low, `${what} is out of range; give ${words}`),
    v.maxValue(high, `${what} is out of range; give ${words}`),
  );

export const frequency = (what: string) =>
  between(what, limits.frequencyHz.low, limits.frequencyHz.high, 'a frequency from 1 Hz to 1 THz');

export const span = (what: string, low: number, high: number, words: string) =>
  v.pipe(
    v.strictObject({
      low: between(`the lower end of ${what}`, low, high, words),
      high: between(`the upper end of ${what}`, low, high, words),
    }),
    v.check(({ low: a, high: b }) => a <= b, `${what} is upside down; give the lower end first`),
  );

/* eslint-disable no-control-regex -- these are what is looked for */
const controls = /[\u0000-\u001f\u007f-\u009f\u2028\u2029]/u;
export const controlsButNewLine = /[\u0000-\u0009\u000b-\u001f\u007f-\u009f]/u;
/* eslint-enable no-control-regex */

export const text = (what: string, letters: number, refused = controls) =>
  v.pipe(
    v.string(`${what} is not text; give it in quotes`),
    v.maxLength(letters, `${what} is too long; give at most ${String(letters)} letters`),
    // Control characters break a line of a form and can't be printed; a new line is the one that a reason may have.
    v.check((value) => !refused.test(value), `${what} holds a control character; leave it out`),
    v.check((value) => value.isWellFormed(), `${what} holds half a character; type it again`),
  );

export const date = (what: string, empty: boolean) =>
  v.pipe(
    v.string(`${what} is not text; give it in quotes`),
    v.check(
      (value) => (empty && value === '') || isDate(value),
      `${what} is not a calendar date; write it as 2026-03-31`,
    ),
  );

function isDate(value: string): boolean {
  if (!/^\d{4}-\d{2}-\d{2}$/u.test(value)) return false;
  const parsed = new Date(`${value}T00:00:00Z`);
  return !Number.isNaN(parsed.getTime()) && parsed.toISOString().startsWith(value);
}

/** Letters that the report's typeface hasn't, and pictures. */
const unprintable =
  /[^\p{Script=Latin}\p{Script=Greek}\p{Script=Cyrillic}\p{Script=Common}\p{Script=Inherited}]|\p{Emoji_Presentation}/u;

/** A text of the engineer's own, which the report prints: in letters that it has. */
export const printed = (what: string, letters: number, refused = controls) =>
  v.pipe(
    text(what, letters, refused),
    v.check(
      (value) => !unprintable.test(value),
      `${what} has letters that the report cannot print; write it in Latin, Greek or Cyrillic letters`,
    ),
  );

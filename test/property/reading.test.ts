import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatImpedanceRead, formatQuantity, formatRead } from '../../src/quantity/format.ts';
import { formatProblem, InputError } from '../../src/quantity/problem.ts';
import { readImpedance } from '../../src/quantity/read-impedance.ts';
import { readQuantity } from '../../src/quantity/read-quantity.ts';
import { readSpan } from '../../src/quantity/read-span.ts';
import type { Reading } from '../../src/quantity/reading.ts';
import type { Unit } from '../../src/quantity/unit.ts';
import { readDraft } from '../../src/record/draft.ts';
import { fieldNames, fieldsOf, type FieldName, type Fields } from '../../src/record/fields.ts';
import { readRecord } from '../../src/record/read-record.ts';
import { logUniform } from './arbitraries.ts';
import { anyRecord } from './records.ts';

const unit = fc.constantFrom<Unit>('Hz', 'Ω', 'H', 'F', 'W', 'dB');
const signed = fc.tuple(fc.constantFrom(1, -1), logUniform(1e-18, 1e14)).map(([sign, size]) => sign * size);
const valueOf = <T>(reading: Reading<T>): T => {
  if (!reading.ok) throw new Error(`${reading.why}; ${reading.would}`);
  return reading.value;
};

/** What fingers, files and attackers type: any characters, and the right ones in the wrong order. */
const junk = fc.oneof(
  fc.string({ unit: 'binary', maxLength: 200 }),
  fc.string({ unit: 'grapheme', maxLength: 200 }),
  fc
    .array(fc.constantFrom(...Array.from('0123456789.,+-−eEjiRkKMGµunpfHΩFzWdB∠<°() \n\t')), { maxLength: 30 })
    .map((all) => all.join('')),
  fc
    .tuple(fc.constantFrom('5 ', '4.7n', '50-j', '1..', '50∠'), fc.string({ maxLength: 2000, size: 'max' }))
    .map((all) => all.join('')),
  fc.constantFrom(
    'NaN',
    'Infinity',
    '-Infinity',
    '1e400',
    '-1e400',
    '1e-400',
    '1e99999999999999999999',
    '__proto__',
    'constructor',
    'undefined',
    '0x10',
    '１２',
    '½',
  ),
);

const oneShortLine = (line: string): void => {
  expect(line).not.toMatch(/[\p{Cc}\p{Zl}\p{Zp}]/u);
  expect(line.length).toBeLessThan(300);
  expect(line).not.toMatch(/NaN|Infinity|undefined/);
};

describe('reading junk', () => {
  it.each<[string, (text: string) => Reading<unknown>]>([
    ['readQuantity', (text) => readQuantity(text, 'H')],
    ['readImpedance', readImpedance],
    ['readSpan', (text) => readSpan(text, 'Hz', '1M..2M')],
  ])('%s never throws: it gives a finite value, or why not in one short line', (_, reader) => {
    fc.assert(
      fc.property(junk, (text) => {
        const reading = reader(text);
        if (reading.ok) {
          const values = typeof reading.value === 'number' ? [reading.value] : Object.values(reading.value as object);
          expect(values.every(Number.isFinite)).toBe(true);
        } else {
          const { why, would } = reading;
          oneShortLine(formatProblem({ field: 'load', read: '', why, would }));
        }
      }),
      { numRuns: 1000 },
    );
  });

  it('readDraft never throws: a record, or problems of one short line each, at most one a field', () => {
    const sound = fieldsOf(fc.sample(anyRecord(), 1)[0]!);
    fc.assert(
      fc.property(fc.dictionary(fc.constantFrom(...fieldNames), junk, { noNullPrototype: true }), (broken) => {
        const fields: Fields = { ...sound, ...broken };
        const { record, problems } = readDraft(fields);
        expect(record === null).toBe(problems.length > 0);
        expect(new Set(problems.map(({ field }) => field)).size).toBe(problems.length);
        for (const problem of problems) {
          expect(fieldNames).toContain(problem.field);
          // What was typed is kept as it was; only the line that shows it is cut.
          expect(problem.read).toBe(fields[problem.field as FieldName]);
          oneShortLine(formatProblem({ ...problem, read: '' }));
          expect(formatProblem(problem)).not.toMatch(/[\p{Cc}\p{Zl}\p{Zp}]/u);
        }
      }),
      { numRuns: 300 },
    );
  });

  it('readRecord throws nothing but an InputError, each problem on one line', () => {
    const sound = fc.sample(anyRecord(), 1)[0]!;
    const text = fc.oneof(
      junk,
      fc.json(),
      fc
        .tuple(fc.constantFrom(...Object.keys(sound)), fc.jsonValue())
        .map(([name, value]) => JSON.stringify({ ...sound, [name]: value })),
      fc
        .tuple(fc.string({ unit: 'binary' }), fc.jsonValue())
        .map(([name, value]) => JSON.stringify({ ...sound, [name]: value })),
    );
    fc.assert(
      fc.property(text, (given) => {
        try {
          readRecord(given);
        } catch (error) {
          expect(error).toBeInstanceOf(InputError);
          const { problems } = error as InputError;
          expect(problems.length).toBeGreaterThan(0);
          for (const problem of problems) expect(formatProblem(problem)).not.toMatch(/[\p{Cc}\p{Zl}\p{Zp}]/u);
        }
      }),
      { numRuns: 500 },
    );
  });
});

describe('reading what was written', () => {
  it('readQuantity(formatRead(value)) is the value to 12 digits', () => {
    fc.assert(
      fc.property(signed, unit, (value, name) => {
        // A frequency below a hertz would be read as a slip of the prefix.
        fc.pre(name !== 'Hz' || Math.abs(value) >= 1);
        expect(Math.abs(valueOf(readQuantity(formatRead(value, name), name)) / value - 1)).toBeLessThan(1e-11);
      }),
      { numRuns: 500 },
    );
  });

  it('readQuantity(formatQuantity(value, unit, n)) is the value to n digits, and n digits are written', () => {
    fc.assert(
      fc.property(
        signed,
        fc.constantFrom<Unit>('Ω', 'H', 'F', 'W'),
        fc.integer({ min: 3, max: 9 }),
        (value, name, n) => {
          const written = formatQuantity(value, name, n);
          expect(Math.abs(valueOf(readQuantity(written, name)) / value - 1)).toBeLessThan(0.5001 * 10 ** (1 - n));
          const digits = written.replace(/[^0-9]/g, '').replace(/^0+/, '');
          if (Math.abs(value) < 1e15) expect(digits).toHaveLength(n);
        },
      ),
      { numRuns: 500 },
    );
  });

  it('readImpedance(formatImpedanceRead(r, x)) is r + jx to 7 digits', () => {
    fc.assert(
      fc.property(logUniform(1e-6, 1e9), signed, (r, x) => {
        const { r: again, x: too } = valueOf(readImpedance(formatImpedanceRead(r, x)));
        expect(Math.abs(again / r - 1)).toBeLessThan(1e-6);
        expect(Math.abs(too / x - 1)).toBeLessThan(1e-6);
      }),
      { numRuns: 500 },
    );
  });

  it('readImpedance reads a magnitude and an angle as the same point', () => {
    fc.assert(
      fc.property(logUniform(1e-3, 1e6), fc.integer({ min: -8999, max: 8999 }), (size, hundredths) => {
        const angle = hundredths / 100;
        for (const text of [`${String(size)}∠${String(angle)}°`, `${String(size)} < ${String(angle)}`]) {
          const { r, x } = valueOf(readImpedance(text));
          expect(Math.hypot(r, x) / size).toBeCloseTo(1, 12);
          expect((Math.atan2(x, r) * 180) / Math.PI).toBeCloseTo(angle, 9);
        }
      }),
      { numRuns: 300 },
    );
  });
});

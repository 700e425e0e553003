import { formatQuantity } from '../quantity/format.ts';
import { normalise, readQuantity } from '../quantity/read-quantity.ts';
import { read, refuse, type Reading } from '../quantity/reading.ts';
import type { Unit } from '../quantity/unit.ts';
import type { StockPart } from './stock.ts';
import { readTolerance } from './tolerance.ts';

/** Columns of a stock list, in the order in which its template has them. */
export const stockColumns = [
  'name',
  'kind',
  'value',
  'tolerance',
  'Q',
  'Q frequency',
  'self-resonance',
  'ESL',
  'rated voltage',
  'rated current',
] as const;
export type StockColumn = (typeof stockColumns)[number];

/** What can't be used in a line, and in which column it stands. */
export interface CellProblem {
  readonly column: StockColumn;
  readonly read: string;
  readonly why: string;
  readonly would: string;
}

const longestName = 120;

/**
 * One part from the cells of its line; those that a list leaves out or blank are ''.
 *
 * @param cell without blanks around it
 */
export function readStockPart(
  cell: (column: StockColumn) => string,
): { readonly part: StockPart } | { readonly problems: readonly CellProblem[] } {
  const problems: CellProblem[] = [];
  const take = <T>(column: StockColumn, reading: Reading<T>): T | null => {
    if (reading.ok) return reading.value;
    problems.push({ column, read: cell(column), why: reading.why, would: reading.would });
    return null;
  };
  /** null where the cell is blank, which means that the list doesn't say. */
  const optional = <T>(column: StockColumn, reader: (text: string) => Reading<T>): T | null =>
    cell(column) === '' ? null : take(column, reader(cell(column)));

  const name = take('name', readName(cell('name')));
  const kind = take('kind', readKind(cell('kind')));
  const value = kind === null ? null : take('value', readValue(cell('value'), kind));
  const rest = {
    tolerance: kind === null ? null : optional('tolerance', (text) => readTolerance(text, kind, value)),
    q: optional('Q', readQ),
    qAtHz: optional('Q frequency', (text) => readWithUnit(text, 'Hz', 1, 1e12)),
    selfResonanceHz: optional('self-resonance', (text) => readWithUnit(text, 'Hz', 1, 1e12)),
    eslH: optional('ESL', (text) =>
      kind === 'inductor'
        ? refuse('an inductor has no series inductance of its own', 'leave it blank')
        : readWithUnit(text, 'H', 1e-15, 1e-6),
    ),
    ratedVolts: optional('rated voltage', (text) => within(readQuantity(text, 'V'), 'V', 1e-3, 1e6)),
    ratedAmps: optional('rated current', (text) => within(readQuantity(text, 'A'), 'A', 1e-6, 1e5)),
  };
  if (cell('Q frequency') !== '' && cell('Q') === '') {
    take('Q frequency', refuse('there is no Q that it could belong to', 'give Q too, or leave it blank'));
  }
  return problems.length > 0 || name === null || kind === null || value === null
    ? { problems }
    : { part: { name, kind, value, ...rest } };
}

function readName(text: string): Reading<string> {
  if (text === '') return refuse('the part has no name', 'give it one');
  if (text.length > longestName) {
    return refuse(`the name has ${String(text.length)} letters`, `give at most ${String(longestName)}`);
  }
  // eslint-disable-next-line no-control-regex -- a name must fit on a line of print
  if (/[\u0000-\u001f\u007f-\u009f\u2028\u2029]/u.test(text)) {
    return refuse('a control character or a line break stands in the name', 'leave it out');
  }
  return read(text);
}

function readKind(text: string): Reading<StockPart['kind']> {
  const kind = { inductor: 'inductor', l: 'inductor', capacitor: 'capacitor', c: 'capacitor' } as const;
  const given = text.toLowerCase();
  return given in kind && Object.hasOwn(kind, given)
    ? read(kind[given as keyof typeof kind])
    : refuse(given === '' ? 'the part has no kind' : 'this kind is unknown', 'give inductor or capacitor');
}

function readValue(text: string, kind: StockPart['kind']): Reading<number> {
  const [unit, other, lowest] = kind === 'inductor' ? (['H', 'F', 1e-12] as const) : (['F', 'H', 1e-18] as const);
  if (text === '') return refuse('the part has no value', `give it, such as ${examples[unit]}`);
  if (!readQuantity(text, unit).ok && readQuantity(text, other).ok) {
    const words = { H: 'henries', F: 'farads' };
    return refuse(
      `${words[other]} don't fit an ${kind}`.replace('an c', 'a c'),
      `give ${words[unit]}, or correct its kind`,
    );
  }
  return readWithUnit(text, unit, lowest, 1);
}

const examples = { Hz: '250 MHz', H: '82 nH', F: '8.2 pF', V: '50 V', A: '0.3 A' } as const;

/** A number alone is refused, because 82 in a list means 82 nH and not 82 H; 82e-9 can't mean anything else. */
function readWithUnit(text: string, unit: 'Hz' | 'H' | 'F', low: number, high: number): Reading<number> {
  const reading = readQuantity(text, unit);
  if (reading.ok && /^[+-]?[\d.,\s]*$/u.test(normalise(text))) {
    return refuse(`a number alone would be in ${unit}`, `give prefix and unit too, such as ${examples[unit]}`);
  }
  return within(reading, unit, low, high);
}

function within(
  reading: Reading<number>,
  unit: keyof typeof examples & Unit,
  low: number,
  high: number,
): Reading<number> {
  if (!reading.ok || (reading.value >= low && reading.value <= high)) return reading;
  const span = `${formatQuantity(low, unit, 1)} to ${formatQuantity(high, unit, 1)}`;
  return refuse(
    reading.value > 0 ? `${formatQuantity(reading.value, unit)} is out of range` : 'it must be above zero',
    `give ${span}, such as ${examples[unit]}`,
  );
}

function readQ(text: string): Reading<number> {
  const would = 'give a number from 1 to 1 000 000, such as 45';
  if (!/^\d+(?:[.,]\d+)?$/u.test(text)) return refuse('not a quality factor', would);
  const q = Number(text.replace(',', '.'));
  return q >= 1 && q <= 1e6 ? read(q) : refuse('out of range', would);
}

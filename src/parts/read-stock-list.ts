import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { InputError, type Problem } from '../quantity/problem.ts';
import { readStockPart, stockColumns, type StockColumn } from './read-stock-part.ts';
import { separatedValues, type Row } from './separated-values.ts';
import { mostStockParts, type StockList, type StockPart } from './stock.ts';

/** Longest file: many times what so many parts fill. */
const mostLetters = 10_000_000;
/** Most problems told at once; the rest are counted. */
const mostProblems = 20;

const mandatory: readonly StockColumn[] = ['name', 'kind', 'value'];

/**
 * Reads a stock list: comma-separated values (RFC 4180), or separated by semicolons or tabs, with a heading that names
 * the columns, in any order; `stockTemplate` is one. Lines that begin with # are comments; a blank cell means that the
 * list doesn't say. Values carry a prefix or a unit, ratings may be plain volts and amperes.
 *
 * @param text     the whole file
 * @param fileName what the list is called in the record
 * @throws InputError with a problem for each line that can't be used, 20 at most and then how many more there are
 */
export function readStockList(text: string, fileName: string): StockList {
  if (text.includes('\u0000') || text.includes('\uFFFD'))
    throw listProblem('it is not text in UTF-8', 'save the list as CSV in UTF-8');
  if (text.length > mostLetters) {
    throw listProblem(
      `${String(text.length)} letters are too many`,
      'keep the parts of the values and kinds in question',
    );
  }
  const { rows, more, brokenQuote } = separatedValues(text, mostStockParts + 1);
  if (brokenQuote !== null) {
    throw new InputError({
      field: lineName(brokenQuote),
      read: '',
      why: 'a quotation mark is not closed, or something follows it',
      would: 'put a whole cell in quotes, and write a mark inside it twice',
    });
  }
  const [heading, ...lines] = rows;
  if (heading === undefined) throw listProblem('the list is empty', 'start from the template');
  const columns = columnsOf(heading);
  if (lines.length === 0) throw listProblem('there is a heading and no part', 'give one part a line');
  if (more > 0) {
    throw listProblem(
      `${String(lines.length + more)} parts are too many`,
      `give at most ${String(mostStockParts)}, of the values and kinds in question`,
    );
  }
  const { parts, problems } = partsOf(lines, columns);
  if (problems.length > 0) throw new InputError(...told(problems));
  return { name: fileName, sha256: bytesToHex(sha256(utf8ToBytes(text))), parts };
}

/** Where each column stands; those that the list doesn't have are left out. */
function columnsOf({ line, cells }: Row): ReadonlyMap<StockColumn, number> {
  const columns = new Map<StockColumn, number>();
  const problem = (read: string, why: string, would: string): InputError =>
    new InputError({ field: lineName(line), read, why, would });
  for (const [at, cell] of cells.entries()) {
    if (cell === '') continue;
    const heard = plain(cell.slice(0, 60));
    const column = stockColumns.find((name) => plain(name) === heard);
    if (column === undefined) {
      // What is misspelt must not be passed over in silence.
      throw problem(cell, 'this column is unknown', `name it one of ${stockColumns.join(', ')}, or take it out`);
    }
    if (columns.has(column)) throw problem(cell, 'this column stands there twice', 'leave one of them');
    columns.set(column, at);
  }
  const missing = mandatory.filter((column) => !columns.has(column));
  if (missing.length > 0) {
    throw problem(
      '',
      `the heading lacks ${missing.join(', ')}`,
      `begin with a line that names the columns: ${stockColumns.join(', ')}`,
    );
  }
  return columns;
}

/** Capitals, hyphens and blanks make no difference to a heading. */
const plain = (heading: string): string => heading.toLowerCase().replaceAll(/[\s_-]+/gu, ' ');

function partsOf(
  lines: readonly Row[],
  columns: ReadonlyMap<StockColumn, number>,
): { readonly parts: readonly StockPart[]; readonly problems: readonly Problem[] } {
  const width = Math.max(...columns.values()) + 1;
  const parts: StockPart[] = [];
  const problems: Problem[] = [];
  const lineOf = new Map<string, number>();
  for (const { line, cells } of lines) {
    const field = lineName(line);
    const surplus = cells.slice(width).find((cell) => cell !== '');
    if (surplus !== undefined) {
      const why = `${String(cells.length)} cells where ${String(width)} belong`;
      problems.push({ field, read: surplus, why, would: 'put a cell that has the separator in it in quotes' });
      continue;
    }
    const result = readStockPart((column) => cells[columns.get(column) ?? width] ?? '');
    if ('problems' in result) {
      problems.push(...result.problems.map(({ column, ...problem }) => ({ field: `${field}, ${column}`, ...problem })));
      continue;
    }
    const { name } = result.part;
    const earlier = lineOf.get(name);
    if (earlier !== undefined) {
      const why = `${lineName(earlier)} has a part of this name too`;
      problems.push({ field, read: name, why, would: 'give each part a name of its own' });
      continue;
    }
    lineOf.set(name, line);
    parts.push(result.part);
  }
  return { parts, problems };
}

function told(problems: readonly Problem[]): readonly Problem[] {
  const more = problems.length - mostProblems;
  if (more <= 0) return problems;
  const why = `${String(more)} more ${more === 1 ? 'problem' : 'problems'} in the list`;
  return [...problems.slice(0, mostProblems), { field: 'list', read: '', why, would: 'mend these first' }];
}

const lineName = (line: number): string => `line ${String(line)}`;

const listProblem = (why: string, would: string): InputError => new InputError({ field: 'list', read: '', why, would });

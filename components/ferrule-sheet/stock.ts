export { readStockList } from '../../src/parts/read-stock-list.ts';
import type { StockList } from '../../src/parts/stock.ts';
import type { Problem } from '../../src/quantity/problem.ts';
import { formatProblem } from '../../src/quantity/problem.ts';
import type { Fields } from '../../src/record/fields.ts';
import { count } from '../base/words.ts';

/** Whether a text of separated values is a list of parts and not of samples: its heading names kind and value. */
export function isStockList(text: string): boolean {
  const heading = text.split(/\r?\n/u).find((line) => line.trim() !== '' && !line.startsWith('#')) ?? '';
  const cells = heading.split(/[,;\t]/u).map((cell) => cell.replaceAll('"', '').trim().toLowerCase());
  return cells.includes('kind') && cells.includes('value');
}

const kindsOf = ({ parts }: StockList) =>
  (['inductor', 'capacitor'] as const).filter((kind) => parts.some((part) => part.kind === kind));

/** Fields by which parts are taken from a list, of the kinds that it has. */
export const stockFields = (list: StockList): Fields => ({
  stock: list.name,
  ...Object.fromEntries(kindsOf(list).map((kind) => [`series-${kind}`, 'stock'])),
});

/** "parts.csv: 5 inductors and 5 capacitors, which are taken from it now." */
export function stockWords(list: StockList): string {
  const kinds = kindsOf(list).map((kind) => count(list.parts.filter((part) => part.kind === kind).length, kind));
  return `${list.name}: ${kinds.join(' and ')}, taken from it now.`;
}

/** What can't be read, one line each. */
export const stockProblems = (name: string, problems: readonly Problem[]): readonly string[] => [
  `${name} can’t be used; the sheet stays as it was.`,
  ...problems.map(formatProblem),
];

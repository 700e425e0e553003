import { describe, expect, it } from 'vitest';
import { isStockList, stockFields, stockProblems, stockWords } from '../../../../components/ferrule-sheet/stock.ts';
import { readStockList } from '../../../../src/parts/read-stock-list.ts';
import { stockTemplate } from '../../../../src/parts/stock-template.ts';

describe('isStockList(text)', () => {
  it.each([
    ['the template', stockTemplate],
    ['semicolons and capitals', 'Name;Kind;Value\na;inductor;1n'],
    ['quotes', '"name","value","kind"'],
  ])('knows a list of parts: %s', (_, text) => {
    expect(isStockList(text)).toBe(true);
  });

  it.each([
    ['samples', '150M,9.2,-62.5\n151M,9.4,-61'],
    ['samples under a heading', 'frequency,R,X\n150M,9.2,-62.5'],
    ['nothing', ''],
  ])('takes %s for none', (_, text) => {
    expect(isStockList(text)).toBe(false);
  });
});

it('stockFields(list) takes parts of the kinds that the list has', () => {
  expect(stockFields(readStockList('name,kind,value\nc,capacitor,1p\n', 'few.csv'))).toEqual({
    stock: 'few.csv',
    'series-capacitor': 'stock',
  });
});

it('stockWords(list) counts kinds', () => {
  expect(stockWords(readStockList(stockTemplate, 'shelf.csv'))).toBe(
    'shelf.csv: 5 inductors and 5 capacitors, taken from it now.',
  );
});

it('stockProblems(name, problems) has a line for each', () => {
  const problem = { field: 'line 3, value', read: '1 x', why: 'no unit', would: 'write 1 nH' };
  expect(stockProblems('shelf.csv', [problem])).toEqual([
    'shelf.csv can’t be used; the sheet stays as it was.',
    'line 3, value "1 x": no unit; write 1 nH',
  ]);
});

import { describe, expect, it } from 'vitest';
import { separatedValues } from '../../../src/parts/separated-values.ts';

const cells = (text: string): (readonly string[])[] => separatedValues(text, 100).rows.map((row) => row.cells.slice());

describe('separatedValues(text, most)', () => {
  it.each([
    ['commas', 'a,b\n1,2\n'],
    ['semicolons', 'a;b\n1;2\n'],
    ['tabs', 'a\tb\n1\t2\n'],
    ['blanks around cells', ' a , b \n1,  2'],
    ['CRLF', 'a,b\r\n1,2\r\n'],
    ['CR alone', 'a,b\r1,2\r'],
    ['a byte order mark', '\uFEFFa,b\n1,2'],
    ['comments, empty lines and rows of separators', '# x\n\na,b\n  # "y\n,\n1,2\n\n'],
    ['a comment that a spreadsheet has quoted', '"# one, two",\na,b\n1,2'],
    ['quotes', '"a","b"\n"1", "2" \n'],
  ])('splits at %s', (_, text) => {
    expect(cells(text)).toEqual([
      ['a', 'b'],
      ['1', '2'],
    ]);
  });

  it('keeps separators, line breaks and doubled quotation marks of a cell in quotes', () => {
    expect(cells('a,b\n"1,5 ""x""","two\nlines"\n3,4')).toEqual([
      ['a', 'b'],
      ['1,5 "x"', 'two\nlines'],
      ['3', '4'],
    ]);
  });

  it('keeps a quotation mark inside a cell without them', () => {
    expect(cells('a,b\n3" long,2')[1]).toEqual(['3" long', '2']);
  });

  it('leaves commas alone where semicolons separate', () => {
    expect(cells('a;b\n4,7;1,5')[1]).toEqual(['4,7', '1,5']);
  });

  it('keeps empty cells', () => {
    expect(cells('a,b,c\n,2,\n"",,3')).toEqual([
      ['a', 'b', 'c'],
      ['', '2', ''],
      ['', '', '3'],
    ]);
  });

  it('counts lines from 1, those passed over and those inside quotes too', () => {
    const { rows } = separatedValues('# x\na,b\n\n"1\n2",3\n4,5', 100);
    expect(rows.map(({ line }) => line)).toEqual([2, 4, 6]);
  });

  it.each([
    ['is never closed', 'a,b\n1,2\n"3,4\n5,6'],
    ['is followed by something else', 'a,b\n1,2\n"3"x,4\n'],
  ])('gives the line of a quotation mark that %s', (_, text) => {
    expect(separatedValues(text, 100)).toMatchObject({ brokenQuote: 3 });
  });

  it('counts the rows beyond the most', () => {
    expect(separatedValues('a\n1\n2\n# no\n3\n4\n', 3)).toMatchObject({ more: 2, brokenQuote: null });
    expect(separatedValues('a\n1\n2\n', 3)).toMatchObject({ more: 0 });
  });
});

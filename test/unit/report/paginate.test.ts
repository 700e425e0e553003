import { describe, expect, it } from 'vitest';
import { paginate, type Sheet } from '../../../src/report/page/paginate.ts';
import type { Piece } from '../../../src/report/page/piece.ts';

const piece = (text: string, height: number, more: Partial<Piece> = {}): Piece => ({
  before: 0,
  height,
  items: [{ kind: 'text', x: 0, y: 10, text, size: 10, bold: false, tone: 'ink' }],
  keep: false,
  ...more,
});

const textOf = ({ items }: Sheet): readonly string[] =>
  items.map((item) => (item.kind === 'text' && typeof item.text === 'string' ? item.text : '?'));

const pagesOf = (pieces: readonly Piece[]): readonly (readonly string[])[] => paginate(pieces, 0, 100).map(textOf);

describe('paginate(pieces, top, bottom)', () => {
  it('fills a sheet before it turns to the next', () => {
    expect(pagesOf([piece('a', 50), piece('b', 50), piece('c', 50)])).toEqual([['a', 'b'], ['c']]);
  });

  it('drops the space over what opens a sheet', () => {
    const [, second] = paginate([piece('a', 100), piece('b', 50, { before: 30 })], 0, 100);
    expect(second?.items[0]).toMatchObject({ y: 10 });
  });

  it('takes a heading to the sheet of what follows it', () => {
    expect(pagesOf([piece('a', 70), piece('heading', 20, { keep: true }), piece('b', 20)])).toEqual([
      ['a'],
      ['heading', 'b'],
    ]);
  });

  it('repeats the head of a table on every sheet that its rows reach', () => {
    const header = piece('head', 10, { keep: true });
    const rows = ['1', '2', '3', '4', '5'].map((text) => piece(text, 30, { header }));
    expect(pagesOf([header, ...rows])).toEqual([
      ['head', '1', '2', '3'],
      ['head', '4', '5'],
    ]);
  });

  it('divides a piece taller than a sheet between its lines', () => {
    const items = Array.from({ length: 12 }, (_, row) => ({
      kind: 'text' as const,
      x: 0,
      y: 20 * row + 15,
      text: String(row),
      size: 10,
      bold: false,
      tone: 'ink' as const,
    }));
    // Five lines of 20 to a sheet.
    expect(pagesOf([piece('', 240, { items })])).toEqual([
      ['0', '1', '2', '3', '4'],
      ['5', '6', '7', '8', '9'],
      ['10', '11'],
    ]);
  });

  it('breaks a chain taller than a sheet where it must', () => {
    const chain = ['a', 'b', 'c'].map((text) => piece(text, 40, { keep: true }));
    expect(pagesOf([...chain, piece('d', 40)])).toEqual([
      ['a', 'b'],
      ['c', 'd'],
    ]);
  });
});

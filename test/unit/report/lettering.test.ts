import { describe, expect, it } from 'vitest';
import { lettering } from '../../../src/report/page/lettering.ts';
import { readTypeface } from '../../../src/report/page/typeface.ts';
import { clip, wrap } from '../../../src/report/page/wrap.ts';
import { fonts } from './records.ts';

const letters = lettering(readTypeface(fonts.regular), readTypeface(fonts.bold));
const linesOf = (text: string, width: number): readonly string[] =>
  wrap({ spans: [{ text }] }, width, letters).map(({ runs }) => runs.map((run) => run.text).join(''));

describe('lettering(regular, bold)', () => {
  it('measures text by the widths of its letters', () => {
    // Ten figures of 0.6 em at 10 pt.
    expect(letters.width('0123456789', 10, false)).toBeCloseTo(60, 9);
  });

  it('puts a mark for what the typeface lacks, one for each character', () => {
    expect(letters.printable('山田 Taro 👩')).toBe('□□ Taro □');
  });

  it('composes letters, and drops what draws nothing', () => {
    expect(letters.printable('e\u0301\u200b\u202e')).toBe('é');
    expect(letters.printable('a\u0000b\n\tc')).toBe('a b c');
  });

  it('sets apostrophes and quotation marks as a writer does, and leaves other marks alone', () => {
    expect(letters.printable(`the source's "free space" can't, 5" and 6" long`)).toBe(
      'the source’s “free space” can’t, 5" and 6" long',
    );
  });

  it('ties a figure to its unit and a reactance to its sign', () => {
    expect(letters.printable('151.3 MHz at 9.4 − j61 Ω or 5 Holes')).toBe(
      '151.3\u00a0MHz at 9.4\u00a0−\u00a0j61\u00a0Ω or 5 Holes',
    );
  });
});

describe('wrap(paragraph, width, letters)', () => {
  it('breaks at spaces, never before a unit', () => {
    expect(linesOf('seen at 151.3 MHz', letters.width('seen at 151.3', 9, false) + 1)).toEqual([
      'seen at ',
      '151.3\u00a0MHz',
    ]);
  });

  it('ends a line that breaks at a space with the space, past its width', () => {
    const lines = wrap({ spans: [{ text: 'seen at' }] }, letters.width('seen', 9, false), letters);
    expect(lines.map(({ runs, width }) => [runs[0]?.text, width])).toEqual([
      ['seen ', letters.width('seen', 9, false)],
      ['at', letters.width('at', 9, false)],
    ]);
  });

  it('breaks a word wider than a line where it must and loses no letter', () => {
    const word = 'W'.repeat(500);
    const lines = linesOf(word, 100);
    expect(lines.join('')).toBe(word);
    expect(Math.max(...lines.map((line) => letters.width(line, 9, false)))).toBeLessThanOrEqual(100);
  });

  it('keeps the weight of each span and the spaces between them', () => {
    const spans = [{ text: 'Passes. ', bold: true }, { text: 'Compared' }];
    const [line] = wrap({ spans }, 500, letters);
    expect(line?.runs.map(({ text, bold }) => [text, bold])).toEqual([
      ['Passes.', true],
      [' Compared', false],
    ]);
    expect(line?.runs[1]?.x).toBeCloseTo(letters.width('Passes.', 9, true), 9);
  });

  it('gives one empty line for nothing', () => {
    expect(linesOf('', 100)).toEqual(['']);
  });
});

describe('clip(text, width, size, bold, letters)', () => {
  it('leaves a text that fits, and ends one that does not with an ellipsis', () => {
    expect(clip('short', 100, 9, false, letters)).toBe('short');
    const clipped = clip('W'.repeat(99), 100, 9, false, letters);
    expect(clipped).toMatch(/^W+…$/u);
    expect(letters.width(clipped, 9, false)).toBeLessThanOrEqual(100);
  });
});

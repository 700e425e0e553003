import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pathOf, readAddress, writeAddress } from '../../../../components/ferrule-sheet/address.ts';
import { defaults, fieldNames } from '../../../../src/record/fields.ts';

describe('readAddress(writeAddress(fields))', () => {
  it('gives back every text as it was typed, wrong ones and empty ones too', () => {
    const texts = fc.record(
      Object.fromEntries(fieldNames.map((name) => [name, fc.string({ unit: 'grapheme', maxLength: 12 })])),
    );
    fc.assert(
      fc.property(texts, (fields) => {
        expect(readAddress(`#${writeAddress(fields)}`)).toEqual(fields);
      }),
    );
  });

  it('leaves out what a field holds when nothing is typed', () => {
    expect(writeAddress({ ...defaults, load: '9.4-j61' })).toBe('load=9.4-j61');
  });

  it('says something even where nothing is typed: an empty address means the demonstration', () => {
    expect(readAddress(`#${writeAddress(defaults)}`)).toEqual(defaults);
  });
});

describe('readAddress(hash)', () => {
  it.each(['', '#', '#main', '#x=1&y=2', '#%'])('"%s" holds no sheet', (hash) => {
    expect(readAddress(hash)).toBeNull();
  });
});

describe('pathOf(method)', () => {
  it('is undefined for a text that names no method', () => {
    expect(pathOf('toString')).toBeUndefined();
    expect(pathOf('')).toBeUndefined();
    expect(pathOf('two-element')).toBe('');
  });
});

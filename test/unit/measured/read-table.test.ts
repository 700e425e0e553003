import { describe, expect, it } from 'vitest';
import { readTable } from '../../../src/measured/read-table.ts';
import { InputError } from '../../../src/quantity/problem.ts';

/** Frequencies with R and X, from Z = 50·(1 + Γ)/(1 − Γ), to nine digits. */
const table = (text: string): number[][] => {
  const { frequencyHz, re, im } = readTable(text);
  return Array.from(frequencyHz, (hz, k) => {
    const d = (1 - re[k]!) ** 2 + im[k]! ** 2;
    return [hz, (50 * (1 - re[k]! ** 2 - im[k]! ** 2)) / d, (100 * im[k]!) / d].map((v) => Number(v.toPrecision(9)));
  });
};

function refusal(text: string): string {
  try {
    readTable(text);
  } catch (error) {
    expect(error).toBeInstanceOf(InputError);
    return (error as InputError).message;
  }
  throw new Error('it was read');
}

const wanted = [
  [100e6, 12.5, -40.25],
  [101.5e6, 13, 38],
];

describe('readTable(text) reads frequency, R and X', () => {
  it.each([
    ['between blanks', '100M 12.5 -40.25\n101.5M 13 38'],
    ['between tabs', '100M\t12.5\t-40.25\n101.5M\t13\t38\n'],
    ['between semicolons', '100M;12.5;-40.25\n101.5M;13;38'],
    ['between commas', '100e6,12.5,-40.25\n101.5e6,13,38'],
    ['between commas and blanks', '100 MHz, 12.5, -40.25\n101.5 MHz, 13, 38'],
    ['with decimal commas between semicolons', '100;12,5;-40,25\n101,5;13;38'.replaceAll(/^(\S+?);/gmu, '$1M;')],
    ['with decimal commas between blanks', '100M 12,5 -40,25\n101,5M 13 38'],
    ['with decimal commas between tabs', '100M\t12,5\t-40,25\n101,5M\t13\t38'],
    ['with units', '100 MHz;12.5 Ω;-40.25 Ω\n101.5 MHz;13 ohm;38 ohm'],
    ['in hertz, with exponents', '1e8 1.25e1 -4.025e1\n1.015e8 13 38'],
    ['in groups of three digits', '100 000 000;12.5;-40.25\n101 500 000;13;38'],
    ['with a true minus sign', '100M 12.5 −40.25\n101.5M 13 38'],
    ['with blank lines, CRLF and comments', '! antenna\r\n\r\n100M 12.5 -40.25 ! first\r\n# and\r\n101.5M 13 38\r\n'],
    ['with lines ended by CR alone', '100M 12.5 -40.25\r101.5M 13 38\r'],
  ])('%s', (_, text) => {
    expect(table(text)).toEqual(wanted);
  });

  it.each([
    'f/MHz R X',
    'f (MHz);R;X',
    'Frequency [MHz], R, X',
    'freq_MHz R X',
    'f in mhz R X',
    '"f/MHz";"R";"X"',
    'my antenna\nf/MHz R X',
    '# f/MHz R X',
    '! Frequency (MHz) R X',
    '# MHz R X',
  ])('with the unit in a heading: %s', (heading) => {
    expect(table(`${heading}\n100 12.5 -40.25\n101.5 13 38`)).toEqual(wanted);
  });

  it.each([
    ['Hz', 1],
    ['kHz', 1e3],
    ['GHz', 1e9],
    ['THz', 1e12],
  ])('in %s by its heading', (unit, hz) => {
    expect(table(`f/${unit} R X\n1 20 30\n2 20 30`)).toEqual([
      [hz, 20, 30],
      [2 * hz, 20, 30],
    ]);
  });

  it('a prefix of its own goes before that of the heading', () => {
    expect(table('f/GHz R X\n100M 12.5 -40.25\n0.1015 13 38')).toEqual(wanted);
  });
});

describe('readTable(text) refuses, and names the line', () => {
  it.each([
    ['nothing', '', /^file: 0 samples are too few/u],
    ['one sample', '100M 12 -40', /^file: 1 samples are too few/u],
    ['two columns', '100M 12 -40\n101M 12', /^line 2 "101M 12": 2 columns where 3 belong/u],
    ['four columns', '100M 12 -40 3', /^line 1 .*: 4 columns where 3 belong/u],
    ['an empty cell', '100M;12;-40\n101M;;-40', /^line 2: nothing is given/u],
    ['a word in a cell', '100M 12 -40\n101M twelve -40', /^line 2 "twelve": not a quantity/u],
    ['a heading between the data', '100M 12 -40\nf R X\n', /^line 2 "f": not a quantity/u],
    ['a falling frequency', '101M 12 -40\n100M 12 -40', /^line 2 "100M": the frequency is not above the one before/u],
    ['a repeated frequency', '100M 12 -40\n\n100M 12 -40', /^line 3 "100M": the frequency is not above/u],
    ['a frequency of zero', '0 12 -40', /^line 1 "0": the frequency must be above zero/u],
    ['a negative frequency', '-1M 12 -40', /^line 1 "-1M": the frequency must be above zero/u],
    ['no resistance', '100M 0 -40', /^line 1 "0": the resistance must be above zero/u],
    ['a negative resistance', '100M -3 -40', /^line 1 "-3": the resistance must be above zero/u],
    ['a resistance that can be nothing but total reflection', '100M 1e300 0', /^line 1 .*reflects all power/u],
    ['the same of a reactance', '100M 1 1e300', /^line 1 .*reflects all power/u],
    ['a number beyond numbers', '100M 1e999 0', /^line 1 "1e999": beyond the range/u],
    ['infinity', '100M Infinity 0', /^line 1 "Infinity": not a quantity/u],
    ['a comma that can mean two things', '100M;1,234;0', /^line 1 "1,234": the comma can mean/u],
    ['quotes', '"100","12","-40"', /^line 1 ""100"": not a quantity/u],
    ['a unit that none has', 'f/YHz R X\n1 2 3\n2 2 3', /^line 1 "f\/YHz R X": this unit is unknown/u],
    ['a line that no table has', `f/MHz R X\n${'1;'.repeat(501)}`, /^line 2 "1;.*": 1002 characters are too many/u],
    ['a text that is no table', ' '.repeat(5_000_001), /^file: more than 5 million characters/u],
    ['millihertz', '100m 12 -40', /^line 1 "100m": .*less than a hertz/u],
  ])('%s', (_, text, why) => {
    expect(refusal(text)).toMatch(why);
  });
});

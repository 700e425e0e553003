import { describe, expect, it } from 'vitest';
import { InputError, type Problem } from '../../../src/quantity/problem.ts';
import { readStockList } from '../../../src/parts/read-stock-list.ts';
import { stockTemplate } from '../../../src/parts/stock-template.ts';

function problemsOf(text: string): readonly Problem[] {
  try {
    readStockList(text, 'list.csv');
  } catch (error) {
    if (error instanceof InputError) return error.problems;
    throw error;
  }
  throw new Error('it was read');
}

const messageOf = (text: string): string => new InputError(...problemsOf(text)).message;

const blank = {
  tolerance: null,
  q: null,
  qAtHz: null,
  selfResonanceHz: null,
  eslH: null,
  ratedVolts: null,
  ratedAmps: null,
};

describe('readStockList(text, fileName)', () => {
  it('reads every column', () => {
    const heading = 'name,kind,value,tolerance,Q,Q frequency,self-resonance,ESL,rated voltage,rated current';
    const coil = '"coil, green",inductor,82 nH,5 %,45,250 MHz,1.2 GHz,,,0.6';
    const chip = 'chip,capacitor,8p2,C,450.5,150M,,0.4 nH,100 V,300 mA';
    expect(readStockList([heading, coil, chip].join('\n'), 'list.csv').parts).toEqual([
      {
        ...blank,
        name: 'coil, green',
        kind: 'inductor',
        value: 82e-9,
        tolerance: { kind: 'relative', value: 0.05 },
        q: 45,
        qAtHz: 250e6,
        selfResonanceHz: 1.2e9,
        ratedAmps: 0.6,
      },
      {
        ...blank,
        name: 'chip',
        kind: 'capacitor',
        value: 8.2e-12,
        tolerance: { kind: 'absolute', value: 0.25e-12 },
        q: 450.5,
        qAtHz: 150e6,
        eslH: 0.4e-9,
        ratedVolts: 100,
        ratedAmps: 0.3,
      },
    ]);
  });

  it.each([
    ['in any order, optional ones left out', 'value,name,kind\n82 nH,coil,inductor'],
    ['in capitals, with blanks or hyphens', 'NAME,Kind,VALUE,self resonance,RATED-VOLTAGE\ncoil,L,82n,,'],
    ['with cells left out at the end of a line', 'name,kind,value,tolerance,Q\ncoil,inductor,82 nH'],
    ['with empty columns', 'name,,kind,value,\ncoil,,inductor,82 nH,'],
    ['between semicolons, with decimal commas', 'name;kind;value\ncoil;INDUCTOR;0,082 µH'],
    ['between tabs', 'name\tkind\tvalue\ncoil\tl\t82e-9'],
    [
      'behind a byte order mark, with CRLF and comments',
      '\uFEFF# mine\r\nname,kind,value\r\n# coils\r\ncoil,L,82n\r\n',
    ],
  ])('reads columns %s', (_, text) => {
    const [part, ...more] = readStockList(text, 'list.csv').parts;
    expect(more).toEqual([]);
    expect(part).toMatchObject({ ...blank, name: 'coil', kind: 'inductor' });
    expect(part!.value).toBeCloseTo(82e-9, 20);
  });

  it('takes the name of the file and the digest of its text', () => {
    const list = readStockList('name,kind,value\ncoil,L,82n\n', 'my list.csv');
    expect(list.name).toBe('my list.csv');
    // printf 'name,kind,value\ncoil,L,82n\n' | sha256sum
    expect(list.sha256).toBe('43db5b28e6eb94880208fbcd1e7e705256bf33509e0da1ae2c953b05c4c8bfe6');
  });

  it('takes a Q without a frequency', () => {
    expect(readStockList('name,kind,value,Q\na,L,1n,45', '').parts[0]).toMatchObject({ q: 45, qAtHz: null });
  });

  it('tells names apart by capitals', () => {
    expect(readStockList('name,kind,value\na,L,1n\nA,L,1n', '').parts).toHaveLength(2);
  });
});

describe('readStockList(text, fileName) refuses a list', () => {
  it.each([
    ['that is empty', '', /^list: the list is empty; start from the template$/u],
    ['of comments', '# a\n\n', /^list: the list is empty/u],
    ['of a heading alone', 'name,kind,value\n', /^list: there is a heading and no part; give one part a line$/u],
    [
      'that is not text',
      'PK\u0003\u0004\u0000\uFFFD',
      /^list: it is not text in UTF-8; save the list as CSV in UTF-8$/u,
    ],
    ['without a heading', '82 nH,inductor\n', /^line 1 "82 nH": this column is unknown; name it one of name, kind/u],
    ['without columns that it needs', '# x\nname,Q\na,3', /^line 2: the heading lacks kind, value; begin with a line/u],
    ['with a column misspelt', 'name,kind,value,tolerence\na,L,1n,5%', /^line 1 "tolerence": this column is unknown/u],
    ['with a column twice', 'name,kind,value,Value\na,L,1n,1n', /^line 1 "Value": this column stands there twice/u],
    ['with a quotation mark left open', 'name,kind,value\n"a,L,1n', /^line 2: a quotation mark is not closed/u],
    ['of ten megabytes', 'x'.repeat(10_000_001), /^list: 10000001 letters are too many/u],
  ])('%s', (_, text, message) => {
    expect(messageOf(text)).toMatch(message);
  });

  it('of 100 000 parts, and says how many', () => {
    const text = `name,kind,value\n${'"a, b",L,82n\n'.repeat(100_000)}`;
    expect(messageOf(text)).toBe(
      'list: 100000 parts are too many; give at most 10000, of the values and kinds in question',
    );
  });
});

describe('readStockList(text, fileName) refuses a line', () => {
  const columns = 'name,kind,value,tolerance,Q,Q frequency,self-resonance,ESL,rated voltage,rated current';
  it.each([
    ['without a name', ',L,1n', 'line 2, name: the part has no name; give it one'],
    [
      'with a long name',
      `${'x'.repeat(121)},L,1n`,
      /^line 2, name "x+…": the name has 121 letters; give at most 120$/u,
    ],
    ['with a line break in its name', '"a\nb",L,1n', /^line 2, name "a b": a control character or a line break/u],
    ['without a kind', 'a,,1n', 'line 2, kind: the part has no kind; give inductor or capacitor'],
    ['of another kind', 'a,resistor,50', 'line 2, kind "resistor": this kind is unknown; give inductor or capacitor'],
    ['of the kind "constructor"', 'a,constructor,50', /^line 2, kind "constructor": this kind is unknown/u],
    ['without a value', 'a,L,', 'line 2, value: the part has no value; give it, such as 82 nH'],
    [
      'with farads of an inductor',
      'a,L,8.2 pF',
      'line 2, value "8.2 pF": farads don\'t fit an inductor; give henries, or correct its kind',
    ],
    [
      'with henries of a capacitor',
      'a,C,82 nH',
      'line 2, value "82 nH": henries don\'t fit a capacitor; give farads, or correct its kind',
    ],
    [
      'with a bare number',
      'a,L,82',
      'line 2, value "82": a number alone would be in H; give prefix and unit too, such as 82 nH',
    ],
    ['with a bare number within range', 'a,L,0.5', /^line 2, value "0.5": a number alone would be in H/u],
    ['with a word', 'a,L,lots', 'line 2, value "lots": not a quantity; write it as 4.7n, 4n7 or 4.7 nH'],
    ['of nothing', 'a,L,0 nH', 'line 2, value "0 nH": it must be above zero; give 1 pH to 1 H, such as 82 nH'],
    ['of less than nothing', 'a,C,-1 pF', /^line 2, value "-1 pF": it must be above zero; give 1 aF to 1 F/u],
    ['of megahenries', 'a,L,82 MH', /^line 2, value "82 MH": 82.00 MH is out of range; give 1 pH to 1 H/u],
    ['of 1e400', 'a,L,1e400', /^line 2, value "1e400": beyond the range of numbers/u],
    [
      'with a tolerance of 100 %',
      'a,L,1n,100%',
      /^line 2, tolerance "100%": at 100 % or more a part could be nothing/u,
    ],
    [
      'with a tolerance as large as its value',
      'a,C,0.5p,0.5 pF',
      /^line 2, tolerance "0.5 pF": with as much as its value/u,
    ],
    ['with a tolerance without a unit', 'a,L,1n,5', /^line 2, tolerance "5": per cent or a unit is missing/u],
    ['with a word for Q', 'a,L,1n,,high', /^line 2, Q "high": not a quality factor; give a number from 1/u],
    ['with a Q of zero', 'a,L,1n,,0', /^line 2, Q "0": out of range/u],
    ['with a negative Q', 'a,L,1n,,-45', /^line 2, Q "-45": not a quality factor/u],
    ['with a frequency and no Q', 'a,L,1n,,,250 MHz', /^line 2, Q frequency "250 MHz": there is no Q/u],
    ['with a bare frequency', 'a,L,1n,,45,250', /^line 2, Q frequency "250": a number alone would be in Hz/u],
    ['with a bare self-resonance', 'a,L,1n,,,,1.2', /^line 2, self-resonance "1.2": a number alone would be in Hz/u],
    ['with an ESL of an inductor', 'a,L,1n,,,,,1 nH', /^line 2, ESL "1 nH": an inductor has no series inductance/u],
    ['with an ESL in ohms', 'a,C,1p,,,,,1 Ω', /^line 2, ESL "1 Ω": "Ω" is not a prefix with H/u],
    ['with a voltage in amperes', 'a,C,1p,,,,,,1 A', /^line 2, rated voltage "1 A": "A" is not a prefix with V/u],
    ['with a negative current', 'a,C,1p,,,,,,,-1', /^line 2, rated current "-1": it must be above zero/u],
    [
      'with a cell too many',
      `a,C,4,7p${','.repeat(7)}x`,
      /^line 2 "x": 11 cells where 10 belong; put a cell that has/u,
    ],
  ])('%s', (_, line, message) => {
    const text = messageOf(`${columns}\n${line}\n`);
    if (typeof message === 'string') expect(text).toBe(message);
    else expect(text).toMatch(message);
  });

  it('whose name another has, and names both', () => {
    expect(messageOf('name,kind,value\na,L,1n\n\nb,L,1n\na,L,2n')).toBe(
      'line 5 "a": line 2 has a part of this name too; give each part a name of its own',
    );
  });

  it('tells all problems of a line, and of all lines', () => {
    expect(problemsOf('name,kind,value,Q\na,L,1,0\nb,C,2n,5\nc,C,x,5').map(({ field }) => field)).toEqual([
      'line 2, value',
      'line 2, Q',
      'line 4, value',
    ]);
  });

  it('tells 20 problems, and how many more there are', () => {
    const problems = problemsOf(`name,kind,value\n${'a,L,82\n'.repeat(9000)}`);
    expect(problems).toHaveLength(21);
    expect(problems[19]).toMatchObject({ field: 'line 21, value' });
    expect(problems[20]).toMatchObject({ field: 'list', why: '8980 more problems in the list' });
  });
});

describe('stockTemplate', () => {
  it('reads without a problem and fills every column', () => {
    const { parts } = readStockList(stockTemplate, 'template.csv');
    expect(parts.length).toBeGreaterThan(5);
    for (const column of Object.keys(blank) as (keyof typeof blank)[]) {
      expect(parts.some((part) => part[column] !== null)).toBe(true);
    }
  });

  it('is read again as a spreadsheet with semicolons and CRLF writes it', () => {
    const changed = stockTemplate.replaceAll(/^[^#].*$/gmu, (line) =>
      line
        .replaceAll(/"([^"]*)"/gu, (_, name: string) => name.replace(',', '\u0001'))
        .replaceAll(',', ';')
        .replaceAll('\u0001', ','),
    );
    const read = readStockList(changed.replaceAll('\n', '\r\n'), 'template.csv').parts;
    expect(read).toEqual(readStockList(stockTemplate, 'template.csv').parts);
  });
});

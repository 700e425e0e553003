import { describe, expect, it } from 'vitest';
import { readTouchstone } from '../../../src/measured/read-touchstone.ts';
import { InputError } from '../../../src/quantity/problem.ts';

const good = '# MHz S RI R 50\n1 0.1 0.2\n2 0.3 -0.4\n';
const samples = (text: string, name = 'a.s1p', port: 1 | 2 = 1) => {
  const { frequencyHz, re, im, referenceOhm } = readTouchstone(text, name, port);
  return { hz: [...frequencyHz], re: [...re], im: [...im], referenceOhm };
};
const read = { hz: [1e6, 2e6], re: [0.1, 0.3], im: [0.2, -0.4], referenceOhm: 50 };

/** The one line that a refusal is told in. */
function refusal(text: string, name = 'a.s1p', port: 1 | 2 = 1): string {
  try {
    readTouchstone(text, name, port);
  } catch (error) {
    expect(error).toBeInstanceOf(InputError);
    const { message } = error as InputError;
    // eslint-disable-next-line no-control-regex -- none may reach a terminal
    expect(message).not.toMatch(/[\u0000-\u001f]|NaN|undefined/u);
    return message;
  }
  throw new Error('it was read');
}

describe('readTouchstone(text, name) reads what the specification allows', () => {
  it.each([
    ['plain lines', good],
    ['lines ended by CRLF', good.replaceAll('\n', '\r\n')],
    ['lines ended by CR alone', good.replaceAll('\n', '\r')],
    ['no end of the last line', good.trimEnd()],
    ['a byte-order mark', `\uFEFF${good}`],
    ['blank lines anywhere', `\n\n${good.replaceAll('\n', '\n\n')}\n\n`],
    ['comments before, behind and between', `! one\n  ! two\n${good.replaceAll('\n', ' ! #[]%\n!three\n')}`],
    ['a comment that touches a number', '# MHz S RI R 50\n1 0.1 0.2!x\n2 0.3 -0.4!y\n'],
    ['tabs and odd spacing', '#\tMHz   S\tRI  R\t50\n\t1\t 0.1\t\t0.2  \n   2 0.3\t-0.4\t\n'],
    ['signs and exponents', '# MHz S RI R 50\n+1.0e0 1E-1 +.2\n2. 3e-1 -40.0e-2\n'],
    ['an option line in lower case', '# mhz s ri r 50\n1 0.1 0.2\n2 0.3 -0.4\n'],
    ['an option line in another order', '# R 50 RI S MHz\n1 0.1 0.2\n2 0.3 -0.4\n'],
    ['no space after the hash', '#MHz S RI R 50\n1 0.1 0.2\n2 0.3 -0.4\n'],
    ['no space after R', '# MHz S RI R50\n1 0.1 0.2\n2 0.3 -0.4\n'],
    ['a second option line, which counts for nothing', '# MHz S RI R 50\n# GHz Z MA R 75\n1 0.1 0.2\n2 0.3 -0.4\n'],
    ['one among the data too', '# MHz S RI R 50\n1 0.1 0.2\n# GHz Z MA R 75\n2 0.3 -0.4\n'],
    ['hertz', '# Hz S RI R 50\n1e6 0.1 0.2\n2e6 0.3 -0.4\n'],
    ['kilohertz', '# kHz S RI R 50\n1000 0.1 0.2\n2000 0.3 -0.4\n'],
  ])('%s', (_, text) => {
    expect(samples(text)).toEqual(read);
  });

  it('an empty option line: gigahertz, S, magnitude and angle, 50 Ω', () => {
    const { hz, re, im, referenceOhm } = samples('#\n1 0.5 90\n2 0.5 180\n');
    expect([hz, referenceOhm]).toEqual([[1e9, 2e9], 50]);
    expect(re[0]).toBeCloseTo(0, 15);
    expect(im[0]).toBeCloseTo(0.5, 15);
    expect(re[1]).toBeCloseTo(-0.5, 15);
  });

  it('a name in capitals, and with a path of its own', () => {
    expect(samples(good, 'C:\\DATA\\ANTENNA.S1P')).toEqual(read);
  });

  it('a frequency of zero', () => {
    expect(samples('# MHz S RI R 50\n0 0.9 0\n1 0.1 0\n').hz).toEqual([0, 1e6]);
  });

  it('noise data of a version 1 two-port, which begin where the frequency falls: left out', () => {
    const row = '0.1 0 0.5 0 0.5 0 0.2 0';
    const text = `# MHz S RI R 50\n100 ${row}\n200 ${row}\n! noise\n50 0.7 0.6 30 0.4\n100 0.8 0.6 40 0.4\n`;
    expect(samples(text, 'amplifier.s2p').hz).toEqual([100e6, 200e6]);
    expect(samples(text, 'amplifier.s2p', 2).re).toEqual([0.2, 0.2]);
  });

  it('a short circuit in series with little, and a large reference', () => {
    // 1 mΩ in 1 MΩ: Γ = (1e-3 − 1e6)/(1e-3 + 1e6) = −1 + 2e-9
    const { re } = samples('# MHz Z RI R 1e6\n1 1e-9 0\n2 1e-9 0\n');
    expect(re[0]! + 1).toBeCloseTo(2e-9, 15);
  });
});

const head = '# MHz S RI R 50\n';
const two = (rest: string): string =>
  `[Version] 2.0\n# MHz S RI R 50\n[Number of Ports] 1\n[Number of Frequencies] 2\n${rest}`;

describe('readTouchstone(text, name) refuses, and names the line', () => {
  it.each([
    ['an empty file', '', /^file: no data/u],
    ['comments alone', '! a\n! b\n', /^line 2: no data/u],
    ['an option line alone', head, /no data/u],
    ['no option line', '1 0.1 0.2\n2 0.3 -0.4\n', /^line 1: no option line/u],
    ['binary data', 'PK\u0003\u0004\u0000\u0000\u0008', /^line 1: this is not text/u],
    ['binary data later', `${head}1 0.1 0.2\n2 \u0001\u0002\u001b[31m\u007f 3\n`, /^line 3 .*not a number/u],
    ['another kind of file', '%PDF-1.7\n1 0 obj\n', /^line 1/u],
    ['a page of the web', '<!DOCTYPE html>\n<html>\n', /^line 1/u],
    ['a falling frequency', `${head}1 0.1 0.2\n3 0.1 0.2\n2 0.3 -0.4\n`, /^line 4 "2": the frequency is below/u],
    ['a repeated frequency', `${head}1 0.1 0.2\n\n1 0.3 -0.4\n`, /^line 4 "1": the frequency repeats/u],
    ['a negative frequency', `${head}-1 0.1 0.2\n`, /^line 2: the frequency is not one/u],
    ['a frequency beyond numbers', '# GHz S RI R 50\n1e305 0.1 0.2\n', /^line 2: the frequency is not one/u],
    ['two columns', `${head}1 0.1\n`, /^line 2: 2 numbers where 3 belong/u],
    ['four columns', `${head}1 0.1 0.2\n2 0.1 0.2 0.3\n`, /^line 3: 4 numbers where 3 belong/u],
    ['a line cut off', `${head}1 0.1 0.2\n2 0.3`, /^line 3: 2 numbers where 3 belong/u],
    ['a word among numbers', `${head}1 0.1 nan\n`, /^line 2 "nan": not a number/u],
    ['infinity', `${head}1 Infinity 0\n`, /^line 2 "Infinity": not a number/u],
    ['a number beyond numbers', `${head}1 1e400 0\n`, /^line 2 "1e400": not a number/u],
    ['hexadecimals', `${head}1 0x1 0\n`, /^line 2 "0x1": not a number/u],
    ['binary numerals', `${head}1 0b1 0\n`, /^line 2 "0b1": not a number/u],
    ['capital hexadecimals', `${head}1 0X1 0\n`, /^line 2 "0X1": not a number/u],
    ['decimal commas', `${head}1 0,1 0\n`, /^line 2 "0,1": not a number/u],
    ['an angle beyond numbers', '# MHz S MA R 50\n1 0.5 1e308\n', /^line 2: these values have no reflection/u],
    ['decibels beyond numbers', '# MHz S DB R 50\n1 1e6 0\n', /^line 2: these values have no reflection/u],
    ['a total reflection', `${head}1 0.1 0\n2 1 0\n`, /^line 3 "2": it reflects all power/u],
    ['an active one', `${head}1 0.9 0.9\n`, /^line 2 "1": it reflects all power or more/u],
    ['a negative resistance', '# MHz Z RI R 50\n1 -0.1 0\n', /^line 2 "1": it reflects all power or more/u],
    ['a pure reactance', '# MHz Z RI R 50\n1 0 1\n', /^line 2 "1": it reflects all power or more/u],
    ['a pole of the reflection', '# MHz Z RI R 50\n1 -1 0\n', /^line 2: these values have no reflection/u],
    ['a unit unknown', '# THz S RI R 50\n', /^line 1 "THZ": this word of the option line/u],
    ['a word unknown', '# MHz S RI R 50 75\n', /^line 1 "75": this word/u],
    ['a reference of nothing', '# MHz S RI R\n1 0.1 0\n', /^line 1: the reference is not a resistance/u],
    ['a reference of zero', '# MHz S RI R 0\n1 0.1 0\n', /^line 1 "0": the reference is not/u],
    ['a negative reference', '# MHz S RI R -50\n1 0.1 0\n', /^line 1 "-50": the reference is not/u],
    ['hybrid parameters', '# MHz H RI R 50\n1 0.1 0\n', /^line 1 "H": H parameters/u],
    [
      'keywords in version 1',
      `${head}1 0.1 0\n[Stray]\n2 0.2 0\n`,
      /^line 3 "\[Stray\]": this keyword does not belong/u,
    ],
    [
      'network data of no version',
      '# MHz S RI R 50\n[Number of Ports] 1\n[Network Data]\n1 0.1 0\n',
      /^line 3: \[Version\]/u,
    ],
    ['version 3.0', '[Version] 3.0\n# MHz S RI R 50\n', /^line 1 "3\.0": this version is unknown/u],
    ['version 1.0 by keyword', '[Version] 1.0\n# MHz S RI R 50\n', /^line 1 "1\.0": this version is unknown/u],
    [
      'three ports by keyword',
      '[Version] 2.0\n# MHz S\n[Number of Ports] 3\n',
      /^line 3 "3": a termination has one port/u,
    ],
    ['mixed modes', '[Version] 2.0\n# MHz S\n[Mixed-Mode Order] D2,3 C2,3\n', /^line 3: mixed-mode/u],
    ['a keyword unknown', two('[Phase Of Moon] full\n'), /^line 5 "\[phase of moon\]": this keyword is unknown/u],
    ['data before their keyword', two('1 0.1 0\n'), /^line 5 "1 0\.1 0": data before \[Network Data\]/u],
    ['a reference missing', two('[Reference]\n[Network Data]\n'), /^line 6: references are missing/u],
    ['a reference too many', two('[Reference] 50 75\n[Network Data]\n'), /^line 6: 2 references for 1 ports/u],
    ['a reference in words', two('[Reference] fifty\n'), /^line 5 "fifty": not a resistance/u],
    ['a matrix format unknown', two('[Matrix Format] Diagonal\n'), /^line 5 "Diagonal": this format is unknown/u],
    [
      'fewer data than said',
      two('[Network Data]\n1 0.1 0\n[End]\n'),
      /1 frequencies where \[Number of Frequencies\] says 2/u,
    ],
    ['a file cut off', two('[Network Data]\n1 0.1 0\n'), /1 frequencies where \[Number of Frequencies\] says 2/u],
    [
      'more data than said',
      two('[Network Data]\n1 0.1 0\n2 0.2 0\n3 0.3 0\n'),
      /^line 8: more than the 2 frequencies/u,
    ],
    [
      'a keyword among the data',
      two('[Network Data]\n1 0.1 0\n[Reference] 75\n2 0.2 0\n'),
      /^line 7 .*does not belong/u,
    ],
    ['an information block without end', two('[Begin Information]\n[Network Data]\n1 0.1 0\n'), /no data/u],
    [
      'no count',
      '[Version] 2.0\n# MHz S\n[Number of Ports] 1\n[Network Data]\n1 0.1 0\n',
      /^line 4: \[Number of Frequencies\]/u,
    ],
    ['a count of zero', '[Version] 2.0\n[Number of Frequencies] 0\n', /^line 2 "0": not a count/u],
    ['a count that is none', '[Version] 2.0\n[Number of Frequencies] -3\n', /^line 2 "-3": not a count/u],
  ])('%s', (_, text, why) => {
    expect(refusal(text)).toMatch(why);
  });

  it('a two-port file of version 2 without its order', () => {
    const text =
      '[Version] 2.0\n# MHz S\n[Number of Ports] 2\n[Number of Frequencies] 1\n[Network Data]\n1 0 0 0 0 0 0 0 0\n';
    expect(refusal(text, 'a.s2p')).toMatch(/^line 5: \[Two-Port Data Order\] is missing/u);
  });

  it('a three-port file by its name, and a name that says nothing', () => {
    expect(refusal(good, 'coupler.s3p')).toMatch(/^file "coupler\.s3p": .* not 3/u);
    expect(refusal(good, 'data.txt')).toMatch(/how many ports is not said; name the file/u);
  });

  it('port 2 of a one-port file', () => {
    expect(refusal(good, 'a.s1p', 2)).toMatch(/^file "port 2": it has 1 port; choose port 1/u);
  });

  it('a two-port file named .s1p, and a one-port file named .s2p', () => {
    expect(refusal(`${head}1 0.1 0 0.2 0 0.2 0 0.1 0\n`)).toMatch(/^line 2: 9 numbers where 3 belong/u);
    expect(refusal(good, 'a.s2p')).toMatch(/^line 2: 3 numbers where 9 belong/u);
  });

  it('a falling frequency of a two-port whose line is no noise', () => {
    const row = '0.1 0 0.5 0 0.5 0 0.2 0';
    expect(refusal(`${head}2 ${row}\n1 ${row}\n`, 'a.s2p')).toMatch(/^line 3 "1": the frequency is below/u);
  });

  it('more lines before the data than any file has', () => {
    expect(refusal('!\n'.repeat(10_001))).toMatch(/^line 10001: no data in 10 000 lines/u);
  });
});

describe('readTouchstone(text, name) of a million lines', () => {
  it('is read whole, every sample in its place', () => {
    const rows = Array.from({ length: 1_000_000 }, (_, k) => `${String(k + 1)} 0.${String(k % 10)} 0`);
    const { frequencyHz, re } = readTouchstone(`# kHz S RI R 50\n${rows.join('\n')}\n`, 'long.s1p');
    expect(frequencyHz).toHaveLength(1_000_000);
    expect(frequencyHz[999_999]).toBe(1e9);
    expect(re[999_997]).toBe(0.7);
  }, 20_000);
});

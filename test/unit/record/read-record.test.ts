import { describe, expect, it } from 'vitest';
import { formatProblem, InputError } from '../../../src/quantity/problem.ts';
import { readRecord } from '../../../src/record/read-record.ts';
import { repeatedName } from '../../../src/record/repeated-name.ts';
import { recordOf } from '../record-of.ts';

const record = recordOf({ frequency: '151.25M', source: '50', load: '9.4-j61' });
const text = JSON.stringify(record);

/** The lines that a text is refused with. */
function linesOf(given: string): string[] {
  try {
    readRecord(given);
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    return error.problems.map(formatProblem);
  }
  return [];
}

/** The record with one value replaced, by its path. */
function withValue(path: string, value: unknown): string {
  const copy = JSON.parse(text);
  const names = path.split('.');
  const last = names.pop()!;
  let inner = copy;
  for (const name of names) inner = inner[name];
  if (value === undefined) Reflect.deleteProperty(inner, last);
  else Object.defineProperty(inner, last, { value, enumerable: true, configurable: true });
  return JSON.stringify(copy);
}

describe('readRecord(text)', () => {
  it('reads a record, with a byte order mark or without', () => {
    expect(readRecord(text)).toEqual(record);
    expect(readRecord(`\uFEFF${text}`)).toEqual(record);
    expect(readRecord(JSON.stringify(record, null, 4))).toEqual(record);
  });

  it.each<[string, unknown, string]>([
    [
      'requirement.frequencyHz',
      0,
      'requirement.frequencyHz "0": the design frequency is out of range; give a frequency from 1 Hz to 1 THz',
    ],
    [
      'source.r',
      0,
      'source.r "0": the source\'s resistance must be above zero for power to flow; give R > 0, as in 9.4-j61',
    ],
    [
      'loads.0.termination.r',
      -5,
      'loads.0.termination.r "-5": the load\'s resistance must be above zero for power to flow; give R > 0, as in 9.4-j61',
    ],
    [
      'loads.0.termination.r',
      1e-7,
      'loads.0.termination.r "1e-7": the load\'s resistance is out of range; give 1 µΩ to 1 GΩ',
    ],
    [
      'loads.0.termination.r',
      '9.4',
      'loads.0.termination.r "9.4": the load\'s resistance is not a number; give a plain number in SI units',
    ],
    [
      'loads.0.termination.r',
      null,
      'loads.0.termination.r "null": the load\'s resistance is not a number; give a plain number in SI units',
    ],
    [
      'loads.0.termination.x',
      1e10,
      'loads.0.termination.x "10000000000": the load\'s reactance is out of range; give −1 GΩ to 1 GΩ',
    ],
    [
      'loads.0.termination.behaviour',
      'fixed',
      'loads.0.termination.behaviour "fixed": the load\'s behaviour is unknown; give constant, series or parallel',
    ],
    ['loads', undefined, 'loads: this field is missing; give it'],
    [
      'loads.0.termination',
      'fifty',
      'loads.0.termination "fifty": not an object; give the fields that the schema names',
    ],
    ['aim', 5, 'aim "5": the aim is unknown; give conjugate or reflectionless'],
    ['sections', 7, 'sections "7": the number of sections is out of range; give auto or a whole number from 1 to 6'],
    [
      'sections',
      2.5,
      'sections "2.5": the number of sections is out of range; give auto or a whole number from 1 to 6',
    ],
    [
      'schema',
      'ferrule-record/3',
      'schema "ferrule-record/3": a later Ferrule wrote this record; this one reads up to ferrule-record/2; open it with a Ferrule that reads ferrule-record/3',
    ],
    [
      'requirement.bandHz',
      { low: 152e6, high: 150e6 },
      'requirement.bandHz "152000000..150000000": the band is upside down; give the lower end first',
    ],
    [
      'requirement.bandHz',
      { low: 152e6, high: 153e6 },
      'requirement.bandHz "152000000..153000000": the band does not hold the design frequency; widen the band or move the frequency',
    ],
    [
      'requirement.bandHz',
      { low: 1e5, high: 200e6 },
      'requirement.bandHz "100000..200000000": the band reaches too far; stay within a thousand times the design frequency',
    ],
    [
      'sweepHz',
      { low: 1e9, high: 2e9 },
      'sweepHz "1000000000..2000000000": the sweep does not hold the design frequency; widen the sweep',
    ],
    [
      'sweepHz',
      { low: 151.25e6, high: 151.25e6 },
      'sweepHz "151250000..151250000": the sweep has no width; give two different frequencies',
    ],
    [
      'requirement.returnLossDb',
      0,
      'requirement.returnLossDb "0": a return loss is above 0 dB; give 0 to 100 dB, larger is better',
    ],
    ['requirement.powerW', -1, 'requirement.powerW "-1": the power must be above zero; give watts, or leave it out'],
    [
      'requirement.blockDc',
      'yes',
      'requirement.blockDc "yes": whether DC is to be blocked is not yes or no; give yes or no, in a record true or false',
    ],
    [
      'method',
      'resistive-pair',
      'method "resistive-pair": the Q method takes two resistances; leave the reactance out, or use complex terminations',
    ],
    [
      'method',
      'cascade',
      'sections "auto": the smallest number of sections needs something to hold; give a band and a return loss, or a number of sections',
    ],
    [
      'identity.date',
      '2026-02-30',
      'identity.date "2026-02-30": the date of issue is not a calendar date; write it as 2026-03-31',
    ],
    [
      'identity.title',
      'x'.repeat(121),
      `identity.title "${'x'.repeat(60)}…": the title is too long; give at most 120 letters`,
    ],
    ['identity.title', 'one\ntwo', 'identity.title "one two": the title holds a control character; leave it out'],
    ['identity.title', 'half \uD83D', 'identity.title "half \uFFFD": the title holds half a character; type it again'],
    ['selection.reason', 'bell \u0007', 'selection.reason "bell": the reason holds a control character; leave it out'],
  ])('refuses %s = %j in one line', (path, value, line) => {
    expect(linesOf(withValue(path, value))).toEqual([line]);
  });

  it('lets a reason have lines', () => {
    expect(linesOf(withValue('selection.reason', 'One.\nTwo.'))).toEqual([]);
  });

  it.each([
    'results',
    '__proto__',
    'toString',
    'constructor',
    'requirement.tolerance',
    'source.q',
    'signOff.checked.mail',
  ])('refuses the unknown field %s by its path', (path) => {
    const [line, ...more] = linesOf(withValue(path, { r: 1 }));
    expect(more).toEqual([]);
    expect(line).toMatch(/: this field is unknown; leave it out or check its spelling$/);
    expect(line!.startsWith(path)).toBe(true);
  });

  it('refuses a field given twice, which JSON itself would let pass', () => {
    const twice = text.replace('"frequencyHz":', '"frequencyHz":1e6,"frequencyHz":');
    expect(linesOf(twice)).toEqual(['frequencyHz: this field is given twice; keep the one that is meant']);
  });

  it('shows no infinity for a number beyond all: 1e400', () => {
    const lines = linesOf(text.replace('151250000', '1e400'));
    expect(lines[0]).toBe(
      'requirement.frequencyHz: the design frequency is out of range; give a frequency from 1 Hz to 1 THz',
    );
    expect(lines.join()).not.toMatch(/Infinity/);
  });

  it.each([
    ['nothing', ''],
    ['broken JSON', text.slice(0, -5)],
    ['half of a nested list', '['.repeat(100_000)],
    ['NaN', text.replace('151250000', 'NaN')],
    ['a comment', `// record\n${text}`],
    ['bytes of a picture', '\uFFFDPNG\r\n\u001a\n\u0000\u0000\u0000\rIHDR'],
  ])('refuses %s: not JSON', (_, given) => {
    expect(linesOf(given)).toEqual([
      expect.stringMatching(/^record( ".*")?: not JSON; give a design record as Ferrule saved it$/),
    ]);
  });

  it.each([
    ['null', 'null'],
    ['a number', '5'],
    ['text', '"record"'],
    ['a list', '[]'],
    ['lists in lists', '['.repeat(100_000) + ']'.repeat(100_000)],
    ['objects in objects', '{"a":'.repeat(100_000) + '1' + '}'.repeat(100_000)],
    ['another document', '{"schema":"ferrule-dossier/1"}'],
  ])('refuses %s, which is no record', (_, given) => {
    const lines = linesOf(given);
    expect(lines.length).toBeGreaterThan(0);
    for (const line of lines) expect(line).not.toMatch(/[\p{Cc}\p{Zl}\p{Zp}]|undefined|NaN/u);
  });

  it('refuses 9 MB unread', () => {
    expect(linesOf(`"${'x'.repeat(9e6)}"`)).toEqual([
      'record: 9.0 million characters are more than a record can have; give a design record of at most 8 million',
    ]);
  });

  it('tells all that is wrong, each field once', () => {
    const broken = {
      ...record,
      aim: 'both',
      loads: [{ name: '', termination: { ...record.loads[0]!.termination, r: -1, x: 'a' } }],
    };
    expect(linesOf(JSON.stringify(broken)).map((line) => line.split(/[ :]/)[0])).toEqual([
      'loads.0.termination.r',
      'loads.0.termination.x',
      'aim',
    ]);
  });
});

describe('repeatedName(text)', () => {
  it.each([
    ['{"a":1,"b":{"a":2},"c":[{"a":3},{"a":4}]}', null],
    ['{"a":1,"a":2}', 'a'],
    ['{"a":{"b":1,"c":2,"b":3}}', 'b'],
    ['[{"a":1},{"x":0,"a":1,"a":2}]', 'a'],
    // The same name, one letter of it escaped.
    [String.raw`{"a":1,"\u0061":2}`, 'a'],
    // Braces, quotes and colons inside text are text.
    [String.raw`{"a":"{\"a\":1","b":"}\\","c":"\"b\":"}`, null],
    ['"a"', null],
    ['{}', null],
    ['{"a" : "b", "b"\n: "a"}', null],
  ])('of %s is %s', (given, name) => {
    expect(() => JSON.parse(given) as unknown).not.toThrow();
    expect(repeatedName(given)).toBe(name);
  });
});

import { describe, expect, it } from 'vitest';
import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import { readDraft } from '../../../src/record/draft.ts';
import { fieldsOf, type Fields } from '../../../src/record/fields.ts';
import {
  loadLabel,
  readLoads,
  readTermination,
  terminationLabel,
  terminationWords,
} from '../../../src/record/read-termination.ts';
import { formatProblem } from '../../../src/quantity/problem.ts';

const file = measuredTermination('# MHz S RI R 50\n90 0.1 0.2\n110 0.3 -0.4\n', 'antenna.s1p');
const attachments = new Map([['antenna.s1p', file]]);
const none = new Map<string, typeof file>();

describe('readTermination(text, behaviour, attachments)', () => {
  it('an impedance takes the behaviour; a model and data have their own', () => {
    expect(readTermination('9.4-j61', 'parallel', none)).toEqual({
      ok: true,
      value: { r: 9.4, x: -61, behaviour: 'parallel' },
    });
    expect(readTermination(' rc-series 12 8.2p ', 'parallel', none)).toEqual({
      ok: true,
      value: { model: 'rc-series', values: [12, 8.2e-12] },
    });
    expect(readTermination('antenna.s1p', 'series', attachments)).toEqual({ ok: true, value: file });
  });

  it.each([
    ['missing.s1p', 'its data are not here'],
    ['missing.s2p (port 2)', 'its data are not here'],
    ['table', 'its data are not here'],
    ['rc-series 12', '1 values where 2 belong'],
    ['nonsense 12 3', '"nonsense" is no circuit model'],
    ['', 'nothing is given'],
    ['fifty', 'not an impedance'],
  ])('"%s": %s', (text, why) => {
    expect(readTermination(text, 'series', attachments)).toMatchObject({ ok: false, why });
  });
});

describe('readLoads(text, behaviour, attachments)', () => {
  it('one line is one state without a name, or with one', () => {
    expect(readLoads('50', 'series', none)).toMatchObject({ value: [{ name: '', termination: { r: 50 } }] });
    expect(readLoads(' free space =  50 ', 'series', none)).toMatchObject({ value: [{ name: 'free space' }] });
  });

  it('several lines are several states; those without a name are numbered; blank lines are none', () => {
    const reading = readLoads('free = 50\r\n\n60-j3\n iced=rc-series 12 8p\nantenna.s1p\n', 'series', attachments);
    expect(reading.ok && reading.value.map(({ name }) => name)).toEqual(['free', 'state 2', 'iced', 'state 4']);
  });

  it('tells which state it is that can not be read', () => {
    expect(readLoads('free = 50\niced = ice', 'series', none)).toMatchObject({
      ok: false,
      why: 'iced: not an impedance',
    });
    expect(readLoads('50\nfifty', 'series', none)).toMatchObject({ ok: false, why: 'state 2: not an impedance' });
    expect(readLoads('', 'series', none)).toMatchObject({ ok: false, why: 'nothing is given' });
  });
});

describe('terminationWords and labels', () => {
  it('say what was understood', () => {
    expect(terminationWords({ r: 9.4, x: -61, behaviour: 'series' })).toBe('9.4 − j61 Ω');
    expect(terminationWords({ model: 'rc-series', values: [12, 8.2e-12] })).toBe('rc-series: R 12 Ω, C 8.2 pF');
    expect(terminationWords(file)).toBe('antenna.s1p, 2 samples, 90.00 MHz to 110.0 MHz');
    expect(terminationLabel(file)).toBe('measured');
    expect(terminationLabel({ model: 'antenna', values: [36, 1e8, 5] })).toBe('antenna');
    expect(
      loadLabel([
        { name: 'a', termination: file },
        { name: 'b', termination: file },
      ]),
    ).toBe('2 states');
  });
});

const typed: Fields = { date: '2026-01-31', frequency: '100M', source: '50', load: '12-j40' };

describe('fieldsOf(record) and back', () => {
  it.each<[string, Fields]>([
    [
      'states of every kind',
      { load: 'free = antenna 36 99.7M 11.37\niced = antenna.s1p\nhand = 12.345678-j40', band: '95M..105M' },
    ],
    ['a model with odd values', { load: 'crystal 30.1 10.00000001m 25.5f 5p' }],
    ['a measured source', { source: 'antenna.s1p' }],
    ['Pi of a chosen Q', { method: 'pi', q: '7.25', load: '1k' }],
    [
      'a fit',
      {
        method: 'fitted',
        band: '95M..105M',
        elements: '5',
        'fit-form': 'high-pass',
        'shunt-inductor': 'no',
        'fit-seed': '42',
        steps: '7',
      },
    ],
    ['loss', { 'q-inductor': '35.5', 'q-capacitor': '800' }],
  ])('%s', (_, fields) => {
    const { record, problems } = readDraft({ ...typed, ...fields }, attachments);
    expect(problems).toEqual([]);
    expect(readDraft(fieldsOf(record!), attachments).record).toEqual(record);
  });
});

describe('readDraft(fields) of bad input', () => {
  it.each<[Fields, RegExp]>([
    [
      { method: 'fitted', band: '95M..105M', elements: '1' },
      /^elements "1": the number of elements is out of range; give auto or a whole number from 2 to 8$/u,
    ],
    [{ method: 'fitted', band: '95M..105M', elements: '9' }, /^elements "9": /u],
    [{ method: 'fitted', band: '95M..105M', elements: '2.5' }, /^elements "2\.5": .*whole number from 2 to 8$/u],
    [{ method: 'fitted', band: '95M..105M', elements: '-2' }, /^elements "-2": /u],
    [{ method: 'fitted', band: '95M..105M', elements: 'many' }, /^elements "many": /u],
    [
      { method: 'fitted', band: '95M..105M', 'fit-seed': '-1' },
      /^fit-seed "-1": the seed is out of range; give a whole number from 0 to 4294967295$/u,
    ],
    [
      { method: 'fitted', band: '95M..105M', 'fit-seed': '1.5' },
      /^fit-seed "1\.5": the seed is not whole; give a whole number from 0 to 4294967295$/u,
    ],
    [{ method: 'fitted', band: '95M..105M', steps: '0' }, /^steps "0": .*whole number from 1$/u],
    [{ method: 'fitted' }, /^band: this method is for a band; give one$/u],
    [{ method: 'equal-ripple' }, /^band: this method is for a band; give one$/u],
    [{ method: 'equal-ripple', band: '95M..105M', sections: '7' }, /^sections "7": .*from 1 to 6$/u],
    [{ method: 'equal-ripple', band: '95M..105M', sections: '1.5' }, /^sections "1\.5": /u],
    [{ method: 'pi', q: '0' }, /^q "0": the chosen Q is out of range; give a Q from 0\.001 to 1 000 000$/u],
    [{ method: 'pi', q: '-3' }, /^q "-3": the chosen Q is out of range/u],
    [{ method: 'pi', q: 'high' }, /^q "high": the chosen Q is not a number/u],
    [{ method: 'sorcery' }, /^method "sorcery": the method is unknown; give two-element, /u],
    [{ 'fit-form': 'band-pass' }, /^fit-form "band-pass": this form is unknown; give any, low-pass or high-pass$/u],
    [{ 'shunt-inductor': 'maybe' }, /^shunt-inductor "maybe": .*give yes or no$/u],
    [{ 'q-inductor': '0' }, /^q-inductor "0": .*from 1 to 1 000 000$/u],
    [{ load: 'a = 50\na = 60' }, /^load "a = 50 a = 60": two load states have the same name; give each its own$/u],
    [
      { load: Array.from({ length: 9 }, (_, k) => `s${String(k)} = 5${String(k)}`).join('\n') },
      /too many load states; give at most 8$/u,
    ],
    [{ load: `${'long '.repeat(10)} = 50\n60` }, /the load state's name is too long; give at most 40 letters$/u],
    [{ load: 'antenna 36 100M 1e15' }, /a value of the load's model is out of range/u],
  ])('%o: one line', (fields, line) => {
    const { record, problems } = readDraft({ ...typed, ...fields }, attachments);
    expect(record).toBeNull();
    expect(problems).toHaveLength(1);
    expect(formatProblem(problems[0]!)).toMatch(line);
    expect(formatProblem(problems[0]!)).not.toMatch(/\n|NaN|undefined/u);
    // What was typed is told as typed.
    expect(problems[0]!.read).toBe(fields[problems[0]!.field as keyof Fields] ?? '');
  });
});

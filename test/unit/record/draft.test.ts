import { describe, expect, it } from 'vitest';
import { formatProblem } from '../../../src/quantity/problem.ts';
import { practicable } from '../../../src/parts/practicable.ts';
import { readDraft } from '../../../src/record/draft.ts';
import { fieldNames, fieldsOf, pathOf, type Fields } from '../../../src/record/fields.ts';
import { recordOf } from '../record-of.ts';

const sound: Fields = { date: '2026-01-31', frequency: '151.25M', source: '50', load: '9.4-j61' };

describe('readDraft(fields)', () => {
  it('fills a record from the texts, with the defaults for the rest', () => {
    const { record, problems } = readDraft(sound);
    expect(problems).toEqual([]);
    expect(record).toEqual({
      schema: 'ferrule-record/2',
      identity: {
        title: 'Matching network',
        number: 'unnumbered',
        revision: 'A',
        date: '2026-01-31',
        ticket: '',
        owner: '',
        change: '',
      },
      requirement: {
        frequencyHz: 151.25e6,
        bandHz: null,
        returnLossDb: null,
        blockDc: false,
        keepDc: 'none',
        inductorH: practicable.inductorH,
        capacitorF: practicable.capacitorF,
        powerW: null,
      },
      source: { r: 50, x: 0, behaviour: 'series' },
      loads: [{ name: '', termination: { r: 9.4, x: -61, behaviour: 'series' } }],
      aim: 'conjugate',
      method: 'two-element',
      sections: 'auto',
      q: null,
      fit: { elements: 'auto', form: 'any', shuntInductor: true, seed: 1, steps: null },
      partQ: { inductor: 50, capacitor: 300 },
      build: null,
      sweepHz: null,
      selection: { option: null, reason: '', set: 1 },
      deviations: [],
      history: [],
      previous: null,
      asBuilt: null,
      signOff: {
        state: 'draft',
        prepared: { name: '', role: '', date: '', remark: '' },
        checked: { name: '', role: '', date: '', remark: '' },
        approved: { name: '', role: '', date: '', remark: '' },
      },
    });
  });

  it('tells what was understood, in engineering notation', () => {
    const { understood } = readDraft({
      ...sound,
      frequency: '151250k',
      load: '61.72<-81.24',
      band: '150.5-152 MHz',
      power: '2000m',
      'return-loss': '14',
      inductors: '1n..10u',
    });
    expect(understood).toMatchObject({
      frequency: '151.25 MHz',
      source: '50 Ω',
      band: '150.5 MHz to 152 MHz',
      power: '2 W',
      'return-loss': '14 dB',
      inductors: '1 nH to 10 µH',
    });
    expect(understood.load).toMatch(/^9\.4\d+ − j60\.99\d+ Ω$|^9\.3\d+ − j61\.00\d+ Ω$/);
  });

  it.each<[Fields, string]>([
    [{ frequency: '' }, 'frequency: nothing is given; write it as 151.25M or 151.25 MHz'],
    [{ frequency: '0' }, 'frequency "0": the design frequency is out of range; give a frequency from 1 Hz to 1 THz'],
    [
      { frequency: '-5M' },
      'frequency "-5M": the design frequency is out of range; give a frequency from 1 Hz to 1 THz',
    ],
    [{ frequency: 'NaN' }, 'frequency "NaN": not a quantity; write it as 151.25M or 151.25 MHz'],
    [{ frequency: '1e400' }, 'frequency "1e400": beyond the range of numbers; write it as 151.25M or 151.25 MHz'],
    [{ load: '' }, 'load: nothing is given; write it as 50, 9.4-j61 or 50∠-30°'],
    [{ load: 'whip' }, 'load "whip": not an impedance; write it as 50, 9.4-j61 or 50∠-30°'],
    [
      { load: '0-j61' },
      'load "0-j61": the load\'s resistance must be above zero for power to flow; give R > 0, as in 9.4-j61',
    ],
    [
      { load: 'j61' },
      'load "j61": the load\'s resistance must be above zero for power to flow; give R > 0, as in 9.4-j61',
    ],
    [
      { source: '-50' },
      'source "-50": the source\'s resistance must be above zero for power to flow; give R > 0, as in 9.4-j61',
    ],
    [
      { source: '50∠95°' },
      'source "50∠95°": the source\'s resistance must be above zero for power to flow; give R > 0, as in 9.4-j61',
    ],
    [
      { 'load-behaviour': 'fixed' },
      'load-behaviour "fixed": the load\'s behaviour is unknown; give constant, series or parallel',
    ],
    [{ band: '152M..150M' }, 'band "152M..150M": the band is upside down; give the lower end first'],
    [
      { band: '152M..153M' },
      'band "152M..153M": the band does not hold the design frequency; widen the band or move the frequency',
    ],
    [{ band: '150M' }, 'band "150M": not a lower and an upper end; write it as 150.5M..152M'],
    [{ 'return-loss': 'good' }, 'return-loss "good": not a quantity; write it as 14'],
    [{ 'return-loss': '-14' }, 'return-loss "-14": a return loss is above 0 dB; give 0 to 100 dB, larger is better'],
    [
      { 'block-dc': 'maybe' },
      'block-dc "maybe": whether DC is to be blocked is not yes or no; give yes or no, in a record true or false',
    ],
    [
      { 'block-dc': 'constructor' },
      'block-dc "constructor": whether DC is to be blocked is not yes or no; give yes or no, in a record true or false',
    ],
    [{ 'keep-dc': 'all' }, 'keep-dc "all": the ends that carry DC are unknown; give none, source, load or both'],
    [{ inductors: '10u..1n' }, 'inductors "10u..1n": the range of inductance is upside down; give the lower end first'],
    [{ aim: 'best' }, 'aim "best": the aim is unknown; give conjugate or reflectionless'],
    [
      { method: 'guess' },
      'method "guess": the method is unknown; give two-element, resistive-pair, pi, tee, cascade, equal-ripple, fitted, all',
    ],
    [
      { method: 'resistive-pair' },
      'method "resistive-pair": the Q method takes two resistances; leave the reactance out, or use complex terminations',
    ],
    [
      { method: 'cascade', sections: '9' },
      'sections "9": the number of sections is out of range; give auto or a whole number from 1 to 6',
    ],
    [{ date: 'today' }, 'date "today": the date of issue is not a calendar date; write it as 2026-03-31'],
    [
      { 'checked-date': '31.1.2026' },
      'checked-date "31.1.2026": the date under checked is not a calendar date; write it as 2026-03-31',
    ],
  ])('refuses %j in one line beside its field', (broken, line) => {
    const { record, problems } = readDraft({ ...sound, ...broken });
    expect(record).toBeNull();
    expect(problems.map(formatProblem)).toEqual([line]);
  });

  it('tells every field that is wrong, once', () => {
    const { problems } = readDraft({ ...sound, frequency: 'x', source: 'y', load: '0', aim: 'z' });
    expect(problems.map(({ field }) => field).sort()).toEqual(['aim', 'frequency', 'load', 'source']);
  });
});

describe('fieldsOf(record)', () => {
  it('gives every field the text that a person would type', () => {
    const record = recordOf({
      ...sound,
      band: '150.5M..152M',
      'return-loss': '14',
      'block-dc': 'yes',
      power: '2',
      sweep: '100M..200M',
      choice: 'shunt-load-minus',
    });
    expect(fieldsOf(record)).toMatchObject({
      frequency: '151.25 MHz',
      source: '50',
      load: '9.4-j61',
      band: '150.5 MHz to 152 MHz',
      'return-loss': '14',
      'block-dc': 'yes',
      inductors: '1 nH to 10 µH',
      capacitors: '1 pF to 100 nF',
      power: '2 W',
      sweep: '100 MHz to 200 MHz',
      choice: 'shunt-load-minus',
      sections: 'auto',
    });
    expect(Object.keys(fieldsOf(record)).sort()).toEqual([...fieldNames].sort());
  });

  it('keeps a number that engineering notation would round, with its own unit', () => {
    const record = recordOf({ ...sound, band: '150500000.1234567 Hz..152M' });
    expect(fieldsOf(record).band).toBe('150500000.1234567 Hz to 152 MHz');
    expect(readDraft(fieldsOf(record)).record).toEqual(record);
  });
});

describe('readDraft(fields) of other scripts', () => {
  it.each(['Müller & Søn', 'Ωμέγα', 'Пётр', 'Nguyễn', '50 Ω → 75 Ω'])('takes "%s"', (title) => {
    expect(readDraft({ ...sound, title }).problems).toEqual([]);
  });

  it.each(['整合回路', 'מעגל', 'دائرة', 'match 🙂'])('refuses "%s" at its field, as it can not be printed', (title) => {
    expect(readDraft({ ...sound, title }).problems.map(({ field, read }) => [field, read])).toEqual([['title', title]]);
  });
});

describe('pathOf', () => {
  it('leads every field to a place that the record has', () => {
    const record = recordOf({ ...sound, band: '150M..152M', 'series-inductor': 'E24' });
    for (const path of Object.values(pathOf)) {
      let inner: unknown = record;
      for (const name of path.split('.')) {
        expect(inner, path).toHaveProperty([name]);
        inner = (inner as Record<string, unknown>)[name];
      }
    }
  });
});

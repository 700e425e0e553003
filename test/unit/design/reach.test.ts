import { describe, expect, it } from 'vitest';
import { design } from '../../../src/design.ts';
import { reachOf } from '../../../src/design/reach.ts';
import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import type { DesignRecord } from '../../../src/record/design-record.ts';
import { readDraft } from '../../../src/record/draft.ts';
import type { Fields } from '../../../src/record/fields.ts';

const data = (low: number, high: number) =>
  measuredTermination(
    `f/MHz R X\n${String(low)} 12 -40\n${String((low + high) / 2)} 13 -38\n${String(high)} 14 -36`,
    'table',
  );
const attachments = new Map([
  ['a.s1p', data(90, 110)],
  ['b.s1p', data(95, 120)],
  ['c.s1p', data(200, 220)],
]);
function record(fields: Fields): DesignRecord {
  const draft = readDraft({ date: '2026-01-31', frequency: '100M', source: '50', ...fields }, attachments);
  if (draft.record === null) throw new Error(draft.problems.map(({ why }) => why).join('; '));
  return draft.record;
}

describe('reachOf(record)', () => {
  it('is what all measured ends share; null where none is measured', () => {
    expect(reachOf(record({ load: '50' }))).toBeNull();
    expect(reachOf(record({ load: 'a.s1p' }))).toEqual({ low: 90e6, high: 110e6 });
    expect(reachOf(record({ load: 'one = a.s1p\ntwo = b.s1p' }))).toEqual({ low: 95e6, high: 110e6 });
    expect(reachOf(record({ source: 'b.s1p', load: 'a.s1p' }))).toEqual({ low: 95e6, high: 110e6 });
  });
});

describe('design(record) of measured data that do not reach', () => {
  it.each([
    [
      { load: 'a.s1p', frequency: '150M' },
      /^frequency "150\.0 MHz": the design frequency is outside the data, 90\.00 MHz to 110\.0 MHz; stay within them/u,
    ],
    [
      { load: 'a.s1p', band: '80M..105M' },
      /^band "80\.00 MHz to 105\.0 MHz": it reaches outside the data, 90\.00 MHz to 110\.0 MHz/u,
    ],
    [{ load: 'a.s1p', band: '95M..110.001M' }, /^band /u],
    [{ load: 'a.s1p', sweep: '50M..105M' }, /^sweep "50\.00 MHz to 105\.0 MHz": it reaches outside the data/u],
    [
      { load: 'one = a.s1p\ntwo = b.s1p', band: '92M..105M' },
      /^band .*outside what all the data share, 95\.00 MHz to 110\.0 MHz/u,
    ],
    [
      { load: 'one = a.s1p\ntwo = c.s1p' },
      /^load: the terminations have no frequency in common; give data that overlap/u,
    ],
    [{ source: 'c.s1p', load: 'a.s1p' }, /no frequency in common/u],
  ])('%o is refused in one line', (fields, message) => {
    expect(() => design(record(fields))).toThrow(message);
  });

  it('to the edge itself is within', () => {
    const { responses, options } = design(record({ load: 'a.s1p', band: '90M..110M' }));
    expect(responses[0]!.spanHz).toEqual({ low: 90e6, high: 110e6 });
    expect(options.length).toBeGreaterThan(0);
  });

  it.each(['90M', '110M'])(
    'a design frequency of %s, an edge of the data, has a peak there and no edge beyond',
    (frequency) => {
      const { options, responses } = design(record({ load: 'a.s1p', frequency }));
      const hz = Number(frequency.replace('M', 'e6'));
      for (const { halfPower, transducerGain } of options) {
        expect(transducerGain).toBeCloseTo(1, 12);
        expect(Number.isFinite(halfPower.peakHz)).toBe(true);
        expect(halfPower.peakGain).toBeCloseTo(1, 9);
        expect(halfPower[frequency === '90M' ? 'lowHz' : 'highHz']).toBeNull();
        expect(halfPower.words).toMatch(/within the data/u);
      }
      expect(responses[0]!.frequencyHz).toContain(hz);
    },
  );

  it('shows no harmonic and no sample outside the data', () => {
    const { options, responses } = design(record({ load: 'a.s1p', band: '95M..105M' }));
    for (const { harmonicDb } of options) {
      expect(harmonicDb).toEqual([
        { order: 2, attenuationDb: null },
        { order: 3, attenuationDb: null },
      ]);
    }
    for (const hz of responses[0]!.frequencyHz) {
      expect(hz).toBeGreaterThanOrEqual(90e6);
      expect(hz).toBeLessThanOrEqual(110e6);
    }
  });

  it('holds no NaN, no infinity and nothing undefined anywhere', () => {
    const dossier = design(record({ source: 'b.s1p', load: 'a.s1p', band: '95M..110M', frequency: '95M' }));
    expect(JSON.parse(JSON.stringify(dossier))).toEqual(dossier);
    expect(JSON.stringify(dossier)).not.toMatch(/NaN|Infinity|undefined/u);
  });
});

import { describe, expect, it } from 'vitest';
import { judge, parts } from '../../../../components/ferrule-sheet/parts.ts';
import { exact, finished, goingOn, settle, stopped, withOption } from '../../../../components/ferrule-sheet/settle.ts';
import { groundsOf } from '../../../../src/design/grounds.ts';
import { designAtOnce } from '../../../../src/design/pipeline.ts';
import { defaults } from '../../../../src/record/fields.ts';
import { built } from '../fixture.ts';

const pair = {
  ...defaults,
  frequency: '10M',
  source: '1k5',
  load: '50',
  date: '2026-01-02',
  'return-loss': '20',
  band: '9.9M..10.1M',
};
const verdicts = (state: Parameters<typeof judge>[1]) => parts.map((part) => judge(part, state).words);

describe('settle(fields, before)', () => {
  it('keeps the dossier of the texts before while these can’t be read', () => {
    const before = settle(pair, null);
    const after = settle({ ...pair, load: '5O' }, before);
    expect(before.stale).toBe(false);
    expect(after.stale).toBe(true);
    expect(after.dossier).toBe(before.dossier);
    expect(after.fields.load).toBe('5O');
    expect(after.problems.load).toMatch(/^load "5O": /);
  });

  it('has no dossier where none could ever be read', () => {
    expect(settle({ ...pair, frequency: '' }, null).dossier).toBeNull();
  });

  it('sets a choice that doesn’t exist aside, says so, and takes it up again when it does', () => {
    const chosen = settle({ ...pair, choice: 'shunt-source-minus' }, null);
    expect(chosen.dossier?.chosenBy).toBe('engineer');
    // 50 Ω is now the lower resistance at the source, so that the shunt arm stands at the load.
    const without = settle({ ...chosen.fields, source: '50', load: '1k5' }, chosen);
    expect(without.notice).toMatch(/doesn’t exist for these terminations/);
    expect(without.stale).toBe(false);
    expect(without.dossier?.chosenBy).not.toBe('engineer');
    expect(settle({ ...without.fields, source: '1k5', load: '50' }, without).dossier?.chosen).toBe(
      'shunt-source-minus',
    );
  });
});

describe('real parts', () => {
  const asked = { ...pair, 'series-inductor': 'E24', 'series-capacitor': 'E24' };
  const first = settle(asked, null);
  const worked = first.dossier!.options.map((option) => ({ ...option, built }));

  it('are still to come behind exact values, which stand at once', () => {
    expect(settle(pair, null)).toMatchObject({ building: null, realParts: 'none' });
    expect(first.realParts).toBe('at work');
    expect(first.building).toBe(first.dossier?.record);
    expect(first.stale).toBe(false);
    expect(first.dossier?.options.every((option) => option.built === null)).toBe(true);
  });

  it('come in network by network', () => {
    const second = withOption(first, worked[1]!);
    expect(second.dossier?.options.map((option) => option.built !== null)).toEqual([false, true]);
    expect(second.dossier?.chosen).toBe(first.dossier?.chosen);
  });

  it('make the dossier whole, of the record that was asked about', () => {
    const copy = structuredClone(first.dossier!);
    const whole = finished(first, { ...copy, options: worked }, '');
    expect(whole).toMatchObject({ building: null, realParts: 'whole', stale: false });
    expect(whole.dossier?.record).toBe(first.building);
  });

  it('are stopped with what there is, and gone on with', () => {
    const some = finished(
      stopped(withOption(first, worked[0]!)),
      { ...first.dossier!, options: [worked[0]!, first.dossier!.options[1]!] },
      '',
    );
    expect(some.realParts).toBe('stopped');
    expect(goingOn(some)).toMatchObject({ realParts: 'at work', building: first.building });
  });

  it('are given up while texts can’t be read', () => {
    expect(settle({ ...asked, load: '?' }, first)).toMatchObject({ stale: true, building: null, realParts: 'stopped' });
  });

  it('follow exact values that the worker found', () => {
    const searched = settle({ ...asked, method: 'fitted' }, null);
    expect(searched.pending).not.toBeNull();
    const dossier = designAtOnce({ ...searched.pending!, method: 'two-element' }, groundsOf);
    expect(exact(searched, dossier, '')).toMatchObject({ pending: null, realParts: 'at work', stale: false });
  });
});

describe('judge(part, state)', () => {
  it('tells each part of its own entries, and assesses nothing that is of earlier ones', () => {
    const wrong = settle({ ...pair, load: 'x', source: 'y', date: 'soon', sweep: '?' }, settle(pair, null));
    expect(verdicts(wrong)).toEqual([
      '2 entries to correct',
      'not assessed',
      'not assessed',
      'not assessed',
      '1 entry to correct',
      'not assessed',
      'not assessed',
      'not assessed',
      '1 entry to correct',
    ]);
  });

  it('does not assess a response that nothing is required of', () => {
    expect(verdicts(settle({ ...pair, 'return-loss': '' }, null))[4]).toBe('not assessed');
  });

  it('says of exact values that they are no more, and judges real parts by what is asked of them', () => {
    const asked = settle({ ...pair, 'series-inductor': 'E24', 'series-capacitor': 'E24' }, null);
    expect(verdicts(asked)[6]).toBe('being worked out');
    expect(verdicts(asked)[3]).toMatch(/, exact values$/u);
    const chosen = asked.dossier!.options.find(({ id }) => id === asked.dossier!.chosen)!;
    const short = { subject: 'yield', verdict: 'falls short', reason: '' } as const;
    const worked = withOption(asked, { ...chosen, built, checks: [short], meets: false });
    expect(verdicts(worked)[6]).toBe('falls short');
    expect(verdicts(worked)[3]).toBe('falls short');
  });
});

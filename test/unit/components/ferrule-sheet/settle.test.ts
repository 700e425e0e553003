import { describe, expect, it } from 'vitest';
import { judge, parts } from '../../../../components/ferrule-sheet/parts.ts';
import { settle } from '../../../../components/ferrule-sheet/settle.ts';
import { defaults } from '../../../../src/record/fields.ts';

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
      '1 entry to correct',
    ]);
  });

  it('does not assess a response that nothing is required of', () => {
    expect(verdicts(settle({ ...pair, 'return-loss': '' }, null))[4]).toBe('not assessed');
  });
});

import { describe, expect, it } from 'vitest';
import { deviating, withDeviation } from '../../../../components/sign-off/deviations.ts';
import { groundsOf } from '../../../../src/design/grounds.ts';
import { designAtOnce } from '../../../../src/design/pipeline.ts';
import { readDraft } from '../../../../src/record/draft.ts';
import { readDeviations } from '../../../../src/record/draft-build.ts';

/** No two parts hold 60 dB over this band. */
const { record } = readDraft({
  frequency: '10M',
  source: '1k5',
  load: '50',
  band: '9M..11M',
  'return-loss': '60',
  date: '2026-01-02',
});
const short = designAtOnce(record!, groundsOf).options[0]!;

describe('deviating(text, option)', () => {
  it('lists what falls short, with the reason for which it is accepted', () => {
    expect(deviating('', short)).toMatchObject([{ subject: 'return loss', reason: '' }]);
    expect(deviating('', short)[0]!.why).toMatch(/60\.00 dB/u);
    expect(deviating('return loss = trial lot = 20 boards', short)).toMatchObject([
      { subject: 'return loss', reason: 'trial lot = 20 boards' },
    ]);
  });

  it('lists what a deviation is written for and doesn’t fall short', () => {
    expect(deviating('yield = few boards', short)).toMatchObject([
      { subject: 'return loss', reason: '' },
      { subject: 'yield', why: '', reason: 'few boards' },
    ]);
    expect(deviating('yield', undefined)).toEqual([{ subject: 'yield', why: '', reason: '' }]);
  });
});

describe('withDeviation(text, subject, reason)', () => {
  it('writes one line anew and leaves the others', () => {
    const text = withDeviation('yield = few\nstress = short pulses', 'yield', 'few boards');
    expect(text).toBe('yield = few boards\nstress = short pulses');
    expect(withDeviation('', 'DC block', 'a = b')).toBe('DC block = a = b');
  });

  it('is read back as it was written, one line however it was typed', () => {
    expect(readDeviations(withDeviation('', 'return loss', 'first\n second = last'))).toEqual([
      { subject: 'return loss', reason: 'first second = last' },
    ]);
  });

  it('leaves the line out when nothing is left of its reason', () => {
    expect(withDeviation('yield = few\nstress = pulses', 'yield', ' ')).toBe('stress = pulses');
    expect(withDeviation('', 'yield', '')).toBe('');
  });
});

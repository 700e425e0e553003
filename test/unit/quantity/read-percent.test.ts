import { describe, expect, it } from 'vitest';
import { readPercent, writePercent } from '../../../src/quantity/read-percent.ts';

describe('readPercent(text)', () => {
  it.each([
    ['5%', 0.05],
    ['2,5 %', 0.025],
    ['100%', 1],
    ['1e-3%', 1e-5],
    ['-3%', -0.03],
  ])('reads %s', (text, value) => {
    expect(readPercent(text)).toEqual({ ok: true, value });
  });

  it.each(['', 'five', '5 %%', '1e400%'])('refuses "%s"', (text) => {
    expect(readPercent(text)).toMatchObject({ ok: false, would: 'write it as 5%' });
  });

  it('refuses a bare number, which could be a fraction', () => {
    expect(readPercent('0.5')).toMatchObject({ ok: false, would: 'write 0.5% if that is meant' });
  });
});

describe('writePercent(fraction)', () => {
  it.each([
    [0.05, '5%'],
    [0.8, '80%'],
    [1, '100%'],
    [0, '0%'],
    [0.0981479, '9.81479%'],
    [1e-7, '1e-5%'],
    [0.001, '0.1%'],
  ])('%d', (fraction, text) => {
    expect(writePercent(fraction)).toBe(text);
    expect(readPercent(text)).toEqual({ ok: true, value: fraction });
  });
});

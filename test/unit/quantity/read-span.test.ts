import { describe, expect, it } from 'vitest';
import { readSpan } from '../../../src/quantity/read-span.ts';

describe('readSpan(text, unit, example)', () => {
  it.each([
    ['150.5M..152M', 150.5e6, 152e6],
    ['150.5M...152M', 150.5e6, 152e6],
    ['150.5 MHz … 152 MHz', 150.5e6, 152e6],
    ['150.5 to 152 MHz', 150.5e6, 152e6],
    ['150.5-152 MHz', 150.5e6, 152e6],
    ['150.5 - 152 MHz', 150.5e6, 152e6],
    ['150.5–152M', 150.5e6, 152e6],
    ['150.5..152M', 150.5e6, 152e6],
    ['1k..2M', 1e3, 2e6],
    ['1e3..2e6', 1e3, 2e6],
    ['1000 Hz to 2 MHz', 1e3, 2e6],
    ['2M..1M', 2e6, 1e6],
  ])('reads "%s", a prefix at the upper end alone holding for both', (text, low, high) => {
    expect(readSpan(text, 'Hz', '1M..2M')).toEqual({ ok: true, value: { low, high } });
  });

  it('reads exponents with their signs: "1e-9..1e-5"', () => {
    expect(readSpan('1e-9..1e-5', 'H', '1n..10u')).toEqual({ ok: true, value: { low: 1e-9, high: 1e-5 } });
  });

  it.each([
    ['', /nothing is given/],
    ['150M', /not a lower and an upper end/],
    ['1..2..3', /not a lower and an upper end/],
    ['a..b', /the lower end: not a quantity/],
    ['1M..', /the upper end: nothing is given/],
    ['1M..NaN', /the upper end: not a quantity/],
    ['1,500..2000', /the lower end: the comma can mean/],
  ])('refuses "%s"', (text, why) => {
    const reading = readSpan(text, 'Hz', '1M..2M');
    expect(reading).toMatchObject({ ok: false, why: expect.stringMatching(why), would: 'write it as 1M..2M' });
  });
});

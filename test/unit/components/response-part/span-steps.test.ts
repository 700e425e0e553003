import { describe, expect, it } from 'vitest';
import { narrower, spanText, wider } from '../../../../components/response-part/span-steps.ts';
import { readSpan } from '../../../../src/quantity/read-span.ts';

describe('wider(span)', () => {
  it('moves each end outwards by √2, to four digits', () => {
    // 100/√2 = 70.71, 200·√2 = 282.8
    expect(wider({ low: 100e6, high: 200e6 })).toEqual({ low: 70.71e6, high: 282.8e6 });
  });
});

describe('narrower(span, f0)', () => {
  it('halves the ratio of each end to the design frequency', () => {
    // √(100·144) = 120, √(144·225) = 180
    expect(narrower({ low: 100e6, high: 225e6 }, 144e6)).toEqual({ low: 120e6, high: 180e6 });
  });

  it('always holds the design frequency', () => {
    let span = { low: 1e6, high: 1e9 };
    for (let k = 0; k < 60; k += 1) span = narrower(span, 151.2345e6);
    expect(span.low).toBeLessThanOrEqual(151.2345e6);
    expect(span.high).toBeGreaterThanOrEqual(151.2345e6);
    expect(span.low).toBeLessThan(span.high);
  });
});

describe('spanText(span)', () => {
  it('reads back as the same span', () => {
    const span = { low: 70.71e6, high: 1.234e9 };
    expect(readSpan(spanText(span), 'Hz', '')).toMatchObject({ ok: true, value: span });
  });
});

import { describe, expect, it } from 'vitest';
import { decibelPair, frequencySpan, returnLossWords } from '../../../src/quantity/figures-in-words.ts';

describe('frequencySpan(span)', () => {
  it('shows the width of a narrow span', () => {
    expect(frequencySpan({ low: 118e6, high: 137e6 })).toBe('118.0 MHz to 137.0 MHz');
    expect(frequencySpan({ low: 150.5e6, high: 152e6 })).toBe('150.50 MHz to 152.00 MHz');
    expect(frequencySpan({ low: 100e6, high: 100.01e6 })).toBe('100.0000 MHz to 100.0100 MHz');
  });
});

describe('decibelPair(a, b)', () => {
  it('gives as many decimals as tell the two apart', () => {
    expect(decibelPair(19.9996, 20)).toEqual(['19.9996 dB', '20.0000 dB']);
    expect(decibelPair(20, 20)).toEqual(['20.00 dB', '20.00 dB']);
  });
});

describe('returnLossWords(db)', () => {
  it('stops at 100 dB', () => {
    expect([returnLossWords(100), returnLossWords(100.1)]).toEqual(['100.00 dB', 'over 100 dB']);
  });
});

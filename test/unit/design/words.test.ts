import { describe, expect, it } from 'vitest';
import { behaviourWords, decibelPair, frequencySpan, returnLossWords } from '../../../src/design/words.ts';

describe('frequencySpan(span)', () => {
  it('writes four digits where they show the width', () => {
    expect(frequencySpan({ low: 102.192e6, high: 201.033e6 })).toBe('102.2 MHz to 201.0 MHz');
    expect(frequencySpan({ low: 5e6, high: 5e6 })).toBe('5.000 MHz to 5.000 MHz');
  });

  it.each([
    [10.6925e6, 10.7075e6],
    [150.5e6, 152e6],
    [99.9968e6, 100.0032e6],
    [99.999998e6, 100.000001e6],
  ])('writes %s to %s Hz with as many as do: two of the width itself', (low, high) => {
    const [from, to] = frequencySpan({ low, high }).split(' to ');
    const width = (Number.parseFloat(to!) - Number.parseFloat(from!)) * 1e6;
    expect(Math.abs(width / (high - low) - 1)).toBeLessThan(0.1);
  });
});

describe('decibelPair(a, b)', () => {
  it.each([
    [17.82, 23, ['17.82 dB', '23.00 dB']],
    [13.9996, 14, ['13.9996 dB', '14.0000 dB']],
    [14, 14, ['14.00 dB', '14.00 dB']],
  ])('never shows %s and %s alike unless they are', (a, b, words) => {
    expect(decibelPair(a, b)).toEqual(words);
  });
});

describe('returnLossWords(db)', () => {
  it('takes what is beyond 100 dB for rounding', () => {
    expect(returnLossWords(14.005)).toMatch(/^14\.0[01] dB$/);
    expect(returnLossWords(153.2)).toBe('over 100 dB');
  });
});

describe('behaviourWords(end, termination, f0)', () => {
  const f0 = 151.25e6;
  it.each([
    [{ r: 50, x: 0, behaviour: 'series' }, 'The source is 50 Ω at every frequency.'],
    [{ r: 9.4, x: -61, behaviour: 'constant' }, 'The source is 9.4 − j61 Ω at every frequency swept (held constant).'],
    // 1/(2π·151.25e6·61) = 17.25 pF.
    [
      { r: 9.4, x: -61, behaviour: 'series' },
      'The source is 9.4 − j61 Ω at the design frequency and varies as 9.400 Ω in series with 17.25 pF.',
    ],
    // 61/(2π·151.25e6) = 64.19 nH.
    [
      { r: 9.4, x: 61, behaviour: 'series' },
      'The source is 9.4 + j61 Ω at the design frequency and varies as 9.400 Ω in series with 64.19 nH.',
    ],
    // 3 − j4: 25/3 Ω across, B = 4/25 S: 0.16/(2π·151.25e6) = 168.4 pF.
    [
      { r: 3, x: -4, behaviour: 'parallel' },
      'The source is 3 − j4 Ω at the design frequency and varies as 8.333 Ω in parallel with 168.4 pF.',
    ],
    // 3 + j4: 1/(2π·151.25e6·0.16) = 6.577 nH.
    [
      { r: 3, x: 4, behaviour: 'parallel' },
      'The source is 3 + j4 Ω at the design frequency and varies as 8.333 Ω in parallel with 6.577 nH.',
    ],
  ] as const)('of %o', (termination, words) => {
    expect(behaviourWords('source', termination, f0)).toBe(words);
  });
});

import { describe, expect, it } from 'vitest';
import { frequencyAxis } from '../../../src/figures/frequency-axis.ts';

describe('frequencyAxis(span, most)', () => {
  it('is linear within three octaves, in the unit of the middle', () => {
    const axis = frequencyAxis({ low: 100e6, high: 200e6 }, 5);
    expect(axis.unit).toBe('MHz');
    expect(axis.ticks.map(({ text }) => text)).toEqual(['100', '120', '140', '160', '180', '200']);
    expect(axis.at(150e6)).toBeCloseTo(0.5, 12);
  });

  it('is logarithmic beyond', () => {
    const axis = frequencyAxis({ low: 1e6, high: 100e6 }, 10);
    expect(axis.ticks.map(({ text }) => text)).toEqual(['1', '2', '5', '10', '20', '50', '100']);
    expect(axis.at(10e6)).toBeCloseTo(0.5, 12);
  });

  it('names whole decades alone where there is room for no more', () => {
    const axis = frequencyAxis({ low: 1e3, high: 1e9 }, 8);
    expect(axis.ticks.map(({ hertz }) => hertz)).toEqual([1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9]);
  });

  it('writes a span across a unit in one of them', () => {
    expect(frequencyAxis({ low: 400e6, high: 1.1e9 }, 5).unit).toBe('MHz');
  });
});

import { describe, expect, it } from 'vitest';
import { progressWords } from '../../../../components/build-progress/progress-words.ts';
import { built } from '../fixture.ts';

const networks = (done: number, all: number) =>
  Array.from({ length: all }, (_, k) => ({ built: k < done ? built : null }));

describe('progressWords(options, realParts)', () => {
  it('counts networks', () => {
    expect(progressWords(networks(3, 12), 'at work')).toBe('3 of 12 networks worked out with real parts…');
  });

  it('says what the others are once it is stopped', () => {
    expect(progressWords(networks(3, 12), 'stopped')).toMatch(/^Stopped: 3 of 12 .*the others are of exact values$/u);
  });

  it('ends with all of them, one alone too', () => {
    expect(progressWords(networks(12, 12), 'whole')).toBe('All 12 networks worked out with real parts');
    expect(progressWords(networks(1, 1), 'whole')).toBe('The network worked out with real parts');
    expect(progressWords([], 'whole')).toBe('There is no network to work out with real parts.');
  });
});

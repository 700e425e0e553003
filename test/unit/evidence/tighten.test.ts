import { describe, expect, it } from 'vitest';
import { tighten } from '../../../src/evidence/tighten.ts';
import { varied } from './in-series.ts';

describe('tighten(parts, sensitivity, found)', () => {
  const parts = [varied('L1', 0, 0.05), varied('C2', 1, 0.05)];
  const row = (designator: string, yieldIfHalved: number | null) => {
    return { designator, dbPerPercent: 0, dbPerMinusPercent: 0, atToleranceDb: 20, yieldIfHalved };
  };

  it('names the part that buys most', () => {
    expect(tighten(parts, [row('L1', 0.92), row('C2', 0.971)], 0.913)).toBe(
      'Tighten C2 first: with ±2.5 % instead of ±5 % the yield is 97.1 % instead of 91.3 %.',
    );
  });

  it('says nothing where nothing is gained or no yield is assessed', () => {
    expect(tighten(parts, [row('L1', 1), row('C2', 1)], 1)).toBe('');
    expect(tighten(parts, [row('L1', 0.9131), row('C2', 0.9)], 0.913)).toBe('');
    expect(tighten(parts, [row('L1', null)], null)).toBe('');
    expect(tighten([], [], 0.5)).toBe('');
  });

  it('does not write all or nothing of what isn’t', () => {
    expect(tighten(parts, [row('L1', 0.99996)], 0.0004)).toContain('the yield is 99.9 % instead of 0.1 %');
  });
});

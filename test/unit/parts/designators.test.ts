import { describe, expect, it } from 'vitest';
import { designatorsOf } from '../../../src/parts/designators.ts';

describe('designatorsOf(arms)', () => {
  it('numbers L and C apart, from the source on', () => {
    const parts = ['inductor', 'capacitor', 'inductor', 'inductor', 'capacitor'] as const;
    const arms = parts.map((part) => ({ arm: 'series' as const, part, value: 1e-9 }));
    expect(designatorsOf(arms)).toEqual(['L1', 'C1', 'L2', 'L3', 'C2']);
    expect(designatorsOf([])).toEqual([]);
  });
});

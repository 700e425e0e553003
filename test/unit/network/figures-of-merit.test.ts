import { describe, expect, it } from 'vitest';
import { attenuationDb, mismatchLossDb, returnLossDb, vswr } from '../../../src/network/figures-of-merit.ts';

describe('returnLossDb(|Γ|²)', () => {
  it('is −10·lg |Γ|², between 0 and 200 dB', () => {
    expect(returnLossDb(0.01)).toBeCloseTo(20, 12);
    expect(returnLossDb(0)).toBe(200);
    expect(returnLossDb(1e-30)).toBe(200);
    expect(returnLossDb(1)).toBe(0);
  });

  it('is 0 where the aim in force reflects more than all', () => {
    expect(returnLossDb(1.78)).toBe(0);
  });
});

describe('vswr(|Γ|)', () => {
  it('is (1 + |Γ|)/(1 − |Γ|), between 1 and a million', () => {
    expect(vswr(0)).toBe(1);
    expect(vswr(0.5)).toBe(3);
    expect(vswr(1)).toBe(1e6);
    expect(vswr(1.5)).toBe(1e6);
  });
});

describe('mismatchLossDb(|Γ|²)', () => {
  it('is −10·lg(1 − |Γ|²), between 0 and 200 dB', () => {
    expect(mismatchLossDb(0.5)).toBeCloseTo(3.0103, 4);
    expect(mismatchLossDb(0)).toBe(0);
    expect(mismatchLossDb(1)).toBe(200);
    expect(mismatchLossDb(2)).toBe(200);
  });
});

describe('attenuationDb(ratio)', () => {
  it('is −10·lg of a power ratio, never −0', () => {
    expect(attenuationDb(0.1)).toBeCloseTo(10, 12);
    expect(Object.is(attenuationDb(1), 0)).toBe(true);
    expect(attenuationDb(0)).toBe(200);
  });
});

import { describe, expect, it } from 'vitest';
import { cornersOf } from '../../../src/evidence/corners.ts';
import { capacitor, db, f0, inductor, series, varied } from './in-series.ts';

describe('cornersOf(subject, requiredDb)', () => {
  it('finds the ends that add up: 100·1.05 − 95/1.02 Ω is more than 95/0.98 − 100·0.95 Ω', () => {
    const found = cornersOf(series([inductor(100), capacitor(95)], [varied('L1', 0, 0.05), varied('C1', 1, 0.02)]), 15);
    expect(found.worstReturnLossDb).toBeCloseTo(db(105 - 95 / 1.02), 10);
    expect(found.words).toBe('L1 +5 %, C1 +2 %');
    expect([found.worstAtHz, found.worstState, found.meets]).toEqual([f0, 'on the bench', true]);
  });

  it('says when not every combination was tried', () => {
    const arms = Array.from({ length: 13 }, (_, k) => inductor(k + 1));
    const found = cornersOf(
      series(
        arms,
        arms.map((_, k) => varied(`L${k + 1}`, k, 0.025)),
      ),
      null,
    );
    expect(found.worstReturnLossDb).toBeCloseTo(db(91 * 1.025), 10);
    expect(found.words).toMatch(/^L1 \+2\.5 %, .*; not every combination was tried\)$/);
    expect(found.meets).toBeNull();
  });

  it('is the network itself where nothing varies', () => {
    const found = cornersOf(series([inductor(20)], [varied('L1', 0, 0)]), 40);
    expect(found).toMatchObject({ words: 'no part varies', meets: false });
    expect(found.worstReturnLossDb).toBeCloseTo(db(20), 10);
  });
});

import { describe, expect, it } from 'vitest';
import { smoothReturnLoss } from '../../../src/figures/smooth-return-loss.ts';
import { resonance } from './fixture.ts';

describe('smoothReturnLoss(response)', () => {
  it('keeps every sample and follows Γ between them', () => {
    const response = resonance(150e6, 152.5e6, [151.25e6]);
    const coarse = resonance(100e6, 200e6, [151.25e6]);
    const { hertz, decibels } = smoothReturnLoss(coarse);
    expect(hertz).toEqual(expect.arrayContaining([...coarse.frequencyHz]));
    expect(hertz).toEqual(hertz.toSorted((a, b) => a - b));
    // Against a sweep forty times as fine, within a fifth of a decibel.
    response.frequencyHz.forEach((frequency, k) => {
      const at = hertz.findIndex((value) => value >= frequency);
      if (Math.abs(frequency - 151.25e6) < 0.1e6 || hertz[at] === undefined) return;
      const [before, after] = [hertz[at - 1]!, hertz[at]];
      const t = (frequency - before) / (after - before);
      const found = decibels[at - 1]! + t * (decibels[at]! - decibels[at - 1]!);
      expect(Math.abs(found - response.returnLossDb[k]!)).toBeLessThan(0.2);
    });
  });

  it('adds nothing where the curve is flat', () => {
    const flat = resonance(100e6, 110e6);
    expect(smoothReturnLoss(flat).hertz).toEqual(flat.frequencyHz);
  });
});

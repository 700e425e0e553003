import { describe, expect, it } from 'vitest';
import { asBuilt, type AsBuiltInput } from '../../../src/evidence/as-built.ts';
import { asBuiltWords } from '../../../src/evidence/as-built-words.ts';
import { f0, grid, input, ladder, load, measure } from './as-built/fixture.ts';

const high = (factor: number, at: number) => ({
  ...ladder,
  arms: ladder.arms.map((arm, k) => (k === at ? { ...arm, value: arm.value * factor } : arm)),
});
const wordsOf = (board: typeof ladder, change: Partial<AsBuiltInput> = {}, samples = grid(100e6, 220e6, 241)): string =>
  asBuiltWords(asBuilt({ ...input, measured: measure({ ladder: board, load }, f0, samples), ...change })).join('\n');

describe('asBuiltWords(figures)', () => {
  it('tells the cause, its size and what it leaves', () => {
    const words = wordsOf(high(1.12, 1));
    expect(words).toContain('board.s1p, 241 samples, 100.0 MHz to 220.0 MHz, in 50.00 Ω');
    expect(words).toContain('181 samples lie within the sweep shown.');
    expect(words).toMatch(
      /Measured over 148\.0 MHz to 152\.0 MHz, the return loss is \d\d\.\d\d dB at worst \(.* MHz\), at least the 10\.00 dB required; 19\.54 dB was predicted\./u,
    );
    expect(words).toMatch(/Measurement and prediction are 0\.0\d\d apart in Γ \(RMS\)\./u);
    expect(words).toContain('L1 is 12 % high (30.2 nH instead of 27.0 nH), beyond its tolerance, which leaves 0.001');
  });

  it('tells causes that fit alike, and the part to replace', () => {
    const candidates = ladder.arms.map((arm, k) => (k === 3 ? [{ ...arm, value: 51e-9 }] : []));
    const words = wordsOf(high(1.15, 3), { candidates, returnLossDb: 12 });
    expect(words).toContain("Any one of these explains it, and this measurement can't tell them apart: ");
    expect(words).toContain('L2 is 15 % high (64.4 nH instead of 56.0 nH)');
    expect(words).toMatch(
      /With such a cause in force, L2 of 51\.0 nH instead of 56\.0 nH brings .* from \d+\.\d\d dB to \d+\.\d\d dB, which holds the 12\.00 dB required\./u,
    );
    expect(wordsOf(high(1.15, 3), { returnLossDb: 12 })).toContain(
      'No single part on sale brings it noticeably closer.',
    );
  });

  it("says what the data don't cover", () => {
    expect(wordsOf(ladder, {}, grid(150e6, 200e6, 51))).toContain(
      "The data don't cover the band, 148.0 MHz to 152.0 MHz, so the requirement is not assessed; nothing is extrapolated.",
    );
    expect(wordsOf(ladder, {}, grid(160e6, 200e6, 41))).toContain(
      'Nothing was measured over 148.0 MHz to 152.0 MHz, so the requirement is not assessed.',
    );
    expect(wordsOf(ladder, {}, grid(300e6, 400e6, 3))).toContain('Nothing of it lies within the sweep shown');
  });

  it('tells which load state was taken', () => {
    const loads = [
      { name: 'free space', termination: load },
      { name: 'in hand', termination: { r: 20, x: -30, behaviour: 'series' } as const },
    ];
    expect(wordsOf(ladder, { loads })).toMatch(
      /is not said; “free space” is nearest and is taken \(RMS distance in Γ: “free space” 0\.001, “in hand” 0\.\d+\)/u,
    );
    expect(wordsOf(ladder, { loads, attached: 'in hand' })).toContain('The load state attached was “in hand”.');
  });

  it('tells where it lies outside the tolerance band', () => {
    const flat = (db: number) => [db, db];
    const percentiles = {
      fractions: [0.05, 0.95],
      states: [{ state: '', frequencyHz: [100e6, 220e6], nominalDb: flat(10), curvesDb: [flat(5), flat(60)] }],
    };
    expect(wordsOf(ladder, { percentiles })).toMatch(
      /It lies outside the tolerance band: from 110\.0 MHz to .* dB below it/u,
    );
    const wide = { ...percentiles, states: [{ ...percentiles.states[0]!, curvesDb: [flat(0), flat(200)] }] };
    expect(wordsOf(ladder, { percentiles: wide })).toContain('It lies within the tolerance band at every sample.');
    expect(wordsOf(ladder)).not.toContain('tolerance band');
  });

  it('is one line a sentence, and each ends with a full stop', () => {
    for (const line of wordsOf(high(1.12, 1)).split('\n')) expect(line).toMatch(/\.$/u);
  });
});

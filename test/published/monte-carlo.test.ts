import { describe, expect, it } from 'vitest';
import { clopperPearson } from '../../src/evidence/clopper-pearson.ts';
import { deviate } from '../../src/evidence/distribution.ts';
import { normalQuantile } from '../../src/evidence/normal.ts';
import { philox as philoxWords } from '../../src/evidence/philox.ts';

const hex = (words: Uint32Array): string => [...words].map((word) => word.toString(16).padStart(8, '0')).join(' ');

describe('J. K. Salmon et al., "Parallel random numbers: as easy as 1, 2, 3", SC 2011', () => {
  const ones = 0xffffffff;
  it.each([
    [[0, 0, 0, 0], [0, 0], '6627e8d5 e169c58d bc57ac4c 9b00dbd8'],
    [[ones, ones, ones, ones], [ones, ones], '408f276d 41c83b0e a20bc7c6 6d5451fd'],
    [[0x243f6a88, 0x85a308d3, 0x13198a2e, 0x03707344], [0xa4093822, 0x299f31d0], 'd16cfe09 94fdcceb 5001e420 24126ea1'],
  ] as const)('Philox4x32-10 of counter %j and key %j is %s (quoted from memory)', (counter, key, words) => {
    const out = [0, 1, 2, 3].map(() => new Uint32Array(5));
    philoxWords(
      Uint32Array.from({ length: 5 }, () => counter[0]),
      Uint32Array.from({ length: 5 }, () => counter[1]),
      [counter[2], counter[3]],
      key,
      out as unknown as Parameters<typeof philoxWords>[4],
    );
    for (const place of [0, 3, 4]) expect(hex(Uint32Array.from(out, (column) => column[place]!))).toBe(words);
  });
});

describe('M. J. Wichura, algorithm AS 241, Applied Statistics 37, 1988', () => {
  it.each([
    [0.25, -0.6744897501960817],
    [0.001, -3.090232306167814],
    [1e-20, -9.262340089798408],
  ])('PPND16 of %d is %d (quoted from memory)', (p, z) => {
    expect(normalQuantile(p) / z).toBeCloseTo(1, 14);
  });
});

describe('JCGM 101:2008', () => {
  /** Standard deviation of deviate(u) with u spread evenly: the midpoint rule over `n` strips. */
  const deviation = (distribution: Parameters<typeof deviate>[1], n = 20_000): number => {
    const squares = Array.from({ length: n }, (_, k) => deviate((k + 0.5) / n, distribution) ** 2);
    return Math.sqrt(squares.reduce((sum, square) => sum + square, 0) / n);
  };

  it('a rectangular distribution of half-width a has standard deviation a/√3', () => {
    expect(deviation('uniform')).toBeCloseTo(1 / Math.sqrt(3), 8);
  });

  it('a symmetric triangular distribution of half-width a has standard deviation a/√6 (quoted from memory)', () => {
    expect(deviation('triangular')).toBeCloseTo(1 / Math.sqrt(6), 6);
  });
});

describe('C. J. Clopper, E. S. Pearson, Biometrika 26, 1934, 95 %', () => {
  it('0 of 10: 0 to 0.3085 (quoted from memory)', () => {
    const { low, high } = clopperPearson(0, 10);
    expect(low).toBe(0);
    expect(high).toBeCloseTo(0.3085, 4);
  });

  it('5 of 10: 0.1871 to 0.8129 (quoted from memory)', () => {
    const { low, high } = clopperPearson(5, 10);
    expect(low).toBeCloseTo(0.1871, 4);
    expect(high).toBeCloseTo(0.8129, 4);
  });
});

describe('SciPy 1.17.1, scipy.stats.beta.ppf', () => {
  it.each([
    [10, 10, 0.95, 0.6915028921812392, 1],
    [913, 1000, 0.95, 0.8937921420429789, 0.9297315139286214],
    [1, 1000, 0.95, 2.5317487491294065e-5, 0.005558924279826672],
    [999_999, 1_000_000, 0.95, 0.9999944283693448, 0.9999999746821924],
    [500_000, 1_000_000, 0.95, 0.49901951919531184, 0.5009804808046882],
    [3, 1_000_000, 0.95, 6.186725501906402e-7, 8.767247788067677e-6],
    [71, 100, 0.99, 0.5800033176932302, 0.8193775340368301],
    [1, 1, 0.9, 0.05, 1],
    [2, 3, 0.5, 0.3263518223330697, 0.9085602964160698],
  ])('%d of %d at confidence %d: %d to %d', (passed, samples, confidence, low, high) => {
    const found = clopperPearson(passed, samples, confidence);
    expect(found.low / low).toBeCloseTo(1, 8);
    expect(found.high / high).toBeCloseTo(1, 8);
  });
});

import { describe, expect, it } from 'vitest';
import { preferredValues } from '../../src/parts/preferred-series.ts';

const decade = (series: Parameters<typeof preferredValues>[0]): number[] =>
  preferredValues(series, 1e-9, 0.999e-8).map((value) => Number((value * 1e11).toPrecision(12)));

describe('IEC 60063:2015, preferred number series, exact', () => {
  it('E24', () => {
    expect(decade('E24').map((value) => value / 10)).toEqual([
      10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91,
    ]);
  });

  it('E12, E6 and E3', () => {
    expect(decade('E12')).toEqual([100, 120, 150, 180, 220, 270, 330, 390, 470, 560, 680, 820]);
    expect(decade('E6')).toEqual([100, 150, 220, 330, 470, 680]);
    expect(decade('E3')).toEqual([100, 220, 470]);
  });

  // The three tables below are quoted from memory.
  it('E48', () => {
    expect(decade('E48')).toEqual([
      100, 105, 110, 115, 121, 127, 133, 140, 147, 154, 162, 169, 178, 187, 196, 205, 215, 226, 237, 249, 261, 274, 287,
      301, 316, 332, 348, 365, 383, 402, 422, 442, 464, 487, 511, 536, 562, 590, 619, 649, 681, 715, 750, 787, 825, 866,
      909, 953,
    ]);
  });

  it('E96, those that E48 has not', () => {
    expect(decade('E96').filter((_, k) => k % 2 === 1)).toEqual([
      102, 107, 113, 118, 124, 130, 137, 143, 150, 158, 165, 174, 182, 191, 200, 210, 221, 232, 243, 255, 267, 280, 294,
      309, 324, 340, 357, 374, 392, 412, 432, 453, 475, 499, 523, 549, 576, 604, 634, 665, 698, 732, 768, 806, 845, 887,
      931, 976,
    ]);
  });

  it('E192, those that E96 has not, 9.20 among them', () => {
    expect(decade('E192').filter((_, k) => k % 2 === 1)).toEqual([
      101, 104, 106, 109, 111, 114, 117, 120, 123, 126, 129, 132, 135, 138, 142, 145, 149, 152, 156, 160, 164, 167, 172,
      176, 180, 184, 189, 193, 198, 203, 208, 213, 218, 223, 229, 234, 240, 246, 252, 258, 264, 271, 277, 284, 291, 298,
      305, 312, 320, 328, 336, 344, 352, 361, 370, 379, 388, 397, 407, 417, 427, 437, 448, 459, 470, 481, 493, 505, 517,
      530, 542, 556, 569, 583, 597, 612, 626, 642, 657, 673, 690, 706, 723, 741, 759, 777, 796, 816, 835, 856, 876, 898,
      920, 942, 965, 988,
    ]);
  });

  it('E96 and E48 are every second and fourth of E192', () => {
    const all = decade('E192');
    expect(decade('E96')).toEqual(all.filter((_, k) => k % 2 === 0));
    expect(decade('E48')).toEqual(all.filter((_, k) => k % 4 === 0));
  });
});

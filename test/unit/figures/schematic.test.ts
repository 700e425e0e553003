import { describe, expect, it } from 'vitest';
import { schematicThumbnail } from '../../../src/figures/schematic-thumbnail.ts';
import { schematic } from '../../../src/figures/schematic.ts';
import type { Arm } from '../../../src/network/arm.ts';
import { outside, overlaps, textsOf } from './overlap.ts';

const source = '50 Ω';
const load = '1234.567 − j1234.567 Ω';
const kinds: readonly Arm[] = [
  { arm: 'series', part: 'inductor', value: 140.2e-9 },
  { arm: 'series', part: 'capacitor', value: 22.6e-12 },
  { arm: 'shunt', part: 'inductor', value: 999.9e-9 },
  { arm: 'shunt', part: 'capacitor', value: 888.8e-12 },
];

/** The k-th ladder of `length` arms: its digits to base 4 name the arms. */
const ladder = (length: number, k: number): readonly Arm[] =>
  Array.from({ length }, (_, index) => kinds[Math.floor(k / 4 ** index) % 4]!);

const named = (arms: readonly Arm[]): readonly string[] => arms.map((_, index) => `L${index + 1}`);

describe('schematic(arms, designators, source, load)', () => {
  it('writes every designator, value and termination', () => {
    const figure = schematic(ladder(2, 0b1100), ['L1', 'C1'], source, load);
    const words = textsOf(figure).map(({ text }) => text);
    expect(words).toEqual(
      expect.arrayContaining(['L1', '140.2 nH', 'C1', '888.8 pF', 'Source', '50 Ω', 'Load', '1234.567 − j1234.567 Ω']),
    );
  });

  it('keeps labels apart and within the figure for every ladder of up to four arms', () => {
    for (let length = 0; length <= 4; length += 1) {
      for (let k = 0; k < 4 ** length; k += 1) {
        const arms = ladder(length, k);
        const figure = schematic(arms, named(arms), source, load);
        expect([...overlaps(figure), ...outside(figure)]).toEqual([]);
      }
    }
  });

  it.each([0b1100, 0b0110, 0b0111])('keeps twelve arms of pattern %i apart, narrow enough for a report', (pattern) => {
    const arms = Array.from({ length: 6 }, () => ladder(2, pattern)).flat();
    const figure = schematic(arms, named(arms), source, load);
    expect([...overlaps(figure), ...outside(figure)]).toEqual([]);
    // A text width of 496 pt then holds it at no less than two thirds: letters of 6 pt.
    expect(figure.width).toBeLessThan(744);
  });

  it('says in words what it draws', () => {
    expect(schematic(ladder(1, 0), ['L1'], source, source).description).toBe(
      'From the source (50 Ω) to the load (50 Ω): series inductor L1 140.2 nH.',
    );
    expect(schematic([], [], source, source).description).toContain('a direct connection, no part');
  });
});

describe('schematicThumbnail(arms)', () => {
  it('writes no value and is as wide as its arms need', () => {
    expect(textsOf(schematicThumbnail(ladder(4, 27)))).toEqual([]);
    expect(schematicThumbnail(ladder(12, 0)).width).toBeGreaterThan(schematicThumbnail([]).width);
  });
});

import { describe, expect, it } from 'vitest';
import { rulesOfThumb } from '../../../src/parts/rules-of-thumb.ts';

const open = { blocked: false, sourceShorted: false, loadShorted: false };
const l = (value: number) => ({ arm: 'series', part: 'inductor', value }) as const;
const c = (value: number) => ({ arm: 'shunt', part: 'capacitor', value }) as const;

describe('rulesOfThumb(arms, designators, dc, sectionQ)', () => {
  it('says nothing of an ordinary network', () => {
    expect(rulesOfThumb([l(100e-9), c(10e-12)], ['L1', 'C1'], open, 3)).toEqual([]);
  });

  it('names a capacitor lost in strays, with the reason', () => {
    expect(rulesOfThumb([c(0.8e-12)], ['C1'], open, 3)).toEqual([
      expect.stringMatching(/^C1 800\.0 fF is below about 1 pF: board strays/),
    ]);
  });

  it('names an inductor ruled by its winding, with the reason', () => {
    expect(rulesOfThumb([l(12e-6)], ['L1'], open, 3)).toEqual([
      expect.stringMatching(/^L1 12\.00 µH is above about 10 µH: the winding's own capacitance/),
    ]);
  });

  it.each([
    [{ ...open, sourceShorted: true }, /shorts DC to ground at the source/],
    [{ ...open, loadShorted: true }, /shorts DC to ground at the load/],
    [{ ...open, sourceShorted: true, loadShorted: true }, /shorts DC to ground at both ends/],
    [{ ...open, blocked: true }, /series capacitor blocks DC/],
  ])('tells what direct current meets: %o', (dc, words) => {
    expect(rulesOfThumb([], [], dc, 3)).toEqual([expect.stringMatching(words)]);
  });

  it('warns of a section Q above 10, not at it', () => {
    expect(rulesOfThumb([], [], open, 10)).toEqual([]);
    expect(rulesOfThumb([], [], open, 12.5)).toEqual([expect.stringMatching(/^Section Q 12\.5 is above 10: losses/)]);
  });
});

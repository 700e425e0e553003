import { describe, expect, it } from 'vitest';
import { biasWords, type DcRequirement } from '../../../src/evidence/bias.ts';
import type { Arm } from '../../../src/network/arm.ts';

const nothing: DcRequirement = { keepDc: 'none', blockDc: false };
const arm = (kind: Arm['arm'], part: Arm['part']): Omit<Arm, 'value'> => ({ arm: kind, part });
const seriesL = arm('series', 'inductor');
const seriesC = arm('series', 'capacitor');
const shuntL = arm('shunt', 'inductor');
const shuntC = arm('shunt', 'capacitor');

const passes = 'No part blocks DC or shorts it to ground: DC passes from source to load.';
const cold = 'if its cold end is bypassed to ground instead of grounded: no separate choke.';

describe('biasWords(arms, designators, required)', () => {
  it.each([
    ['no part', [], []],
    ['a low-pass network', [seriesL, shuntC], ['L1', 'C1']],
  ])('%s passes DC', (_, arms, designators) => {
    expect(biasWords(arms, designators, nothing)).toEqual([passes]);
  });

  it('a shunt inductor shorts both ends where nothing blocks, and could feed both', () => {
    expect(biasWords([shuntL, seriesL], ['L1', 'L2'], nothing)).toEqual([
      'DC at the source and at the load: shorted to ground by L1.',
      `L1 could carry the bias feed to both ends ${cold}`,
    ]);
  });

  it('a series capacitor leaves one end open and spares the block', () => {
    expect(biasWords([seriesC, shuntL], ['C1', 'L1'], nothing)).toEqual([
      'DC at the source: open, ends at C1.',
      'DC at the load: shorted to ground by L1.',
      `L1 could carry the bias feed to the load ${cold}`,
      'C1 serves as the block between source and load: no separate blocking capacitor.',
    ]);
  });

  it('each end has the shunt inductors on its side of the block', () => {
    expect(biasWords([shuntL, seriesC, shuntL], ['L1', 'C1', 'L2'], nothing)).toEqual([
      'DC at the source: shorted to ground by L1.',
      'DC at the load: shorted to ground by L2.',
      `L1 could carry the bias feed to the source ${cold}`,
      `L2 could carry the bias feed to the load ${cold}`,
      'C1 serves as the block between source and load: no separate blocking capacitor.',
    ]);
  });

  it('an inductor between two series capacitors feeds neither end', () => {
    expect(biasWords([seriesC, shuntL, seriesC], ['C1', 'L1', 'C2'], nothing)).toEqual([
      'DC at the source: open, ends at C1.',
      'DC at the load: open, ends at C2.',
      'C1 and C2 each serve as a block between source and load: no separate blocking capacitor.',
    ]);
  });

  it('of several shunt inductors on one side all must be bypassed', () => {
    expect(biasWords([shuntL, seriesL, shuntL, seriesC], ['L1', 'L2', 'L3', 'C1'], nothing)[2]).toBe(
      'L1 or L3 could carry the bias feed to the source if the cold ends of L1 and L3 are bypassed to ground instead of grounded: no separate choke.',
    );
  });

  const conflict = (end: string, part: string): string =>
    `Conflict: the ${end} carries DC, and ${part} would short it, unless bypassed to ground by a capacitor instead of grounded.`;
  it.each<[DcRequirement['keepDc'], string[]]>([
    ['none', []],
    ['source', [conflict('source', 'L1')]],
    ['load', [conflict('load', 'L2')]],
    ['both', [conflict('source', 'L1'), conflict('load', 'L2')]],
  ])('tells what shorts an end that carries DC: %s', (keepDc, wanted) => {
    const words = biasWords([shuntL, seriesC, shuntL], ['L1', 'C1', 'L2'], { keepDc, blockDc: true });
    expect(words.filter((sentence) => sentence.startsWith('Conflict'))).toEqual(wanted);
  });

  it('sees no conflict at an end that is open', () => {
    expect(biasWords([seriesC, shuntL], ['C1', 'L1'], { keepDc: 'source', blockDc: true }).join(' ')).not.toMatch(
      /Conflict/u,
    );
  });

  it('tells that nothing blocks what must be blocked', () => {
    expect(biasWords([seriesL, shuntC], ['L1', 'C1'], { keepDc: 'both', blockDc: true })).toEqual([
      passes,
      'Conflict: DC must be blocked, and no series capacitor does it; a separate blocking capacitor is needed.',
    ]);
  });
});

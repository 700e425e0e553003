import { describe, expect, it } from 'vitest';
import { impracticable, practicable } from '../../../src/parts/practicable.ts';

const { inductorH, capacitorF } = practicable;
const out = (part: 'inductor' | 'capacitor', value: number): string[] =>
  impracticable([{ arm: 'series', part, value }], ['X1'], inductorH, capacitorF);

describe('impracticable(arms, designators, inductances, capacitances)', () => {
  it.each([
    ['inductor', 0.5e-9, 'X1 500.0 pH is below 1.00 nH'],
    ['inductor', 12e-6, 'X1 12.00 µH is above 10.0 µH'],
    ['capacitor', 0.47e-12, 'X1 470.0 fF is below 1.00 pF'],
    ['capacitor', 220e-9, 'X1 220.0 nF is above 100 nF'],
  ] as const)('names an %s of %s and the limit that it passes', (part, value, phrase) => {
    expect(out(part, value)).toEqual([phrase]);
  });

  it('admits the limits themselves, whatever their last digit', () => {
    expect(out('inductor', 1e-9 * (1 - 1e-15))).toEqual([]);
    expect(out('inductor', 1e-5 * (1 + 1e-15))).toEqual([]);
    expect(out('capacitor', 1e-12)).toEqual([]);
    expect(out('capacitor', 1e-7)).toEqual([]);
  });

  it('judges each part by its own range and names each', () => {
    const arms = [
      { arm: 'series', part: 'inductor', value: 1e-12 },
      { arm: 'shunt', part: 'capacitor', value: 1e-12 },
      { arm: 'series', part: 'capacitor', value: 1e-15 },
    ] as const;
    expect(impracticable(arms, ['L1', 'C1', 'C2'], inductorH, capacitorF)).toEqual([
      'L1 1.000 pH is below 1.00 nH',
      'C2 1.000 fF is below 1.00 pF',
    ]);
  });
});

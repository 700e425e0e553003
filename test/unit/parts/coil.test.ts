import { describe, expect, it } from 'vitest';
import { coil, selfCapacitance } from '../../../src/parts/coil.ts';

/** Inductance by the formula itself, r and l in inches. */
const wheeler = (turns: number, diameterM: number, lengthM: number): number => {
  const r = diameterM / 2 / 0.0254;
  return ((r * turns) ** 2 / (9 * r + (10 * lengthM) / 0.0254)) * 1e-6;
};

describe('coil(designator, inductanceH, form)', () => {
  it('gives turns, length and diameter that make the inductance', () => {
    const { turns, diameterM, lengthM, ...rest } = coil('L2', 220e-9, { wireM: 0.5e-3, formM: 4e-3, gapM: 0.1e-3 });
    expect(diameterM).toBeCloseTo(4.5e-3, 15);
    expect(lengthM).toBeCloseTo(turns * 0.6e-3, 15);
    expect(wheeler(turns, diameterM, lengthM) / 220e-9).toBeCloseTo(1, 12);
    expect(rest).toMatchObject({ designator: 'L2', inductanceH: 220e-9, wireM: 0.5e-3, caution: '' });
  });

  it('unrolls every turn: the hypotenuse of circumference and pitch', () => {
    const wound = coil('L1', 220e-9, { wireM: 0.5e-3, formM: 4e-3, gapM: 0.1e-3 });
    expect(wound.wireLengthM / (wound.turns * Math.sqrt((Math.PI * 4.5e-3) ** 2 + 0.6e-3 ** 2))).toBeCloseTo(1, 12);
  });

  it('resonates with its self-capacitance: ω²LC = 1', () => {
    const { selfResonanceHz, selfCapacitanceF } = coil('L1', 220e-9, { wireM: 0.5e-3, formM: 4e-3, gapM: 0.1e-3 });
    expect((2 * Math.PI * selfResonanceHz!) ** 2 * 220e-9 * selfCapacitanceF!).toBeCloseTo(1, 12);
  });

  const winding = { wireM: 0.5e-3, formM: 4e-3, gapM: 0 };
  it.each([
    ['less than one turn', 1e-9, winding, /^Less than one turn: .* not longer than 0\.8 /u],
    ['a short winding on a wide form', 100e-9, { ...winding, formM: 20e-3 }, /not longer than 0\.8 of its radius/u],
    ['a long winding', 4e-6, winding, /^Length over diameter, 11\.\d+, is outside 0\.1 to 10: no figure for/u],
    ['many turns', 20e-6, { wireM: 0.1e-3, formM: 4e-3, gapM: 0 }, /More than 100 turns/u],
  ])('cautions of %s', (_, inductanceH, form, caution) => {
    expect(coil('L1', inductanceH, form).caution).toMatch(caution);
  });

  it('has no self-resonance where the table has no value', () => {
    const wound = coil('L1', 4e-6, winding);
    expect(wound).toMatchObject({ selfCapacitanceF: null, selfResonanceHz: null });
  });
});

describe('selfCapacitance(lengthM, diameterM)', () => {
  it('is straight between the values of the table: half way from 0.50 to 0.56 it is 0.53 pF per cm', () => {
    expect(selfCapacitance(0.0225, 0.01)! / 0.53e-12).toBeCloseTo(1, 12);
  });

  it.each([0.099, 10.01])('is null at %s times the diameter', (ratio) => {
    expect(selfCapacitance(ratio * 0.01, 0.01)).toBeNull();
  });
});

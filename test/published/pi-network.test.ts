import { describe, expect, it } from 'vitest';
import { design } from '../../src/design.ts';
import type { Arm } from '../../src/network/arm.ts';
import { recordOf } from '../unit/record-of.ts';

describe('C. Bowick, RF Circuit Design, Sams 1982, Pi network of loaded Q 15 (quoted from memory)', () => {
  const omega = 2 * Math.PI * 100e6;
  const size = ({ part, value }: Arm): number => (part === 'inductor' ? omega * value : 1 / (omega * value));
  const { options } = design(recordOf({ method: 'pi', frequency: '100M', source: '100', load: '1k', q: '15' }));

  it('100 Ω to 1000 Ω: four networks', () => {
    expect(options.map(({ arms }) => arms.map(({ arm, part }) => `${arm} ${part}`).join(', '))).toEqual([
      'shunt capacitor, series inductor, shunt capacitor',
      'shunt capacitor, series capacitor, shunt inductor',
      'shunt inductor, series inductor, shunt capacitor',
      'shunt inductor, series capacitor, shunt inductor',
    ]);
  });

  it('66.7 Ω across the 1000 Ω end of each, within 0.1 %', () => {
    for (const { arms } of options) expect(Math.abs(size(arms[2]!) / 66.7 - 1)).toBeLessThan(1e-3);
  });

  it('virtual resistance 4.42 Ω and 66.4 Ω in series towards the 1000 Ω end, within 0.2 %', () => {
    // The series arm is the sum, or with parts of unlike kind the difference, of both sections' reactances: half the sum
    // of the two is the larger, Q·Rv.
    const larger = (size(options[0]!.arms[1]!) + size(options[1]!.arms[1]!)) / 2;
    expect(Math.abs(larger / 66.4 - 1)).toBeLessThan(2e-3);
    expect(Math.abs(larger / 15 / 4.42 - 1)).toBeLessThan(2e-3);
  });

  it('is matched at 100 MHz', () => {
    for (const { seen, transducerGain } of options) {
      expect(Math.hypot(seen.r - 100, seen.x)).toBeLessThan(1e-9);
      expect(Math.abs(transducerGain - 1)).toBeLessThan(1e-12);
    }
  });
});

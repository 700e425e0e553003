import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { cascade } from '../../../src/synthesis/cascade.ts';
import { targetOf } from '../../../src/synthesis/target.ts';

const hz = 434e6;
const omega = 2 * Math.PI * hz;
const z = (r: number, x = 0): Complex => new Complex(r, x);
const found = (target: Complex, load: Complex, n: number, id: string) =>
  cascade(target, load, hz, [n]).candidates.find((one) => one.id === id)!;

describe('cascade(target, load, frequency, sections)', () => {
  it('steps 12.5 Ω to 50 Ω in three equal ratios of 4^(1/3)', () => {
    const q = Math.sqrt(4 ** (1 / 3) - 1);
    const r = [12.5, 12.5 * 4 ** (1 / 3), 12.5 * 4 ** (2 / 3), 50];
    const { arms, sectionQ } = found(z(12.5), z(50), 3, 'low-pass-3-shunt-load');
    expect(sectionQ).toBeCloseTo(q, 14);
    const wanted = [0, 1, 2].flatMap((k) => [
      ['series', 'inductor', (q * r[k]!) / omega],
      ['shunt', 'capacitor', q / (r[k + 1]! * omega)],
    ]);
    arms.forEach(({ arm, part, value }, k) => {
      const [wantedArm, wantedPart, wantedValue] = wanted[k]!;
      expect([arm, part]).toEqual([wantedArm, wantedPart]);
      expect(value / (wantedValue as number)).toBeCloseTo(1, 12);
    });
    expect(arms).toHaveLength(6);
  });

  it('has a high-pass of the same Q: series C, shunt L', () => {
    const q = Math.sqrt(4 ** (1 / 3) - 1);
    const { arms } = found(z(12.5), z(50), 3, 'high-pass-3-shunt-load');
    expect(arms.map(({ arm, part }) => `${arm} ${part}`)).toEqual(
      [1, 2, 3].flatMap(() => ['series capacitor', 'shunt inductor']),
    );
    expect(arms[0]!.value * omega * q * 12.5).toBeCloseTo(1, 12);
    expect((arms[5]!.value * omega * q) / 50).toBeCloseTo(1, 12);
  });

  it('runs the other way for 50 Ω to 12.5 Ω, the shunt arm at the source', () => {
    const { arms } = found(z(50), z(12.5), 2, 'low-pass-2-shunt-source');
    expect(arms.map(({ arm, part }) => `${arm} ${part}`)).toEqual([
      'shunt capacitor',
      'series inductor',
      'shunt capacitor',
      'series inductor',
    ]);
  });

  it("absorbs the ends' reactance in the outer arms: 12.5 + j5 Ω source, 40 Ω with 0.01 S across it", () => {
    const load = z(40).inverse().add(new Complex(0, 0.01)).inverse();
    const q = Math.sqrt((40 / 12.5) ** (1 / 2) - 1);
    const middle = Math.sqrt(40 * 12.5);
    const { arms } = found(targetOf(z(12.5, 5), 'conjugate'), load, 2, 'low-pass-2-shunt-load');
    // The source's +j5 Ω is part of the first series arm, the load's 0.01 S part of the last shunt arm.
    const wanted = [(q * 12.5 - 5) / omega, q / middle / omega, (q * middle) / omega, (q / 40 - 0.01) / omega];
    arms.forEach(({ value }, k) => expect(value / wanted[k]!).toBeCloseTo(1, 10));
    expect(arms.map(({ part }) => part)).toEqual(['inductor', 'capacitor', 'inductor', 'capacitor']);
  });

  it('resonates reactance of the other sign: a part of the other kind is what remains', () => {
    // A source of 12.5 + j20 Ω has more than the Q·12.5 = 11.1 Ω that the first arm wants: −j8.9 Ω, a capacitor.
    const { arms } = found(targetOf(z(12.5, 20), 'conjugate'), z(40), 2, 'low-pass-2-shunt-load');
    const q = Math.sqrt((40 / 12.5) ** (1 / 2) - 1);
    expect(arms[0]).toMatchObject({ arm: 'series', part: 'capacitor' });
    expect(1 / (omega * arms[0]!.value)).toBeCloseTo(20 - q * 12.5, 10);
  });

  it('lists each number of sections in order, four networks each where both arrangements exist', () => {
    const { candidates, absent } = cascade(z(50), z(20, 60), hz, [1, 2]);
    expect(absent).toEqual([]);
    expect(candidates.map(({ id }) => id)).toEqual(
      [1, 2].flatMap((n) =>
        ['load', 'source'].flatMap((end) => [
          `low-pass-${String(n)}-shunt-${end}`,
          `high-pass-${String(n)}-shunt-${end}`,
        ]),
      ),
    );
  });

  it('needs no part for equal ends, said once', () => {
    const { candidates } = cascade(z(50), z(50), hz, [1, 2, 3, 4, 5, 6]);
    expect(candidates.map(({ id, sections }) => [id, sections])).toEqual([['direct', 0]]);
  });

  it('puts no part at all first where the ends are matched already', () => {
    const { candidates } = cascade(z(50, 30), z(50, 30), hz, [1, 2]);
    expect(candidates.map(({ sections }) => sections).slice(0, 3)).toEqual([0, 1, 1]);
  });

  it('tells why an arrangement has none', () => {
    expect(cascade(z(12.5), z(50), hz, [1]).absent).toEqual([
      {
        form: 'sections with the shunt arm at the source',
        why: expect.stringMatching(/RL ≤ 1\/GT.*50\.00 Ω > 12\.50 Ω \(ratio 4\.000\)/),
      },
    ]);
  });
});

describe('targetOf(source, aim)', () => {
  it('is ZS* for the conjugate aim and ZS for the reflectionless one', () => {
    expect(targetOf(z(17, -32), 'conjugate')).toMatchObject({ re: 17, im: 32 });
    expect(targetOf(z(17, -32), 'reflectionless')).toMatchObject({ re: 17, im: -32 });
  });

  it('gives a real source no reactance, not even −0', () => {
    expect(Object.is(targetOf(z(50, 0), 'conjugate').im, 0)).toBe(true);
  });
});

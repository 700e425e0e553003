import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { equalRippleElements, ripple } from '../../../src/synthesis/equal-ripple-elements.ts';
import { equalRipple } from '../../../src/synthesis/equal-ripple.ts';

const resistor = (r: number) => ({ z: new Complex(r, 0), behaviour: 'constant' as const });
const band = { low: 80e6, high: 120e6 };

describe('ripple(r, low, high, n)', () => {
  it('is what the mismatch at zero frequency leaves: ε·T_n(x0) = (r − 1)/(2√r)', () => {
    // r = 4: 3/4. Edges 1 and √3: x0 = (1 + 3)/(3 − 1) = 2; T_1 = 2, T_2 = 7, T_3 = 26.
    for (const [n, t] of [
      [1, 2],
      [2, 7],
      [3, 26],
    ] as const) {
      const { epsilon, reflection } = ripple(4, 1, Math.sqrt(3), n);
      expect(epsilon).toBeCloseTo(0.75 / t, 14);
      expect(reflection).toBeCloseTo(Math.sin(Math.atan(0.75 / t)), 14);
    }
  });
});

describe('equalRippleElements(r, low, high, n)', () => {
  it('one section: L and C solved by hand', () => {
    // Series L from 1 Ω, C across r: at zero |Γ| = (r − 1)/(r + 1), a perfect match at ω1² = (ωa² + ωb²)/2 only. There
    // Q = √(r − 1): ω1·L = Q, ω1·C = Q/r.
    const [r, low, high] = [4, 0.8, 1.25];
    const w1 = Math.sqrt((low * low + high * high) / 2);
    const { values, end } = equalRippleElements(r, low, high, 1);
    expect(values[0]!).toBeCloseTo(Math.sqrt(3) / w1, 12);
    expect(values[1]!).toBeCloseTo(Math.sqrt(3) / 4 / w1, 12);
    expect(end).toBeCloseTo(r, 12);
  });

  it.each([1, 2, 3, 4, 5, 6])('%i sections: ends in the ratio itself, and is its own mirror image', (n) => {
    const { values, end } = equalRippleElements(7, 0.85, 1 / 0.85, n);
    expect(values).toHaveLength(2 * n);
    expect(Math.abs(end / 7 - 1)).toBeLessThan(1e-12);
    // A low-pass transformer is antimetric: the k-th L is r times the k-th C from the other end.
    for (let k = 0; k < 2 * n; k += 2)
      expect(Math.abs(values[k]! / (7 * values[2 * n - 1 - k]!) - 1)).toBeLessThan(1e-9);
  });
});

describe('equalRipple(source, load, f0, band, sections)', () => {
  it('names what it makes: form, sections, and the end of the shunt arm', () => {
    const up = equalRipple(resistor(50), resistor(200), 1e8, band, [1, 2]).candidates;
    expect(up.map(({ id }) => id)).toEqual([
      'equal-ripple-low-pass-1-shunt-load',
      'equal-ripple-high-pass-1-shunt-load',
      'equal-ripple-low-pass-2-shunt-load',
      'equal-ripple-high-pass-2-shunt-load',
    ]);
    expect(up[0]!.title).toBe('Equal ripple, 1 section, low-pass, shunt arm at the load');
    const down = equalRipple(resistor(200), resistor(50), 1e8, band, [1]).candidates;
    expect(down.map(({ id }) => id)).toEqual([
      'equal-ripple-low-pass-1-shunt-source',
      'equal-ripple-high-pass-1-shunt-source',
    ]);
  });

  it('says that two equal resistances need none, and that a band needs a width', () => {
    expect(equalRipple(resistor(50), resistor(50), 1e8, band, [1]).absent[0]!.why).toMatch(
      /two different resistances/u,
    );
    const point = equalRipple(resistor(50), resistor(200), 1e8, { low: 1e8, high: 1e8 }, [1]);
    expect(point.candidates).toEqual([]);
    expect(point.absent[0]!.why).toMatch(/needs a band with a width/u);
  });

  it('refuses what double precision cannot bear out, with the figure', () => {
    const { candidates, absent } = equalRipple(resistor(50), resistor(55), 1e8, { low: 99e6, high: 101e6 }, [1, 6]);
    expect(candidates.map(({ sections }) => sections)).toEqual([1, 1]);
    expect(absent.map(({ form }) => form)).toEqual([
      'equal ripple, 6 sections, low-pass, shunt arm at the load',
      'equal ripple, 6 sections, high-pass, shunt arm at the load',
    ]);
    expect(absent[0]!.why).toMatch(/promises \d{3} dB, which double precision can't bear out/u);
  });

  it('leaves the outer element out where the end is exactly it', () => {
    const omega = 2 * Math.PI * 1e8;
    const bare = equalRipple(resistor(50), resistor(200), 1e8, band, [2]).candidates[0]!;
    const b = omega * bare.arms[3]!.value;
    const end = { z: new Complex(1 / 200, b * (1 - 1e-15)).inverse(), behaviour: 'parallel' as const };
    const { candidates } = equalRipple(resistor(50), end, 1e8, band, [2]);
    const outer = candidates[0]!.arms[3]?.value ?? 0;
    expect(outer).toBeLessThan(1e-12 * bare.arms[3]!.value);
  });

  it.each([
    [
      'an end of the other kind',
      new Complex(1 / 200, -1e-3).inverse(),
      'parallel',
      /other kind than the outer capacitor/u,
    ],
    [
      'one larger than the outer element',
      new Complex(1 / 200, 0.1).inverse(),
      'parallel',
      /does not hold the end's own/u,
    ],
    ['one held constant', new Complex(1 / 200, 1e-3).inverse(), 'constant', /one part in parallel; it is not/u],
    ['one in series', new Complex(1 / 200, 1e-3).inverse(), 'series', /one part in parallel; it is not/u],
  ] as const)('cannot absorb %s in the low-pass form, and says so', (_, z, behaviour, why) => {
    const { absent } = equalRipple(resistor(50), { z, behaviour }, 1e8, band, [2]);
    const lowPass = absent.find(({ form }) => form.includes('low-pass') && form.includes('load'));
    expect(lowPass!.why).toMatch(why);
  });
});

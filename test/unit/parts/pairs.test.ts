import { describe, expect, it } from 'vitest';
import { realImpedance, type RealArm } from '../../../src/network/real-arm.ts';
import { joined, withPairs } from '../../../src/parts/pairs.ts';

const coil = (value: number, q: number | null = null): RealArm => ({
  arm: 'series',
  part: 'inductor',
  value,
  q,
  qSlope: 0.5,
  parallelF: 0.2e-12,
  seriesH: 1e-9,
});
const capacitor = (value: number, q: number | null = null): RealArm => ({
  arm: 'shunt',
  part: 'capacitor',
  value,
  q,
  qSlope: -1,
  parallelF: 0,
  seriesH: 0.5e-9,
});

describe('joined(join, a, b)', () => {
  it.each([
    ['in series', coil(100e-9, 40), coil(47e-9, 70)],
    ['in parallel', coil(100e-9, 40), coil(47e-9, 70)],
    ['in series', capacitor(22e-12, 100), capacitor(68e-12, 400)],
    ['in parallel', capacitor(22e-12, 100), capacitor(68e-12, 400)],
  ] as const)('%s has the impedance of the two, loss too, far below their resonances', (join, a, b) => {
    const f0 = 20e6;
    for (const hz of [19e6, 21e6]) {
      const [za, zb] = [realImpedance(a, f0, hz), realImpedance(b, f0, hz)];
      const wanted = join === 'in series' ? za.add(zb) : za.mul(zb).div(za.add(zb));
      const found = realImpedance(joined(join, a, b), f0, hz);
      expect(found.im / wanted.im).toBeCloseTo(1, 3);
      // Resonances 50 times higher and unlike Q bring in some parts of a thousand.
      expect(Math.abs(found.re / wanted.re - 1)).toBeLessThan(0.02);
    }
  });

  it('of two equal parts has their Q, and of lossless ones none', () => {
    expect(joined('in parallel', capacitor(10e-12, 200), capacitor(10e-12, 200))).toEqual({
      ...capacitor(20e-12, 200),
      seriesH: 0.25e-9,
    });
    expect(joined('in series', coil(10e-9), coil(10e-9))).toMatchObject({
      value: 20e-9,
      q: null,
      parallelF: 0.1e-12,
      seriesH: 2e-9,
    });
  });
});

describe('withPairs(singles, wanted)', () => {
  const e6 = [10e-12, 15e-12, 22e-12, 33e-12, 47e-12, 68e-12];

  it('puts the three next pairs on either side among the single parts', () => {
    const found = withPairs(
      e6.map((value) => capacitor(value)),
      12e-12,
    );
    const pairs = found.filter(({ pair }) => pair !== null);
    // Between 10 and 15 pF: in series 15·33/48 = 10.31, 15·47/62 = 11.37, 22·22/44 = 11, 15·68/83 = 12.29,
    // 22·33/55 = 13.2 and 22·47/69 = 14.99; none in parallel, and 10 with anything in series is less than 10.
    expect(pairs.map(({ arm }) => Number((arm.value * 1e12).toFixed(2)))).toEqual([
      10.31, 11, 11.37, 12.29, 13.2, 14.99,
    ]);
    expect(pairs.map(({ pair }) => pair)).toContainEqual({ join: 'in series', of: [1, 5] });
    expect(found).toHaveLength(e6.length + 6);
    expect(found.map(({ arm }) => arm.value)).toEqual(found.map(({ arm }) => arm.value).sort((a, b) => a - b));
  });

  it('joins coils: 10 + 22 nH in series for 32 nH between 22 and 33 nH', () => {
    const found = withPairs(
      [10e-9, 22e-9, 33e-9].map((value) => coil(value)),
      32e-9,
    );
    const pairs = found.filter(({ pair }) => pair !== null);
    expect(pairs.find(({ arm }) => Math.abs(arm.value - 32e-9) < 1e-15)?.pair).toEqual({
      join: 'in series',
      of: [0, 1],
    });
    expect(pairs.every(({ arm }) => arm.value > 22e-9 && arm.value < 33e-9)).toBe(true);
  });

  it('adds nothing where a single part has the value, or where there is one part alone', () => {
    expect(
      withPairs(
        e6.map((value) => capacitor(value)),
        22e-12,
      ),
    ).toHaveLength(6);
    expect(withPairs([capacitor(10e-12)], 12e-12)).toHaveLength(1);
  });
});

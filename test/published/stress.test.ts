import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { realBranches } from '../../src/evidence/branch.ts';
import { realPoint } from '../../src/evidence/real-point.ts';
import { stressOf, type StressPart } from '../../src/evidence/stress.ts';
import type { RealArm } from '../../src/network/real-arm.ts';
import { endsOver } from '../../src/network/sweep.ts';
import { apart, solveRealWithMathjs } from './nodal.ts';

const f0 = 151.25e6;
const unknown = { ratedVolts: null, ratedAmps: null, ratedWatts: null };
const arm = (kind: RealArm['arm'], part: RealArm['part'], value: number, more: Partial<RealArm> = {}): RealArm => ({
  arm: kind,
  part,
  value,
  q: null,
  qSlope: 0,
  parallelF: 0,
  seriesH: 0,
  ...more,
});
const partsOf = (arms: readonly RealArm[]): StressPart[] =>
  arms.map((alone, armIndex) => ({
    designator: `P${String(armIndex + 1)}`,
    armIndex,
    pair: null,
    alone,
    ratedVolts: null,
    ratedAmps: null,
  }));
const at = (source: Complex, load: Complex, hz: number) =>
  endsOver(
    { r: source.re, x: source.im, behaviour: 'constant' },
    { r: load.re, x: load.im, behaviour: 'constant' },
    f0,
    Float64Array.of(hz),
  );

const coil = { q: 45, qSlope: 0.5, parallelF: 0.31e-12 };
const chip = { q: 320, qSlope: -1, seriesH: 0.4e-9 };
const ladders = [
  {
    name: 'a shunt capacitor, a series coil',
    arms: [
      arm('shunt', 'capacitor', 42e-12, { ...chip, seriesH: 1.1e-9 }),
      arm('series', 'inductor', 21e-9, { ...coil, seriesH: 0.2e-9 }),
    ],
    strayF: 0.6e-12,
  },
  {
    name: 'six arms of both kinds',
    arms: [
      arm('series', 'capacitor', 33e-12, chip),
      arm('shunt', 'inductor', 47e-9, { ...coil, seriesH: 0.8e-9 }),
      arm('series', 'inductor', 68e-9, coil),
      arm('shunt', 'capacitor', 8.2e-12, { ...chip, seriesH: 1.2e-9 }),
      arm('series', 'inductor', 15e-9, coil),
      arm('shunt', 'capacitor', 27e-12, { ...chip, seriesH: 1.2e-9 }),
    ],
    strayF: 1.1e-12,
  },
];

describe.each(ladders)('nodal equations solved by mathjs, to 1 part in 10⁹: $name, lossy and with strays', (ladder) => {
  const source = new Complex(47, -12);
  const load = new Complex(9.4, -61);
  const powerW = 25;
  const emf = Math.sqrt(8 * source.re * powerW);
  const solvedWith = (z: Complex, hz: number) =>
    solveRealWithMathjs(ladder, { source: { r: 47, x: -12 }, load: { r: z.re, x: z.im }, emf }, f0, hz);
  const near = (found: number, wanted: number): void => expect(Math.abs(found / wanted - 1)).toBeLessThan(1e-9);

  it.each([0.9, 1, 1.07, 2])('realPoint() and stressOf() at %f of the design frequency', (multiple) => {
    const hz = multiple * f0;
    const solved = solvedWith(load, hz);
    const point = realPoint(realBranches(ladder, f0, hz), source, load, powerW);
    const stress = stressOf(
      { ladder, f0, parts: partsOf(ladder.arms), states: [at(source, load, hz)] },
      powerW,
      null,
      unknown,
      1,
    );
    expect(apart(point.seen, solved.zin)).toBeLessThan(1e-9);
    near(point.gain, solved.gain);
    near(point.loadW, solved.gain * powerW);
    solved.arms.forEach(({ volts, amps, watts }, k) => {
      const part = point.arms[k]!;
      expect(apart(part.volts, volts)).toBeLessThan(1e-9);
      expect(apart(part.amps, amps)).toBeLessThan(1e-9);
      near(part.watts, watts);
      const { voltsPeak, ampsRms, watts: heat } = stress.parts[k]!;
      near(voltsPeak, Math.hypot(volts.re, volts.im));
      near(ampsRms, Math.hypot(amps.re, amps.im) / Math.SQRT2);
      near(heat, watts);
    });
  });

  it('stressOf() with a VSWR of 5: the worst of 720 loads on its circle, to 1 part in 10⁴', () => {
    const hz = 1.02 * f0;
    const { parts } = stressOf(
      { ladder, f0, parts: partsOf(ladder.arms), states: [at(source, load, hz)] },
      powerW,
      5,
      unknown,
      1,
    );
    const most = ladder.arms.map(() => ({ volts: 0, amps: 0, watts: 0 }));
    for (let k = 0; k < 720; k += 1) {
      // (5 − 1)/(5 + 1) of the wave comes back.
      const gamma = new Complex({ abs: 4 / 6, arg: (k * Math.PI) / 360 });
      const z = load.add(gamma.mul(load.conjugate())).div(new Complex(1, 0).sub(gamma));
      solvedWith(z, hz).arms.forEach(({ volts, amps, watts }, n) => {
        const so = most[n]!;
        so.volts = Math.max(so.volts, Math.hypot(volts.re, volts.im));
        so.amps = Math.max(so.amps, Math.hypot(amps.re, amps.im));
        so.watts = Math.max(so.watts, watts);
      });
    }
    most.forEach(({ volts, amps, watts }, n) => {
      const { voltsPeak, ampsRms, watts: heat } = parts[n]!.mismatched!;
      for (const [found, scanned] of [
        [voltsPeak, volts],
        [ampsRms * Math.SQRT2, amps],
        [heat, watts],
      ] as const) {
        expect(found).toBeGreaterThan(scanned * (1 - 1e-9));
        expect(found).toBeLessThan(scanned * (1 + 1e-4));
      }
    });
  });
});

describe('stressOf() worked by hand from circuit theory: 50 Ω to 10 Ω, 10 W', () => {
  const omega = 2 * Math.PI * f0;
  // Q = √(50/10 − 1) = 2: 2·10 = 20 Ω in series with the 10 Ω, 50/2 = 25 Ω across the 50 Ω.
  const shunt = arm('shunt', 'capacitor', 1 / (omega * 25));

  it('lossless: 1 A in the series arm, 22.36 V across the shunt arm', () => {
    const arms = [shunt, arm('series', 'inductor', 20 / omega)];
    const states = [at(new Complex(50, 0), new Complex(10, 0), f0)];
    const { parts } = stressOf({ ladder: { arms, strayF: 0 }, f0, parts: partsOf(arms), states }, 10, null, unknown, 1);
    const [c, l] = parts;
    // I = √(10 W/10 Ω) = 1 A RMS; across 20 Ω that is 20 V RMS, 28.28 V peak.
    expect(l!.ampsRms).toBeCloseTo(1, 12);
    expect(l!.voltsPeak).toBeCloseTo(20 * Math.SQRT2, 11);
    // V = √(10 W·50 Ω) = 22.36 V RMS, 31.62 V peak; through 25 Ω that is 0.894 A RMS.
    expect(c!.voltsPeak).toBeCloseTo(Math.sqrt(1000), 11);
    expect(c!.ampsRms).toBeCloseTo(Math.sqrt(500) / 25, 12);
    expect([c!.watts, l!.watts]).toEqual([0, 0]);
  });

  it('a coil of Q = 100 takes 0.2 W of the 10 W from a load of 9.8 Ω', () => {
    // 20 Ω/100 = 0.2 Ω, with the load 10 Ω as before: still matched, 1 A RMS, 0.2 W of heat, 9.8 W in the load.
    const arms = [shunt, arm('series', 'inductor', 20 / omega, { q: 100 })];
    const ladder = { arms, strayF: 0 };
    const point = realPoint(realBranches(ladder, f0, f0), new Complex(50, 0), new Complex(9.8, 0), 10);
    expect(point.loadW).toBeCloseTo(9.8, 12);
    expect(point.inputW).toBeCloseTo(10, 12);
    expect(point.lostW).toBeCloseTo(0.2, 12);
    expect(point.reflectedW).toBeCloseTo(0, 20);
    expect(point.efficiency).toBeCloseTo(0.98, 12);
    const states = [at(new Complex(50, 0), new Complex(9.8, 0), f0)];
    const { parts } = stressOf({ ladder, f0, parts: partsOf(arms), states }, 10, null, unknown, 1);
    expect(parts[1]!.watts).toBeCloseTo(0.2, 12);
    expect(parts[1]!.ampsRms).toBeCloseTo(1, 12);
  });
});

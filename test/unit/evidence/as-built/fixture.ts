import { Complex } from 'complex.js';
import type { AsBuiltInput } from '../../../../src/evidence/as-built.ts';
import type { MeasuredData } from '../../../../src/measured/measured.ts';
import { realImpedance, type RealArm, type RealLadder } from '../../../../src/network/real-arm.ts';
import { terminationAt } from '../../../../src/network/termination-at.ts';
import type { Termination } from '../../../../src/network/termination.ts';

/** What a synthetic board has that its prediction hasn't. */
export interface Built {
  readonly ladder: RealLadder;
  readonly load: Termination;
  /** Capacitance added at each node, F; the source's first. */
  readonly extraF?: readonly number[];
  readonly seriesH?: number;
  readonly resistance?: number;
}

/**
 * Impedance of a board, Ω, added up from the load to the source with complex numbers: apart from the sweep that is under
 * test, which carries voltages and currents in typed arrays.
 */
export function boardImpedance(
  { ladder, load, extraF = [], seriesH = 0, resistance = 1 }: Built,
  f0: number,
  hz: number,
): Complex {
  const omega = 2 * Math.PI * hz;
  const across = (z: Complex, node: number): Complex =>
    z
      .inverse()
      .add(new Complex(0, omega * (ladder.strayF + (extraF[node] ?? 0))))
      .inverse();
  let node = ladder.arms.filter(({ arm }) => arm === 'series').length;
  const stated = terminationAt(load, f0, hz);
  let z = across(new Complex(stated.re * resistance, stated.im + omega * seriesH), node);
  for (const arm of ladder.arms.toReversed()) {
    const own = realImpedance(arm, f0, hz);
    if (arm.arm === 'series') z = across(z.add(own), (node -= 1));
    else z = z.inverse().add(own.inverse()).inverse();
  }
  return z;
}

/** A measurement of a board in a reference, with a ripple of fixed phases where a real one has noise. */
export function measure(
  built: Built,
  f0: number,
  frequencyHz: readonly number[],
  referenceOhm = 50,
  noise = 5e-4,
): MeasuredData {
  const gammas = frequencyHz.map((hz, k) => {
    const z = boardImpedance(built, f0, hz);
    return z
      .sub(referenceOhm)
      .div(z.add(referenceOhm))
      .mul(0.999)
      .add(new Complex(noise * Math.cos(k * k), noise * Math.sin(7 * k * k)));
  });
  return {
    name: 'board.s1p',
    sha256: '0'.repeat(64),
    samples: frequencyHz.length,
    thinningError: 0,
    referenceOhm,
    frequencyHz,
    re: gammas.map(({ re }) => re),
    im: gammas.map(({ im }) => im),
  };
}

export const grid = (low: number, high: number, n: number): number[] =>
  Array.from({ length: n }, (_, k) => low + ((high - low) * k) / (n - 1));

export const part = (
  arm: RealArm['arm'],
  kind: RealArm['part'],
  value: number,
  more: Partial<RealArm> = {},
): RealArm => ({
  arm,
  part: kind,
  value,
  q: kind === 'inductor' ? 60 : 400,
  qSlope: 0,
  parallelF: 0,
  seriesH: 0,
  ...more,
});

export const f0 = 150e6;

/** 50 Ω to 12 − j40 Ω at 150 MHz by shunt C, series L, shunt C, series L. */
export const ladder: RealLadder = {
  arms: [
    part('shunt', 'capacitor', 20e-12, { seriesH: 1e-9 }),
    part('series', 'inductor', 27e-9, { parallelF: 0.1e-12 }),
    part('shunt', 'capacitor', 43e-12, { seriesH: 1e-9 }),
    part('series', 'inductor', 56e-9, { parallelF: 0.1e-12 }),
  ],
  strayF: 0.5e-12,
};
export const load: Termination = { r: 12, x: -40, behaviour: 'series' };

export const input: Omit<AsBuiltInput, 'measured'> = {
  ladder,
  designators: ['C1', 'L1', 'C2', 'L2'],
  tolerances: ladder.arms.map(() => ({ kind: 'relative', value: 0.05 })),
  candidates: ladder.arms.map(() => []),
  source: { r: 50, x: 0, behaviour: 'constant' },
  loads: [{ name: '', termination: load }],
  attached: null,
  aim: 'conjugate',
  f0,
  spanHz: { low: 110e6, high: 200e6 },
  bandHz: { low: 148e6, high: 152e6 },
  returnLossDb: 10,
  percentiles: null,
};

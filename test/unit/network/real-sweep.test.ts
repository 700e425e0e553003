import { Complex } from 'complex.js';
import { describe, expect, it } from 'vitest';
import { realImpedance, type RealArm, type RealLadder } from '../../../src/network/real-arm.ts';
import { prepareReal, reflectionAt, worstInto, type Draws } from '../../../src/network/real-sweep.ts';
import { endsOver } from '../../../src/network/sweep.ts';
import type { Aim, OneImpedance } from '../../../src/network/termination.ts';

const f0 = 100e6;
const frequencyHz = Float64Array.of(60e6, 95e6, 100e6, 180e6);
const source: OneImpedance = { r: 40, x: 13, behaviour: 'constant' };
const load: OneImpedance = { r: 9.4, x: -61, behaviour: 'constant' };
const ends = endsOver(source, load, f0, frequencyHz);

/** Dimensionless, spread over −1 to 1 without order: fractional parts of multiples of the golden ratio. */
const scatter = (k: number): number => 2 * ((k * 0.6180339887498949) % 1) - 1;

interface Extras {
  readonly q?: number | null;
  readonly qSlope?: number;
  readonly parallelF?: number;
  readonly seriesH?: number;
}
const part = (arm: RealArm['arm'], kind: RealArm['part'], value: number, extras: Extras = {}): RealArm => ({
  ...{ arm, part: kind, value, q: 40, qSlope: 0.5, parallelF: 0, seriesH: 0 },
  ...extras,
});

/** |Γ|² from impedances put together one by one, looking in from the load. */
function stepByStep(ladder: RealLadder, draws: Draws, aim: Aim, d: number, hz: number): number {
  const spread = ({ r, x }: OneImpedance, dr: Float64Array | null, dx: Float64Array | null): Complex =>
    new Complex(r * (1 + (dr?.[d] ?? 0)), x + (dx?.[d] ?? 0) * Math.hypot(r, x));
  const stray = new Complex(0, 2 * Math.PI * hz * ladder.strayF);
  const across = (z: Complex, y: Complex): Complex => z.inverse().add(y).inverse();
  let z = across(spread(load, draws.loadR, draws.loadX), stray);
  for (let k = ladder.arms.length - 1; k >= 0; k -= 1) {
    const arm = ladder.arms[k]!;
    const own = realImpedance({ ...arm, value: arm.value * draws.scale[k]![d]! }, f0, hz);
    z = arm.arm === 'series' ? across(z.add(own), stray) : across(z, own.inverse());
  }
  const zs = spread(source, draws.sourceR, draws.sourceX);
  const target = aim === 'conjugate' ? zs.conjugate() : zs;
  return z.sub(target).div(z.add(zs)).abs() ** 2;
}

function drawsOf(arms: number, count: number, endsVary: boolean): Draws {
  const column = (offset: number): Float64Array =>
    Float64Array.from({ length: count }, (_, d) => 0.2 * scatter(1 + d * 10 + offset));
  const scale = Array.from({ length: arms }, (_, arm) => column(arm).map((deviation) => 1 + deviation));
  return endsVary
    ? { count, scale, loadR: column(arms), loadX: column(11), sourceR: column(12), sourceX: column(13) }
    : { count, scale, loadR: null, loadX: null, sourceR: null, sourceX: null };
}

function expectAgreement(ladder: RealLadder, aim: Aim, endsVary: boolean, count = 5): void {
  const draws = drawsOf(ladder.arms.length, count, endsVary);
  const prepared = prepareReal(ladder, ends, f0, aim);
  const out = new Float64Array(count);
  const worst = new Float64Array(count);
  const wanted = new Float64Array(count);
  frequencyHz.forEach((hz, k) => {
    reflectionAt(prepared, k, draws, out);
    out.forEach((found, d) => {
      const expected = stepByStep(ladder, draws, aim, d, hz);
      expect(Math.abs(found - expected)).toBeLessThan(1e-12);
      wanted[d] = Math.max(wanted[d]!, expected);
    });
  });
  worstInto(prepared, draws, worst);
  worst.forEach((found, d) => expect(Math.abs(found - wanted[d]!)).toBeLessThan(1e-12));
}

const henry = 80e-9;
const farad = 30e-12;
const extras: readonly Extras[] = [
  {},
  { q: null },
  { seriesH: 0.8e-9 },
  { parallelF: 0.7e-12 },
  { seriesH: 0.8e-9, parallelF: 0.7e-12 },
  { q: null, seriesH: 0.8e-9, parallelF: 0.7e-12 },
];
const alone = (['series', 'shunt'] as const).flatMap((arm) =>
  (['inductor', 'capacitor'] as const).flatMap((kind) =>
    extras.map((extra) => part(arm, kind, kind === 'inductor' ? henry : farad, extra)),
  ),
);

describe('reflectionAt(prepared, k, draws, out) and worstInto(prepared, draws, worst), against impedances put together one by one', () => {
  it.each(alone)('agree for %o alone', (arm) => {
    for (const strayF of [0, 1e-12]) {
      expectAgreement({ arms: [arm], strayF }, 'conjugate', false);
      expectAgreement({ arms: [arm], strayF }, 'reflectionless', true);
    }
  });

  it('agree for every kind of part before every other', () => {
    for (const first of alone) {
      for (const second of alone) {
        const third = part('series', 'inductor', 120e-9, { q: null });
        expectAgreement({ arms: [first, second, third], strayF: 0.4e-12 }, 'conjugate', true, 2);
      }
    }
  });

  it('agree for lossless ladders, whose numbers are all real', () => {
    const arms = [0, 1, 2].flatMap((k) => [
      part('shunt', 'capacitor', farad / (1 + k), { q: null }),
      part('series', 'inductor', henry * (1 + k), { q: null }),
      part('series', 'capacitor', farad * (1 + k), { q: null }),
      part('shunt', 'inductor', henry / (1 + k), { q: null }),
    ]);
    for (const aim of ['conjugate', 'reflectionless'] as const) {
      for (const strayF of [0, 1e-12]) expectAgreement({ arms, strayF }, aim, strayF > 0);
    }
  });

  it('agree without an arm, with strays and without', () => {
    for (const strayF of [0, 2e-12]) {
      for (const vary of [false, true]) expectAgreement({ arms: [], strayF }, 'conjugate', vary);
    }
  });

  it('agree for any number of networks, odd ones and more than a block', () => {
    const arms = [part('shunt', 'capacitor', farad), part('series', 'inductor', henry)];
    for (const count of [1, 2, 3, 255, 257, 513]) expectAgreement({ arms, strayF: 0.5e-12 }, 'conjugate', true, count);
  });
});

describe('worstInto(prepared, draws, worst)', () => {
  it('keeps what is worse already', () => {
    const ladder = { arms: [part('series', 'inductor', henry)], strayF: 0 };
    const worst = Float64Array.of(2, 0);
    worstInto(prepareReal(ladder, ends, f0, 'conjugate'), drawsOf(1, 2, false), worst);
    expect(worst[0]).toBe(2);
    expect(worst[1]).toBeGreaterThan(0);
  });

  it('has a number at the very resonance of a lossless part: nothing gets past', () => {
    // ω²LC = 1 in doubles as in the mind: ω = 1 rad/s, 1 H beside 1 F.
    const hz = 1 / (2 * Math.PI);
    const here = endsOver(
      { r: 1, x: 0, behaviour: 'constant' },
      { r: 1, x: 0, behaviour: 'constant' },
      hz,
      Float64Array.of(hz),
    );
    const draws: Draws = {
      count: 1,
      scale: [Float64Array.of(1)],
      loadR: null,
      loadX: null,
      sourceR: null,
      sourceX: null,
    };
    const lossless = { q: null, qSlope: 0 };
    for (const arm of [
      part('series', 'inductor', 1, { ...lossless, parallelF: 1 }),
      part('shunt', 'capacitor', 1, { ...lossless, seriesH: 1 }),
    ]) {
      const worst = new Float64Array(1);
      worstInto(prepareReal({ arms: [arm], strayF: 0 }, here, hz, 'conjugate'), draws, worst);
      expect(worst[0]).toBeCloseTo(1, 12);
    }
  });
});

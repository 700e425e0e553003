import type { Arm } from '../../../src/network/arm.ts';
import type { RealArm } from '../../../src/network/real-arm.ts';
import { endsOver, type Ends } from '../../../src/network/sweep.ts';
import { logGrid } from '../../../src/network/worst-in-band.ts';
import { preferredValues, type PreferredSeries } from '../../../src/parts/preferred-series.ts';

/** Arms from `series L 12n, shunt C 33p`. */
export function armsOf(text: string): Arm[] {
  return text.split(', ').map((each) => {
    const [arm, kind, size] = each.split(' ') as [Arm['arm'], 'L' | 'C', string];
    const value = Number(`${size.slice(0, -1)}e${{ n: '-9', p: '-12' }[size.at(-1) as 'n' | 'p']}`);
    return { arm, part: kind === 'L' ? 'inductor' : 'capacitor', value };
  });
}

/** Coils of Q 60 growing as the root of frequency with 0.1 pF across, capacitors of Q 300 with 0.4 nH. */
export const real = ({ arm, part }: Arm, value: number): RealArm =>
  part === 'inductor'
    ? { arm, part, value, q: 60, qSlope: 0.5, parallelF: 0.1e-12, seriesH: 0 }
    : { arm, part, value, q: 300, qSlope: 0, parallelF: 0, seriesH: 0.4e-9 };

/** Real parts of a series within a ratio of each arm's value. */
export const within = (arms: readonly Arm[], series: PreferredSeries, ratio: number): RealArm[][] =>
  arms.map((arm) => preferredValues(series, arm.value / ratio, arm.value * ratio).map((value) => real(arm, value)));

/** 50 Ω, and R + jX loads in series form, over a band. */
export const interfaces = (
  loads: readonly (readonly [number, number])[],
  f0: number,
  [low, high]: readonly [number, number],
  points = 101,
): Ends[] =>
  loads.map(([r, x]) =>
    endsOver({ r: 50, x: 0, behaviour: 'constant' }, { r, x, behaviour: 'series' }, f0, logGrid(low, high, points)),
  );

/** Everything a generator does, and what it returns. */
export function finish<T>(steps: Generator<void, T>): T {
  for (;;) {
    const step = steps.next();
    if (step.done === true) return step.value;
  }
}

export const decibels = (gammaSquared: number): number => -10 * Math.log10(gammaSquared);

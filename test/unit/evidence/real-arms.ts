import type { RealArm } from '../../../src/network/real-arm.ts';
import { endsOver, type Ends } from '../../../src/network/sweep.ts';
import type { StressPart } from '../../../src/evidence/stress.ts';

/** Design frequency at which ω is 1: an inductance in H is its reactance in Ω. */
export const f0 = 1 / (2 * Math.PI);

/** A lossless arm of reactance `x` Ω at f0. */
export const reactance = (arm: RealArm['arm'], x: number, more: Partial<RealArm> = {}): RealArm => ({
  arm,
  part: x > 0 ? 'inductor' : 'capacitor',
  value: x > 0 ? x : -1 / x,
  q: null,
  qSlope: 0,
  parallelF: 0,
  seriesH: 0,
  ...more,
});

export const alone = (arm: RealArm, armIndex: number, more: Partial<StressPart> = {}): StressPart => ({
  designator: `P${String(armIndex + 1)}`,
  armIndex,
  pair: null,
  alone: arm,
  ratedVolts: null,
  ratedAmps: null,
  ...more,
});

/** Source and load in Ω at f0, the same at every other frequency given. */
export const between = (source: number, load: { r: number; x: number }, frequencies: readonly number[] = [f0]): Ends =>
  endsOver(
    { r: source, x: 0, behaviour: 'constant' },
    { ...load, behaviour: 'constant' },
    f0,
    Float64Array.from(frequencies),
  );

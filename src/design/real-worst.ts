import { returnLossDb } from '../network/figures-of-merit.ts';
import type { RealLadder } from '../network/real-arm.ts';
import { realReflection } from '../network/real-reflection.ts';
import { endsOver, type Ends } from '../network/sweep.ts';
import { logGrid, worstInBand, type Worst } from '../network/worst-in-band.ts';
import type { DesignRecord } from '../record/design-record.ts';

/** Samples over the required band. */
const bandPoints = 101;

/** The source and every load state over the band, or at the design frequency where there is none, worked out once. */
export interface RealStates {
  readonly record: DesignRecord;
  /** In the order of the record's loads. */
  readonly ends: readonly Ends[];
}

export function realStates(record: DesignRecord): RealStates {
  const { frequencyHz: f0, bandHz } = record.requirement;
  const grid = bandHz === null ? Float64Array.of(f0) : logGrid(bandHz.low, bandHz.high, bandPoints);
  return { record, ends: record.loads.map(({ termination }) => endsOver(record.source, termination, f0, grid)) };
}

/** Least return loss of a network of real parts over band and states, dB, and where it occurs. */
export function realWorst(
  { record, ends }: RealStates,
  ladder: RealLadder,
): { readonly returnLossDb: number; readonly atHz: number; readonly state: string } {
  const { source, loads, aim, requirement } = record;
  const worst = loads
    .map(({ name, termination }, k): Worst & { readonly state: string } => {
      const at = (hz: number): number => {
        const { gamma } = realReflection(ladder, source, termination, requirement.frequencyHz, aim, hz);
        return gamma.re * gamma.re + gamma.im * gamma.im;
      };
      const { frequencyHz } = ends[k]!;
      return { ...worstInBand(frequencyHz, frequencyHz.map(at), at), state: name };
    })
    .reduce((a, b) => (b.gammaSquared > a.gammaSquared ? b : a));
  return { returnLossDb: returnLossDb(worst.gammaSquared), atHz: worst.atHz, state: worst.state };
}

import type { HalfPower } from '../dossier.ts';
import type { Arm } from '../network/arm.ts';
import type { Form } from '../network/form.ts';
import { edgeGrid, halfPowerEdges } from '../network/half-power.ts';
import { prepareLadder } from '../network/ladder.ts';
import { endsOver, sweep, sweepInto, type Ends, type SweepResult } from '../network/sweep.ts';
import { fillTermination } from '../network/termination-at.ts';
import type { Termination } from '../network/termination.ts';
import { logGrid, worstInBand, type Worst } from '../network/worst-in-band.ts';
import { formatQuantity } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { frequencySpan } from './words.ts';

/** Samples over the required band; every hump between them is refined. */
const bandPoints = 101;

/** What one network does at single frequencies and over the band, into one load state. Γ is for the aim in force. */
export interface BandFigures {
  readonly gainAt: (hz: number) => number;
  readonly gammaSquaredAt: (hz: number) => number;
  readonly worst: Worst | null;
  readonly halfPower: HalfPower;
}

export type BandSweeper = (arms: readonly Arm[], form: Form) => BandFigures;

/** The source and one load over the grids that every network is swept on, worked out once. */
export function bandSweeper(record: DesignRecord, load: Termination, reach: Span | null): BandSweeper {
  const { source, aim } = record;
  const { frequencyHz: f0, bandHz } = record.requirement;
  const wide = endsOver(source, load, f0, edgeGrid(f0, reach));
  const band = bandHz === null ? null : endsOver(source, load, f0, logGrid(bandHz.low, bandHz.high, bandPoints));
  const one = endsOver(source, load, f0, Float64Array.of(f0));

  return (arms, form) => {
    const ladder = prepareLadder(arms);
    const single: SweepResult = {
      gain: new Float64Array(1),
      gammaRe: new Float64Array(1),
      gammaIm: new Float64Array(1),
    };
    const at = (hz: number): void => {
      one.frequencyHz[0] = hz;
      fillTermination(source, f0, one.frequencyHz, one.rs, one.xs);
      fillTermination(load, f0, one.frequencyHz, one.rl, one.xl);
      sweepInto(ladder, one, aim, single);
    };
    const gainAt = (hz: number): number => {
      at(hz);
      return single.gain[0]!;
    };
    const gammaSquaredAt = (hz: number): number => {
      at(hz);
      return single.gammaRe[0]! ** 2 + single.gammaIm[0]! ** 2;
    };
    const edges = halfPowerEdges(wide.frequencyHz, sweep(ladder, wide, aim).gain, gainAt, f0);
    return {
      gainAt,
      gammaSquaredAt,
      worst: band === null ? null : worstOver(sweep(ladder, band, aim), band, gammaSquaredAt),
      halfPower: { ...edges, bandwidthHz: width(edges.lowHz, edges.highHz), words: edgeWords(edges, form, reach) },
    };
  };
}

function worstOver({ gammaRe, gammaIm }: SweepResult, ends: Ends, at: (hz: number) => number): Worst {
  const squared = gammaRe.map((re, k) => re * re + gammaIm[k]! * gammaIm[k]!);
  return worstInBand(ends.frequencyHz, squared, at);
}

const width = (low: number | null, high: number | null): number | null =>
  low === null || high === null ? null : high - low;

function edgeWords(
  { lowHz, highHz }: { readonly lowHz: number | null; readonly highHz: number | null },
  form: Form,
  reach: Span | null,
): string {
  if (lowHz !== null && highHz !== null) return frequencySpan({ low: lowHz, high: highHz });
  const why = reach !== null ? 'within the data' : form === 'all-pass' ? 'no part limits it' : form;
  if (lowHz === null && highHz === null) return `no edge on either side: ${why}`;
  if (lowHz === null) return `none below (${why}); up to ${formatQuantity(highHz!, 'Hz')}`;
  return `from ${formatQuantity(lowHz, 'Hz')}; none above (${why})`;
}

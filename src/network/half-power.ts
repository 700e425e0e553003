import type { Span } from '../quantity/span.ts';
import { zeroBetween, goldenMaximum } from './search.ts';
import { exp, log } from '../quantity/elementary.ts';

/** Edges 3.0103 dB below the peak of transducer gain nearest the design frequency; null where there is none. */
export interface HalfPowerEdges {
  readonly lowHz: number | null;
  readonly highHz: number | null;
  readonly peakHz: number;
  readonly peakGain: number;
}

/**
 * Frequencies at which edges are looked for: log-spaced away from f0, each step 3 % of the distance from f0 so that
 * both a band of parts per million and one of several decades are resolved; 1e-6·f0 to 1e6·f0, within `range`.
 */
export function edgeGrid(f0: number, range: Span | null = null): Float64Array {
  const offsets: number[] = [];
  for (let u = 1e-6; u < log(1e6); u *= 1.03) offsets.push(u);
  const n = offsets.length;
  const grid = new Float64Array(2 * n + 1);
  grid[n] = f0;
  offsets.forEach((u, k) => {
    grid[n + 1 + k] = f0 * exp(u);
    grid[n - 1 - k] = f0 * exp(-u);
  });
  if (range === null) return grid;
  // The ends of the data are samples too: an edge may lie between the last step and them.
  const within = grid.filter((hz) => hz === f0 || (range.low < hz && hz < range.high));
  return Float64Array.of(
    ...(range.low < f0 ? [Math.max(range.low, f0 * 1e-6)] : []),
    ...within,
    ...(range.high > f0 ? [range.high] : []),
  );
}

/**
 * Half-power edges of a gain curve sampled on `edgeGrid`, refined with `gainAt`.
 *
 * @param frequencyHz ascending, the design frequency among them
 * @param gain        transducer gain at each
 * @param gainAt      the same at any frequency, Hz
 * @param f0          design frequency, Hz
 */
export function halfPowerEdges(
  frequencyHz: Float64Array,
  gain: Float64Array,
  gainAt: (hz: number) => number,
  f0: number,
): HalfPowerEdges {
  const last = frequencyHz.length - 1;
  const start = frequencyHz.indexOf(f0);
  let top = start;
  while (top < last && gain[top + 1]! > gain[top]!) top += 1;
  while (top > 0 && gain[top - 1]! > gain[top]!) top -= 1;
  // A match at f0 is the peak; that rounding lifts a neighbour by a part in 1e12 doesn't move it.
  if (gain[top]! < gain[start]! * (1 + 1e-12)) top = start;
  const peak =
    top === 0 || top === last || top === start
      ? { at: frequencyHz[top]!, value: gain[top]! }
      : goldenMaximum(gainAt, frequencyHz[top - 1]!, frequencyHz[top + 1]!);
  const half = peak.value / 2;

  const edge = (step: 1 | -1): number | null => {
    for (let k = top; k + step >= 0 && k + step <= last; k += step) {
      if (gain[k + step]! >= half) continue;
      // The peak may be narrower than the grid: its own sample can lie below half of it.
      return zeroBetween((hz) => gainAt(hz) - half, k === top ? peak.at : frequencyHz[k]!, frequencyHz[k + step]!);
    }
    return null;
  };
  return { lowHz: edge(-1), highHz: edge(1), peakHz: peak.at, peakGain: peak.value };
}

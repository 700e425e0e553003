import type { Conclusion, Fault } from '../as-built-figures.ts';
import type { Reflections } from './aimed-reflection.ts';
import { rmsDistance } from './board-sweep.ts';
import { withFault, type Board } from './board.ts';
import { faultOf, hypothesesOf, type Hypothesis, type Scale } from './hypotheses.ts';
import { goldenMaximum } from '../../network/search.ts';

/** Distance in Γ that calibration and repeatability of a good measurement leave; what lies below tells nothing. */
export const measurementFloor = 0.002;
/** Residuals within this of each other are of causes that can't be told apart. */
const apart = 1.1;
/** A cause that leaves more than this of the distance doesn't explain it. */
const leaves = 0.5;
/** A cause that takes away less than this part of the distance takes nothing away. */
const counts = 0.01;
const scanned = 61;
/** Golden sections that find a dip's bottom. */
const refinements = 18;

export interface Fitted {
  readonly fault: Fault;
  readonly residual: number;
}

export interface Explained {
  readonly conclusion: Exclude<Conclusion, 'not compared'>;
  /** Least residual first. */
  readonly fits: readonly Fitted[];
  readonly alike: number;
}

/**
 * Fits each single cause by itself: its size is scanned and the two best places refined (golden section), so that the
 * RMS distance of |Γ measured − Γ predicted| is least.
 *
 * @param distance of the board as predicted
 */
export function explain(
  board: Board,
  measured: Reflections,
  sweep: (board: Board) => Reflections,
  scale: Scale,
  distance: number,
): Explained {
  const fits = hypothesesOf(board, scale)
    .map((hypothesis) => fit(hypothesis, (fault) => rmsDistance(sweep(withFault(board, fault)), measured)))
    .filter(({ residual }) => residual < distance * (1 - counts))
    .sort((a, b) => a.residual - b.residual);
  if (distance <= measurementFloor) return { conclusion: 'as predicted', fits, alike: 0 };
  const best = fits[0]?.residual ?? distance;
  if (best > distance * leaves) return { conclusion: 'unexplained', fits, alike: 0 };
  const alike = fits.filter(({ residual }) => residual <= Math.max(best * apart, measurementFloor)).length;
  return { conclusion: alike > 1 ? 'alike' : 'explained', fits, alike: Math.max(1, alike) };
}

function fit(hypothesis: Hypothesis, residualOf: (fault: Fault) => number): Fitted {
  const at = (t: number): number => residualOf(faultOf(hypothesis, t));
  const step = (1 - hypothesis.from) / (scanned - 1);
  const values = Array.from({ length: scanned }, (_, k) => at(hypothesis.from + k * step));
  const dips = values
    .map((value, k) => ({ t: hypothesis.from + k * step, k, value }))
    .filter(({ k, value }) => value <= (values[k - 1] ?? Infinity) && value <= (values[k + 1] ?? Infinity))
    .sort((a, b) => a.value - b.value)
    // Another dip twice as far up won't be the deepest.
    .filter(({ value }, k, [deepest]) => k < 2 && value <= 2 * deepest!.value);
  let best = { t: dips[0]!.t, value: dips[0]!.value };
  for (const { t } of dips) {
    const dip = goldenMaximum((u) => -at(u), Math.max(hypothesis.from, t - step), Math.min(1, t + step), refinements);
    if (-dip.value < best.value) best = { t: dip.at, value: -dip.value };
  }
  return { fault: faultOf(hypothesis, best.t), residual: best.value };
}

import { returnLossDb } from '../../network/figures-of-merit.ts';
import type { RealArm } from '../../network/real-arm.ts';
import { formatQuantity } from '../../quantity/format.ts';
import type { Fault, Remedy } from '../as-built-figures.ts';
import type { Reflections } from './aimed-reflection.ts';
import { withFault, type Board } from './board.ts';

/** A gain in return loss below this isn't worth a soldering iron, dB. */
const worth = 0.1;

/**
 * The one part that, replaced by one on sale, gives the best worst return loss with the cause in force: whatever made
 * a part's value differ is taken to stay with its place. Of causes that can't be told apart, the worst counts.
 *
 * @param candidates parts on sale for each arm, the nearest values below and above
 * @param sweeps     of every load state, over the band
 */
export function remedyOf(
  board: Board,
  designators: readonly string[],
  candidates: readonly (readonly RealArm[])[],
  faults: readonly Fault[],
  sweeps: readonly ((board: Board) => Reflections)[],
  requiredDb: number | null,
): Remedy | null {
  const worstDb = (changed: Board): number => {
    let worst = 0;
    for (const fault of faults) {
      for (const sweep of sweeps) {
        const { re, im } = sweep(withFault(changed, fault));
        for (let k = 0; k < re.length; k += 1) worst = Math.max(worst, re[k]! * re[k]! + im[k]! * im[k]!);
      }
    }
    return returnLossDb(worst);
  };
  const beforeDb = worstDb(board);
  let best: { readonly at: number; readonly arm: RealArm; readonly db: number } | null = null;
  for (const [at, parts] of candidates.entries()) {
    for (const arm of parts) {
      const db = worstDb({ ...board, arms: board.arms.map((a, k) => (k === at ? arm : a)) });
      if (db > (best?.db ?? beforeDb + worth)) best = { at, arm, db };
    }
  }
  if (best === null) return null;
  const designator = designators[best.at]!;
  const from = board.arms[best.at]!.value;
  const unit = best.arm.part === 'inductor' ? 'H' : 'F';
  return {
    designator,
    from,
    to: best.arm.value,
    words: `${designator} of ${formatQuantity(best.arm.value, unit, 3)} instead of ${formatQuantity(from, unit, 3)}`,
    beforeDb,
    afterDb: best.db,
    meets: requiredDb === null ? null : best.db >= requiredDb,
  };
}

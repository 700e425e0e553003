import { drawsWith } from './spread.ts';
import { withTolerance, type PreparedSubject } from './subject.ts';
import type { PartSensitivity } from './tolerance-figures.ts';
import { passedOf, worstReturnLosses } from './yield.ts';

/** Step up and down, as a fraction of a part's value: at its best a return loss falls to both sides. */
const step = 0.01;

/**
 * What each part does to the worst return loss, largest effect within its tolerance first.
 *
 * @param yieldsIfHalved of each part in the order of the subject's, as `yieldIfHalved` finds them; null: none assessed
 */
export function sensitivityOf(subject: PreparedSubject, yieldsIfHalved: readonly number[] | null): PartSensitivity[] {
  const { parts } = subject;
  const nominalDb = worstWith(
    subject,
    parts.map(() => [0]),
  )[0]!;
  const rows = parts.map(({ designator, tolerance }, k) => {
    const alone = (deviations: readonly number[]): Float64Array =>
      worstWith(
        subject,
        parts.map((_, other) => deviations.map((deviation) => (other === k ? deviation : 0))),
      );
    const found = alone([step, -step, tolerance, -tolerance]);
    const atToleranceDb = Math.min(found[2]!, found[3]!);
    return {
      effectDb: nominalDb - atToleranceDb,
      figures: {
        designator,
        dbPerPercent: found[0]! - nominalDb,
        dbPerMinusPercent: found[1]! - nominalDb,
        atToleranceDb,
        yieldIfHalved: yieldsIfHalved?.[k] ?? null,
      },
    };
  });
  return rows.toSorted((one, other) => other.effectDb - one.effectDb).map(({ figures }) => figures);
}

/** Yield with one part's tolerance halved, of the same networks as `yieldOf`. */
export const yieldIfHalved = (
  subject: PreparedSubject,
  part: number,
  requiredDb: number,
  seed: number,
  samples: number,
): number =>
  passedOf(withTolerance(subject, part, subject.parts[part]!.tolerance / 2), requiredDb, seed, 0, samples) / samples;

/** Worst return losses of networks with relative deviations of each part, one row a part. */
function worstWith(subject: PreparedSubject, deviations: readonly (readonly number[])[]): Float64Array {
  const parts = subject.parts.map((part) => ({ ...part, tolerance: 1 }));
  const columns = deviations.map((column) => Float64Array.from(column));
  return worstReturnLosses(subject, drawsWith(parts, subject.ladder.arms.length, columns, columns[0]?.length ?? 1));
}

import { formatTolerance } from '../parts/tolerance.ts';
import { formatFixed } from '../quantity/format.ts';
import type { VariedPart } from './spread.ts';
import type { PartSensitivity } from './tolerance-figures.ts';

/**
 * Which tolerance to tighten first and what it would buy, in a sentence; '' where nothing is gained.
 *
 * @param found yield as it is, 0 to 1; null: none assessed
 */
export function tighten(
  parts: readonly VariedPart[],
  sensitivity: readonly PartSensitivity[],
  found: number | null,
): string {
  if (found === null) return '';
  const best = sensitivity.reduce<PartSensitivity | null>(
    (best, each) => ((each.yieldIfHalved ?? 0) > (best?.yieldIfHalved ?? found) ? each : best),
    null,
  );
  const part = parts.find(({ designator }) => designator === best?.designator);
  if (best === null || part === undefined) return '';
  const [then, now] = [percent(best.yieldIfHalved ?? 0), percent(found)];
  if (then === now) return '';
  const tolerance = (value: number): string => formatTolerance({ kind: 'relative', value }, 'inductor');
  return `Tighten ${part.designator} first: with ${tolerance(part.tolerance / 2)} instead of ${tolerance(part.tolerance)} the yield is ${then} instead of ${now}.`;
}

/** To a tenth of a per cent; what isn't all or nothing is never written so. */
function percent(fraction: number): string {
  const rounded = Math.round(fraction * 1000) / 10;
  const kept = fraction < 1 && rounded === 100 ? 99.9 : fraction > 0 && rounded === 0 ? 0.1 : rounded;
  return `${formatFixed(kept, 1)} %`;
}

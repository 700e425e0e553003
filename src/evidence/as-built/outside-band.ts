import type { Percentiles } from '../tolerance-figures.ts';
import type { OutsideSpan, Overlay } from '../as-built-figures.ts';

/**
 * Runs of samples whose return loss is outside the band between the outermost percentile curves. Samples beyond the
 * curves' own frequencies are left out; between these the curves are straight.
 *
 * @returns null where no curves are given for the state
 */
export function outsideBand(
  { frequencyHz, measuredDb }: Overlay,
  percentiles: Percentiles | null,
  state: string,
): OutsideSpan[] | null {
  const curves = percentiles?.states.find((of) => of.state === state);
  if (percentiles === null || curves === undefined || curves.curvesDb.length < 2) return null;
  const order = percentiles.fractions
    .map((_, k) => k)
    .sort((a, b) => percentiles.fractions[a]! - percentiles.fractions[b]!);
  const lowDb = curves.curvesDb[order[0]!]!;
  const highDb = curves.curvesDb[order.at(-1)!]!;
  const spans: OutsideSpan[] = [];
  let open: OutsideSpan | null = null;
  let interval = 0;
  for (const [k, hz] of frequencyHz.entries()) {
    while (interval < curves.frequencyHz.length - 2 && curves.frequencyHz[interval + 1]! <= hz) interval += 1;
    const [from, to] = [curves.frequencyHz[interval]!, curves.frequencyHz[interval + 1]!];
    const along = (curve: readonly number[]): number =>
      curve[interval]! + ((curve[interval + 1]! - curve[interval]!) * (hz - from)) / (to - from);
    const below = along(lowDb) - measuredDb[k]!;
    const above = measuredDb[k]! - along(highDb);
    const byDb = Math.max(below, above);
    if (!(from <= hz && hz <= to && byDb > 0)) {
      open = null;
      continue;
    }
    const side = below > above ? 'below' : 'above';
    const grown: OutsideSpan =
      open?.side === side
        ? { ...open, high: hz, ...(byDb > open.byDb ? { byDb, atHz: hz } : {}) }
        : { low: hz, high: hz, side, byDb, atHz: hz };
    if (open?.side === side) spans.pop();
    spans.push(grown);
    open = grown;
  }
  return spans;
}

import type { Arm } from '../network/arm.ts';
import { formatQuantity } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';

/**
 * Range of values taken as practicable where nobody says otherwise (common practice, no source): below about 1 pF a
 * capacitor is lost in board strays, above about 10 µH an inductor is ruled by its winding; 1 nH is a few millimetres
 * of conductor, and above 100 nF a capacitor has lost its resonance to its leads at radio frequency.
 */
export const practicable = {
  inductorH: { low: 1e-9, high: 1e-5 },
  capacitorF: { low: 1e-12, high: 1e-7 },
} as const;

/** One phrase for each part whose value lies outside its range; empty when all can be bought. */
export function impracticable(
  arms: readonly Arm[],
  designators: readonly string[],
  inductorH: Span,
  capacitorF: Span,
): string[] {
  return arms.flatMap((arm, k) => {
    const [range, unit] = arm.part === 'inductor' ? ([inductorH, 'H'] as const) : ([capacitorF, 'F'] as const);
    // An end typed as 1p and a value computed as 1 pF may differ in the last bit.
    const below = arm.value < range.low * (1 - 1e-9);
    const above = arm.value > range.high * (1 + 1e-9);
    if (!below && !above) return [];
    const limit = formatQuantity(below ? range.low : range.high, unit, 3);
    return [`${designators[k]!} ${formatQuantity(arm.value, unit)} is ${below ? 'below' : 'above'} ${limit}`];
  });
}

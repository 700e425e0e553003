import type { HalfPower } from '../dossier.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';

/** Difference between the two half-power figures above which the estimate is said not to hold. */
const estimateWithin = 0.1;

/**
 * How f0/Q_L and the sweep compare and, where they differ, why.
 *
 * @param fromQ    f0/Q_L, Hz; null where no section has a Q
 * @param sections of the network
 * @param reactive an end has reactance
 */
export function bandwidthNote(
  fromQ: number | null,
  { bandwidthHz }: HalfPower,
  sections: number,
  reactive: boolean,
): string {
  if (fromQ === null) return 'No section has a Q: there is nothing to estimate from.';
  if (bandwidthHz === null) {
    return 'The estimate assumes an edge on either side; the sweep finds none on one side, so the two do not compare.';
  }
  const difference = fromQ / bandwidthHz - 1;
  if (Math.abs(difference) <= estimateWithin) {
    return `The estimate is within 10 % of the sweep (${percent(difference)}).`;
  }
  const causes = [
    sections > 1 ? `it takes one section alone, and ${String(sections)} sections shape the band together` : '',
    reactive ? "it leaves out the energy stored in the terminations' reactance" : '',
    sections === 1 && !reactive
      ? 'it assumes a resonance whose edges lie close to it on either side; this Q is low'
      : '',
  ].filter((cause) => cause !== '');
  return `The estimate does not hold (${percent(difference)} against the sweep): ${causes.join('; ')}.`;
}

const percent = (fraction: number): string =>
  Math.abs(fraction) < 10
    ? `${fraction > 0 ? '+' : ''}${formatFixed(100 * fraction, 0)} %`
    : `${formatQuantity(1 + fraction, '', 2)} times`;

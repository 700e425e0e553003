import { formatFixed } from '../quantity/format.ts';

/** A match at one frequency has a return loss without end there; beyond this no one reads a difference. */
const highest = 40;

/**
 * Upper end of an axis of return loss, and its title.
 *
 * @param best    highest value drawn, dB
 * @param needed  dB; null: none is required
 */
export function returnLossAxis(best: number, needed: number | null): { readonly high: number; readonly title: string } {
  const top = Math.max(10, (needed ?? 0) + 6, Math.min(highest, best));
  const high = Math.ceil(top / 10) * 10;
  const cut = best > high ? `; above ${formatFixed(high, 0)} dB not drawn` : '';
  return { high, title: `Return loss, dB (larger is better${cut})` };
}
